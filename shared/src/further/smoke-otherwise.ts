import { estimate, estimateOutputs } from '../methods/estimate.ts';
import { layerFillingGrowing, layerFillingSteady } from '../methods/smoke/layer-filling.ts';
import { sootMass } from '../methods/smoke/soot-mass.ts';
import { visibility } from '../methods/smoke/visibility.ts';
import { meanYields } from '../tally/mean-yields.ts';
import { readingOf, type FurtherGiven, type FurtherReading } from './further-reading.ts';

const TIMES_S = [60, 120, 180, 300] as const;
const NFPA_RATE_KW = 1055;
const NOTHING = 'Nothing that burns is recorded in the room.';

/** How the smoke comes down, and what is seen through it. */
export function smokeOtherwise(given: FurtherGiven): FurtherReading[] {
  return [
    readingOf(
      {
        id: 'layer-filling',
        topic: 'smoke',
        title: 'How far the smoke has come down',
        note: 'Height of the layer’s lower edge over the height of the room, without any exhaust: 1 is none yet, 0 the floor.',
      },
      () => layer(given),
    ),
    readingOf(
      {
        id: 'visibility',
        topic: 'smoke',
        title: 'What is seen when one kilogram has burnt',
        note: 'The smoke spread evenly through the closed room. The tally gives the mass at which 10 m are left.',
      },
      () => seen(given),
    ),
  ];
}

function layer({ tally, basis: { areas } }: FurtherGiven) {
  const alpha = tally.growth.alpha?.value ?? null;
  const peak = tally.growth.peak?.value ?? null;
  if (alpha === null || peak === null) return 'There is no design curve for the room.';
  const { floor: A, height: H } = areas;
  const size = { H, A, shape: A / H ** 2 };
  return [
    ...TIMES_S.map((t) => ({
      name: `Growing fire, after ${t} s`,
      estimate: estimate(
        layerFillingGrowing,
        { t, t_g: Math.sqrt(NFPA_RATE_KW / alpha), ...size },
        {
          workings: true,
          origins: { t: 'default', t_g: { origin: 'computed', note: 'from the growth of the tally' } },
        },
      ),
    })),
    {
      name: `Fire at its peak from the start, after ${TIMES_S[0]} s`,
      estimate: estimate(
        layerFillingSteady,
        { t: TIMES_S[0], Q: peak, ...size },
        { workings: true, origins: { t: 'default' } },
      ),
    },
  ];
}

function seen({ basis }: FurtherGiven) {
  const yields = meanYields(basis.heats);
  if (!yields) return NOTHING;
  const soot = estimate(
    sootMass,
    { y_s: yields.soot, m: 1 },
    {
      workings: true,
      origins: { y_s: { origin: 'catalogue', note: 'mean of the contents by mass' }, m: 'default' },
    },
  );
  const run = estimateOutputs(
    visibility,
    { m: soot.value ?? 0, V: basis.areas.estimates.volume.value ?? 0 },
    { workings: true },
  );
  return [
    { name: 'Soot', estimate: soot },
    { name: 'Signs that reflect are seen at', estimate: run.of('reflecting') },
    { name: 'Signs that shine are seen at', estimate: run.of('shining') },
  ];
}
