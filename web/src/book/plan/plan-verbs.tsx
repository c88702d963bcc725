import { Key } from '../../components/key.tsx';
import type { Action, ActionWorld } from '../actions/action.ts';
import { keyLabel } from '../actions/key-name.ts';
import { useBook } from '../session/use-book.ts';

interface PlanVerbsProps {
  readonly actions: readonly Action[];
  readonly world: ActionWorld;
  /** False where everybody knows the key. */
  readonly keysShown?: boolean;
}

/** The row of verbs above the plan: what this person can do next, each with its key. */
export function PlanVerbs({ actions, world, keysShown = true }: PlanVerbsProps) {
  const canEdit = useBook((state) => state.canEdit);
  const offered = actions.filter(({ edits }) => canEdit || edits !== true);
  return (
    <>
      {offered.map((action) => (
        <Verb key={action.id} action={action} world={world} keyShown={keysShown} />
      ))}
    </>
  );
}

interface VerbProps {
  readonly action: Action;
  readonly world: ActionWorld;
  readonly keyShown: boolean;
}

function Verb({ action, world, keyShown }: VerbProps) {
  const on = useBook((state) => action.isOn?.(state) ?? false);
  const available = useBook(action.isAvailable);
  const [key] = action.keys;
  return (
    <button
      type="button"
      className="verb"
      aria-pressed={action.isOn === undefined ? undefined : on}
      aria-disabled={available ? undefined : true}
      aria-keyshortcuts={action.keys.join(' ')}
      onClick={() => {
        if (available) action.run(world);
      }}
    >
      {action.label}
      {key === undefined || !keyShown ? null : <Key>{keyLabel(key)}</Key>}
    </button>
  );
}
