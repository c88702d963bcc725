import { useBook } from '../session/use-book.ts';
import { ContentsPicker } from './contents-picker.tsx';
import { OpeningKinds } from './opening-kinds.tsx';

const HINTS = {
  'draw-room':
    'Drag a rectangle, or press corner by corner and close on the first. Type a length while you point: 4.2, or 6 x 4. Alt lets go of snapping.',
  measure: 'Press twice, or drag. Nothing is changed.',
} as const;

/** What the tool in hand asks, in one line under the verbs. */
export function ToolOptions({ focusPlan }: { readonly focusPlan: () => void }) {
  const tool = useBook((state) => state.tool);
  switch (tool) {
    case 'select':
      return null;
    case 'opening':
      return (
        <div className="tool-options">
          <OpeningKinds />
          <p className="text-small text-soft">Press on a wall.</p>
        </div>
      );
    case 'contents':
      return (
        <div className="tool-options">
          <ContentsPicker onPicked={focusPlan} />
        </div>
      );
    case 'draw-room':
    case 'measure':
      return (
        <div className="tool-options">
          <p className="text-small text-soft">{HINTS[tool]}</p>
        </div>
      );
  }
}
