import { z } from 'zod/mini';
import { elementsDraft } from './elements-draft.ts';
import { moistureDraft } from './moisture-draft.ts';

/** An ultimate analysis, from which a published correlation estimates the gross heat. */
export const ultimateDraft = {
  way: z.literal('ultimate'),
  elements: elementsDraft,
  /**
   * What the shares are of: the dry material, the dry material without its ash, or the material as it lies there, without the
   * hydrogen and oxygen of its water.
   */
  of: z.enum(['dry', 'dry-ash-free', 'as-received']),
  correlation: z.enum(['channiwala-parikh', 'boie']),
  /** Water in the material as it lies there; absent: none. */
  moisture: z.optional(moistureDraft),
};
