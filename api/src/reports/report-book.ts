import type { Standing } from '@embertally/shared/limits/standing';
import type { Entry, Room, Storey, SurveyDocument } from '@embertally/shared/survey/survey-document';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import type { Figures } from './figures.ts';
import type { ReportInput, ReportLimit } from './report-input.ts';

/** One room as the report shows it. */
export interface RoomReport {
  /** Counted through the whole building, from 1; the same on plan, table and tally. */
  readonly number: number;
  readonly room: Room;
  readonly storey: Storey;
  /** In the order of the ledger; its first line is 1 on the plan too. */
  readonly entries: readonly Entry[];
  readonly tally: RoomTally;
  readonly limits: readonly ReportLimit[];
  /** The worst of its standings. */
  readonly standing: Standing;
}

export interface StoreyReport {
  readonly storey: Storey;
  readonly rooms: readonly RoomReport[];
}

/** All that the pages are drawn from. */
export interface ReportBook {
  readonly input: ReportInput;
  readonly document: SurveyDocument;
  readonly storeys: readonly StoreyReport[];
  /** Rooms of all storeys that are reported on, by number. */
  readonly rooms: readonly RoomReport[];
  readonly figures: Figures;
}
