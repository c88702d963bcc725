import type { Entry } from '@embertally/shared/survey/survey-document';

/** How an entry is kept, known and enclosed, as tables say it. */
export const KEEPING_WORDS: Readonly<Record<Entry['keeping'], string>> = {
  fixed: 'fixed',
  stored: 'stored',
  passing: 'passing',
};

export const EVIDENCE_WORDS: Readonly<Record<Entry['evidence'], string>> = {
  weighed: 'weighed',
  counted: 'counted',
  measured: 'measured',
  estimated: 'estimated',
  hearsay: 'hearsay',
};

export const ENCLOSURE_WORDS: Readonly<Record<Entry['enclosure'], string>> = {
  open: 'open',
  cabinet: 'cabinet',
  sealed: 'sealed metal',
};
