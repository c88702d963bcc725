import { z } from 'zod/mini';
import { atLeastZero, percent, positive, someText } from './draft-numbers.ts';
import { elementsDraft } from './elements-draft.ts';
import { moistureDraft } from './moisture-draft.ts';

/** A run with benzoic acid that gives the water equivalent of the calorimeter. */
const calibrationRun = z.strictObject({
  mass_kg: positive(0.1),
  /** Corrected temperature rise. */
  rise_K: positive(20),
  /** Heat of fuse, thread and paper. */
  fuse_MJ: atLeastZero(0.01),
  /** Heat of the nitric and sulfuric acid that formed. */
  acid_MJ: z.optional(atLeastZero(0.01)),
});

/** A run with the material. */
const bombRun = z.strictObject({
  mass_kg: positive(0.1),
  /** Temperature rise, corrected for the heat exchanged with the surroundings. */
  rise_K: z.number().check(z.minimum(-20), z.maximum(20)),
  fuse_MJ: atLeastZero(0.1),
  acid_MJ: z.optional(atLeastZero(0.1)),
  /** Benzoic acid added to help burning. */
  aid_kg: z.optional(atLeastZero(0.1)),
  /** Why this run does not count; a run is left out by a person who says why, never by the book. */
  left_out: z.optional(someText(300)),
});

/** Runs in an oxygen bomb: gross heat at constant volume, brought to net, as received. */
export const bombDraft = {
  way: z.literal('bomb'),
  calibration: z.discriminatedUnion('by', [
    z.strictObject({ by: z.literal('given'), water_equivalent_MJ_K: positive(1) }),
    z.strictObject({
      by: z.literal('runs'),
      /** From the certificate of the benzoic acid; absent: 26.434 MJ/kg, for mass in vacuum. */
      benzoic_MJ_kg: z.optional(z.number().check(z.minimum(26.38), z.maximum(26.48))),
      runs: z.array(calibrationRun).check(z.minLength(1), z.maxLength(50)),
    }),
  ]),
  runs: z.array(bombRun).check(z.maxLength(50)),
  /** What separates gross from net: the hydrogen of the sample as analysed, the water weighed after a run, or the formula. */
  hydrogen: z.discriminatedUnion('by', [
    z.strictObject({ by: z.literal('content'), hydrogen_pct: percent }),
    z.strictObject({ by: z.literal('condensate'), water_kg_kg: atLeastZero(10) }),
    z.strictObject({ by: z.literal('formula') }),
    z.strictObject({ by: z.literal('elements') }),
  ]),
  formula: z.optional(someText(200)),
  /** Of the dry sample. */
  elements: z.optional(elementsDraft),
  /** Water in the sample when it was burnt; absent: it was dry. */
  analysed: z.optional(moistureDraft),
  /** Water in the material as it lies there; absent: as it was burnt. */
  received: z.optional(moistureDraft),
};
