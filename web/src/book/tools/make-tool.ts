import type { ToolName } from '../session/book-state.ts';
import { contentsTool } from './contents-tool.ts';
import { drawRoomTool } from './draw-room-tool.ts';
import { measureTool } from './measure-tool.ts';
import { openingTool } from './opening-tool.ts';
import { selectTool } from './select-tool.ts';
import { splitRoomTool } from './split-room-tool.ts';
import type { Tool, ToolPorts } from './tool.ts';

const TOOLS: Readonly<Record<ToolName, (ports: ToolPorts) => Tool>> = {
  select: selectTool,
  'draw-room': drawRoomTool,
  opening: openingTool,
  contents: contentsTool,
  measure: measureTool,
  'split-room': splitRoomTool,
};

/** The tool of a name, fresh and idle. */
export function makeTool(name: ToolName, ports: ToolPorts): Tool {
  return TOOLS[name](ports);
}
