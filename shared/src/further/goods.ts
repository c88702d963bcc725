import type { Hazard, Material } from '../catalogue/catalogue-row.ts';
import { estimate, estimateOutputs } from '../methods/estimate.ts';
import { POOL_FUELS } from '../methods/pool/pool-fuels.ts';
import { poolFire } from '../methods/pool/pool-fire.ts';
import { spillArea } from '../methods/pool/spill-area.ts';
import { thinSpill } from '../methods/pool/thin-spill.ts';
import { emissivePower } from '../methods/radiation/emissive-power.ts';
import { solidFlame } from '../methods/radiation/solid-flame.ts';
import { viewCylinder } from '../methods/radiation/view-cylinder.ts';
import { flameHeight } from '../methods/plume/flame-height.ts';
import { dustThresholds } from '../methods/storage/dust.ts';
import { gasCylinder } from '../methods/storage/gas-cylinder.ts';
import { lithiumBattery } from '../methods/storage/lithium-battery.ts';
import type { EntryHeat } from '../tally/entry-heats.ts';
import { askedOrigin } from './further-asked.ts';
import { readingOf, type FurtherGiven, type FurtherReading, type NamedReading } from './further-reading.ts';

/** Rows beyond these are left to their own entries: a page that nobody reads helps nobody. */
const MOST_PER_HAZARD = 12;
const L_PER_M3 = 1000;
const THIN_SHARE = 0.2;
const LEAST_POOL_M = 0.2;
/** Petrol, for liquids the table of pools does not have: it burns faster than nearly all of them. */
const USUAL_FUEL = 'gasoline';
/** The catalogue's key where the table of pools has another one. */
const POOL_KEYS: Readonly<Record<string, string>> = { petrol: USUAL_FUEL };
const LITHIUM_ION = 'lithium-ion-cell';
const KWH_PER_KG = 0.15;

interface Goods {
  readonly id: string;
  readonly label: string;
  readonly material: Material;
  /** All pieces, kg. */
  readonly mass: number;
  /** One piece, kg. */
  readonly piece: number;
  /** Net, MJ/kg. */
  readonly heat: number;
}

/** Liquids, batteries, cylinders and dusts, which do not behave like their megajoules. */
export function goodsOtherwise(given: FurtherGiven): FurtherReading[] {
  const { heats } = given.basis;
  const dust = goodsOf(heats, 'dust');
  return [
    ...goodsOf(heats, 'liquid').map((one) => liquid(given, one)),
    ...goodsOf(heats, 'battery').map(battery),
    ...goodsOf(heats, 'gas').map(cylinder),
    ...(dust.length > 0 ? [dusts(given, dust)] : []),
  ];
}

function goodsOf(heats: readonly EntryHeat[], hazard: Hazard): Goods[] {
  return heats
    .flatMap(({ entry, parts }) =>
      parts.flatMap(({ part, count }, index): Goods[] => {
        const { material, mass } = part;
        if (!material?.hazards.includes(hazard) || !(mass * count > 0)) return [];
        const label = entry.label ?? entry.id;
        const id = `${entry.id}-${index}`;
        return [{ id, label, material, mass: mass * count, piece: mass, heat: part.heat }];
      }),
    )
    .sort((a, b) => b.mass - a.mass)
    .slice(0, MOST_PER_HAZARD);
}

function liquid({ basis, asked }: FurtherGiven, goods: Goods): FurtherReading {
  const { label, material, mass, heat } = goods;
  const poolKey = POOL_KEYS[material.key] ?? material.key;
  const fuel = POOL_FUELS.find(({ key }) => key === poolKey);
  const { rate, kBeta, density } = fuel ?? POOL_FUELS.find(({ key }) => key === USUAL_FUEL)!;
  const about = {
    id: `liquid-${goods.id}`,
    topic: 'goods',
    title: `${label} spilt and burning`,
    note: fuel
      ? 'All of it on a level floor, from the thin spill to the deep pool of the same area.'
      : `All of it on a level floor. Pools of ${material.label.toLowerCase()} are not in the table: the burning rate and density of petrol stand in.`,
  } as const;
  return readingOf(about, () => {
    const V = (mass / density) * L_PER_M3;
    const spill = estimate(
      spillArea,
      { V, A_bund: Math.max(0.01, basis.areas.floor) },
      {
        workings: true,
        origins: {
          V: { origin: 'computed', note: 'mass over density' },
          A_bund: { origin: 'default', note: 'no bund: the floor of the room' },
        },
      },
    );
    const A = spill.value ?? 0;
    const D = Math.sqrt((4 * A) / Math.PI);
    if (!(D >= LEAST_POOL_M)) return 'It is too little for a pool of 0.2 m.';
    const inCatalogue = { origin: 'catalogue', note: fuel ? fuel.name : 'petrol stands in' } as const;
    const origins = {
      rate: inCatalogue,
      kBeta: inCatalogue,
      rho: inCatalogue,
      H: 'catalogue',
      by: 'catalogue',
    } as const;
    const pool = estimateOutputs(
      poolFire,
      {
        rate,
        by: kBeta === null ? 'is-constant' : 'depends-on-diameter',
        kBeta: kBeta ?? 1,
        D,
        H: heat,
        rho: density,
        V,
      },
      { workings: true, origins },
    );
    const thin = estimateOutputs(
      thinSpill,
      { burning: pool.result.burning, share: THIN_SHARE, A, H: heat, rho: density, V },
      { workings: true, origins: { share: 'default', H: 'catalogue', rho: inCatalogue } },
    );
    return [
      { name: 'Area of the spill', estimate: spill },
      { name: 'Rate as a thin spill', estimate: thin.of('rate') },
      { name: 'It burns for', estimate: thin.of('time') },
      { name: 'Rate as a deep pool of that area', estimate: pool.of('rate') },
      ...radiation(pool.result.rate, D, asked),
    ];
  });
}

