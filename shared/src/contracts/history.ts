import { z } from 'zod/mini';
import { defineContract } from './contract.ts';

/** One thing that happened on a site, as it stands in the site's chain of audit events. */
export const historyEventSchema = z.strictObject({
  position: z.int(),
  at: z.iso.datetime(),
  /** Noun and verb, as `site-role.given`. */
  action: z.string(),
  by: z.nullable(z.strictObject({ name: z.string(), organisation_name: z.string() })),
  object: z.strictObject({ kind: z.string(), id: z.string() }),
  /** Short facts for reading, as `role: viewer`. */
  facts: z.record(z.string(), z.union([z.string(), z.number(), z.boolean(), z.null()])),
  hash: z.string(),
});
export type HistoryEvent = z.infer<typeof historyEventSchema>;

export const readHistory = defineContract({
  id: 'history.read',
  method: 'GET',
  path: '/api/sites/:siteId/history',
  summary: 'What was done on a site, newest first',
  policy: { kind: 'site', action: 'history.read', of: 'site', param: 'siteId' },
  params: z.strictObject({ siteId: z.uuid() }),
  query: z.strictObject({
    before: z.optional(z.coerce.number().check(z.int(), z.minimum(1))),
    limit: z.optional(z.coerce.number().check(z.int(), z.minimum(1), z.maximum(100))),
  }),
  response: z.strictObject({ items: z.array(historyEventSchema), next_before: z.nullable(z.int()) }),
  status: 200,
});
