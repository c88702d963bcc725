import { MOST_POINTS } from '../materials/drafts/curve-draft.ts';
import { belowZero } from './below-zero.ts';
import { burntMass } from './burnt-mass.ts';
import type { CalorimeterChoices } from './calorimeter-choices.ts';
import type { CalorimeterNote, CalorimeterPreview, CalorimeterReading } from './calorimeter-reading.ts';
import { choiceFaults } from './choice-faults.ts';
import { cleanTimes, type RawCurve } from './clean-times.ts';
import type { Role } from './column-units.ts';
import { curveBasis } from './curve-basis.ts';
import type { Curve } from './curve.ts';
import { curveTotals } from './curve-totals.ts';
import { FaultList } from './fault-list.ts';
import { fromStart } from './from-start.ts';
import { formatNumber } from '../units/format-number.ts';
import { rateOfGases } from './rate-of-gases.ts';
import { readColumns, type ReadColumns } from './read-columns.ts';
import { resampleCurve } from './resample-curve.ts';
import { withoutBlanks } from './without-blanks.ts';

const LEAST_READINGS = 3;
const GAS_ROLES: readonly Role[] = ['time', 'oxygen', 'carbonDioxide', 'carbonMonoxide', 'flow', 'mass', 'massLoss'];
const RATE_ROLES: readonly Role[] = ['time', 'rate', 'mass', 'massLoss'];

/**
 * Reads a calorimeter's file as its choices say and gives a curve to look at, or every fault at its line. Nothing is
 * corrected that the person did not ask for; nothing is read from a column that was not chosen.
 */
export function readCalorimeterCsv(text: string, choices: CalorimeterChoices): CalorimeterReading {
  const wrong = choiceFaults(choices);
  if (wrong.length > 0) return { ok: false, faults: wrong, moreFaults: 0 };
  const faults = new FaultList();
  const notes: CalorimeterNote[] = [];
  const read = readColumns(text, choices, choices.from === 'gases' ? GAS_ROLES : RATE_ROLES, faults);
  const raw = faults.count > 0 ? null : rawCurve(read, choices, notes, faults);
  const full = raw === null || faults.count > 0 ? null : withoutBlanks(raw, choices, notes, faults);
  if (full !== null && full.rate.length < LEAST_READINGS)
    faults.add(
      null,
      'too_short',
      () =>
        `Only ${full.rate.length} lines have both a time and a reading; a curve needs three. Check the columns and where the readings begin.`,
    );
  const ordered = full === null || faults.count > 0 ? null : cleanTimes(full, choices, faults);
  const started = ordered === null || faults.count > 0 ? null : fromStart(ordered, choices, notes);
  if (started !== null && !(curveTotals(started).heat_MJ > 0))
    faults.add(null, 'no_heat', () => 'The readings hold no heat after the start. Check the column and the start.');
  if (started === null || faults.count > 0) return { ok: false, faults: faults.shown, moreFaults: faults.more };
  const { curve, undecided } = belowZero(started, choices, notes);
  return { ok: true, preview: previewOf(curve, undecided, choices, read, notes) };
}

function rawCurve(
  read: ReadColumns,
  choices: CalorimeterChoices,
  notes: CalorimeterNote[],
  faults: FaultList,
): RawCurve | null {
  const time_s = read.values.time ?? new Float64Array();
  if (choices.from === 'rate') return { time_s, rate: read.values.rate ?? new Float64Array(), lines: read.lines };
  const gases = rateOfGases(read, choices.humidity ?? 0, faults);
  if (gases === null) return null;
  notes.push({
    code: 'BASELINE',
    text: `Air before the fire by the file: ${formatNumber(100 * gases.oxygenBefore, 4)} % oxygen, ${formatNumber(100 * gases.carbonDioxideBefore, 2)} % carbon dioxide; ${choices.humidity === undefined ? 'taken as dry' : `${formatNumber(100 * choices.humidity, 2)} % water vapour`}. 13.1 MJ per kg of oxygen, good to 5 %.`,
  });
  return { time_s, rate: gases.rate, lines: read.lines };
}

function previewOf(
  curve: Curve,
  undecided: boolean,
  choices: CalorimeterChoices,
  read: ReadColumns,
  notes: CalorimeterNote[],
): CalorimeterPreview {
  const { per } = curveBasis(choices);
  const totals = curveTotals(curve);
  const area = per === 'm2' ? choices.specimen_m2 : 1;
  const piece = area === undefined ? null : totals.heat_MJ * area;
  const burnt_kg = choices.burnt_kg ?? burntMass(read, piece, notes);
  const points = resampleCurve(curve, MOST_POINTS);
  return {
    per,
    readings: curve.rate.length,
    ...totals,
    piece_heat_MJ: piece,
    burnt_kg,
    effective_MJ_kg: piece === null || burnt_kg === null ? null : piece / burnt_kg,
    points,
    curve: undecided
      ? null
      : {
          per,
          points: points.map(([t, q]) => [t, q]),
          ...(choices.specimen_m2 === undefined ? {} : { specimen_m2: choices.specimen_m2 }),
          ...(burnt_kg === null ? {} : { burnt_kg }),
        },
    undecided: undecided ? ['negatives'] : [],
    notes,
  };
}
