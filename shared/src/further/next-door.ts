import { estimate, estimateOutputs } from '../methods/estimate.ts';
import { externalFlame } from '../methods/radiation/external-flame.ts';
import { boundaryRadiation, openingRadiation } from '../methods/radiation/opening-radiation.ts';
import { viewRectangle } from '../methods/radiation/view-rectangle.ts';
import { openingState } from '../tally/opening-state.ts';
import { askedOrigin } from './further-asked.ts';
import { readingOf, type FurtherGiven, type FurtherReading } from './further-reading.ts';

const KW_PER_MW = 1000;
const ZERO_C_IN_K = 273.15;
/** Where no burn-out temperature is known: common practice for a fully developed fire. */
const USUAL_GAS_C = 1000;
const NO_OUTSIDE = 'No opening to the outside is open or would break.';

/** What comes out of the openings: flames up the façade, radiation to what stands opposite. */
export function nextDoor(given: FurtherGiven): FurtherReading[] {
  return [
    readingOf(
      {
        id: 'external-flame',
        topic: 'next door',
        title: 'Flames out of the openings',
        note: 'Above the top of the opening, glass broken, no draught through the room. They can reach the floor above.',
      },
      () => flames(given),
    ),
    readingOf(
      {
        id: 'radiation-opposite',
        topic: 'next door',
        title: `Radiation ${given.asked.opposite_m} m opposite the largest opening`,
        note: 'Often held against 12.6 kW/m2; what counts at a boundary is set by the local rules.',
      },
      () => opposite(given),
    ),
  ];
}

function outside({ input }: FurtherGiven) {
  return (input.room.openings ?? []).filter(
    (opening) => opening.leads_to !== 'inside' && openingState(opening) !== 'closed',
  );
}

function flames(given: FurtherGiven) {
  const openings = outside(given);
  const peak = given.tally.growth.peak?.value ?? null;
  if (openings.length === 0) return NO_OUTSIDE;
  if (peak === null) return 'There is no design curve for the room.';
  const A_v = openings.reduce((sum, { width_m, height_m }) => sum + width_m * height_m, 0);
  const h = openings.reduce((sum, { width_m, height_m }) => sum + width_m * height_m * height_m, 0) / A_v;
  return [
    {
      name: 'Flame above the openings',
      estimate: estimate(
        externalFlame,
        { Q: peak / KW_PER_MW, A_v, h },
        {
          workings: true,
          origins: {
            Q: { origin: 'computed', note: 'peak of the design curve' },
            A_v: { origin: 'given', note: 'openings to the outside, open or breaking' },
            h: 'given',
          },
        },
      ),
    },
  ];
}

function opposite(given: FurtherGiven) {
  const { tally, asked } = given;
  const [largest] = outside(given).sort((a, b) => b.width_m * b.height_m - a.width_m * a.height_m);
  if (!largest) return NO_OUTSIDE;
  const view = estimateOutputs(
    viewRectangle,
    { a: largest.width_m, b: largest.height_m, s: asked.opposite_m },
    { workings: true, origins: { a: 'given', b: 'given', s: askedOrigin(asked, 'opposite_m') } },
  );
  const F = view.result.centre;
  const gas = tally.burnout.asKept?.parametric?.peak.value ?? null;
  return [
    { name: 'What is seen of the opening', estimate: view.of('centre') },
    {
      name: 'From the gas behind it',
      estimate: estimate(
        openingRadiation,
        { F, epsilon: 1, T: (gas ?? USUAL_GAS_C) + ZERO_C_IN_K },
        {
          workings: true,
          origins: {
            epsilon: 'default',
            T:
              gas === null
                ? { origin: 'default', note: '1000 °C: the burn-out temperature is not covered here' }
                : { origin: 'computed', note: 'burn-out peak, load as kept' },
          },
        },
      ),
    },
    ...(['reduced', 'standard'] as const).map((intensity) => ({
      name: `By boundary practice, ${intensity}`,
      estimate: estimate(boundaryRadiation, { F, intensity }, { workings: true, origins: { intensity: 'default' } }),
    })),
  ];
}
