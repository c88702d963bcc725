import type { ToolPointer, ToolPorts } from '../tool.ts';
import type { Drag } from './drag.ts';

/** One finger on empty floor moves the view. */
export function dragView({ pan }: ToolPorts, from: ToolPointer): Drag {
  let last = from.at;
  return {
    name: 'moving the view',
    move(pointer) {
      pan(pointer.at.x - last.x, pointer.at.y - last.y);
      last = pointer.at;
    },
    commit: () => undefined,
  };
}
