import type { EstimateWarning } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import { computedInput } from '../spread/computed-input.ts';
import { modelEstimate } from '../spread/model-estimate.ts';
import { simulateSpread, type SpreadInput, type SpreadResult } from '../spread/simulate-spread.ts';
import { spreadInput } from '../spread/spread-input.ts';
import { SPREAD_METHOD } from '../methods/models/spread-method.ts';
import type { RoomBasis } from './room-basis.ts';
import type { RoomTally, SpreadTally } from './room-tally.ts';
import { spreadEvents } from './spread-events.ts';
import { spreadGapRows } from './spread-gap-rows.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

/** Above this the sums over all pairs would take minutes. */
const MOST_ENTRIES = 2000;
const PATHS = ['events', 'gaps', 'curve', 'flashover', 'peak', 'end', 'heatReleased', 'unburnt'] as const;

/** The section `spread` of a tally: which entry ignites which, from where they stand on the plan. */
export function spreadSection(basis: RoomBasis, air: RoomTally['air'], context: TallyContext): SpreadTally {
  const { input, defaults } = spreadInput({
    ...basis,
    oxygenLimitedHeat_MJ: air.oxygenLimitedHeat?.value ?? null,
  });
  const reason = whyNot(input);
  const fire = reason ? undefined : simulateSpread(input);
  if (!fire) {
    const [wanted, why] = reason ?? NOT_BURNING;
    for (const path of PATHS) noteMissing(context, `spread.${path}`, wanted, why);
    return {};
  }
  const names = new Map(basis.input.contents.map(({ id, label }) => [id, label ?? id]));
  const nameOf = (id: string) => names.get(id) ?? id;
  return {
    events: spreadEvents(fire, input, nameOf, context),
    ...spreadGapRows(input, context),
    curve: fire.curve,
    first: fire.first,
    firstChosen: fire.chosen.by,
    ...(fire.chosen.by === 'worst' && { firstTried: fire.chosen.tried, firstOf: fire.chosen.of }),
    ...figuresOf(fire, input, nameOf, context),
    defaults,
    layerIncluded: fire.layerIncluded,
  };
}

const NOT_BURNING = ['contents', 'Nothing that burns is recorded in the room.'] as const;

function whyNot({ entries, first }: SpreadInput): readonly [input: string, why: string] | undefined {
  const burning = entries.filter(
    ({ enclosure, heat_MJ, peak_kW }) => enclosure !== 'sealed' && heat_MJ > 0 && peak_kW > 0,
  );
  if (burning.length === 0) return NOT_BURNING;
  if (burning.length > MOST_ENTRIES) {
    const why = `The room has ${burning.length} entries that burn; the order of ignition is worked out for up to ${MOST_ENTRIES}.`;
    return ['contents', why];
  }
  if (burning.every(({ place }) => place === null)) {
    return ['contents.x_m', 'No entry has a place on the plan. Place them to see which ignites which.'];
  }
  if (first === null || burning.some(({ id }) => id === first)) return undefined;
  const why = entries.some(({ id }) => id === first)
    ? 'The entry chosen to burn first is sealed or has no heat to give. Choose another one.'
    : 'The entry chosen to burn first is not in the room. Choose another one.';
  return ['options.first_entry', why];
}

type Figures = Pick<SpreadTally, 'flashover' | 'peak' | 'end' | 'heatReleased' | 'unburnt'>;

