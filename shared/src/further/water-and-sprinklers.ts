import { estimate, estimateOutputs } from '../methods/estimate.ts';
import { sprinklerLimited } from '../methods/plume/sprinkler-limited.ts';
import { balanceFlow } from '../methods/water/balance-flow.ts';
import { heatUptake } from '../methods/water/heat-uptake.ts';
import { jetsUsed, observedFlowLondon, ruleOfIowa } from '../methods/water/observed-flows.ts';
import { readingOf, type FurtherGiven, type FurtherReading } from './further-reading.ts';

const KW_PER_MW = 1000;
const WATER_C = 10;
const STEAM_C = 100;
const HAND_LINE = 0.5;
const DENSITY_MM_S = 0.07;
const AFTER_S = [60, 300] as const;

/** What water takes up, what was used in other fires, and the curve if sprinklers work. */
export function waterAndSprinklers(given: FurtherGiven): FurtherReading[] {
  return [
    readingOf(
      {
        id: 'sprinklers-work',
        topic: 'sprinklers',
        title: 'The rate if sprinklers work',
        note: 'Never the default: the design load credits sprinklers by its own factor, and one credit is all there is.',
      },
      () => sprinklers(given),
    ),
    readingOf(
      {
        id: 'water-uptake',
        topic: 'water',
        title: 'What water takes up',
        note: 'A heat balance at the peak of the design curve. It sizes nothing: what must be supplied is set by local rules.',
      },
      () => uptake(given),
    ),
    readingOf(
      {
        id: 'water-observed',
        topic: 'water',
        title: 'What was used in other fires',
        note: 'Surveys and rules of thumb over the whole floor of the room, with their own limits.',
      },
      () => observed(given),
    ),
  ];
}

function sprinklers({ input, tally }: FurtherGiven) {
  if (input.room.protection?.sprinklers == null) return 'No sprinklers are recorded for the room.';
  const t_act = tally.response.sprinkler?.value ?? null;
  const alpha = tally.growth.alpha?.value ?? null;
  const peak = tally.growth.peak?.value ?? null;
  if (t_act === null || alpha === null || peak === null) {
    return tally.response.sprinkler?.never ?? 'When the sprinklers open is not known.';
  }
  const Q_act = Math.min(peak, alpha * t_act ** 2);
  return AFTER_S.map((dt) => ({
    name: `${dt} s after they opened`,
    estimate: estimateOutputs(
      sprinklerLimited,
      { Q_act, dt, w: DENSITY_MM_S, reading: 'decaying' },
      {
        workings: true,
        origins: {
          Q_act: { origin: 'computed', note: 'growth of the tally at the time of response' },
          dt: 'default',
          w: { origin: 'default', note: '0.07 mm/s, the least of the tests' },
          reading: 'default',
        },
      },
    ).of('rate'),
  }));
}

function uptake({ tally }: FurtherGiven) {
  const heat = estimate(
    heatUptake,
    { T_0: WATER_C, T_s: STEAM_C },
    { workings: true, origins: { T_0: 'default', T_s: 'default' } },
  );
  const peak = tally.growth.peak?.value ?? null;
  const numbers = [{ name: 'Heat that one kilogram takes up', estimate: heat }];
  if (peak === null) return numbers;
  return [
    ...numbers,
    {
      name: 'Flow that would balance the peak, theoretical',
      estimate: estimateOutputs(
        balanceFlow,
        { Q: peak / KW_PER_MW, eta: HAND_LINE, h: heat.value ?? 0 },
        {
          workings: true,
          origins: {
            Q: { origin: 'computed', note: 'peak of the design curve' },
            eta: { origin: 'default', note: '0.3 to 0.5 for hand lines' },
          },
        },
      ).of('perSecond'),
    },
  ];
}

function observed({ basis: { areas } }: FurtherGiven) {
  const { floor: A } = areas;
  if (!(A > 0)) return 'The room has no floor area.';
  const whole = { workings: true, origins: { A: { origin: 'computed', note: 'the whole floor' } } } as const;
  return [
    { name: 'In London fires', estimate: estimate(observedFlowLondon, { A }, whole) },
    {
      name: 'By the rule of Iowa, for about 30 s',
      estimate: estimate(ruleOfIowa, { V: areas.estimates.volume.value ?? 0 }, { workings: true }),
    },
    { name: 'Jets in large fires', estimate: estimate(jetsUsed, { A }, whole) },
  ];
}
