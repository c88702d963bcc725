import { z } from 'zod/mini';

/** Text of at least one and at most `most` characters. */
export const someText = (most: number) => z.string().check(z.minLength(1), z.maxLength(most));

export const positive = (most: number) => z.number().check(z.positive(), z.maximum(most));

export const atLeastZero = (most: number) => z.number().check(z.minimum(0), z.maximum(most));

/** A share of a mass in percent. */
export const percent = z.number().check(z.minimum(0), z.maximum(100));
