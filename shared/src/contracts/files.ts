import { z } from 'zod/mini';
import { defineContract } from './contract.ts';

const MB = 1024 * 1024;

/** What is taken as a file, with the most bytes of each. Nothing else is stored, whatever it is called. */
export const FILE_TYPES = {
  'application/pdf': { word: 'PDF', maxBytes: 15 * MB },
  'image/png': { word: 'PNG picture', maxBytes: 15 * MB },
  'image/jpeg': { word: 'JPEG picture', maxBytes: 15 * MB },
  'text/csv': { word: 'CSV table', maxBytes: 25 * MB },
} as const;
export type FileType = keyof typeof FILE_TYPES;
export const fileTypeSchema = z.enum(['application/pdf', 'image/png', 'image/jpeg', 'text/csv']);

/** A stored file: its content never changes. It is kept while something refers to it, and a day longer. */
export const storedFileSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  type: fileTypeSchema,
  bytes: z.int(),
  /** SHA-256 of the content, hexadecimal. */
  sha256: z.string(),
  sent_by: z.string(),
  sent_at: z.iso.datetime(),
});
export type StoredFile = z.infer<typeof storedFileSchema>;

/**
 * The body is the file itself, its `Content-Type` one of `FILE_TYPES`; the name is for people only. The same id with the
 * same content gives the stored answer.
 */
export const sendFile = defineContract({
  id: 'files.create',
  method: 'POST',
  path: '/api/files',
  summary: 'Send a file to be kept: a report, a sheet, a measured table, a picture',
  policy: { kind: 'organisation', action: 'file.send' },
  query: z.strictObject({
    id: z.uuid(),
    name: z.string().check(z.trim(), z.minLength(1), z.maxLength(200)),
  }),
  upload: FILE_TYPES,
  costly: true,
  response: storedFileSchema,
  status: 201,
});

export const readFile = defineContract({
  id: 'files.read',
  method: 'GET',
  path: '/api/files/:fileId',
  summary: 'A file of one’s own organisation, to save',
  policy: { kind: 'organisation', action: 'file.read' },
  params: z.strictObject({ fileId: z.uuid() }),
  status: 200,
  media: 'application/octet-stream',
});
