import { z } from 'zod/mini';
import { defineContract } from './contract.ts';

/** A file made off the request thread: asked for, watched, fetched. */
export const exportSchema = z.strictObject({
  id: z.uuid(),
  survey_id: z.uuid(),
  kind: z.enum(['survey-report', 'room-tally']),
  room_id: z.nullable(z.uuid()),
  state: z.enum(['waiting', 'running', 'ready', 'failed', 'stopped']),
  progress: z.number().check(z.minimum(0), z.maximum(1)),
  file_name: z.nullable(z.string()),
  bytes: z.nullable(z.int()),
  /** Why it failed and what to do, for a person. */
  problem: z.nullable(z.string()),
  created_at: z.iso.datetime(),
});
export type Export = z.infer<typeof exportSchema>;

const exportId = z.strictObject({ exportId: z.uuid() });

export const createExport = defineContract({
  id: 'exports.create',
  method: 'POST',
  path: '/api/surveys/:surveyId/exports',
  summary: 'Ask for a PDF of the working survey or of one room’s tally',
  policy: { kind: 'site', action: 'export.create', of: 'survey', param: 'surveyId' },
  params: z.strictObject({ surveyId: z.uuid() }),
  body: z.strictObject({
    id: z.uuid(),
    kind: z.enum(['survey-report', 'room-tally']),
    room_id: z.nullable(z.uuid()),
    /** Units the reader chose. */
    units: z.enum(['SI', 'US']),
  }),
  response: exportSchema,
  status: 202,
  costly: true,
});

export const readExport = defineContract({
  id: 'exports.read',
  method: 'GET',
  path: '/api/exports/:exportId',
  summary: 'How far the file is',
  policy: { kind: 'site', action: 'survey.read', of: 'export', param: 'exportId' },
  params: exportId,
  response: exportSchema,
  status: 200,
});

export const stopExport = defineContract({
  id: 'exports.stop',
  method: 'DELETE',
  path: '/api/exports/:exportId',
  summary: 'Stop making the file',
  policy: { kind: 'site', action: 'export.create', of: 'export', param: 'exportId' },
  params: exportId,
  status: 204,
});

export const readExportFile = defineContract({
  id: 'exports.read-file',
  method: 'GET',
  path: '/api/exports/:exportId/file',
  summary: 'The file itself',
  policy: { kind: 'site', action: 'survey.read', of: 'export', param: 'exportId' },
  params: exportId,
  status: 200,
  media: 'application/pdf',
});
