import type { Keeping } from '@embertally/shared/survey/survey-document';

/** How an entry is kept, as it is said. */
export const KEEPING_CHOICES: readonly { readonly value: Keeping; readonly label: string }[] = [
  { value: 'stored', label: 'stored' },
  { value: 'fixed', label: 'fixed' },
  { value: 'passing', label: 'passing' },
];
