import type { CalculationKind, CalculationMessage, CalculationTask, CalculationValue } from './calculation-message.ts';

/** A calculation that nobody waits for any more. */
export class CalculationStoppedError extends Error {
  override readonly name = 'CalculationStoppedError';

  constructor() {
    super('The calculation was stopped.');
  }
}

/** Calculates in the background, one task at a time. */
export interface CalculationThread {
  /**
   * @param onProgress called with the share done, 0 to 1
   * @param signal ends the calculation at once
   * @throws CalculationStoppedError, or an error that says what went wrong
   */
  run<K extends CalculationKind>(
    task: CalculationTask & { readonly kind: K },
    onProgress: (fraction: number) => void,
    signal: AbortSignal,
  ): Promise<CalculationValue[K]>;
  /** Ends the thread; what is running is stopped. */
  close(): void;
}

/** A thread of the browser. It is started with its first task, and again after one was stopped. */
export function browserThread(): CalculationThread {
  let worker: Worker | null = null;
  let stopRunning: (() => void) | null = null;
  const end = () => {
    worker?.terminate();
    worker = null;
  };
  return {
    run<K extends CalculationKind>(
      task: CalculationTask & { readonly kind: K },
      onProgress: (fraction: number) => void,
      signal: AbortSignal,
    ) {
      stopRunning?.();
      return new Promise<CalculationValue[K]>((resolve, reject) => {
        if (signal.aborted) {
          reject(new CalculationStoppedError());
          return;
        }
        worker ??= new Worker(new URL('./calculation-worker.ts', import.meta.url), { type: 'module' });
        const running = worker;
        const settle = (finish: () => void) => {
          signal.removeEventListener('abort', stop);
          running.onmessage = null;
          running.onerror = null;
          stopRunning = null;
          finish();
        };
        const stop = () => {
          settle(() => {
            end();
            reject(new CalculationStoppedError());
          });
        };
        stopRunning = stop;
        signal.addEventListener('abort', stop, { once: true });
        running.onmessage = ({ data }: MessageEvent<CalculationMessage>) => {
          switch (data.kind) {
            case 'progress':
              onProgress(data.fraction);
              break;
            case 'done':
              // The thread answers the kind it was asked for.
              settle(() => {
                resolve(data.value as CalculationValue[K]);
              });
              break;
            case 'failed':
              settle(() => {
                reject(new Error(data.message));
              });
              break;
          }
        };
        running.onerror = (event) => {
          settle(() => {
            end();
            reject(new Error(event.message || 'The thread that calculates could not be started.'));
          });
        };
        running.postMessage(task);
      });
    },
    close() {
      stopRunning?.();
      end();
    },
  };
}
