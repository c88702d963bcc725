/** What is wrong in a file, where, and what to do. */
export interface CalorimeterFault {
  /** Line of the file, from 1; null where the whole file or a choice is meant. */
  readonly line: number | null;
  readonly code: string;
  readonly message: string;
}
