import type { ContentCheck } from './content-check.ts';

/** Where to look next: past so many bytes, at so many; what they say decides about the rest. */
export interface Look {
  readonly skip: number;
  readonly take: number;
  readonly then: (bytes: Uint8Array) => Look | Verdict;
}
/** `end`: nothing may follow; `rest`: whatever follows is content; `wrong`: it is not what it says. */
export type Verdict = 'end' | 'rest' | 'wrong';

/** Walks along the parts of a file by their lengths, keeping no more of it than the bytes it is looking at. */
export class ByteWalk implements ContentCheck {
  private next: Look | Verdict;
  private skipped = 0;
  private taken: number[] = [];

  constructor(first: Look) {
    this.next = first;
  }

  readonly push = (piece: Uint8Array): boolean => {
    let at = 0;
    while (at < piece.length) {
      const { next } = this;
      if (next === 'end') this.next = 'wrong';
      if (typeof next === 'string') break;
      const passing = Math.min(next.skip - this.skipped, piece.length - at);
      this.skipped += passing;
      at += passing;
      while (at < piece.length && this.taken.length < next.take) {
        this.taken.push(piece[at] ?? 0);
        at += 1;
      }
      this.settle(next);
    }
    return this.next !== 'wrong';
  };

  readonly end = (): boolean => this.next === 'end' || this.next === 'rest';

  private settle(look: Look): void {
    if (this.skipped < look.skip || this.taken.length < look.take) return;
    const bytes = Uint8Array.from(this.taken);
    this.skipped = 0;
    this.taken = [];
    this.next = look.then(bytes);
  }
}
