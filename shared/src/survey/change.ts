import { z } from 'zod/mini';
import { ENTITY_KINDS, type EntityKind } from './survey-document.ts';

/**
 * What one gesture did to one row. A create has `before: null` and the whole row in `after`; an edit carries only the
 * touched fields on both sides; a delete carries the whole row in `before` and `after: null`.
 */
export interface Change {
  readonly kind: EntityKind;
  readonly id: string;
  readonly before: Readonly<Record<string, unknown>> | null;
  readonly after: Readonly<Record<string, unknown>> | null;
}
export type Changes = readonly Change[];

export const MAX_CHANGES = 2000;
export const MAX_CHANGE_SET_BYTES = 2 * 1024 * 1024;

const fields = z.nullable(z.record(z.string(), z.unknown()));
export const changeSchema = z.strictObject({
  kind: z.enum(ENTITY_KINDS as [EntityKind, ...EntityKind[]]),
  id: z.uuid(),
  before: fields,
  after: fields,
});
export const changeSetBodySchema = z.strictObject({
  /** Made by the client; the same id with the same body gets the stored answer again. */
  id: z.uuid(),
  /** What the gesture was, for the history: a command's name. */
  label: z.string().check(z.maxLength(120)),
  changes: z.array(changeSchema).check(z.minLength(1), z.maxLength(MAX_CHANGES)),
});
export type ChangeSetBody = z.infer<typeof changeSetBodySchema>;

/** Why a change could not be merged. `geometry`: each side is fine alone, together they break an invariant. */
export const clashSchema = z.strictObject({
  reason: z.enum(['field', 'gone', 'edited', 'geometry']),
  kind: z.enum(ENTITY_KINDS as [EntityKind, ...EntityKind[]]),
  id: z.uuid(),
  field: z.nullable(z.string()),
  base: z.unknown(),
  theirs: z.unknown(),
  mine: z.unknown(),
  by: z.nullable(z.string()),
  at: z.nullable(z.iso.datetime()),
  /** One sentence for the person. */
  message: z.string(),
});
export type Clash = z.infer<typeof clashSchema>;
