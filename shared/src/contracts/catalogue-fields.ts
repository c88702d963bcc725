import { z } from 'zod/mini';

/** Fields that several rows of the catalogue have in common. */
export const sourceField = z.strictObject({ title: z.string(), locator: z.string(), fromMemory: z.boolean() });
export const rangeField = z.strictObject({ typical: z.number(), low: z.number(), high: z.number() });
export const wordsField = z.array(z.string());
export const ignitionField = z.enum(['easy', 'normal', 'hard', 'resistant']);
