import { FirstTables1764547200000 } from './first-tables.ts';

/** Oldest first. A released migration is never edited; a change is a new one. */
export const ALL_MIGRATIONS = [FirstTables1764547200000];
