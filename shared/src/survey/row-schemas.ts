import { z } from 'zod/mini';
import type { EntityKind } from './survey-document.ts';
import { corner, entry, opening, room, storey } from './versions/v2.ts';

/** What a whole row of each kind must look like. */
export const rowSchemas = { storey, corner, room, opening, entry } as const satisfies Record<
  EntityKind,
  z.core.$ZodType
>;

/** What an edit of each kind may touch: any fields but the id and the storey a thing belongs to. */
export const patchSchemas = {
  storey: z.partial(z.omit(storey, { id: true })),
  corner: z.partial(z.omit(corner, { id: true, storey_id: true })),
  room: z.partial(z.omit(room, { id: true, storey_id: true })),
  opening: z.partial(z.omit(opening, { id: true, storey_id: true })),
  entry: z.partial(z.omit(entry, { id: true })),
} as const satisfies Record<EntityKind, z.core.$ZodType>;
