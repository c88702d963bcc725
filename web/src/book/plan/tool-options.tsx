import { lazy, Suspense, useState } from 'react';
import { TextField } from '../../components/text-field.tsx';
import { useBook } from '../session/use-book.ts';
import { OpeningKinds } from './opening-kinds.tsx';

// Comes with the catalogue it searches, when contents are first placed.
const ContentsPicker = lazy(async () => ({ default: (await import('./contents-picker.tsx')).ContentsPicker }));

const HINTS = {
  'draw-room':
    'Drag a rectangle, or press corner by corner and close on the first. Type a length while you point: 4.2, or 6 x 4. Alt lets go of snapping.',
  measure: 'Press twice, or drag. Nothing is changed.',
  'split-room': 'Press on a wall of the room, then on another one. Presses between bend the new wall.',
} as const;

interface ToolOptionsProps {
  readonly focusPlan: () => void;
  /** Puts the tool down. */
  readonly leave: () => void;
}

/** What the tool in hand asks, in one line under the verbs. */
export function ToolOptions({ focusPlan, leave }: ToolOptionsProps) {
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
        <div
          className="tool-options"
          onKeyDownCapture={(event) => {
            // The list of the picker closes first.
            const listOpen = event.target instanceof Element && event.target.ariaExpanded === 'true';
            if (event.key === 'Escape' && !listOpen) leave();
          }}
        >
          <ContentsOptions focusPlan={focusPlan} />
        </div>
      );
    case 'draw-room':
    case 'measure':
    case 'split-room':
      return (
        <div className="tool-options">
          <p className="text-small text-soft">{HINTS[tool]}</p>
        </div>
      );
  }
}

/** What is typed while the catalogue is on its way arrives in the picker, and is not taken for keys of the plan. */
function ContentsOptions({ focusPlan }: { readonly focusPlan: () => void }) {
  const [typed, setTyped] = useState('');
  return (
    <Suspense
      fallback={
        <div className="contents-picker">
          <TextField label="Kind or material" autoFocus autoComplete="off" value={typed} onChange={setTyped} />
          <p className="text-small text-soft">Opening the catalogue…</p>
        </div>
      }
    >
      <ContentsPicker typed={typed} onType={setTyped} onPicked={focusPlan} />
    </Suspense>
  );
}
