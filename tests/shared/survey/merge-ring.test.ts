import { expect, test } from 'vitest';
import { mergeRing } from '@embertally/shared/survey/merge/merge-ring';

test.each([
  ['different walls', 'abcd', 'axbcd', 'abcyd', 'axbcyd'],
  ['the last wall and the first', 'abcd', 'axbcd', 'abcdy', 'axbcdy'],
  ['the same corners in the same wall', 'abcd', 'axbcd', 'axbcd', 'axbcd'],
  ['one side only', 'abcd', 'abcd', 'axbyczd', 'axbyczd'],
  ['one taken out, one put in far away', 'abcdef', 'abdef', 'abcdexf', 'abdexf'],
  ['different corners in the same wall', 'abcd', 'axbcd', 'aybcd', null],
  ['the closing wall from both ends', 'abcd', 'xabcd', 'abcdy', null],
  ['a corner taken out and one put in beside it', 'abcd', 'acd', 'axbcd', null],
  ['turned round', 'abcd', 'bcda', 'abxcd', null],
] as const)('%s', (_, base, theirs, mine, expected) => {
  expect(mergeRing([...base], [...theirs], [...mine])?.join('') ?? null).toBe(expected);
});
