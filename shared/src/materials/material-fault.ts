/** Why a draft gives no material: where, and what to change, in a sentence for a person. */
export interface MaterialFault {
  /** JSON pointer into the draft: `/runs/0/mass_kg`. */
  readonly pointer: string;
  readonly code: string;
  readonly message: string;
}
