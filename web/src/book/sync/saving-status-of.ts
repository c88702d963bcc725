import type { HeldSet, SavingStatus } from '../session/saving-status.ts';
import { dependsOn } from './depends-on.ts';
import type { KeptSet } from './kept-set.ts';

/** What the status line says of the sets that are still here. */
export function savingStatusOf(
  unsent: readonly KeptSet[],
  why: SavingStatus['why'],
  savedAt: string | null,
  onDisk: boolean,
): SavingStatus {
  const held = unsent.flatMap((set): HeldSet[] =>
    set.held === null
      ? []
      : [
          {
            id: set.body.id,
            label: set.body.label,
            reason: set.held.reason,
            clashes: set.held.clashes,
            waiting: unsent.filter(
              (later) =>
                later.held === null && later.order > set.order && dependsOn(later.body.changes, set.body.changes),
            ).length,
          },
        ],
  );
  return { state: stateOf(unsent, held, why), unsent: unsent.length, savedAt, why, onDisk, held };
}

function stateOf(
  unsent: readonly KeptSet[],
  held: readonly HeldSet[],
  why: SavingStatus['why'],
): SavingStatus['state'] {
  if (held.some((set) => set.clashes.length > 0)) return 'clash';
  if (held.length > 0) return 'attention';
  if (unsent.length === 0) return 'saved';
  return why === null ? 'saving' : 'kept';
}
