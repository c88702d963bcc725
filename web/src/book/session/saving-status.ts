import type { Clash } from '@embertally/shared/survey/change';

/** A change set the server refused; it stays on the device until the person decides. */
export interface HeldSet {
  readonly id: string;
  readonly label: string;
  /** Why, in one sentence. */
  readonly reason: string;
  /** Present when another person changed the same thing: both values, who and when. */
  readonly clashes: readonly Clash[];
  /** Other unsent sets that build on this one and wait with it. */
  readonly waiting: number;
}

/** Where the person's changes are: said in the header, always true. */
export interface SavingStatus {
  readonly state: 'saved' | 'saving' | 'kept' | 'attention' | 'clash';
  /** Change sets not yet accepted by the server. */
  readonly unsent: number;
  /** When the last set was accepted, ISO; null when nothing was sent yet. */
  readonly savedAt: string | null;
  /** Why sending stands still, when it does. */
  readonly why: 'offline' | 'signed-out' | 'server' | null;
  /** Whether the changes are on the device's disk (false: only in memory, storage refused). */
  readonly onDisk: boolean;
  readonly held: readonly HeldSet[];
}

export const NOTHING_TO_SAVE: SavingStatus = {
  state: 'saved',
  unsent: 0,
  savedAt: null,
  why: null,
  onDisk: true,
  held: [],
};
