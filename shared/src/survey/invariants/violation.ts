import type { EntityKind } from '../survey-document.ts';

/** A rule of the survey document that does not hold, in one sentence, with the rows it is about. */
export interface Violation {
  readonly code: string;
  readonly message: string;
  readonly storeyId: string | null;
  readonly kind: EntityKind;
  /** The row at fault first, then the others it is about. */
  readonly ids: readonly string[];
  /** The field a person would change, when there is one. */
  readonly field?: string;
  /** The row that is not there, when that is the fault. */
  readonly missing?: { readonly kind: EntityKind; readonly id: string };
}
