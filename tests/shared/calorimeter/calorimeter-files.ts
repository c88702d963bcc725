import { expect } from 'vitest';
import type { CalorimeterChoices } from '@embertally/shared/calorimeter/calorimeter-choices';
import type { CalorimeterPreview } from '@embertally/shared/calorimeter/calorimeter-reading';
import { describeCalorimeterCsv } from '@embertally/shared/calorimeter/describe-calorimeter-csv';
import { readCalorimeterCsv } from '@embertally/shared/calorimeter/read-calorimeter-csv';

type Changes = Partial<CalorimeterChoices>;

/** A file read as it is proposed, with a person's changes. */
export function reading(text: string, changes: Changes = {}) {
  return readCalorimeterCsv(text, { ...describeCalorimeterCsv(text).proposed, ...changes });
}

/** The preview of a file that has to give one. */
export function preview(text: string, changes: Changes = {}): CalorimeterPreview {
  const read = reading(text, changes);
  expect(read.ok ? [] : read.faults).toEqual([]);
  if (!read.ok) throw new Error('The file gives no curve.');
  return read.preview;
}

/** Faults as `line code`. */
export function faultsIn(text: string, changes: Changes = {}): readonly string[] {
  const read = reading(text, changes);
  return read.ok ? [] : read.faults.map(({ line, code }) => `${line ?? 'file'} ${code}`);
}

export const csv = (...lines: readonly string[]): string => `${lines.join('\n')}\n`;

/** A triangle of 1,000 kW over 180 s: 90 MJ. */
export const TRIANGLE = ['0,0', '60,1000', '120,500', '180,0'] as const;

/** Area under straight lines, in thousandths of the product of the units. */
export function areaOf(points: readonly (readonly [number, number])[]): number {
  return points.reduce((sum, [t, q], i) => {
    const [before, last] = points[i - 1] ?? [t, q];
    return sum + ((q + last) / 2) * (t - before);
  }, 0);
}
