import { lazy, Suspense } from 'react';
import { useBook } from '../session/use-book.ts';
import { OpeningKinds } from './opening-kinds.tsx';

// Comes with the catalogue it searches, when contents are first placed.
const ContentsPicker = lazy(async () => ({ default: (await import('./contents-picker.tsx')).ContentsPicker }));

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
          <Suspense fallback={<p className="text-small text-soft">Opening the catalogue…</p>}>
            <ContentsPicker onPicked={focusPlan} />
          </Suspense>
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
