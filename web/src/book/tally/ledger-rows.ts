import type { Estimate } from '@embertally/shared/methods/estimate';
import type { Entry } from '@embertally/shared/survey/survey-document';
import type { RoomTally } from '@embertally/shared/tally/room-tally';

export interface LedgerRow {
  readonly id: string;
  readonly label: string;
  /** Path of the heat in the tally. */
  readonly path: string;
  readonly heat: Estimate;
  readonly count: number;
  /** Of one piece. */
  readonly mass_kg: number;
  readonly keeping: Entry['keeping'];
  readonly evidence: Entry['evidence'];
  /** Sum of the heat down to this row, MJ, from unrounded values. */
  readonly running_MJ: number;
}

/** The ledger of a room: its entries with the most heat first, each with the sum so far. */
export function ledgerRows(
  byEntry: RoomTally['load']['byEntry'],
  entries: ReadonlyMap<string, Entry>,
): readonly LedgerRow[] {
  let running_MJ = 0;
  const order = byEntry.map((share, index) => ({ share, index }));
  order.sort((a, b) => (b.share.heat.value ?? 0) - (a.share.heat.value ?? 0));
  return order.flatMap(({ share, index }) => {
    const entry = entries.get(share.id);
    if (entry === undefined) return [];
    running_MJ += share.heat.value ?? 0;
    return [
      {
        id: share.id,
        label: entry.label,
        path: `load.byEntry.${index}.heat`,
        heat: share.heat,
        count: entry.count,
        mass_kg: entry.parts.reduce((sum, part) => sum + part.mass_kg, 0),
        keeping: entry.keeping,
        evidence: entry.evidence,
        running_MJ,
      },
    ];
  });
}
