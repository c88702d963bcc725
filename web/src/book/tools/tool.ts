import type { Point } from '@embertally/shared/geometry/point';
import type { ViewPoint } from '../interaction/camera.ts';
import type { Preview } from '../interaction/preview.ts';
import type { BookSession } from '../session/book-session.ts';
import type { ToolName } from '../session/book-state.ts';

/** One fact about the pointer, in plan metres and view pixels. */
export interface ToolPointer {
  readonly point: Point;
  readonly at: ViewPoint;
  readonly type: 'mouse' | 'touch' | 'pen' | 'keyboard';
  /** Shift: add to what is picked, keep proportions, turn in steps. */
  readonly shift: boolean;
  /** Alt or Ctrl: let go of all snapping. */
  readonly free: boolean;
}

export interface ToolKey {
  readonly key: string;
  readonly shift: boolean;
}

/** What a tool may ask of the world. Never the whole editor. */
export interface ToolPorts {
  readonly session: Pick<
    BookSession,
    'state' | 'run' | 'select' | 'say' | 'announce' | 'setTool' | 'newId' | 'now' | 'person'
  >;
  /** Draws what would happen; the latest replaces the one before. */
  readonly show: (preview: Preview) => void;
  /** Moves the view by pixels. */
  readonly pan: (dx: number, dy: number) => void;
}

/**
 * A state machine fed by the pointer and the keyboard. A gesture takes a snapshot when it starts, computes every move
 * from the snapshot, and ends in one command or in nothing at all.
 */
export interface Tool {
  readonly name: ToolName;
  /** Where the machine stands, for the cursor and for tests. */
  state(): string;
  down(pointer: ToolPointer): void;
  move(pointer: ToolPointer): void;
  up(pointer: ToolPointer): void;
  /** Returns true when the tool used the key. */
  key(key: ToolKey): boolean;
  /** Escape, a lost pointer, a second finger or another tool: back to idle exactly as before the gesture. */
  cancel(): void;
}

/** How far beside a thing a pointer still means it, px. A fingertip is wider than a mouse. */
export function marginPx(type: ToolPointer['type']): number {
  return type === 'touch' ? 22 : 7;
}

/** Movement below this is a press, not a drag, px. */
export function dragStartPx(type: ToolPointer['type']): number {
  return type === 'touch' ? 10 : 4;
}
