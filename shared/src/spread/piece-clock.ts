import type { OwnCurve } from './own-curve.ts';

/** c0 + c1 T + c2 T², kW over burning time, s. */
export interface Polynomial {
  c0: number;
  c1: number;
  c2: number;
}

/** By how much the rate of one curve changes at one moment. */
export interface PieceChange extends Polynomial {
  index: number;
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
  /** Length of the shortest piece in burning that is no straight line, s; Infinity when all are straight. */
  shortestCurved = Infinity;
  /** Rate of all curves together; summed anew at each change, so that nothing of a curve is left when it has ended. */
  readonly total: Polynomial = { c0: 0, c1: 0, c2: 0 };
  private nextIndex = -1;
  private readonly nextAt: Float64Array;
  private readonly begun: Float64Array;
  private readonly piece: Int32Array;
  /** Length of the piece that burns now if it is no straight line, s; else Infinity. */
  private readonly curved: Float64Array;
  private readonly curves: (OwnCurve | undefined)[];
  /** The piece of each curve that burns now, in burning time. */
  private readonly c0: Float64Array;
  private readonly c1: Float64Array;
  private readonly c2: Float64Array;
  private readonly change: PieceChange = { index: 0, c0: 0, c1: 0, c2: 0 };

  constructor(count: number) {
    this.nextAt = new Float64Array(count).fill(Infinity);
    this.begun = new Float64Array(count);
    this.piece = new Int32Array(count).fill(-1);
    this.curved = new Float64Array(count).fill(Infinity);
    [this.c0, this.c1, this.c2] = [new Float64Array(count), new Float64Array(count), new Float64Array(count)];
    this.curves = new Array<OwnCurve | undefined>(count).fill(undefined);
  }

  /** A curve begins; its first piece is the change at T. */
  begin(index: number, curve: OwnCurve, T: number): void {
    this.curves[index] = curve;
    this.begun[index] = T;
    this.nextAt[index] = T;
    this.burning += 1;
    this.lookOver();
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

  /** Takes the change at `next`. The object is the same every time. */
  take(): PieceChange {
    const { change, nextIndex: index } = this;
    const curve = this.curves[index]!;
    const piece = this.piece[index]! + 1;
    const ended = piece === curve.pieces.length;
    const began = this.begun[index]!;
    const [a0, a1, a2] = ended ? NOTHING : curve.pieces[piece]!;
    const c0 = a0 - a1 * began + a2 * began * began;
    const c1 = a1 - 2 * a2 * began;
    change.index = index;
    change.c0 = c0 - this.c0[index]!;
    change.c1 = c1 - this.c1[index]!;
    change.c2 = a2 - this.c2[index]!;
    this.c0[index] = c0;
    this.c1[index] = c1;
    this.c2[index] = a2;
    this.piece[index] = piece;
    this.nextAt[index] = ended ? Infinity : began + curve.starts[piece + 1]!;
    this.curved[index] = a2 === 0 ? Infinity : curve.starts[piece + 1]! - curve.starts[piece]!;
    if (ended) this.burning -= 1;
    this.lookOver();
    return change;
  }

  private lookOver(): void {
    const { total } = this;
    this.next = this.shortestCurved = Infinity;
    total.c0 = total.c1 = total.c2 = 0;
    for (let i = 0; i < this.nextAt.length; i += 1) {
      if (this.nextAt[i]! < this.next) {
        this.next = this.nextAt[i]!;
        this.nextIndex = i;
      }
      if (this.curved[i]! < this.shortestCurved) this.shortestCurved = this.curved[i]!;
      total.c0 += this.c0[i]!;
      total.c1 += this.c1[i]!;
      total.c2 += this.c2[i]!;
    }
  }
}

const NOTHING = [0, 0, 0] as const;
