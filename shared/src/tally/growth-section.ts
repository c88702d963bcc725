import { estimate, estimateOutputs, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { designFire, designFireCurve } from '../methods/growth/design-fire.ts';
import { growthCoefficient } from '../methods/growth/growth-coefficient.ts';
import { heatReleased } from '../methods/growth/heat-released.ts';
import { openingsPlateau } from '../methods/growth/openings-plateau.ts';
import { plateau as plateauMethod } from '../methods/growth/plateau.ts';
import type { EntryHeat } from './entry-heats.ts';
import { fuelPlateauOf } from './fuel-plateau-of.ts';
import type { ChosenGrowth } from './growth-class.ts';
import type { RoomAreas } from './room-areas.ts';
import type { RoomInput } from './room-input.ts';
import { GLASS_ASSUMED_BROKEN, type RoomOpenings } from './room-openings.ts';
import type { RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

type Growth = RoomTally['growth'];
type Given = {
  readonly input: RoomInput;
  readonly areas: RoomAreas;
  readonly openings: RoomOpenings;
  readonly heats: readonly EntryHeat[];
  readonly chosen: ChosenGrowth;
  readonly load: RoomTally['load'];
};

const AFTER_PLATEAU = ['governedBy', 'growthEnd', 'decayStart', 'end', 'peak', 'curve'] as const;
/** Below this many MJ or kW there is nothing to draw a curve of. */
const LEAST = 1e-9;
const NO_OPENING: EstimateWarning = {
  code: 'NO_OPENING',
  text: 'The room has no opening: the curve runs on the fuel alone, and the air in the room would end the fire sooner.',
};

/** The section `growth` of a tally: how fast the heat could come out. */
export function growthSection(given: Given, context: TallyContext): Growth {
  const { input, chosen, load } = given;
  const { workings } = context;
  const alpha = estimate(
    growthCoefficient,
    { growth: chosen.growth, convention: input.options?.growth_convention ?? 'EN' },
    {
      workings,
      warnings: chosen.warnings,
      origins: {
        growth: { origin: chosen.origin, note: chosen.why },
        convention: input.options?.growth_convention == null ? 'default' : 'given',
      },
    },
  );
  const released = estimate(
    heatReleased,
    { m: load.combustionFactor.value ?? 1, Q: load.total.value ?? 0 },
    { workings },
  );
  const plateaus = plateausOf(given, context);
  return { alpha, heatReleased: released, ...plateaus, ...fireOf(alpha, released, plateaus, given, context) };
}

function plateausOf({ input, areas, openings, heats }: Given, context: TallyContext) {
  const { workings } = context;
  const F = openings.afterGlass.factor;
  const fuel = fuelPlateauOf(input, areas, heats, context);
  const air =
    F > 0
      ? estimate(
          openingsPlateau,
          { F },
          { workings, warnings: openings.glassAssumedBroken ? [GLASS_ASSUMED_BROKEN] : [] },
        )
      : noteMissing(
          context,
          'growth.openingsPlateau',
          'room.openings',
          'The room has no opening that is open or would break.',
        );
  const plateau =
    fuel || air
      ? estimate(
          plateauMethod,
          { fuel: fuel?.value ?? Infinity, openings: air?.value ?? Infinity },
          { workings, warnings: plateauWarnings(fuel, air) },
        )
      : noteMissing(
          context,
          'growth.plateau',
          'options.plateau_kW_m2',
          'Neither fuel nor openings give a highest rate.',
        );
  return {
    ...(fuel && { fuelPlateau: fuel }),
    ...(air && { openingsPlateau: air }),
    ...(plateau && { plateau }),
  };
}

function plateauWarnings(fuel: Estimate | undefined, air: Estimate | undefined): EstimateWarning[] {
  if (!air) return [NO_OPENING];
  if (fuel) return [];
  return [
    {
      code: 'FUEL_PLATEAU_UNKNOWN',
      text: 'What the fuel can feed is not known: the openings alone set the plateau, which is the most the room allows.',
    },
  ];
}

function fireOf(
  alpha: Estimate,
  released: Estimate,
  { fuelPlateau: fuel, openingsPlateau: air, plateau }: Pick<Growth, 'fuelPlateau' | 'openingsPlateau' | 'plateau'>,
  { openings }: Given,
  context: TallyContext,
): Growth {
  const E = released.value ?? 0;
  const Q_max = plateau?.value ?? 0;
  if (!(E >= LEAST) || !(Q_max >= LEAST)) {
    const [input, why] =
      E >= LEAST
        ? (['options.plateau_kW_m2', 'The highest heat release rate of the room is not known.'] as const)
        : (['contents', 'Nothing that burns is recorded in the room.'] as const);
    for (const path of AFTER_PLATEAU) noteMissing(context, `growth.${path}`, input, why);
    return {};
  }
  const warnings = [...(plateau?.warnings ?? []), ...(openings.glassAssumedBroken ? [GLASS_ASSUMED_BROKEN] : [])];
  const run = estimateOutputs(
    designFire,
    { E, Q_max, alpha: alpha.value ?? 0 },
    { workings: context.workings, warnings: [...alpha.warnings, ...warnings] },
  );
  return {
    governedBy: governedBy(run.result.plateauReached, fuel, air),
    growthEnd: run.of('growthEnd'),
    decayStart: run.of('decayStart'),
    end: run.of('end'),
    peak: run.of('peak'),
    curve: designFireCurve(run.result),
  };
}

/** What holds the curve down; a tie of fuel and openings goes to the openings. */
function governedBy(
  plateauReached: boolean,
  fuel: Estimate | undefined,
  air: Estimate | undefined,
): Growth['governedBy'] {
  if (!air) return 'closed';
  if (!plateauReached) return 'load';
  return fuel && (fuel.value ?? 0) < (air.value ?? 0) ? 'fuel' : 'openings';
}