/** The fire of the whole room in five numbers; these carry the model's assumptions and limits. */
function figuresOf(
  fire: SpreadResult,
  input: SpreadInput,
  nameOf: (id: string) => string,
  { workings }: TallyContext,
): Figures {
  const warnings = warningsOf(fire, input);
  const never = fire.flashover_s === null ? whyNoFlashover(fire, input) : undefined;
  const describe = workings
    ? () => ({
        inputs: roomInputs(input),
        steps: stepsOf(fire, input, nameOf),
        assumptions: [...SPREAD_METHOD.assumptions, ...SPREAD_METHOD.limits],
      })
    : undefined;
  const number = (output: keyof typeof SPREAD_METHOD.outputs, value: number | null, reason?: string) =>
    modelEstimate(SPREAD_METHOD, output, { value, warnings, ...(reason !== undefined && { never: reason }) }, describe);
  return {
    flashover: number('flashover', fire.flashover_s, never),
    peak: number('peak', fire.peak_kW),
    end: number('end', fire.end_s),
    heatReleased: number('released', fire.released_MJ),
    unburnt: number('unburnt', fire.unburnt_MJ),
  };
}

function warningsOf(fire: SpreadResult, { room }: SpreadInput): EstimateWarning[] {
  const warnings: EstimateWarning[] = [];
  const add = (code: string, text: string) => warnings.push({ code, text });
  if (!fire.layerIncluded) {
    const why =
      room.surfaces === null
        ? 'the linings are not known'
        : room.large
          ? 'the room is large'
          : 'no opening lets a layer form in the way the method knows';
    add('LAYER_NOT_INCLUDED', `The hot layer is left out: ${why}. Entries may light sooner than shown.`);
  }
  if (fire.chosen.by === 'worst' && fire.chosen.tried < fire.chosen.of) {
    add(
      'NOT_EVERY_FIRST_TRIED',
      `Of ${fire.chosen.of} entries that could burn first, the ${fire.chosen.tried} that promise the worst fire were tried.`,
    );
  }
  if (fire.stopped === 'starved') {
    add('NO_OPENING', 'The room has no opening: the fire ends with its air and flares up again when a door is opened.');
  }
  if (fire.stopped === 'four-hours')
    add('FOUR_HOURS', 'The fire is followed for four hours; something still burns then.');
  return warnings;
}

function whyNoFlashover(fire: SpreadResult, { room }: SpreadInput): string {
  return room.flashover_kW === null
    ? 'None of the criteria applies to this room.'
    : `The fire peaks at ${figure(fire.peak_kW)} kW, below the ${figure(room.flashover_kW)} kW of the lowest criterion that applies.`;
}

function roomInputs({ room, entries }: SpreadInput) {
  return [
    computedInput('n', 'n', 'Entries', '', entries.length),
    computedInput(
      'placed',
      'n_p',
      'Entries with a place on the plan',
      '',
      entries.filter(({ place }) => place !== null).length,
    ),
    computedInput('F0', 'F_0', 'A√H of what is open', 'm5/2', room.factorBefore),
    computedInput('F1', 'F_1', 'A√H with broken glass', 'm5/2', room.factorAfter),
    computedInput('A_T', 'A_T', 'Lining area', 'm2', room.liningArea_m2),
    computedInput('Q_fo', 'Q_fo', 'Lowest flashover criterion that applies', 'kW', room.flashover_kW ?? 'none'),
    computedInput(
      'E_O2',
      'E_O2',
      'Heat that the air of the closed room can feed',
      'MJ',
      room.oxygenLimitedHeat_MJ ?? 'none',
    ),
  ];
}

function stepsOf(fire: SpreadResult, { entries }: SpreadInput, nameOf: (id: string) => string) {
  const lit = fire.events.filter(({ id }) => id !== null).length;
  const { chosen } = fire;
  return [
    chosen.by === 'given'
      ? { text: `First to burn: ${nameOf(fire.first)}, as chosen.` }
      : { text: `First to burn: ${nameOf(fire.first)}, the worst of ${chosen.tried} tried of ${chosen.of}.` },
    { text: 'Entries that light', value: lit, unit: '' },
    { text: 'Heat of all entries that can burn', value: fire.released_MJ + fire.unburnt_MJ, unit: 'MJ' },
    { text: 'Time at the limit of the openings', value: fire.atCap_s, unit: 's' },
    { text: `Entries that stay unlit: ${entries.length - lit}.` },
  ];
}
