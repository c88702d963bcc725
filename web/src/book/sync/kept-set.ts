import type { ChangeSetBody, Clash } from '@embertally/shared/survey/change';

/** A change set that the server has not accepted yet, as it waits on the device. */
export interface KeptSet {
  readonly body: ChangeSetBody;
  /** Place in the order of gestures; rises for ever. */
  readonly order: number;
  /** Rows the set edits, whole, as this person left them: what a recovered copy is made of. */
  readonly rows: Readonly<Record<string, Readonly<Record<string, unknown>>>>;
  /** Set when the server would not take it: it stays until the person decides. */
  readonly held: { readonly reason: string; readonly clashes: readonly Clash[] } | null;
}
