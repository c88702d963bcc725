import type { PlaceableMaterial } from '@embertally/shared/catalogue/placeable-material';
import type { Limit } from '@embertally/shared/contracts/limits';
import type { Survey } from '@embertally/shared/contracts/surveys';
import type { Refusal } from '@embertally/shared/survey/command';
import type { Entry, Opening, SurveyDocument } from '@embertally/shared/survey/survey-document';
import type { SavingStatus } from './saving-status.ts';

/** The units the person reads in; inside everything is SI. */
export type Units = 'SI' | 'US';

/** The three pages of the Book on a narrow screen. */
export type BookPageName = 'plan' | 'tally' | 'rooms';

export type ToolName = 'select' | 'draw-room' | 'opening' | 'contents' | 'measure' | 'split-room';

/** Something on the plan a person can pick. A wall has no row of its own: its id is `cornerId|cornerId` in ring order. */
export interface Selected {
  readonly kind: 'room' | 'wall' | 'corner' | 'opening' | 'entry';
  readonly id: string;
}

/** What part of the storey is looked at: the plan point in the middle of the view, and pixels per metre. */
export interface Camera {
  readonly x_m: number;
  readonly y_m: number;
  readonly pxPerM: number;
}

/** A sentence that stands on the plan until the next gesture: why something was refused, or what was left out. */
export interface BookMessage {
  readonly kind: 'refusal' | 'notice';
  readonly text: string;
  readonly refusal?: Refusal;
  /** A way out, offered beside the sentence. */
  readonly offer?: { readonly label: string; readonly run: () => void };
}

/** What an armed tool places next. */
export interface Placing {
  /** The entry that is placed with the next press, made from a kind or material; its id and place are filled in then. */
  readonly entry: Entry | null;
  readonly openingKind: Opening['kind'];
}

/** Everything the Book shows. Replaced, never changed; parts that did not change keep their identity. */
export interface BookState {
  readonly survey: Survey;
  readonly document: SurveyDocument;
  readonly limits: readonly Limit[];
  readonly units: Units;
  readonly canEdit: boolean;
  readonly storeyId: string | null;
  /** The room whose tally is read; null when the storey has none. */
  readonly roomInHand: string | null;
  readonly selection: readonly Selected[];
  /** Which page lies open where only one has room. */
  readonly page: BookPageName;
  /** The left page shows the tables of rooms, openings and contents instead of the plan. */
  readonly tables: boolean;
  readonly tool: ToolName;
  readonly placing: Placing;
  readonly camera: Camera;
  /** Size of the plan's view, px. */
  readonly view: { readonly width: number; readonly height: number };
  readonly message: BookMessage | null;
  /** The latest sentence for the live region; `count` rises so that the same words twice are spoken twice. */
  readonly announcement: { readonly text: string; readonly count: number };
  readonly clipboard: readonly Entry[];
  readonly canUndo: string | null;
  readonly canRedo: string | null;
  readonly saving: SavingStatus;
  /** Rises when the tally engine arrives, so that readers of tallies look again. */
  readonly engineReady: boolean;
  /** Approved materials of the person's organisation; none until they have arrived. */
  readonly ownMaterials: readonly PlaceableMaterial[];
}
