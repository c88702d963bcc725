import { estimate, type EstimateWarning } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import { asKept } from '../methods/load/as-kept.ts';
import { characteristicLoad } from '../methods/load/characteristic-load.ts';
import { combustionFactor } from '../methods/load/combustion-factor.ts';
import { perEnclosure } from '../methods/load/per-enclosure.ts';
import { perFloor } from '../methods/load/per-floor.ts';
import type { WorkingStep } from '../methods/working.ts';
import { designLoadOf } from './design-factors.ts';
import type { CountedPart, EntryHeat } from './entry-heats.ts';
import { loadBand } from './load-band.ts';
import { loadBasis } from './load-basis.ts';
import { localPeakOf } from './local-peak-of.ts';
import { placeAmongUse } from './place-among-use.ts';
import type { RoomAreas } from './room-areas.ts';
import type { RoomInput } from './room-input.ts';
import { allParts, sharesByEntry, sharesByMaterial, sumOfParts } from './room-load.ts';
import type { RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

const NEEDS_FLOOR = [
  'perFloor',
  'perEnclosure',
  'asKept',
  'design',
  'band',
  'standardUncertainty',
  'localPeak',
  'placeAmongUse',
];

/** The section `load` of a tally. */
export function loadSection(
  input: RoomInput,
  areas: RoomAreas,
  heats: readonly EntryHeat[],
  context: TallyContext,
): RoomTally['load'] {
  const { workings } = context;
  const parts = allParts(heats);
  const total = sumOfParts(parts, context, protectionWarnings(input, heats), workings ? defaultSteps(heats) : []);
  const Q = total.value ?? 0;
  const kept = (keeping: 'fixed' | 'stored' | 'passing') =>
    sumOfParts(allParts(heats.filter(({ entry }) => (entry.keeping ?? 'stored') === keeping)), context);
  const fixed = kept('fixed');
  const m = factorOfRoom(input, parts, context);
  const base = {
    total,
    fixed,
    stored: kept('stored'),
    passing: kept('passing'),
    combustionFactor: m,
    byMaterial: sharesByMaterial(parts, Q, context),
    byEntry: sharesByEntry(heats, Q, context),
  };
  if (!(areas.floor > 0 && areas.enclosing > 0)) {
    for (const path of NEEDS_FLOOR) noteMissing(context, `load.${path}`, 'room.ring_m', 'The room has no floor area.');
    return base;
  }
  const A_f = areas.floor;
  const origins = { A_f: areas.floorMeasured ? ('measured' as const) : ('computed' as const) };
  const floorLoad = estimate(perFloor, { Q, A_f }, { workings, origins });
  const characteristic = characteristicOf(input, (fixed.value ?? 0) / A_f, (Q - (fixed.value ?? 0)) / A_f, context);
  return {
    ...base,
    perFloor: floorLoad,
    perEnclosure: estimate(perEnclosure, { Q, A_t: areas.enclosing }, { workings }),
    asKept: estimate(
      asKept,
      { m: m.value ?? 1, q_fk: characteristic.value },
      { workings, warnings: characteristic.warnings, steps: characteristic.steps },
    ),
    design: designLoadOf(input, areas, m.value ?? 1, characteristic, context),
    ...loadBand(heats, { Q, A_f, q: floorLoad.value ?? 0 }, context),
    ...optional('localPeak', localPeakOf(heats, context)),
    ...optional('placeAmongUse', placeAmongUse(input.room.use ?? null, (Q - (fixed.value ?? 0)) / A_f, context)),
  };
}

function optional<K extends string, V>(key: K, value: V | undefined): { readonly [P in K]?: V } {
  return value === undefined ? {} : ({ [key]: value } as { readonly [P in K]?: V });
}

/** m of the room: a person's own factor for everything, else the materials' weighted by heat. */
function factorOfRoom(input: RoomInput, parts: readonly CountedPart[], context: TallyContext) {
  const own = input.options?.combustion_factor ?? null;
  const Q = parts.map(({ counted }) => counted);
  return estimate(
    combustionFactor,
    { m: parts.map(({ part }) => own ?? part.combustionFactor), Q },
    {
      workings: context.workings,
      origins: { m: own === null ? 'catalogue' : { origin: 'given', note: 'one factor for all contents' } },
      ...(Q.some((heat) => heat > 0)
        ? {}
        : {
            warnings: [{ code: 'NO_CONTENTS', text: 'Nothing that burns is recorded: the factor has no meaning yet.' }],
          }),
    },
  );
}

/** q_f,k by what a person says the surveyed amount stands for. */
function characteristicOf(input: RoomInput, fixed: number, variable: number, context: TallyContext) {
  const { basis, V } = loadBasis(input);
  const inputs = { fixed, variable, V, basis };
  const value = characteristicLoad.run(inputs);
  const warnings: EstimateWarning[] =
    basis === 'as_surveyed'
      ? [
          {
            code: 'SURVEY_TAKEN_AS_CHARACTERISTIC',
            text: 'What was found on the day of the survey is taken as the characteristic load; it can be more on another day.',
          },
        ]
      : [];
  return {
    value,
    warnings,
    steps: context.workings
      ? [
          {
            text: `q_f,k (${basis.replaceAll('_', ' ')}): fixed ${figure(fixed)}, stored and passing ${figure(variable)} MJ/m2`,
            equation: characteristicLoad.equation,
            value,
            unit: 'MJ/m2',
          },
        ]
      : [],
  };
}

/** Names what nobody said about the entries and was therefore assumed. */
function defaultSteps(heats: readonly EntryHeat[]): WorkingStep[] {
  const unsaid = (field: 'keeping' | 'enclosure' | 'evidence') =>
    heats.filter(({ entry }) => entry[field] == null).length;
  return (
    [
      [unsaid('keeping'), 'stored'],
      [unsaid('enclosure'), 'open'],
      [unsaid('evidence'), 'estimated'],
    ] as const
  )
    .filter(([count]) => count > 0)
    .map(([count, taken]) => ({
      text: `By default ${count} ${count === 1 ? 'entry is' : 'entries are'} taken as ${taken}.`,
    }));
}

function protectionWarnings(input: RoomInput, heats: readonly EntryHeat[]): EstimateWarning[] {
  const cabinets = heats.some(({ entry }) => entry.enclosure === 'cabinet');
  const unrated = heats.filter(({ entry }) => entry.enclosure === 'sealed' && entry.sealed_rating_min == null).length;
  const warnings: EstimateWarning[] = [];
  if (cabinets && input.options?.protected_loads === 'EN') {
    const note = input.options.protected_loads_note ?? '';
    warnings.push({
      code: 'PROTECTED_LOADS_EN_RULE',
      text: `Closed cabinets are counted by the EN 10 % rule${note === '' ? '; nobody has noted why the rest cannot be heated to ignition' : `: ${note}`}.`,
    });
  }
  if (unrated > 0) {
    warnings.push({
      code: 'SEALED_WITHOUT_RATING',
      text: `${unrated} sealed ${unrated === 1 ? 'entry has' : 'entries have'} no stated rating and ${unrated === 1 ? 'counts' : 'count'} in full.`,
    });
  }
  return warnings;
}
