import { Worker } from 'node:worker_threads';
import { RoomGoneError } from './build-report-book.ts';
import type { ReportInput } from './report-input.ts';
import type { ReportMessage, ReportTask } from './report-message.ts';

/** The report was stopped before it was whole; nothing of it is kept. */
export class ReportStoppedError extends Error {
  override readonly name = 'ReportStoppedError';

  constructor() {
    super('The report was stopped; nothing of it is kept.');
  }
}

/** The report could not be made; `message` says why. */
export class ReportFailedError extends Error {
  override readonly name = 'ReportFailedError';
}

/** Old-generation heap of the thread, MB: a report that needs more fails alone and leaves the process standing. */
const HEAP_MB = 512;

/**
 * {@link makeReport} in a thread of its own, so that requests go on being answered. The thread ends with the report.
 *
 * @param onProgress called with the share done, 0 to 1
 * @param signal stops the thread at once
 * @throws ReportStoppedError, RoomGoneError, ReportFailedError
 */
export function makeReportInWorker(
  input: ReportInput,
  onProgress: (fraction: number) => void = () => {},
  signal?: AbortSignal,
): Promise<Uint8Array> {
  return new Promise((resolve, reject) => {
    if (signal?.aborted === true) {
      reject(new ReportStoppedError());
      return;
    }
    const task: ReportTask = { input };
    const worker = new Worker(new URL('./report-worker.mjs', import.meta.url), {
      workerData: task,
      resourceLimits: { maxOldGenerationSizeMb: HEAP_MB },
    });
    const stop = () => {
      settle(() => reject(new ReportStoppedError()));
    };
    let settled = false;
    const settle = (finish: () => void) => {
      if (settled) return;
      settled = true;
      signal?.removeEventListener('abort', stop);
      void worker.terminate().then(finish, finish);
    };
    signal?.addEventListener('abort', stop, { once: true });
    worker.on('message', (message: ReportMessage) => {
      switch (message.kind) {
        case 'progress':
          if (!settled) onProgress(message.fraction);
          break;
        case 'done':
          settle(() => resolve(message.bytes));
          break;
        case 'failed':
          settle(() => reject(message.name === 'RoomGoneError' ? new RoomGoneError() : failed(message.message)));
          break;
      }
    });
    worker.on('error', (error: unknown) => {
      const reason = error instanceof Error ? error.message : String(error);
      settle(() => reject(failed(reason)));
    });
    worker.on('exit', () => {
      settle(() => reject(failed('its thread ended before it was whole')));
    });
  });
}

function failed(reason: string): ReportFailedError {
  return new ReportFailedError(
    `The report could not be made: ${reason}. The survey is unchanged. Ask for the report again; if it fails again, tell whoever runs this server.`,
  );
}
