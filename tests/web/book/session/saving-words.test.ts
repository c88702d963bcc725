import { NOTHING_TO_SAVE } from '@embertally/web/src/book/session/saving-status.ts';
import { savingWords } from '@embertally/web/src/book/session/saving-words.ts';
import { expect, test } from 'vitest';

const held = { id: 'x', label: 'Moved', reason: 'no', clashes: [], waiting: 0 };

test.each([
  [{ ...NOTHING_TO_SAVE }, 'Saved'],
  [{ ...NOTHING_TO_SAVE, savedAt: '2026-03-02T14:32:10Z' }, 'Saved 14:32'],
  [{ ...NOTHING_TO_SAVE, state: 'saving', unsent: 1 } as const, 'Saving…'],
  [{ ...NOTHING_TO_SAVE, state: 'kept', unsent: 1 } as const, 'Kept on this device – 1 change to send'],
  [{ ...NOTHING_TO_SAVE, state: 'kept', unsent: 6 } as const, 'Kept on this device – 6 changes to send'],
  [{ ...NOTHING_TO_SAVE, state: 'attention', held: [held, held] } as const, 'Needs attention (2)'],
  [{ ...NOTHING_TO_SAVE, state: 'clash', held: [held] } as const, 'Clash – choose'],
])('%#', (saving, words) => {
  expect(savingWords(saving, 'UTC')).toBe(words);
});
