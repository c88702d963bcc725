import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { EstimateTask } from '../services/estimate-maker.ts';

/** The tally of one room as JSON, in the thread that asks. */
export function makeEstimate({ input, workings }: EstimateTask): string {
  return JSON.stringify(estimateRoom(input, { workings }));
}
