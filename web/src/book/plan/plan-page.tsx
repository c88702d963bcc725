import { lazy, Suspense, useRef, useState } from 'react';
import { Key } from '../../components/key.tsx';
import { FIT_ACTIONS, HISTORY_ACTIONS, TABLE_ACTIONS, TOOL_ACTIONS } from '../actions/plan-actions.ts';
import type { PlanHost } from '../interaction/plan-host.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { useSpreadPlay } from '../spread/use-spread-play.ts';
import { EmptyPlan } from './empty-plan.tsx';
import { LoadLegend } from './load-legend.tsx';
import { PlanMessage } from './plan-message.tsx';
import { PlanSurface } from './plan-surface.tsx';
import { PlanVerbs } from './plan-verbs.tsx';
import { SelectionStrip } from './selection-strip.tsx';
import { ToolOptions } from './tool-options.tsx';
import { usePlanKeys } from './use-plan-keys.ts';

const SpreadPlayer = lazy(async () => ({ default: (await import('../spread/spread-player.tsx')).SpreadPlayer }));
const KeysDialog = lazy(async () => ({ default: (await import('./keys-dialog.tsx')).KeysDialog }));

/** The left page: what can be done next, the plan, and what its shading means. */
export function PlanPage({ host }: { readonly host: PlanHost }) {
  const session = useBookSession();
  const page = useRef<HTMLDivElement>(null);
  const [keysOpen, setKeysOpen] = useState(false);
  const empty = useBook((state) => state.document.rooms.size === 0 && state.tool === 'select');
  const world = { session, host };
  const showsFire = useSpreadPlay((state) => state.fire !== null || state.gap !== null);
  const focusPlan = () => {
    page.current?.querySelector<HTMLElement>('.plan-canvas')?.focus();
  };
  usePlanKeys(page, world, () => {
    setKeysOpen(true);
  });
  return (
    <div className="plan-page" ref={page}>
      <div className="verbs" role="toolbar" aria-label="What can be done on the plan">
        <PlanVerbs actions={TOOL_ACTIONS} world={world} />
        <span className="verbs-gap" />
        <PlanVerbs actions={HISTORY_ACTIONS} world={world} keysShown={false} />
        <PlanVerbs actions={TABLE_ACTIONS} world={world} />
      </div>
      <PlanSurface host={host}>
        <ToolOptions
          focusPlan={focusPlan}
          leave={() => {
            host.cancel();
            focusPlan();
          }}
        />
        {empty ? <EmptyPlan world={world} /> : null}
        <SelectionStrip host={host} />
        <PlanMessage />
        {showsFire ? (
          <Suspense fallback={null}>
            <SpreadPlayer />
          </Suspense>
        ) : null}
      </PlanSurface>
      <div className="plan-foot">
        <LoadLegend />
        <span className="verbs-gap" />
        <PlanVerbs actions={FIT_ACTIONS} world={world} />
        <button
          type="button"
          className="verb"
          aria-label="All keys"
          onClick={() => {
            setKeysOpen(true);
          }}
        >
          <Key>?</Key>
        </button>
      </div>
      {keysOpen ? (
        <Suspense>
          <KeysDialog
            onClose={() => {
              setKeysOpen(false);
            }}
          />
        </Suspense>
      ) : null}
    </div>
  );
}
