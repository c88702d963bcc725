import { poolFire } from '../methods/pool/pool-fire.ts';
import { POOL_FUELS, type PoolFuel } from '../methods/pool/pool-fuels.ts';
import type { CountedPart } from '../tally/entry-heats.ts';

/** Materials of the catalogue that burn as a fuel of the table of pool fires. */
const BURNS_AS: Readonly<Record<string, string>> = {
  petrol: 'gasoline',
  kerosene: 'kerosene',
  turpentine: 'kerosene',
  diesel: 'diesel',
  'heavy-fuel-oil': 'heavy-fuel-oil',
  'transformer-oil': 'transformer-oil',
  'lubricating-oil': 'transformer-oil',
  methanol: 'methanol',
  ethanol: 'ethanol',
  isopropanol: 'ethanol',
  butanol: 'ethanol',
  'spirits-40': 'ethanol',
  'hand-gel': 'ethanol',
  pentane: 'hexane',
  hexane: 'hexane',
  cyclohexane: 'hexane',
  heptane: 'heptane',
  octane: 'heptane',
  isooctane: 'heptane',
  benzene: 'benzene',
  toluene: 'benzene',
  styrene: 'benzene',
  xylene: 'xylene',
  acetone: 'acetone',
  'diethyl-ether': 'diethyl-ether',
};
/** For a liquid that the table does not know. */
const USUAL = 'gasoline';
/** Any: it stands in the method for rates that do not depend on the diameter. */
const NO_GROWTH = 1;

/**
 * Peak of an entry that is mostly liquid, burning as a pool as large as its footprint: bund, tray or the vessel itself, kW.
 * @param area_m2 footprint, above 0
 * @returns undefined when no part of it is a liquid
 */
export function poolPeak(parts: readonly CountedPart[], area_m2: number): number | undefined {
  const liquids = parts.filter(({ part }) => part.material?.hazards.includes('liquid'));
  const [main] = [...liquids].sort((a, b) => b.counted - a.counted);
  if (!main) return undefined;
  const { rate, kBeta, density } = fuelOf(main.part.material?.key ?? '');
  const burning = poolFire.run({
    rate,
    by: kBeta === null ? 'is-constant' : 'depends-on-diameter',
    kBeta: kBeta ?? NO_GROWTH,
    D: Math.sqrt((4 * area_m2) / Math.PI),
    H: main.part.heat,
    rho: density,
    V: 0,
  });
  return burning.rate;
}

function fuelOf(material: string): PoolFuel {
  const wanted = BURNS_AS[material] ?? USUAL;
  const fuel = POOL_FUELS.find(({ key }) => key === wanted);
  if (!fuel) throw new RangeError(`The table of pool fires has no ${wanted}.`);
  return fuel;
}
