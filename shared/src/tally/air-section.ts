import { estimate, estimateOutputs, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import { carbonMonoxide } from '../methods/smoke/carbon-monoxide.ts';
import { massForVisibility } from '../methods/smoke/mass-for-visibility.ts';
import { oxygenEnd } from '../methods/smoke/oxygen-end.ts';
import { oxygenLimitedHeat } from '../methods/smoke/oxygen-limited-heat.ts';
import { rangeFaults } from '../methods/range-faults.ts';
import type { WorkingStep } from '../methods/working.ts';
import { meanYields, type MeanYields } from './mean-yields.ts';
import type { RoomBasis } from './room-basis.ts';
import type { RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

type Air = RoomTally['air'];
type Basis = Pick<RoomBasis, 'input' | 'areas' | 'openings' | 'heats' | 'growth'>;

/** ρ T of dry air at 101 325 Pa, kg K/m³, from the ideal gas with 28.965 g/mol. */
const AIR_KG_K_M3 = 352.98;
const ZERO_C_IN_K = 273.15;
const USUAL_AMBIENT_C = 20;
const OXYGEN_BEFORE = 0.2095;
/** Oxygen at which flames go out: the low value means more heat and stands first. */
const LIMITS = { usual: 0.13, high: 0.15, low: 0.1 } as const;
const VISIBILITY_M = 10;
const SHORT_OF_AIR_KG_KG = 0.2;
/** With less of the mass known than this a mean yield says nothing about the room. */
const LEAST_KNOWN = 0.5;

/**
 * The section `air` of a tally: what the air in the room allows, with every opening taken as closed, and what becomes of
 * it. Rooms with openings get the same numbers: it is what they would be with doors and windows shut.
 */
export function airSection(basis: Basis, context: TallyContext): Air {
  const { input, areas } = basis;
  const volume = areas.estimates.volume.value ?? 0;
  const T = input.options?.ambient_C ?? USUAL_AMBIENT_C;
  const common = { V: volume, rho: AIR_KG_K_M3 / (T + ZERO_C_IN_K), X_0: OXYGEN_BEFORE };
  const [fault] = rangeFaults(oxygenLimitedHeat, { ...common, X_lim: LIMITS.usual });
  if (fault) {
    const field = fault.input === 'rho' ? 'options.ambient_C' : 'room.ring_m';
    for (const path of PATHS) noteMissing(context, `air.${path}`, field, fault.text);
    return {};
  }
  const heatTo = (X_lim: number) =>
    estimateOutputs(
      oxygenLimitedHeat,
      { ...common, X_lim },
      {
        workings: context.workings,
        origins: {
          V: { origin: 'computed', note: 'floor area × height' },
          rho: { origin: 'computed', note: `dry air at ${figure(T)} °C` },
          X_0: { origin: 'default', note: 'fresh air' },
          X_lim: { origin: 'default', note: '13 % usual, 15 % in cool air, 10 % and less in hot layers' },
        },
      },
    ).of('heat');
  const oxygen = heatTo(LIMITS.usual);
  return {
    oxygenLimitedHeat: oxygen,
    oxygenLimitedHeatAt15: heatTo(LIMITS.high),
    oxygenLimitedHeatAt10: heatTo(LIMITS.low),
    ...endOf(basis, oxygen.value ?? 0, context),
    ...smokeOf(basis, { volume, T, heat: oxygen.value ?? 0 }, context),
  };
}

const PATHS = ['oxygenLimitedHeat', 'massForVisibility10m', 'carbonMonoxide'] as const;

/** Where the oxygen ends the design curve of a room without any opening. */
function endOf({ openings, growth }: Basis, E_O2: number, context: TallyContext): Pick<Air, 'oxygenEnd'> {
  const { curve } = growth;
  if (openings.afterGlass.factor > 0 || curve === undefined) return {};
  const inputs = { t: curve.map(([t]) => t), Q: curve.map(([, Q]) => Q), E_O2 };
  const [fault] = rangeFaults(oxygenEnd, inputs);
  if (fault) return noteMissing(context, 'air.oxygenEnd', 'contents', fault.text) ?? {};
  const run = estimateOutputs(oxygenEnd, inputs, { workings: context.workings, warnings: [OPENED_AGAIN] });
  const never = run.result.time === null ? 'The contents have less heat than the air of the room can feed.' : undefined;
  return { oxygenEnd: run.of('time', never) };
}

const OPENED_AGAIN: EstimateWarning = {
  code: 'MAY_FLARE_UP',
  text: 'A fire that went out for want of air can flare up at once when the room is opened.',
};

interface Closed {
  readonly volume: number;
  readonly T: number;
  /** MJ, to the usual oxygen limit. */
  readonly heat: number;
}

function smokeOf(basis: Basis, closed: Closed, context: TallyContext): Partial<Air> {
  const yields = meanYields(basis.heats);
  const lack = yields === undefined ? NOTHING : 1 - yields.assumed < LEAST_KNOWN ? unknownYields(yields) : undefined;
  if (yields === undefined || lack !== undefined) {
    for (const path of ['massForVisibility10m', 'carbonMonoxide'])
      noteMissing(context, `air.${path}`, 'contents', lack ?? NOTHING);
    return {};
  }
  const warnings = yieldWarnings(yields);
  return { ...visibilityOf(yields, warnings, closed, context), ...gasOf(basis, yields, warnings, closed, context) };
}

const NOTHING = 'Nothing that burns is recorded in the room.';

function unknownYields({ assumed }: MeanYields): string {
  return `How much soot and carbon monoxide it gives is not known for ${percent(assumed)} of the mass. Name catalogue materials with yields.`;
}

function yieldWarnings({ assumed, asWood }: MeanYields): EstimateWarning[] {
  const warnings: EstimateWarning[] = [];
  if (assumed > 0) {
    warnings.push({
      code: 'YIELDS_ASSUMED',
      text: `For ${percent(assumed)} of the mass yields are not known; 0.07 kg/kg of soot and 0.04 kg/kg of carbon monoxide are assumed.`,
    });
  }
  if (asWood > 0) {
    warnings.push({
      code: 'YIELDS_AS_WOOD',
      text: `For ${percent(asWood)} of the mass, boards and paper, the yields of red oak stand.`,
    });
  }
  return warnings;
}

function percent(share: number): string {
  return `${figure(Number((100 * share).toPrecision(2)))} %`;
}

function visibilityOf(
  { soot }: MeanYields,
  warnings: readonly EstimateWarning[],
  { volume }: Closed,
  context: TallyContext,
): Pick<Air, 'massForVisibility10m' | 'massForVisibility10mShining'> {
  const inputs = { V: volume, S: VISIBILITY_M, y_s: soot };
  const [fault] = rangeFaults(massForVisibility, { ...inputs, seen: 'reflecting' });
  if (fault) return noteMissing(context, 'air.massForVisibility10m', 'contents', fault.text) ?? {};
  const seen = (what: 'reflecting' | 'shining') =>
    estimate(
      massForVisibility,
      { ...inputs, seen: what },
      {
        workings: context.workings,
        warnings,
        origins: { S: 'default', seen: 'default', y_s: { origin: 'catalogue', note: 'weighted by mass' } },
      },
    );
  return { massForVisibility10m: seen('reflecting'), massForVisibility10mShining: seen('shining') };
}

function gasOf(
  { heats, growth }: Basis,
  yields: MeanYields,
  warnings: readonly EstimateWarning[],
  { volume, T, heat }: Closed,
  context: TallyContext,
): Pick<Air, 'carbonMonoxide' | 'carbonMonoxideShortOfAir'> {
  const mass = massThatBurns(heats);
  const perKg = (growth.heatReleased?.value ?? 0) / mass;
  const m = Math.min(mass, heat / perKg);
  const steps: WorkingStep[] = [
    { text: 'Heat released per kg of the contents', value: perKg, unit: 'MJ/kg' },
    { text: 'Heat to the oxygen limit', value: heat, unit: 'MJ' },
    { text: 'm: what burns until then, at most all there is', value: m, unit: 'kg' },
  ];
  const inputs = { m, V: volume, T };
  const [fault] = rangeFaults(carbonMonoxide, { ...inputs, y: yields.carbonMonoxide });
  if (fault) return noteMissing(context, 'air.carbonMonoxide', 'contents', fault.text) ?? {};
  const ppm = (y: number, note: string, extra: readonly EstimateWarning[]): Estimate =>
    estimate(
      carbonMonoxide,
      { ...inputs, y },
      {
        workings: context.workings,
        warnings: extra,
        steps: context.workings ? steps : [],
        origins: {
          y: { origin: 'catalogue', note },
          T: { origin: 'computed', note: 'as before the fire: parts of the air that was there' },
        },
      },
    );
  return {
    carbonMonoxide: ppm(yields.carbonMonoxide, 'with enough air, weighted by mass', warnings),
    carbonMonoxideShortOfAir: ppm(SHORT_OF_AIR_KG_KG, 'short of air', []),
  };
}

/** kg of what counts in the fire. */
function massThatBurns(heats: Basis['heats']): number {
  let mass = 0;
  for (const { parts } of heats)
    for (const { counted, count, part } of parts) if (counted > 0) mass += count * part.mass;
  return mass;
}
