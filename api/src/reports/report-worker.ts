import { parentPort, workerData } from 'node:worker_threads';
import { makeReport } from './make-report.ts';
import type { ReportMessage, ReportTask } from './report-message.ts';

/** Runs in a thread of its own: makes one report, tells how far it is, hands the bytes over and ends. */
const port = parentPort;
if (port === null) throw new Error('The report worker runs as a worker thread only.');
const say = (message: ReportMessage, handOver: ArrayBuffer[] = []) => port.postMessage(message, handOver);

try {
  const { input } = workerData as ReportTask;
  const bytes = await makeReport(input, (fraction) => say({ kind: 'progress', fraction }));
  const whole = new Uint8Array(bytes);
  say({ kind: 'done', bytes: whole }, [whole.buffer]);
} catch (error) {
  const { name, message } = error instanceof Error ? error : new Error(String(error));
  say({ kind: 'failed', name, message });
}
