import { describeCalorimeterCsv } from '@embertally/shared/calorimeter/describe-calorimeter-csv';
import { readCalorimeterCsv } from '@embertally/shared/calorimeter/read-calorimeter-csv';
import { atMost, median, type BenchRow } from './bench-row.ts';

const READINGS = 1_000_000;
const ROUNDS = 3;

/** A calorimeter's file of a million readings: described, read, resampled. */
export function benchCalorimeter(): Promise<readonly BenchRow[]> {
  const lines = ['Time (s),HRR (kW)'];
  for (let i = 0; i < READINGS; i += 1) lines.push(`${(i / 10).toFixed(1)},${((i % 5000) / 5).toFixed(1)}`);
  const text = lines.join('\n');
  const times = Array.from({ length: ROUNDS }, () => {
    const began = performance.now();
    const read = readCalorimeterCsv(text, describeCalorimeterCsv(text).proposed);
    if (!read.ok) throw new Error(read.faults.map(({ message }) => message).join(' '));
    return (performance.now() - began) / 1000;
  });
  return Promise.resolve([atMost('a calorimeter’s file of a million readings', median(times), 's', null)]);
}
