/** Which column a table is sorted by, and which way. */
export interface Sort {
  readonly key: string;
  readonly direction: 'ascending' | 'descending';
}
