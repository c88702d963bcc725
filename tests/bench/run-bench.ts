import { writeFileSync } from 'node:fs';
import type { BenchRow } from './bench-row.ts';
import { benchApi } from './bench-api.ts';
import { benchBundle } from './bench-bundle.ts';
import { benchCalorimeter } from './bench-calorimeter.ts';
import { benchEstimateRoom } from './bench-estimate-room.ts';
import { benchMonteCarlo } from './bench-monte-carlo.ts';
import { benchHitTest } from './bench-hit-test.ts';
import { benchReport } from './bench-report.ts';
import { benchSpread } from './bench-spread.ts';
import { benchStart } from './bench-start.ts';

/** Runs every benchmark one after the other and prints one table; `--json FILE` writes the rows as well. */
const benches: readonly (() => Promise<readonly BenchRow[]>)[] = [
  benchEstimateRoom,
  benchSpread,
  benchCalorimeter,
  benchHitTest,
  benchMonteCarlo,
  benchBundle,
  benchApi,
  benchReport,
  benchStart,
];

const rows: BenchRow[] = [];
for (const bench of benches) {
  const made = await bench();
  rows.push(...made);
  for (const row of made) {
    const bound = row.bound === null ? '' : `≤ ${row.bound}`;
    const word = row.bound === null ? '' : row.holds ? 'holds' : 'DOES NOT HOLD';
    process.stdout.write(
      `${row.name.padEnd(74)} ${row.value.toPrecision(3).padStart(9)} ${row.unit.padEnd(6)} ${bound.padEnd(8)} ${word}\n`,
    );
  }
}

const at = process.argv.indexOf('--json');
const file = process.argv[at + 1];
if (at >= 0 && file !== undefined) writeFileSync(file, `${JSON.stringify(rows, null, 2)}\n`);
