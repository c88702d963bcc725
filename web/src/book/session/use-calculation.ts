import { use, useCallback, useEffect, useRef, useState } from 'react';
import { CalculationContext } from './calculation-context.ts';
import type { CalculationKind, CalculationTask, CalculationValue } from './calculation-message.ts';
import { CalculationStoppedError, type CalculationThread } from './calculation-thread.ts';

/** So long the survey has to be quiet before a calculation begins, ms. */
const QUIET_ms = 400;

export interface Calculation<K extends CalculationKind> {
  /** `idle`: nothing to calculate. `waiting`: it begins when the survey has been quiet for a moment. */
  readonly state: 'idle' | 'waiting' | 'running' | 'ready' | 'stopped' | 'failed';
  /** Share done, 0 to 1. */
  readonly fraction: number;
  /** Belongs to the task as it is now; null until it is ready. */
  readonly value: CalculationValue[K] | null;
  /** Why it failed. */
  readonly message: string | null;
  readonly stop: () => void;
  /** Begins again after it was stopped or has failed. */
  readonly again: () => void;
}

type Progress<K extends CalculationKind> = Omit<Calculation<K>, 'stop' | 'again'> & { readonly of: unknown };

const WAITING = { state: 'waiting', fraction: 0, value: null, message: null } as const;

/**
 * Runs a task in the background and again whenever it changes; what belonged to an older task is never shown.
 * @param task the same object as long as it is the same task; null when there is nothing to calculate
 */
export function useCalculation<K extends CalculationKind>(
  task: (CalculationTask & { readonly kind: K }) | null,
): Calculation<K> {
  const makeThread = use(CalculationContext);
  const thread = useRef<CalculationThread | null>(null);
  const running = useRef<AbortController | null>(null);
  const [attempt, setAttempt] = useState(0);
  const [progress, setProgress] = useState<Progress<K>>({ ...WAITING, of: null });

  useEffect(
    () => () => {
      thread.current?.close();
      thread.current = null;
    },
    [],
  );

  useEffect(() => {
    if (task === null) return;
    const abort = new AbortController();
    running.current = abort;
    const show = (now: Partial<Omit<Progress<K>, 'of'>>) => {
      setProgress({ ...WAITING, ...now, of: task });
    };
    const begin = () => {
      show({ state: 'running' });
      thread.current ??= makeThread();
      thread.current
        .run<K>(task, (fraction) => show({ state: 'running', fraction }), abort.signal)
        .then(
          (value) => {
            if (!abort.signal.aborted) show({ state: 'ready', fraction: 1, value });
          },
          (error: unknown) => {
            if (error instanceof CalculationStoppedError) return;
            show({ state: 'failed', message: error instanceof Error ? error.message : String(error) });
          },
        );
    };
    show({});
    const timer = setTimeout(begin, QUIET_ms);
    return () => {
      clearTimeout(timer);
      abort.abort();
    };
  }, [task, attempt, makeThread]);

  const stop = useCallback(() => {
    running.current?.abort();
    setProgress({ ...WAITING, state: 'stopped', of: task });
  }, [task]);
  const again = useCallback(() => {
    setAttempt((count) => count + 1);
  }, []);

  if (task === null) return { ...WAITING, state: 'idle', stop, again };
  const { of, ...now } = progress;
  return { ...(of === task ? now : WAITING), stop, again };
}
