import { standingOf } from '../limits/standing.ts';
import { growthCoefficient } from '../methods/growth/growth-coefficient.ts';
import { rangeFaults } from '../methods/range-faults.ts';
import { layerFillingGrowing } from '../methods/smoke/layer-filling.ts';
import type { RoomTally } from '../tally/room-tally.ts';
import type { Sight } from './search-change.ts';

/** What of a tally a question watches while something is varied. */
export type ReadingName = 'governed-by' | 'flashover' | 'regime' | 'burnout' | 'exposure' | 'limits' | 'smoke-layer';

interface Reading {
  readonly title: string;
  /** Unit of the number behind it. */
  readonly unit: string;
  readonly read: (tally: RoomTally) => Omit<Sight, 'x'>;
}

const NOT_COVERED = 'not covered';
const GOVERNS = {
  fuel: 'the fuel governs',
  openings: 'the openings govern',
  load: 'the load is used up before a plateau',
  closed: 'no opening feeds the fire',
} as const;
const REGIMES = {
  compartment: 'one room that can fill with a hot layer',
  large: 'a large room',
  closed: 'a closed room',
} as const;
/** When and above which height the lower edge of the smoke is looked for. */
export const SMOKE_AT_S = 180;
export const SMOKE_ABOVE_M = 2;
const NFPA_RATE_KW = 1055;

/** Every reading by its name; what each says is all a question can find a change of. */
export const READINGS: Readonly<Record<ReadingName, Reading>> = {
  'governed-by': {
    title: 'What holds the fire down',
    unit: 'kW',
    read: ({ growth }) => ({
      state: growth.governedBy === undefined ? NOT_COVERED : GOVERNS[growth.governedBy],
      value: growth.peak?.value ?? null,
    }),
  },
  flashover: {
    title: 'Whether the design curve reaches flashover',
    unit: 's',
    read: ({ room: { flashover } }) => ({
      state: flashover.time === undefined ? NOT_COVERED : flashover.time.value === null ? 'no flashover' : 'flashover',
      value: flashover.time?.value ?? null,
    }),
  },
  regime: {
    title: 'What sort of room it is to the methods',
    unit: '',
    read: ({ room }) => ({ state: REGIMES[room.regime], value: null }),
  },
  burnout: {
    title: 'What controls the burn-out, load as kept',
    unit: '°C',
    read: ({ burnout: { asKept } }) => ({
      state:
        asKept?.parametric === undefined
          ? NOT_COVERED
          : asKept.parametric.controlledBy === 'fuel'
            ? 'the fuel controls the burn-out'
            : 'the openings control the burn-out',
      value: asKept?.parametric?.peak.value ?? null,
    }),
  },
  exposure: {
    title: 'Equivalent time of exposure against the rated resistance',
    unit: 'min',
    read: ({ burnout: { asKept } }) => ({
      state: asKept?.standing ?? NOT_COVERED,
      value: asKept?.equivalentTime?.value ?? null,
    }),
  },
  limits: {
    title: 'Standing against the limits of the room',
    unit: '%',
    read: ({ limits }) => {
      const ratios = limits.flatMap(({ ratio }) => (ratio === null ? [] : [ratio]));
      const worst = ratios.length === 0 ? null : Math.max(...ratios);
      return { state: standingOf(worst, 1), value: worst === null ? null : 100 * worst };
    },
  },
  'smoke-layer': {
    title: `Whether the smoke layer is above ${SMOKE_ABOVE_M} m after ${SMOKE_AT_S} s`,
    unit: 'm',
    read: smokeLayer,
  },
};

function smokeLayer({ room, growth }: RoomTally): Omit<Sight, 'x'> {
  const A = room.floorArea.value ?? 0;
  const H = A > 0 ? (room.volume.value ?? 0) / A : 0;
  const alpha = growth.alpha?.value ?? growthCoefficient.run({ growth: 'medium', convention: 'EN' });
  const inputs = { t: SMOKE_AT_S, t_g: Math.sqrt(NFPA_RATE_KW / alpha), H, A, shape: H > 0 ? A / H ** 2 : 0 };
  if (rangeFaults(layerFillingGrowing, inputs).length > 0) return { state: NOT_COVERED, value: null };
  const edge = layerFillingGrowing.run(inputs) * H;
  const above = edge > SMOKE_ABOVE_M;
  return { state: above ? `above ${SMOKE_ABOVE_M} m` : `at ${SMOKE_ABOVE_M} m or lower`, value: edge };
}
