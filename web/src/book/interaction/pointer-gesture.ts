import type { ViewPoint } from './camera.ts';

export interface PointerFact {
  readonly id: number;
  readonly type: 'mouse' | 'touch' | 'pen';
  readonly at: ViewPoint;
  /** The first finger of those down now, wherever on the screen it is. */
  readonly primary: boolean;
}

/** What fingers do to the view. */
export interface ViewMove {
  readonly dx: number;
  readonly dy: number;
  /** Factor of the zoom around `at`. */
  readonly factor: number;
  readonly at: ViewPoint;
}

export type GestureAnswer =
  /** The tool may act on it. */
  | { readonly to: 'tool' }
  /** A pen came down beside a finger: what the finger began is called off and the pen starts. */
  | { readonly to: 'tool afresh' }
  /** A second finger came: what the first began is called off. */
  | { readonly to: 'cancel' }
  | { readonly to: 'view'; readonly move: ViewMove }
  | { readonly to: 'nobody' };

/**
 * Keeps fingers apart: one draws, two move the view and never edit. Once a second finger has touched, nothing reaches the
 * tool until all are lifted. While a pen is down, touches (a resting palm) are ignored.
 */
export class PointerGesture {
  readonly #down = new Map<number, PointerFact>();
  #viewing = false;
  readonly #palms = new Set<number>();

  press(pointer: PointerFact): GestureAnswer {
    // The hand rests: beside a pen, or its first finger is on a strip or a verb next to the plan.
    const resting = this.#hasPen() || (!pointer.primary && this.#down.size === 0);
    if (pointer.type === 'touch' && resting) {
      this.#palms.add(pointer.id);
      return { to: 'nobody' };
    }
    const first = this.#down.size === 0;
    this.#down.set(pointer.id, pointer);
    if (first) return { to: 'tool' };
    if (pointer.type === 'pen') {
      for (const [id, other] of this.#down)
        if (other.type === 'touch') {
          this.#down.delete(id);
          this.#palms.add(id);
        }
      this.#viewing = false;
      return { to: 'tool afresh' };
    }
    const began = !this.#viewing;
    this.#viewing = true;
    return began ? { to: 'cancel' } : { to: 'nobody' };
  }

  move(pointer: PointerFact): GestureAnswer {
    if (this.#palms.has(pointer.id)) return { to: 'nobody' };
    const before = this.#down.get(pointer.id);
    if (before === undefined) return pointer.type === 'touch' ? { to: 'nobody' } : { to: 'tool' };
    if (!this.#viewing) {
      this.#down.set(pointer.id, pointer);
      return { to: 'tool' };
    }
    const [a, b] = this.#pair();
    this.#down.set(pointer.id, pointer);
    const [c, d] = this.#pair();
    if (a === null || b === null || c === null || d === null) return { to: 'nobody' };
    const from = { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 };
    const to = { x: (c.x + d.x) / 2, y: (c.y + d.y) / 2 };
    const spread = Math.hypot(a.x - b.x, a.y - b.y);
    const factor = spread < 1 ? 1 : Math.hypot(c.x - d.x, c.y - d.y) / spread;
    return { to: 'view', move: { dx: to.x - from.x, dy: to.y - from.y, factor: factor || 1, at: to } };
  }

  /** A pointer was lifted; the answer says whether the tool should hear of it. */
  lift(id: number): GestureAnswer {
    if (this.#palms.delete(id)) return { to: 'nobody' };
    if (!this.#down.delete(id)) return { to: 'nobody' };
    if (!this.#viewing) return { to: 'tool' };
    if (this.#down.size === 0) this.#viewing = false;
    return { to: 'nobody' };
  }

  /** The window lost the pointers. */
  lose(): void {
    this.#down.clear();
    this.#palms.clear();
    this.#viewing = false;
  }

  #hasPen(): boolean {
    return [...this.#down.values()].some((pointer) => pointer.type === 'pen');
  }

  #pair(): [ViewPoint | null, ViewPoint | null] {
    const [a, b] = [...this.#down.values()];
    return [a?.at ?? null, b?.at ?? null];
  }
}
