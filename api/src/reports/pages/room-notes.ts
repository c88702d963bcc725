import type { Estimate } from '@embertally/shared/methods/estimate';

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/**
 * The flags that stand next to a room's numbers: each different flag gets a number, which stands after every figure it
 * belongs to, and its text once below.
 */
export class RoomNotes {
  private readonly texts: string[] = [];

  /** The note marks of an estimate, to be set after its figure; empty when it has no flags. */
  marks(estimate: Estimate | undefined): string {
    if (estimate === undefined || estimate.warnings.length === 0) return '';
    return this.marked(estimate.warnings.map(({ code, text }) => `${text} (${code})`));
  }

  /** The note marks of texts that explain a figure. */
  marked(texts: readonly string[]): string {
    const numbers = texts.map((text) => this.numberOf(text));
    return ` ${[...new Set(numbers)].map(superscript).join('˒')}`;
  }

  /** All flags so far, in the order of their numbers. */
  get all(): readonly string[] {
    return this.texts;
  }

  private numberOf(note: string): number {
    const known = this.texts.indexOf(note);
    if (known >= 0) return known + 1;
    return this.texts.push(note);
  }
}

export function superscript(number: number): string {
  return [...String(number)].map((digit) => SUPERSCRIPTS[Number(digit)] ?? '').join('');
}
