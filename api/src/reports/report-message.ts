import type { ReportInput } from './report-input.ts';

/** What the worker is started with. */
export interface ReportTask {
  readonly input: ReportInput;
}

/** What the worker says while it works and at its end. */
export type ReportMessage =
  | { readonly kind: 'progress'; readonly fraction: number }
  | { readonly kind: 'done'; readonly bytes: Uint8Array }
  | { readonly kind: 'failed'; readonly name: string; readonly message: string };
