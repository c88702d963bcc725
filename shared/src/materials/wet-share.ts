import { moistureWetBasis } from '../methods/heat/moisture-wet-basis.ts';
import { DraftRefused } from './draft-refused.ts';
import type { MoistureDraft } from './drafts/moisture-draft.ts';
import type { Workbook } from './workbook.ts';

const MOST_WET_PCT = 95;

/** Water per wet mass, kg/kg, from a stated moisture; 0 where none is stated. */
export function wetShare(book: Workbook, moisture: MoistureDraft | undefined, pointer: string): number {
  if (moisture === undefined || moisture.pct === 0) return 0;
  const share =
    moisture.per === 'wet'
      ? moisture.pct / 100
      : book.run(moistureWetBasis, { u: moisture.pct / 100 }, { at: `${pointer}/pct` }, { origins: { u: 'given' } });
  if (share > MOST_WET_PCT / 100)
    throw DraftRefused.at(
      `${pointer}/pct`,
      'too_wet',
      `Water is at most ${MOST_WET_PCT} % of the wet mass. If the sheet gives it per dry mass, say so.`,
    );
  return share;
}
