import { heatsInForce, newerPart, type NewerHeat } from '@embertally/shared/survey/newer-heat';
import type { Entry, EntryPart } from '@embertally/shared/survey/survey-document';
import { useMemo } from 'react';
import { useBook } from './use-book.ts';

export interface NewerHeats {
  readonly inForce: ReadonlyMap<string, NewerHeat>;
  /** The parts of an entry whose material has a newer approved version, as they are and as they would be. */
  readonly of: (entry: Entry) => readonly { readonly now: EntryPart; readonly newer: EntryPart }[];
}

/** Which entries were tallied with an older version of one of the organisation's own materials. */
export function useNewerHeats(): NewerHeats {
  const materials = useBook((state) => state.ownMaterials);
  return useMemo(() => {
    const inForce = heatsInForce(materials);
    return {
      inForce,
      of: (entry) =>
        inForce.size === 0
          ? []
          : entry.parts.flatMap((now) => {
              const newer = newerPart(now, inForce);
              return newer === null ? [] : [{ now, newer }];
            }),
    };
  }, [materials]);
}
