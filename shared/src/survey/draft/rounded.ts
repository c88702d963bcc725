import { roundToMillimetre } from '../../geometry/round-to-millimetre.ts';

/** The row with these lengths rounded to the millimetre; anything but a number is left for the schema to refuse. */
export function rounded<R extends object, F extends keyof R>(row: R, fields: readonly F[]): R {
  const copy = { ...row };
  for (const field of fields) {
    const value: unknown = row[field];
    if (typeof value === 'number') copy[field] = roundToMillimetre(value) as R[F];
  }
  return copy;
}
