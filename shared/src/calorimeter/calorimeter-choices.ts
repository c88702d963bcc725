import { z } from 'zod/mini';
import type { Role } from './column-units.ts';

export type Delimiter = ',' | ';' | '\t';

/** How a file is to be read. Everything here is proposed by `describeCalorimeterCsv` and may be changed by the person. */
export interface CalorimeterChoices {
  readonly delimiter: Delimiter;
  /** Null: not known; a number such as 1,234 is then asked about. */
  readonly decimal: 'point' | 'comma' | null;
  /** Number of the first line that holds readings. */
  readonly firstLine: number;
  /** Column of each role, from 0. */
  readonly columns: Partial<Readonly<Record<Role, number>>>;
  /** Unit of each mapped column, a key of `COLUMN_UNITS`. */
  readonly units: Partial<Readonly<Record<Role, string>>>;
  /** Read the rate itself, or work it out from oxygen, carbon dioxide, carbon monoxide and flow. */
  readonly from: 'rate' | 'gases';
  /** Exposed area of the test piece. */
  readonly specimen_m2?: number;
  /** Mass that burnt, entered by hand; goes before what the file says of it. */
  readonly burnt_kg?: number;
  /** Water vapour in the air before the fire, parts of 1; absent: taken as dry, which gives the higher rate. */
  readonly humidity?: number;
  /** The time that becomes 0; earlier readings are left out. Absent: 0 where the file starts before 0, else as it is. */
  readonly start_s?: number;
  /** Readings below 0 are set to 0. Absent: not decided. */
  readonly negatives?: 'zero';
  /** Blank readings between others are passed over, straight from one to the next. Absent: they are faults. */
  readonly blanks?: 'bridge';
  /** Readings are put in order of time and readings of one time averaged. Absent: they are faults. */
  readonly order?: 'mend';
}

const name = z.string().check(z.maxLength(200));

/** A mapping worth keeping for the next file of the same instrument: columns by their header, not by their place. */
export const calorimeterMappingSchema = z.strictObject({
  delimiter: z.enum([',', ';', '\t']),
  decimal: z.nullable(z.enum(['point', 'comma'])),
  from: z.enum(['rate', 'gases']),
  columns: z.record(z.string().check(z.maxLength(40)), name),
  units: z.record(z.string().check(z.maxLength(40)), z.string().check(z.maxLength(20))),
});
export type CalorimeterMapping = z.infer<typeof calorimeterMappingSchema>;
