import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { deriveMaterial } from '@embertally/shared/materials/derive-material';
import { materialDraftSchema } from '@embertally/shared/materials/material-draft';
import '../../support/property-seed.ts';
import { derived, faultsOf, NO_OWN_MATERIALS } from './derived.ts';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const formula = fc.record({ C: fc.nat(30), H: fc.nat(60), O: fc.nat(12), N: fc.nat(4), Cl: fc.nat(3) }).map((atoms) =>
  Object.entries(atoms)
    .filter(([, count]) => count > 0)
    .map(([element, count]) => `${element}${count}`)
    .join(''),
);
const moisture = fc.record({ pct: number(0, 300), per: fc.constantFrom('wet', 'dry') });
const elements = fc.record(
  { carbon_pct: number(0, 95), hydrogen_pct: number(0, 16), nitrogen_pct: number(0, 10), ash_pct: number(0, 60) },
  { requiredKeys: ['carbon_pct', 'hydrogen_pct'] },
);
const bombRun = fc.record({ mass_kg: number(1e-5, 0.002), rise_K: number(-1, 5), fuse_MJ: number(0, 2e-4) });
const ways = fc.oneof(
  fc.record({
    way: fc.constant('formula'),
    formula,
    formation_kJ_mol: number(-5000, 5000),
    phase: fc.constantFrom('gas', 'solid'),
  }),
  fc.record({
    way: fc.constant('equation'),
    formula,
    water: fc.constantFrom('vapour', 'liquid'),
    heat: fc.record({ as: fc.constant('mole'), heat_kJ_mol: number(1e-3, 1e6) }),
  }),
  fc.record(
    {
      way: fc.constant('bomb'),
      calibration: fc.record({ by: fc.constant('given'), water_equivalent_MJ_K: number(1e-5, 0.1) }),
      runs: fc.oneof(
        fc.array(bombRun, { maxLength: 5 }),
        bombRun.map((one) => [one, one, one]),
      ),
      hydrogen: fc.oneof(
        fc.record({ by: fc.constant('content'), hydrogen_pct: number(0, 15) }),
        fc.record({ by: fc.constant('condensate'), water_kg_kg: number(0, 2) }),
        fc.constant({ by: 'formula' }),
        fc.constant({ by: 'elements' }),
      ),
      formula,
      elements,
      analysed: moisture,
      received: moisture,
    },
    { requiredKeys: ['way', 'calibration', 'runs', 'hydrogen'] },
  ),
  fc.record({
    way: fc.constant('ultimate'),
    elements,
    of: fc.constantFrom('dry', 'dry-ash-free', 'as-received'),
    correlation: fc.constantFrom('channiwala-parikh', 'boie'),
    moisture,
  }),
  fc.record(
    {
      way: fc.constant('supplier'),
      heat_MJ: number(1e-3, 100_000),
      per: fc.constantFrom('kg', 'L', 'm3'),
      heat: fc.constantFrom('net', 'gross'),
      state: fc.constantFrom('dry', 'as-received'),
      hydrogen_pct: number(0, 20),
      formula,
      elements,
      moisture,
      counterpart: fc.constantFrom('timber', 'methane', 'polyethylene'),
      density_kg_m3: number(0.1, 2000),
      range: fc.record({ by: fc.constant('class'), evidence: fc.constantFrom('exact', 'mixed') }),
    },
    { requiredKeys: ['way', 'heat_MJ', 'per', 'heat', 'state', 'range'] },
  ),
);

/** Every number anywhere in a value. */
function numbersIn(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(numbersIn) : [];
}

