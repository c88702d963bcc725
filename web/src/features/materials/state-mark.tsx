import type { VersionState } from './api/own-materials.ts';

export const STATE_WORDS: Readonly<Record<VersionState, string>> = {
  draft: 'draft',
  'put-forward': 'put forward',
  approved: 'approved',
  returned: 'returned',
  withdrawn: 'withdrawn',
};

/** How far a version has come, in a word and an edge: colour never speaks alone. */
export function StateMark({ state }: { readonly state: VersionState }) {
  return (
    <span className="state-mark" data-state={state}>
      {STATE_WORDS[state]}
    </span>
  );
}
