import { estimate, estimateOutputs } from '../methods/estimate.ts';
import { inverseOpeningFactor } from '../methods/room/inverse-opening-factor.ts';
import { kawagoe } from '../methods/room/kawagoe.ts';
import { roofVentEquivalent } from '../methods/room/roof-vent-equivalent.ts';
import { closedRoom } from '../methods/temperature/closed-room.ts';
import { readingOf, type FurtherGiven, type FurtherReading } from './further-reading.ts';

const NO_OPENING = 'No opening is open or would break.';
const AIR_KG_M3 = 1.2;
const AIR_HEAT_KJ_KGK = 1;
const CLOSED_ROOM_S = 300;

/** The openings counted otherwise, and a room without any. */
export function openingsOtherwise(given: FurtherGiven): FurtherReading[] {
  const { openings, areas } = given.basis;
  const { area, factor } = openings.afterGlass;
  return [
    readingOf(
      {
        id: 'kawagoe',
        topic: 'openings',
        title: 'Wood that the openings let burn',
        note: 'The oldest relation for a fire held down by its openings; glass that would break is taken as broken.',
      },
      () => {
        if (!(factor > 0)) return NO_OPENING;
        const run = estimateOutputs(kawagoe, { F: factor }, { workings: true });
        return [
          { name: 'Burning rate of wood', estimate: run.of('rate') },
          { name: 'Air that flows in', estimate: run.of('air') },
        ];
      },
    ),
    readingOf(
      {
        id: 'inverse-opening-factor',
        topic: 'openings',
        title: 'Inverse opening factor',
        note: 'As research on burning regimes counts openings: large is closed, small is open.',
      },
      () =>
        factor > 0
          ? [
              {
                name: 'Inverse opening factor',
                estimate: estimate(
                  inverseOpeningFactor,
                  { A_t: areas.enclosing, A_v: area, H: (factor / area) ** 2 },
                  { workings: true },
                ),
              },
            ]
          : NO_OPENING,
    ),
    readingOf(
      {
        id: 'roof-vents',
        topic: 'openings',
        title: 'Wall openings and roof vents together',
        note: 'The tally knows wall openings only and says so where a vent is not closed.',
      },
      () => roofVents(given),
    ),
    readingOf(
      {
        id: 'closed-room',
        topic: 'openings',
        title: `Gas in the closed room after ${CLOSED_ROOM_S / 60} minutes`,
        note: 'Every opening closed, the rate of the growing fire at that time held from the start: more than it would be. The oxygen may end it sooner.',
      },
      () => closed(given),
    ),
  ];
}

function roofVents({ input, basis: { openings, areas } }: FurtherGiven) {
  const F = openings.afterGlass.factor;
  if (openings.roofVents === 0) return 'The room has no roof vent that is not closed.';
  if (!(F > 0)) return `${NO_OPENING} The relation needs a wall opening below the vent.`;
  const wall = (input.room.openings ?? []).reduce(
    (sum, { width_m, height_m, sill_m }) => {
      const A = width_m * height_m;
      return { area: sum.area + A, moment: sum.moment + A * ((sill_m ?? 0) + height_m / 2) };
    },
    { area: 0, moment: 0 },
  );
  const h_d = areas.height - wall.moment / wall.area;
  const share = (openings.roofVents * Math.sqrt(Math.max(0, h_d))) / F;
  return [
    {
      name: 'Ventilation factor with the roof vents',
      estimate: estimate(
        roofVentEquivalent,
        { F, A_h: openings.roofVents, h_d, share },
        { workings: true, origins: { A_h: 'given', h_d: { origin: 'computed', note: 'mean of all wall openings' } } },
      ),
    },
  ];
}

function closed({ tally, basis: { linings, areas } }: FurtherGiven) {
  const alpha = tally.growth.alpha?.value ?? null;
  const layer = linings.layers.walls[0];
  if (!layer) return 'What the walls are made of is not known.';
  if (alpha === null || tally.growth.peak === undefined) return 'There is no design curve for the room.';
  const Q = Math.min(alpha * CLOSED_ROOM_S ** 2, tally.growth.peak.value ?? 0);
  const run = estimateOutputs(
    closedRoom,
    {
      Q,
      t: CLOSED_ROOM_S,
      k: layer.conductivity_W_mK,
      rho: layer.density_kg_m3,
      c: layer.specific_heat_J_kgK,
      A_T: areas.enclosing,
      m: (areas.estimates.volume.value ?? 0) * AIR_KG_M3,
      c_p: AIR_HEAT_KJ_KGK,
    },
    {
      workings: true,
      origins: {
        t: 'default',
        k: { origin: 'given', note: 'exposed layer of the walls, taken for all sides' },
        rho: 'given',
        c: 'given',
        m: { origin: 'computed', note: 'volume × 1.2 kg/m3' },
        c_p: 'default',
      },
    },
  );
  return [{ name: 'Rise of the gas', estimate: run.of('rise') }];
}