describe('whatever a person states', () => {
  it('gives a sound material or sentences at fields: no NaN, no Infinity, low ≤ net ≤ high, net ≤ gross', () => {
    let gave = 0;
    fc.assert(
      fc.property(ways, (stated) => {
        const draft = materialDraftSchema.parse({ label: 'Sample', source: 'Report 12', ...stated });
        const derivation = deriveMaterial(draft, NO_OWN_MATERIALS);
        if (!derivation.ok) {
          expect(derivation.faults.length).toBeGreaterThan(0);
          for (const { pointer, message } of derivation.faults) {
            expect(pointer).toMatch(/^(\/\w+)*$/);
            expect(message).toMatch(/^[A-Z“\d].{9,}[.]$/s);
            expect(message).not.toMatch(/NaN|Infinity|undefined|@\d/);
          }
          return;
        }
        gave += 1;
        const { net_MJ_kg, low_MJ_kg, high_MJ_kg, gross_MJ_kg, basis } = derivation.value;
        expect(numbersIn(derivation.value).every(Number.isFinite)).toBe(true);
        expect(net_MJ_kg).toBeGreaterThanOrEqual(0);
        expect(low_MJ_kg).toBeLessThanOrEqual(net_MJ_kg);
        expect(high_MJ_kg).toBeGreaterThanOrEqual(net_MJ_kg);
        if (gross_MJ_kg !== null) expect(gross_MJ_kg).toBeGreaterThanOrEqual(net_MJ_kg - 1e-9);
        if (basis?.proposal) expect(basis.proposal.net_MJ_kg).not.toBe(net_MJ_kg);
        expect(JSON.stringify(derivation.value)).not.toMatch(/NaN|Infinity|undefined/);
      }),
      { numRuns: 800 },
    );
    expect(gave).toBeGreaterThan(100);
  }, 30_000);

  it('an equation for n moles gives the same material for every n', () => {
    fc.assert(
      fc.property(number(0.1, 100), (n) => {
        const material = (moles: number) =>
          derived({
            way: 'equation',
            formula: 'C8H18',
            water: 'vapour',
            heat: { as: 'equation', moles, enthalpy_kJ: -5074.4 * moles },
          });
        expect(material(n).net_MJ_kg).toBeCloseTo(material(1).net_MJ_kg, 8);
      }),
    );
  });

  it('the same draft gives the same material, to the last digit', () => {
    fc.assert(
      fc.property(ways, (stated) => {
        const draft = materialDraftSchema.parse({ label: 'Sample', source: 'Report 12', ...stated });
        const once = JSON.stringify(deriveMaterial(draft, NO_OWN_MATERIALS));
        expect(JSON.stringify(deriveMaterial(draft, NO_OWN_MATERIALS))).toBe(once);
      }),
      { numRuns: 100 },
    );
  });
});

describe('what a material says beside its heat', () => {
  const ethanol = { way: 'formula', formula: 'C2H5OH', formation_kJ_mol: -277.6, phase: 'liquid' };

  it('takes what is stated, and says the usual where nothing is', () => {
    expect(derived(ethanol)).toMatchObject({
      cellulosic: false,
      combustion_factor: 1,
      ignition_class: 'normal',
      radiative_fraction: 0.35,
      moisture_pct_wet: null,
      curve: null,
    });
    expect(derived({ ...ethanol, ignition_class: 'easy', radiative_fraction: 0.2 })).toMatchObject({
      ignition_class: 'easy',
      radiative_fraction: 0.2,
    });
    expect(derived({ ...ethanol, group: 'paper' }).combustion_factor).toBe(0.8);
    expect(derived({ ...ethanol, group: 'paper', cellulosic: false }).combustion_factor).toBe(1);
  });

  it('names what the heat rests on and where the figures are from', () => {
    expect(derived({ ...ethanol, source: 'CRC Handbook, 97th edition' }).heat_source).toBe(
      'Net, as received, from the formula C2H5OH (liquid) and its enthalpy of formation. CRC Handbook, 97th edition',
    );
    expect(derived({ ...ethanol, source: 'x'.repeat(500) }).heat_source).toHaveLength(500);
  });

  it('carries a measured curve with its totals', () => {
    const curve = {
      per: 'm2',
      specimen_m2: 0.01,
      burnt_kg: 0.05,
      points: [
        [0, 0],
        [60, 1000],
        [180, 0],
      ],
    };
    expect(derived({ ...ethanol, curve }).curve).toMatchObject({
      per: 'm2',
      heat_MJ: 90,
      peak: 1000,
      peak_s: 60,
      effective_MJ_kg: 18,
    });
    expect(
      faultsOf({
        ...ethanol,
        curve: {
          ...curve,
          points: [
            [0, 0],
            [0, 1],
          ],
        },
      }),
    ).toMatchObject([{ pointer: '/curve/points/1', code: 'not_rising' }]);
    expect(
      faultsOf({
        ...ethanol,
        curve: {
          ...curve,
          points: [
            [0, 0],
            [1, 0],
          ],
        },
      }),
    ).toMatchObject([{ pointer: '/curve/points', code: 'no_heat' }]);
  });
});
