import { FILE_TYPES, readFile, sendFile } from '@embertally/shared/contracts/files';
import { fileAnswer } from '../http/file-answer.ts';
import { defineRoute, type Route } from '../http/define-route.ts';
import { uploadBody } from '../http/upload-body.ts';
import type { FileService } from '../services/file-service.ts';

export function fileRoutes(files: FileService): Route[] {
  return [
    defineRoute(sendFile, async ({ actor, query, request, trail }) => {
      const { type, pieces } = uploadBody(request, FILE_TYPES);
      return { kind: 'json', body: await files.send(actor, { ...query, type }, pieces, trail) };
    }),
    defineRoute(readFile, async ({ actor, params, request }) =>
      fileAnswer(request, await files.read(actor, params.fileId)),
    ),
  ];
}
