import { OutOfRangeError } from '../methods/estimate.ts';
import { oxygenCarbon } from '../methods/calorimetry/oxygen-carbon.ts';
import type { FaultList } from './fault-list.ts';
import type { ReadColumns } from './read-columns.ts';

/** Heat per kg of oxygen, kJ/kg, of organic fuels and of CO burning to CO2. */
const PER_OXYGEN = 13_100;
const PER_OXYGEN_CO = 17_600;
/** Readings at the start from which the air before the fire is taken, and how long they may take, s. */
const BASELINE_READINGS = 60;
const BASELINE_S = 60;
const MOST_OXYGEN = 0.2105;
const LEAST_OXYGEN = 0.05;
/** Below nothing by the noise of an analyser. */
const NOISE = -0.001;

export interface GasRate {
  /** kW; NaN where a reading is blank. */
  readonly rate: Float64Array;
  /** Dry oxygen and carbon dioxide before the fire, parts of 1. */
  readonly oxygenBefore: number;
  readonly carbonDioxideBefore: number;
}

/**
 * Heat release rate by oxygen consumption from what the file has: oxygen and flow at least; carbon dioxide and carbon
 * monoxide correct it where they are there.
 *
 * The air before the fire is the mean of the readings of the first minute (at most 60), or of those before
 * time 0 where the file has any.
 * @param humidity water vapour in that air, parts of 1
 */
export function rateOfGases({ lines, values }: ReadColumns, humidity: number, faults: FaultList): GasRate | null {
  const { time, oxygen, carbonDioxide, carbonMonoxide, flow } = values;
  if (time === undefined || oxygen === undefined || flow === undefined) return null;
  const before = baseline(time, oxygen);
  const X0_O2 = mean(oxygen, before);
  const X0_CO2 = carbonDioxide === undefined ? 0 : Math.max(0, mean(carbonDioxide, before));
  if (!(X0_O2 >= 0.2 && X0_O2 <= MOST_OXYGEN)) {
    faults.add(
      null,
      'baseline',
      () =>
        `Before the fire the file has ${(100 * X0_O2).toPrecision(4)} % oxygen; dry air has 20.95 %. Check the column and its unit.`,
    );
    return null;
  }
  const rate = new Float64Array(time.length);
  for (let i = 0; i < time.length; i += 1) {
    const row = {
      m_e: flow[i] ?? Number.NaN,
      X0_O2,
      X0_CO2,
      X0_H2O: humidity,
      X_O2: oxygen[i] ?? Number.NaN,
      X_CO2: unlessNoise(carbonDioxide?.[i] ?? 0),
      X_CO: unlessNoise(carbonMonoxide?.[i] ?? 0),
      E: PER_OXYGEN,
      E_CO: PER_OXYGEN_CO,
    };
    const blank = [row.m_e, row.X_O2, row.X_CO2, row.X_CO].some(Number.isNaN);
    rate[i] = blank ? Number.NaN : rateOf(row, lines[i] ?? 0, faults);
  }
  return { rate, oxygenBefore: X0_O2, carbonDioxideBefore: X0_CO2 };
}

function rateOf(row: Parameters<typeof oxygenCarbon.run>[0], line: number, faults: FaultList): number {
  if (!(row.X_O2 >= LEAST_OXYGEN && row.X_O2 <= MOST_OXYGEN + 0.002)) {
    faults.add(line, 'oxygen', () => `Oxygen of ${(100 * row.X_O2).toPrecision(4)} % is outside 5 to 21.25 %.`);
    return Number.NaN;
  }
  if (row.m_e < 0 || row.X_CO2 < 0 || row.X_CO < 0) {
    faults.add(line, 'negative_gas', () => 'A flow or a gas below 0 is no noise. Check the reading.');
    return Number.NaN;
  }
  try {
    return oxygenCarbon.run(row).rate;
  } catch (error) {
    if (!(error instanceof OutOfRangeError)) throw error;
    faults.add(line, 'drift', () => error.message);
    return Number.NaN;
  }
}

const unlessNoise = (value: number): number => (value < 0 && value > NOISE ? 0 : value);

function baseline(time: Float64Array, oxygen: Float64Array): readonly number[] {
  const known = [...oxygen.keys()].filter((i) => !Number.isNaN(oxygen[i]) && !Number.isNaN(time[i]));
  const lead = known.filter((i) => time[i]! < 0);
  if (lead.length > 0) return lead.slice(-BASELINE_READINGS);
  const first = time[known[0] ?? 0] ?? 0;
  return known.filter((i) => time[i]! - first <= BASELINE_S).slice(0, BASELINE_READINGS);
}

function mean(values: Float64Array, at: readonly number[]): number {
  const known = at.map((i) => values[i]!).filter((value) => !Number.isNaN(value));
  return known.reduce((sum, value) => sum + value, 0) / known.length;
}
