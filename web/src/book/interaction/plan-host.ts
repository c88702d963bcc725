import type { Point } from '@embertally/shared/geometry/point';
import { createValue } from '../../lib/create-value.ts';
import type { BookSession } from '../session/book-session.ts';
import { makeTool } from '../tools/make-tool.ts';
import type { Tool, ToolPointer } from '../tools/tool.ts';
import { panned, toPlan, toView, zoomed, type ViewPoint } from './camera.ts';
import { PointerGesture } from './pointer-gesture.ts';
import { NO_PREVIEW, type Preview } from './preview.ts';

/** A pointer event without the browser. */
export interface HostPointer {
  readonly id: number;
  readonly type: 'mouse' | 'touch' | 'pen';
  readonly at: ViewPoint;
  /** The first pointer of its type that is down. */
  readonly primary: boolean;
  readonly shift: boolean;
  readonly free: boolean;
  /** Middle button, or the space bar held: the view moves, nothing is edited. */
  readonly pans: boolean;
}

export interface HostKey {
  readonly key: string;
  readonly shift: boolean;
  readonly alt: boolean;
}

const ARROWS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

/**
 * Stands between what a person does on the plan and the tool in hand: keeps fingers apart, moves the view, and lets the
 * keyboard point where a mouse would.
 */
export class PlanHost {
  readonly preview = createValue<Preview>(NO_PREVIEW);
  /** Where the keyboard points while it places things; null when it does not. */
  readonly crosshair = createValue<Point | null>(null);
  readonly #session: BookSession;
  readonly #gesture = new PointerGesture();
  #tool: Tool;
  #panning: { readonly id: number; at: ViewPoint } | null = null;
  #active: number | null = null;
  readonly #unsubscribe: () => void;

  constructor(session: BookSession) {
    this.#session = session;
    this.#tool = this.#make();
    this.#unsubscribe = session.subscribe(() => {
      this.#followTool();
    });
  }

  get tool(): Tool {
    return this.#tool;
  }

  /** Ends what is going on and lets go of the session. */
  close(): void {
    this.cancel();
    this.#unsubscribe();
  }

  press(pointer: HostPointer): void {
    if (pointer.pans) {
      this.#panning = { id: pointer.id, at: pointer.at };
      return;
    }
    this.crosshair.set(null);
    const answer = this.#gesture.press(pointer);
    if (answer.to === 'cancel' || answer.to === 'tool afresh') this.#drop();
    if (answer.to !== 'tool' && answer.to !== 'tool afresh') return;
    this.#active = pointer.id;
    this.#tool.down(this.#fact(pointer));
  }

  move(pointer: HostPointer): void {
    if (this.#panning?.id === pointer.id) {
      const { at } = this.#panning;
      this.#panning.at = pointer.at;
      this.#session.setCamera(panned(this.#session.state.camera, pointer.at.x - at.x, pointer.at.y - at.y));
      return;
    }
    const answer = this.#gesture.move(pointer);
    if (answer.to === 'view') {
      const { dx, dy, factor, at } = answer.move;
      const { camera, view } = this.#session.state;
      this.#session.setCamera(zoomed(panned(camera, dx, dy), view, at, factor));
    } else if (answer.to === 'tool' && (this.#active === null || this.#active === pointer.id))
      this.#tool.move(this.#fact(pointer));
  }

  lift(pointer: HostPointer): void {
    if (this.#panning?.id === pointer.id) {
      this.#panning = null;
      return;
    }
    const answer = this.#gesture.lift(pointer.id);
    if (answer.to !== 'tool' || this.#active !== pointer.id) return;
    this.#active = null;
    this.#tool.up(this.#fact(pointer));
  }

  /** The pointer left the plan without being pressed: ghosts that followed it go. */
  leave(): void {
    if (this.#active === null && this.#tool.state() === 'idle' && this.crosshair.get() === null)
      this.preview.set(NO_PREVIEW);
  }

  /** The browser took the pointer away, or the window lost focus. */
  lose(): void {
    this.#gesture.lose();
    this.#panning = null;
    this.#drop();
  }

  zoomAt(at: ViewPoint, factor: number): void {
    const { camera, view } = this.#session.state;
    this.#session.setCamera(zoomed(camera, view, at, factor));
  }

  panBy(dx: number, dy: number): void {
    this.#session.setCamera(panned(this.#session.state.camera, dx, dy));
  }

  /** Escape: first the gesture, then the tool, then the selection. */
  cancel(): void {
    const busy = this.#tool.state() !== 'idle' || this.crosshair.get() !== null;
    this.#drop();
    this.crosshair.set(null);
    if (busy) return;
    if (this.#session.state.tool !== 'select') this.#session.setTool('select');
    else this.#session.select([]);
  }

  /**
   * A key pressed on the plan. With a placing tool in hand the arrows point (0.1 m, Shift 1 m, Alt 1 mm) and Enter presses
   * where they point. Returns true when the key was used.
   */
  key(key: HostKey): boolean {
    if (key.key === 'Escape') {
      this.cancel();
      return true;
    }
    if (this.#tool.key(key)) return true;
    if (this.#tool.name === 'select') return false;
    const arrow = ARROWS[key.key];
    if (arrow !== undefined) {
      this.#point(arrow, key);
      return true;
    }
    const pointed = this.crosshair.get();
    if ((key.key === 'Enter' || key.key === ' ') && pointed !== null) {
      const fact = this.#keyboardFact(pointed, key);
      this.#tool.down(fact);
      this.#tool.up(fact);
      return true;
    }
    return false;
  }

  #point([dx, dy]: readonly [number, number], key: HostKey): void {
    const { camera } = this.#session.state;
    const step = key.alt ? 0.001 : key.shift ? 1 : 0.1;
    const from = this.crosshair.get();
    const at =
      from === null
        ? { x_m: Math.round(camera.x_m * 10) / 10, y_m: Math.round(camera.y_m * 10) / 10 }
        : { x_m: round(from.x_m + dx * step), y_m: round(from.y_m + dy * step) };
    this.crosshair.set(at);
    this.#tool.move(this.#keyboardFact(at, key));
    this.#session.announce(`${at.x_m.toFixed(3)} m, ${at.y_m.toFixed(3)} m`);
  }

  #keyboardFact(point: Point, key: HostKey): ToolPointer {
    const { camera, view } = this.#session.state;
    return { point, at: toView(camera, view, point), type: 'keyboard', shift: key.shift, free: key.alt };
  }

  #fact(pointer: HostPointer): ToolPointer {
    const { camera, view } = this.#session.state;
    return {
      point: toPlan(camera, view, pointer.at),
      at: pointer.at,
      type: pointer.type,
      shift: pointer.shift,
      free: pointer.free,
    };
  }

  #drop(): void {
    this.#active = null;
    this.#tool.cancel();
    this.preview.set(NO_PREVIEW);
  }

  #followTool(): void {
    if (this.#tool.name === this.#session.state.tool) return;
    this.#drop();
    this.crosshair.set(null);
    this.#tool = this.#make();
  }

  #make(): Tool {
    return makeTool(this.#session.state.tool, {
      session: this.#session,
      show: (preview) => {
        this.preview.set(preview);
      },
      pan: (dx, dy) => {
        this.panBy(dx, dy);
      },
    });
  }
}

function round(value: number): number {
  return Math.round(value * 1000) / 1000;
}
