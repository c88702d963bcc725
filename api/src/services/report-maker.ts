import type { ReportInput } from '../reports/report-input.ts';

/**
 * Makes the bytes of a report off the request thread.
 * @param onProgress told how far it is, 0 to 1
 * @param signal stops the work
 */
export type ReportMaker = (
  input: ReportInput,
  onProgress: (fraction: number) => void,
  signal: AbortSignal,
) => Promise<Uint8Array>;
