import { z } from 'zod/mini';
import { roomInputSchema } from '../tally/room-input.ts';
import { defineContract } from './contract.ts';

/**
 * The tally of one room as a calculation on its own: nothing is stored. The answer is a `RoomTally`; its shape is the
 * business of `shared/src/tally`. Faults of the input come back as 422, every one of them.
 */
export const createEstimate = defineContract({
  id: 'estimates.create',
  method: 'POST',
  path: '/api/estimates',
  summary: 'Estimate one room; ?workings=1 adds inputs, steps and sources to every number',
  policy: { kind: 'signed-in' },
  query: z.strictObject({ workings: z.optional(z.enum(['0', '1'])) }),
  body: z.record(z.string(), z.unknown()),
  bodyShape: roomInputSchema,
  maxBodyBytes: 4 * 1024 * 1024,
  response: z.looseObject({ engine: z.string() }),
  status: 200,
  costly: true,
});
