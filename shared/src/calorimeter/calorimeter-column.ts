export interface CalorimeterColumn {
  readonly index: number;
  /** As the header has it, without its unit; `Column 3` where there is no header. */
  readonly name: string;
  /** As the header spells it; empty where it names none. */
  readonly unitText: string;
  /** The same in the book's spelling; null where it is not known. */
  readonly unit: string | null;
  /** The first few readings. */
  readonly samples: readonly string[];
  /** No reading in the first few hundred lines. */
  readonly empty: boolean;
}
