import { useRef, useState, type SubmitEvent } from 'react';
import { ContractError, OfflineError, ProblemError, UnprocessableError } from '../lib/api-errors.ts';
import { draftOf } from '../lib/draft.ts';
import { useErrorTitle } from '../lib/page-title.ts';
import { ToldError } from '../lib/told-error.ts';
import type { SummaryError } from './error-summary.tsx';

type Texts<V> = { readonly [K in keyof V]: string };
export type FieldErrors<V> = { readonly [K in keyof V]?: string };

interface FormOptions<V extends Texts<V>> {
  /** Names the form: ids of its fields, and its draft. */
  readonly name: string;
  readonly initial: V;
  /** Everything wrong with what was typed, in words that say how to put it right. */
  readonly validate: (values: V) => FieldErrors<V>;
  readonly submit: (values: V) => Promise<void>;
  /** Fields to keep through a reload until the form is sent. Never a password. */
  readonly keep?: readonly (keyof V & string)[] | 'everything';
  /** Which field a fault of the server belongs to, by its pointer into what was sent; null: the whole. Its first step when not said. */
  readonly placeFault?: (pointer: string, values: V) => (keyof V & string) | null;
}

interface FieldTies {
  readonly id: string;
  readonly name: string;
  readonly value: string;
  readonly error: string | undefined;
  readonly onChange: (value: string) => void;
}

export interface Form<V extends Texts<V>> {
  readonly values: V;
  readonly set: <K extends keyof V & string>(name: K, value: V[K]) => void;
  /** Sets several fields at once, as when one answer suggests others; a function where what stands there now matters. */
  readonly fill: (patch: Partial<V> | ((values: V) => Partial<V>)) => void;
  /** What a text field needs, its error included. */
  readonly field: (name: keyof V & string) => FieldTies;
  readonly summary: { readonly errors: readonly SummaryError[]; readonly attempt: number };
  readonly busy: boolean;
  /** Empties the form back to how it began, for the next one. */
  readonly reset: () => void;
  /** Forgets what was kept, for a form that is left on purpose. */
  readonly forget: () => void;
  readonly onSubmit: (event: SubmitEvent) => void;
}

function isForeseen(error: unknown): error is Error {
  return error instanceof OfflineError || error instanceof ProblemError || error instanceof ToldError;
}

function pick<V extends object>(values: V, names: readonly (keyof V)[]): Partial<V> {
  const picked: Partial<V> = {};
  for (const name of names) picked[name] = values[name];
  return picked;
}

/** The words for a failure that belongs to the whole form. */
function wholeFormMessage(error: unknown): string {
  if (isForeseen(error)) return error.message;
  if (error instanceof ContractError) {
    return 'The server answered unexpectedly, so it is not known whether this was saved. Reload the page to see.';
  }
  return 'Something went wrong on this page. What you typed is kept; try again.';
}

/**
 * A form that is checked when it is sent, loses nothing that was typed, and shows every fault at its field and in the
 * summary in the same words, whether found here or by the server. A fault at a field goes when the field is changed.
 */
export function useForm<V extends Texts<V>>(options: FormOptions<V>): Form<V> {
  const [draft] = useState(() => draftOf<V>(options.name));
  const [values, setValues] = useState<V>(() =>
    options.keep ? { ...options.initial, ...draft.read() } : options.initial,
  );
  // What comes late, as the end of an upload, must not put back what was typed meanwhile.
  const latest = useRef(values);
  const [errors, setErrors] = useState<FieldErrors<V>>({});
  const [whole, setWhole] = useState<readonly string[]>([]);
  const [attempt, setAttempt] = useState(0);
  const [busy, setBusy] = useState(false);
  const fieldId = (name: string) => `${options.name}-${name}`;
  const faults = Object.entries<string | undefined>(errors);
  const summaryErrors: SummaryError[] = [
    ...whole.map((message) => ({ fieldId: null, message })),
    ...faults.flatMap(([name, message]) => (message === undefined ? [] : [{ fieldId: fieldId(name), message }])),
  ];
  useErrorTitle(summaryErrors.length > 0);

  const fill: Form<V>['fill'] = (change) => {
    const patch = typeof change === 'function' ? change(latest.current) : change;
    const next = { ...latest.current, ...patch };
    latest.current = next;
    setValues(next);
    setErrors((current) => {
      const still = Object.entries(current).filter(([name]) => !(name in patch));
      return Object.fromEntries(still) as FieldErrors<V>;
    });
    if (options.keep) draft.keep(options.keep === 'everything' ? next : pick(next, options.keep));
  };
  const set = <K extends keyof V & string>(name: K, value: V[K]) => {
    fill({ [name]: value } as unknown as Partial<V>);
  };

  const refuse = (fieldErrors: FieldErrors<V>, messages: readonly string[]) => {
    setErrors(fieldErrors);
    setWhole(messages);
    setAttempt((count) => count + 1);
  };

  const refuseByServer = (error: unknown) => {
    if (!(error instanceof UnprocessableError)) {
      // A failure nobody foresaw is still reported, beside the words for the person.
      if (!isForeseen(error)) reportError(error);
      refuse({}, [wholeFormMessage(error)]);
      return;
    }
    const byField: Record<string, string> = {};
    const rest: string[] = [];
    for (const fault of error.problem.errors ?? []) {
      const first = fault.pointer.split('/')[1] ?? '';
      const name = options.placeFault ? options.placeFault(fault.pointer, values) : first in values ? first : null;
      if (name !== null && byField[name] === undefined) byField[name] = fault.message;
      else rest.push(fault.message);
    }
    refuse(byField, rest.length === 0 && Object.keys(byField).length === 0 ? [error.problem.detail] : rest);
  };

  const send = async () => {
    setBusy(true);
    setWhole([]);
    try {
      await options.submit(values);
      draft.forget();
    } catch (error) {
      refuseByServer(error);
    } finally {
      setBusy(false);
    }
  };

  return {
    values,
    set,
    fill,
    field: (name) => ({
      id: fieldId(name),
      name,
      value: values[name],
      error: errors[name],
      onChange: (value) => {
        set(name, value as V[typeof name]);
      },
    }),
    summary: { errors: summaryErrors, attempt },
    busy,
    reset: () => {
      latest.current = options.initial;
      setValues(options.initial);
      setErrors({});
      setWhole([]);
    },
    forget: draft.forget,
    onSubmit: (event) => {
      event.preventDefault();
      if (busy) return;
      const found = options.validate(values);
      if (Object.values(found).some((message) => message !== undefined)) refuse(found, []);
      else void send();
    },
  };
}
