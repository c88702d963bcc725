import type { SurveyDocumentV2 } from './versions/v2.ts';

/**
 * The survey document as commands, geometry and the tally see it: flat maps by id, relations by id, lengths in metres.
 * The stored and sent form is {@link SurveyDocumentV2}; `fromStored` / `toStored` convert.
 */
export type {
  Corner,
  Enclosure,
  Evidence,
  Keeping,
  Lining,
  LiningLayer,
  LiningSurface,
  Opening,
  OpeningState,
  PlanPicture,
  Protection,
  Storey,
} from './versions/v1.ts';
export type { Assumptions, Entry, EntryPart, Measure, Room } from './versions/v2.ts';

export type EntityKind = 'storey' | 'corner' | 'room' | 'opening' | 'entry';
export const ENTITY_KINDS: readonly EntityKind[] = ['storey', 'corner', 'room', 'opening', 'entry'];

type Row<K extends keyof SurveyDocumentV2> = SurveyDocumentV2[K] extends readonly (infer R)[] ? R : never;

export interface SurveyDocument {
  readonly surveyId: string;
  /** The number of the last change set this state contains. */
  readonly sequence: number;
  readonly storeys: ReadonlyMap<string, Row<'storeys'>>;
  readonly corners: ReadonlyMap<string, Row<'corners'>>;
  readonly rooms: ReadonlyMap<string, Row<'rooms'>>;
  readonly openings: ReadonlyMap<string, Row<'openings'>>;
  readonly entries: ReadonlyMap<string, Row<'entries'>>;
}
