import { z } from 'zod/mini';
import { defineContract } from './contract.ts';

export const readLive = defineContract({
  id: 'health.live',
  method: 'GET',
  path: '/api/health/live',
  summary: 'The process answers',
  policy: { kind: 'public', why: 'a balancer asks without a session' },
  response: z.strictObject({ live: z.literal(true) }),
  status: 200,
});

export const readReady = defineContract({
  id: 'health.ready',
  method: 'GET',
  path: '/api/health/ready',
  summary: 'The database answers too; 503 while it does not',
  policy: { kind: 'public', why: 'a balancer asks without a session' },
  response: z.strictObject({ ready: z.literal(true) }),
  status: 200,
});
