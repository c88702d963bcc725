import type { PlanHost } from '../interaction/plan-host.ts';
import type { BookSession } from '../session/book-session.ts';
import type { BookState } from '../session/book-state.ts';

export interface ActionWorld {
  readonly session: BookSession;
  readonly host: PlanHost;
}

/** Something that can be done, once, for the row of verbs, the shortcuts and the list of keys alike. */
export interface Action {
  readonly id: string;
  /** A verb: "Draw room". */
  readonly label: string;
  /** Keys as `Control+Z`, `Shift+F`, `R`; the first is the one shown. */
  readonly keys: readonly string[];
  /** Where it stands in the list of keys. */
  readonly group: 'draw' | 'change' | 'look';
  /** Not offered to a person who may only read. */
  readonly edits?: boolean;
  readonly isAvailable: (state: BookState) => boolean;
  /** Whether it is what is being done now (a tool in hand). */
  readonly isOn?: (state: BookState) => boolean;
  readonly run: (world: ActionWorld) => void;
}
