/** Looks at a file while it comes in, so that a file that is not what it says never has to arrive whole. */
export interface ContentCheck {
  /** @returns whether it can still be what it says */
  readonly push: (piece: Uint8Array) => boolean;
  /** Once everything has been pushed: whether it is what it says. */
  readonly end: () => boolean;
}
