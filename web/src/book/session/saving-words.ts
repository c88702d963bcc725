import type { SavingStatus } from './saving-status.ts';

/** The quiet line in the header: where the person's changes are. */
export function savingWords(saving: SavingStatus, timeZone?: string): string {
  switch (saving.state) {
    case 'saved':
      return saving.savedAt === null ? 'Saved' : `Saved ${clock(saving.savedAt, timeZone)}`;
    case 'saving':
      return 'Saving…';
    case 'kept':
      return `Kept on this device – ${saving.unsent} ${saving.unsent === 1 ? 'change' : 'changes'} to send`;
    case 'attention':
      return `Needs attention (${saving.held.length})`;
    case 'clash':
      return 'Clash – choose';
  }
}

function clock(iso: string, timeZone: string | undefined): string {
  return new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone }).format(new Date(iso));
}
