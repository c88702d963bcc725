import { z } from 'zod/mini';
import { defineContract } from './contract.ts';

export const cautionSchema = z.strictObject({ id: z.string(), title: z.string(), text: z.string() });

export const listCautions = defineContract({
  id: 'cautions.list',
  method: 'GET',
  path: '/api/cautions',
  summary: 'The cautions that stand with results',
  policy: { kind: 'public', why: 'safety notices are for everyone' },
  response: z.strictObject({ items: z.array(cautionSchema) }),
  status: 200,
});