/** A pool seen as a cylinder of flame, from its edge outwards; nothing nearer than that. */
function radiation(Q: number, D: number, asked: FurtherGiven['asked']): NamedReading[] {
  const L = asked.aside_m + D / 2;
  const flame = estimate(flameHeight, { Q, D, ratio: Q ** 0.4 / D }, { workings: true });
  const height = flame.value ?? 0;
  if (!(height > 0)) return [];
  const view = estimateOutputs(viewCylinder, { L, H: height, D }, { workings: true });
  const power = estimate(emissivePower, { D }, { workings: true });
  return [
    {
      name: `Radiation ${asked.aside_m} m from its edge, deep pool`,
      estimate: estimate(
        solidFlame,
        { E: power.value ?? 0, F: view.result.most },
        {
          workings: true,
          warnings: power.warnings,
          steps: [
            { text: 'Distance from the axis', value: L, unit: 'm' },
            { text: 'Flame height', equation: flameHeight.equation, value: height, unit: 'm' },
            { text: 'View factor of the worst direction', value: view.result.most, unit: '' },
            { text: 'Emissive power', equation: emissivePower.equation, value: power.value, unit: 'kW/m2' },
            {
              text:
                askedOrigin(asked, 'aside_m') === 'given'
                  ? 'The distance is as said.'
                  : 'The distance is taken by default.',
            },
          ],
        },
      ),
    },
  ];
}

function battery(goods: Goods): FurtherReading {
  return readingOf(
    {
      id: `battery-${goods.id}`,
      topic: 'goods',
      title: `${goods.label}: a battery that burns out`,
      note: 'Ranges, not values. Vented gas can explode and cells light again after hours: no number covers that.',
    },
    () => {
      if (goods.material.key !== LITHIUM_ION) {
        return 'The ranges are those of lithium-ion cells; for other cells none is known here.';
      }
      const run = estimateOutputs(
        lithiumBattery,
        { E: goods.mass * KWH_PER_KG },
        {
          workings: true,
          origins: {
            E: { origin: 'default', note: `${KWH_PER_KG} kWh per kg of cells; the plate on the pack knows better` },
          },
        },
      );
      return [
        { name: 'Heat, low end', estimate: run.of('low') },
        { name: 'Heat, high end', estimate: run.of('high') },
        { name: 'Peak, low end', estimate: run.of('peakLow') },
        { name: 'Peak, high end', estimate: run.of('peakHigh') },
        { name: 'Hydrogen fluoride, high end', estimate: run.of('fluorideHigh') },
      ];
    },
  );
}

function cylinder(goods: Goods): FurtherReading {
  return readingOf(
    {
      id: `cylinder-${goods.id}`,
      topic: 'goods',
      title: `${goods.label}: one of them bursts`,
      note: 'The fireball of a liquefied gas. Others behave otherwise, and fragments fly much farther.',
    },
    () => {
      const run = estimateOutputs(
        gasCylinder,
        { m: goods.piece, H: goods.heat },
        { workings: true, origins: { m: { origin: 'given', note: 'gas in one piece' }, H: 'catalogue' } },
      );
      return [
        { name: 'Heat of one', estimate: run.of('heat') },
        { name: 'Diameter of the fireball', estimate: run.of('fireball') },
        { name: 'It lasts', estimate: run.of('time') },
      ];
    },
  );
}

function dusts({ basis: { areas } }: FurtherGiven, goods: readonly Goods[]): FurtherReading {
  const mass = goods.reduce((sum, one) => sum + one.mass, 0);
  return readingOf(
    {
      id: 'dust',
      topic: 'goods',
      title: 'Dust that can be whirled up',
      note: `${Math.round(mass * 10) / 10} kg of goods that make dust are recorded. What counts is what lies about, not what is in closed bins.`,
    },
    () => {
      const run = estimateOutputs(dustThresholds, { A: areas.floor, H: areas.height }, { workings: true });
      return [
        { name: 'From this on a dust explosion counts', estimate: run.of('explosion') },
        { name: 'From this on a dust fire counts', estimate: run.of('fire') },
      ];
    },
  );
}
