import { z } from 'zod/mini';
import { defineContract } from './contract.ts';

export const readOpenapi = defineContract({
  id: 'openapi.read',
  method: 'GET',
  path: '/api/openapi.json',
  summary: 'This API as OpenAPI 3.1',
  policy: { kind: 'public', why: 'it describes the program and holds no data' },
  response: z.looseObject({ openapi: z.string() }),
  status: 200,
});

export const readDocs = defineContract({
  id: 'docs.read',
  method: 'GET',
  path: '/api/docs',
  summary: 'This API as a page to read',
  policy: { kind: 'public', why: 'it describes the program and holds no data' },
  status: 200,
  media: 'text/html',
});
