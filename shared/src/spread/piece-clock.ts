import type { OwnCurve } from './own-curve.ts';

/** How the sum of all curves changes at one moment: its polynomial in burning time T grows by these, kW. */
export interface PieceChange {
  index: number;
  /** Burning time of the change, s. */
  at: number;
  c0: number;
  c1: number;
  c2: number;
  /** The curve has come to its end. */
  ended: boolean;
}

/**
 * Curves that began at different burning times, followed from one change of piece to the next. Burning time runs with the
 * clock while the air suffices and slower when it does not, the same for all; between two changes the sum of the curves
 * is one polynomial, so only changes have to be looked at.
 */
export class PieceClock {
  /** Burning time of the next change of any curve, s; Infinity when there is none. */
  next = Infinity;
  /** Curves that have begun and not ended. */
  burning = 0;
  private nextIndex = -1;
  private readonly nextAt: Float64Array;
  private readonly begun: Float64Array;
  private readonly piece: Int32Array;
  private readonly curves: (OwnCurve | undefined)[];
  private readonly change: PieceChange = { index: 0, at: 0, c0: 0, c1: 0, c2: 0, ended: false };

  constructor(count: number) {
    this.nextAt = new Float64Array(count).fill(Infinity);
    this.begun = new Float64Array(count);
    this.piece = new Int32Array(count).fill(-1);
    this.curves = new Array<OwnCurve | undefined>(count).fill(undefined);
  }

  /** A curve begins; its first piece is the change at T. */
  begin(index: number, curve: OwnCurve, T: number): void {
    this.curves[index] = curve;
    this.begun[index] = T;
    this.nextAt[index] = T;
    this.burning += 1;
    this.findNext();
  }

  curveOf(index: number): OwnCurve | undefined {
    return this.curves[index];
  }

  begunAt(index: number): number {
    return this.begun[index]!;
  }

  isBurning(index: number): boolean {
    return this.curves[index] !== undefined && this.nextAt[index] !== Infinity;
  }

  /** Length of the shortest growing or curved piece that burns now, s; Infinity when all are straight. */
  shortestCurvedPiece(): number {
    let least = Infinity;
    for (const [index, curve] of this.curves.entries()) {
      const piece = this.piece[index]!;
      if (curve === undefined || piece < 0 || piece >= curve.pieces.length || curve.pieces[piece]![2] === 0) continue;
      least = Math.min(least, curve.starts[piece + 1]! - curve.starts[piece]!);
    }
    return least;
  }

  /** Takes the change at `next`. The object is the same every time. */
  take(): PieceChange {
    const { change, nextIndex: index } = this;
    const curve = this.curves[index]!;
    const from = this.piece[index]!;
    const to = from + 1;
    change.index = index;
    change.at = this.next;
    change.c0 = change.c1 = change.c2 = 0;
    if (from >= 0) this.add(curve.pieces[from]!, index, -1);
    change.ended = to === curve.pieces.length;
    if (!change.ended) this.add(curve.pieces[to]!, index, 1);
    this.piece[index] = to;
    this.nextAt[index] = change.ended ? Infinity : this.begun[index]! + curve.starts[to + 1]!;
    if (change.ended) this.burning -= 1;
    this.findNext();
    return change;
  }

  /** A piece in time since ignition, written in burning time. */
  private add([c0, c1, c2]: readonly [number, number, number], index: number, sign: number): void {
    const began = this.begun[index]!;
    this.change.c0 += sign * (c0 - c1 * began + c2 * began * began);
    this.change.c1 += sign * (c1 - 2 * c2 * began);
    this.change.c2 += sign * c2;
  }

  private findNext(): void {
    this.next = Infinity;
    for (let i = 0; i < this.nextAt.length; i += 1) {
      if (this.nextAt[i]! < this.next) {
        this.next = this.nextAt[i]!;
        this.nextIndex = i;
      }
    }
  }
}
