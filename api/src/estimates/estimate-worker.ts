import { parentPort } from 'node:worker_threads';
import type { EstimateTask } from '../services/estimate-maker.ts';
import type { EstimateMessage } from './estimate-message.ts';
import { makeEstimate } from './make-estimate.ts';

/** Runs in a thread of its own and takes one task at a time; it is stopped by ending the thread. */
const port = parentPort;
if (port === null) throw new Error('The estimate worker runs as a worker thread only.');
const say = (message: EstimateMessage) => port.postMessage(message);

port.on('message', (task: EstimateTask) => {
  try {
    say({ kind: 'done', json: makeEstimate(task) });
  } catch (error) {
    say({ kind: 'failed', message: error instanceof Error ? (error.stack ?? error.message) : String(error) });
  }
});
