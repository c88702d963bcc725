import { z } from 'zod/mini';
import { MAX_CHANGE_SET_BYTES, changeSchema, changeSetBodySchema } from '../survey/change.ts';
import { surveyDocument } from '../survey/versions/v2.ts';
import { defineContract } from './contract.ts';
import { siteRoleSchema } from './sites.ts';

const surveyId = z.strictObject({ surveyId: z.uuid() });

/** Where the survey belongs and what the reader may do; the document itself is another answer. */
export const surveySchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(['working', 'trial']),
  sequence: z.int(),
  building: z.strictObject({ id: z.uuid(), name: z.string() }),
  site: z.strictObject({ id: z.uuid(), name: z.string(), time_zone: z.string() }),
  my_role: siteRoleSchema,
  of_keeper: z.boolean(),
});
export type Survey = z.infer<typeof surveySchema>;

export const readSurvey = defineContract({
  id: 'surveys.read',
  method: 'GET',
  path: '/api/surveys/:surveyId',
  summary: 'A survey: where it belongs and my role',
  policy: { kind: 'site', action: 'survey.read', of: 'survey', param: 'surveyId' },
  params: surveyId,
  response: surveySchema,
  status: 200,
});

export const readDocument = defineContract({
  id: 'surveys.read-document',
  method: 'GET',
  path: '/api/surveys/:surveyId/document',
  summary: 'The whole document; ETag "s<sequence>"',
  policy: { kind: 'site', action: 'survey.read', of: 'survey', param: 'surveyId' },
  params: surveyId,
  response: surveyDocument,
  status: 200,
});

/** An accepted change set as it stands in the feed. */
export const fedChangeSetSchema = z.strictObject({
  id: z.uuid(),
  sequence: z.int(),
  label: z.string(),
  changes: z.array(changeSchema),
  by: z.strictObject({ person_id: z.uuid(), name: z.string() }),
  at: z.iso.datetime(),
});
export type FedChangeSet = z.infer<typeof fedChangeSetSchema>;

export const readChanges = defineContract({
  id: 'surveys.read-changes',
  method: 'GET',
  path: '/api/surveys/:surveyId/changes',
  summary: 'Accepted change sets after a sequence number, oldest first',
  policy: { kind: 'site', action: 'survey.read', of: 'survey', param: 'surveyId' },
  params: surveyId,
  query: z.strictObject({
    after: z.coerce.number().check(z.int(), z.minimum(0)),
    limit: z.optional(z.coerce.number().check(z.int(), z.minimum(1), z.maximum(500))),
  }),
  response: z.strictObject({ items: z.array(fedChangeSetSchema), sequence: z.int(), more: z.boolean() }),
  status: 200,
});

/**
 * Apply one change set in one transaction. 409 answers carry `clashes` (see `clashSchema`) beside the problem fields
 * and nothing is applied; 422 when the id is known with another body or a row breaks its schema.
 */
export const applyChangeSet = defineContract({
  id: 'change-sets.create',
  method: 'POST',
  path: '/api/surveys/:surveyId/change-sets',
  summary: 'Apply a change set',
  policy: { kind: 'site', action: 'survey.edit', of: 'survey', param: 'surveyId' },
  params: surveyId,
  body: changeSetBodySchema,
  maxBodyBytes: MAX_CHANGE_SET_BYTES,
  response: z.strictObject({
    id: z.uuid(),
    sequence: z.int(),
    /** The changes as applied after merging. */
    changes: z.array(changeSchema),
  }),
  status: 201,
});

export const readEvents = defineContract({
  id: 'surveys.read-events',
  method: 'GET',
  path: '/api/surveys/:surveyId/events',
  summary: 'Server-sent events: one per accepted change set, id = sequence',
  policy: { kind: 'site', action: 'survey.read', of: 'survey', param: 'surveyId' },
  params: surveyId,
  status: 200,
  media: 'text/event-stream',
});

/** The headline of one room as last computed; `stale` while a change is being recomputed. */
export const roomSummarySchema = z.strictObject({
  room_id: z.uuid(),
  storey_id: z.uuid(),
  name: z.string(),
  floor_area_m2: z.nullable(z.number()),
  load_total_MJ: z.nullable(z.number()),
  load_per_floor_MJ_m2: z.nullable(z.number()),
  peak_kW: z.nullable(z.number()),
  flashover_time_s: z.nullable(z.number()),
  standing: z.enum(['within', 'near', 'over', 'no limit set']),
  /** value ÷ bound of the limit that is nearest or most exceeded. */
  ratio: z.nullable(z.number()),
  entries: z.int(),
  engine: z.string(),
  stale: z.boolean(),
  computed_at: z.nullable(z.iso.datetime()),
});
export type RoomSummary = z.infer<typeof roomSummarySchema>;

export const listRoomSummaries = defineContract({
  id: 'room-summaries.list',
  method: 'GET',
  path: '/api/surveys/:surveyId/room-summaries',
  summary: 'The headline of every room of a survey',
  policy: { kind: 'site', action: 'survey.read', of: 'survey', param: 'surveyId' },
  params: surveyId,
  response: z.strictObject({ items: z.array(roomSummarySchema) }),
  status: 200,
});
