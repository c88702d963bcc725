import type { ReferenceRow } from './reference-row.ts';

/** Id, method, inputs, output, value. */
export type Recomputed = readonly [string, string, ReferenceRow['inputs'], string, number];

/** A row of the second reader, who worked at full precision. */
export function recomputed([id, method, inputs, output, value]: Recomputed): ReferenceRow {
  return {
    id: `recomputed-${id}`,
    method,
    inputs,
    expected: { [output]: value },
    tolerance: { rel: 2e-5 },
    origin: 'independent',
    source: 'second reader, from the published relation by another script',
  };
}
