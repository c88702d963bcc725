import { createExport, readExport, readExportFile, stopExport } from '@embertally/shared/contracts/exports';
import { attachment } from '../http/attachment.ts';
import { defineRoute, type Route } from '../http/define-route.ts';
import type { ExportService } from '../services/export-service.ts';

export function exportRoutes(exports: ExportService): Route[] {
  return [
    defineRoute(createExport, async ({ actor, access, params, body, trail }) => ({
      kind: 'json',
      body: await exports.create(actor, access, params.surveyId, body, trail),
    })),
    defineRoute(readExport, async ({ params }) => ({ kind: 'json', body: await exports.read(params.exportId) })),
    defineRoute(stopExport, async ({ actor, access, params, trail }) => {
      await exports.stop(actor, access, params.exportId, trail);
      return { kind: 'nothing' };
    }),
    defineRoute(readExportFile, async ({ params }) => {
      const file = await exports.readFile(params.exportId);
      return attachment(file.name, 'application/pdf', file.bytes);
    }),
  ];
}
