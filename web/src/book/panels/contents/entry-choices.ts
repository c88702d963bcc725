import type { Entry } from '@embertally/shared/survey/survey-document';

interface Choice<T extends string> {
  readonly value: T;
  readonly label: string;
}

export const KEEPING: readonly Choice<Entry['keeping']>[] = [
  { value: 'stored', label: 'stored' },
  { value: 'fixed', label: 'fixed' },
  { value: 'passing', label: 'passing' },
];

export const EVIDENCE: readonly Choice<Entry['evidence']>[] = [
  { value: 'weighed', label: 'weighed' },
  { value: 'counted', label: 'counted' },
  { value: 'measured', label: 'measured' },
  { value: 'estimated', label: 'estimated' },
  { value: 'hearsay', label: 'hearsay' },
];

export const ENCLOSURE: readonly Choice<Entry['enclosure']>[] = [
  { value: 'open', label: 'open' },
  { value: 'cabinet', label: 'closed cabinet, not rated' },
  { value: 'sealed', label: 'sealed metal' },
];

export const GROWTH: readonly Choice<NonNullable<Entry['growth']> | ''>[] = [
  { value: '', label: 'as the use has it' },
  { value: 'slow', label: 'slow' },
  { value: 'medium', label: 'medium' },
  { value: 'fast', label: 'fast' },
  { value: 'ultra-fast', label: 'ultra-fast' },
];

export const IGNITION: readonly Choice<NonNullable<Entry['ignition_class']> | ''>[] = [
  { value: '', label: 'not known' },
  { value: 'easy', label: 'easy' },
  { value: 'normal', label: 'normal' },
  { value: 'hard', label: 'hard' },
  { value: 'resistant', label: 'resistant' },
];
