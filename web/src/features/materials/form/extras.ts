import { curveDraft } from '@embertally/shared/materials/drafts/curve-draft';
import { z } from 'zod/mini';
import type { DraftExtras } from './read-draft.ts';
import type { Values } from './field-spec.ts';

/** Names under which what no field holds is kept with the typed text. */
export const CURVE = 'curve.read';
export const ACCEPTED = 'accepted.proposal';
export const EVIDENCE = 'evidence.files';

const accepted = z.strictObject({
  finding: z.enum(['wrong-mole-basis', 'gross-for-net', 'dry-for-received']),
  factor: z.number(),
});
const evidence = z.array(z.strictObject({ id: z.uuid(), name: z.string() }));
export type EvidenceFile = z.infer<typeof evidence>[number];

interface Extras {
  readonly draft: DraftExtras;
  readonly evidence: readonly EvidenceFile[];
}

/** What was read and taken over beside the fields. What cannot be read any more is as if it were not there. */
export function extrasOf(values: Values): Extras {
  const curve = curveDraft.safeParse(parsed(values[CURVE]));
  const taken = accepted.safeParse(parsed(values[ACCEPTED]));
  const files = evidence.safeParse(parsed(values[EVIDENCE]));
  return {
    draft: {
      ...(curve.success ? { curve: curve.data } : {}),
      ...(taken.success ? { accepted: taken.data } : {}),
    },
    evidence: files.success ? files.data : [],
  };
}

function parsed(text: string | undefined): unknown {
  if (text === undefined || text === '') return undefined;
  try {
    return JSON.parse(text);
  } catch {
    // Only a draft damaged in storage comes here; the fields around it still stand.
    return undefined;
  }
}
