import type { Point } from '@embertally/shared/geometry/point';
import type { Changes } from '@embertally/shared/survey/change';
import type { Entry, Opening } from '@embertally/shared/survey/survey-document';
import type { Guide, SnapReason } from './snap.ts';

/** What a gesture would do if it ended now. Drawn over the plan; nothing of it is in the document. */
export interface Preview {
  /** Rows of walls and openings as they would be: the plan is drawn with them applied. */
  readonly changes?: Changes;
  /** Entries as they would be: drawn instead of those in the document. */
  readonly entries?: readonly Entry[];
  /** Corners placed so far of a room being drawn, and where the next would go. */
  readonly drawing?: { readonly points: readonly Point[]; readonly next: Point | null; readonly closes: boolean };
  /** A footprint that follows the pointer before it is placed. */
  readonly ghost?: Entry;
  readonly openingGhost?: { readonly opening: Pick<Opening, 'kind' | 'state'>; readonly a: Point; readonly b: Point };
  /** Rectangle dragged to pick what lies in it. */
  readonly marquee?: { readonly a: Point; readonly b: Point };
  /** Lines whose length is written beside them. */
  readonly lengths?: readonly { readonly a: Point; readonly b: Point }[];
  readonly guides?: readonly Guide[];
  readonly snap?: { readonly at: Point; readonly why: SnapReason | null };
  /** What is being typed as a length. */
  readonly typed?: { readonly at: Point; readonly text: string };
  /** Set when it could not be placed here. */
  readonly unfit?: boolean;
}

export const NO_PREVIEW: Preview = {};
