import type { ToolPointer } from '../tool.ts';

/** One drag of the select tool: everything is computed from what stood when it began. */
export interface Drag {
  /** For tests and the cursor. */
  readonly name: string;
  move(pointer: ToolPointer): void;
  /** The one command of the gesture; nothing when nothing moved. */
  commit(): void;
}
