import { randomUUID } from 'node:crypto';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { MaterialDraft } from '@embertally/shared/materials/material-draft';
import { compositionDraft, formulaDraft, supplierDraft } from '../../support/sample-drafts.ts';
import { TestApp, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let person: TestPerson;
beforeAll(async () => {
  app = await TestApp.open();
  person = await app.person();
});
afterAll(() => app.close());

const elements = { carbon_pct: 50, hydrogen_pct: 6, nitrogen_pct: 1, sulfur_pct: 0.1, ash_pct: 1 };
const common = { label: 'Sample', source: 'Report 1' };
const DRAFTS: readonly MaterialDraft[] = [
  supplierDraft({ moisture: { pct: 10, per: 'wet' }, hydrogen_pct: 6, counterpart: 'wool', density_kg_m3: 300 }),
  supplierDraft({
    heat: 'gross',
    state: 'dry',
    per: 'L',
    density_kg_m3: 900,
    elements,
    moisture: { pct: 12, per: 'dry' },
  }),
  formulaDraft(),
  compositionDraft([
    { material: 'timber', version: null, mass_pct: 50 },
    { material: 'cotton', version: null, mass_pct: 50 },
  ]),
  {
    ...common,
    way: 'equation',
    formula: 'C8H18',
    water: 'vapour',
    heat: { as: 'equation', moles: 2, enthalpy_kJ: -10_149, text: '2 C8H18 + 25 O2 -> 16 CO2 + 18 H2O' },
  },
  { ...common, way: 'equation', formula: 'CH4', water: 'liquid', heat: { as: 'mole', heat_kJ_mol: 890 } },
  {
    ...common,
    way: 'bomb',
    calibration: { by: 'given', water_equivalent_MJ_K: 0.0101 },
    runs: [1, 2, 3].map(() => ({ mass_kg: 0.001, rise_K: 2.5, fuse_MJ: 0.00005, aid_kg: 0.0001 })),
    hydrogen: { by: 'condensate', water_kg_kg: 0.5 },
    analysed: { pct: 5, per: 'wet' },
    received: { pct: 15, per: 'wet' },
    formula: 'C6H10O5',
  },
  { ...common, way: 'ultimate', elements, of: 'dry', correlation: 'boie', moisture: { pct: 8, per: 'wet' } },
].map(
  (draft) =>
    ({
      ...draft,
      curve: {
        per: 'piece',
        points: [
          [0, 0],
          [10, 5],
          [20, 0],
        ],
      },
    }) as MaterialDraft,
);

const oddNumber = fc.oneof(
  fc.constantFrom(0, -0, -1, 1e-320, 1e-9, 0.5, 1, 5, 50, 99.999999, 100, 1e3, 1e9, 1e308),
  fc.double({ noNaN: true, noDefaultInfinity: true }),
  fc.double({ min: 0, max: 120, noNaN: true }),
);
const oddText = fc.oneof(
  fc.constantFrom('', '0', 'C', 'C0', 'C1e9', '((((((H))))))', 'C99999999999', 'He', 'CH4.5', 'C6H12O6·H2O', 'UF6'),
  fc.constantFrom('CCl4', 'CHCl3', 'N2', 'O2', 'H2O', 'CO2', 'C2H2', 'CHN', '\u202e', '٣', 'x'.repeat(600)),
  fc.constantFrom(
    'wet',
    'dry',
    'net',
    'gross',
    'kg',
    'L',
    'm3',
    'gas',
    'liquid',
    'solid',
    'vapour',
    'piece',
    'm2',
    'paper',
  ),
  fc.string({ maxLength: 20 }),
);
const oddThing = fc.constantFrom<unknown>(null, [], {}, true, 'text', 7);
/** Something for a place: mostly of the sort that stands there, so that it is looked at by more than the schema. */
const odd = fc.record({ number: oddNumber, string: oddText, other: oddThing, crude: fc.nat({ max: 9 }) });

function oddFor(
  present: unknown,
  { number, string, other, crude }: { number: number; string: string; other: unknown; crude: number },
): unknown {
  if (crude === 0 || (typeof present === 'object' && crude < 4)) return other;
  return typeof present === 'number' ? number : typeof present === 'string' ? string : present;
}

/** Every place in a value where something else could stand. */
function places(value: unknown, path: readonly string[] = []): (readonly string[])[] {
  if (typeof value !== 'object' || value === null) return [path];
  return [path, ...Object.entries(value).flatMap(([key, item]) => places(item, [...path, key]))];
}

function put(value: unknown, [key, ...rest]: readonly string[], change: (present: unknown) => unknown): unknown {
  if (key === undefined) return change(value);
  const copy = structuredClone(value) as Record<string, unknown>;
  copy[key] = put(copy[key], rest, change);
  return copy;
}

describe('a draft with odd values in odd places', () => {
  it('is refused with its faults or derived in finite numbers, never a defect: 1,200 of them', async () => {
    const taken = { yes: 0, no: 0 };
    await fc.assert(
      fc.asyncProperty(
        fc.constantFrom(...DRAFTS),
        fc.array(fc.tuple(fc.nat(), odd), { minLength: 1, maxLength: 2 }),
        async (draft, changes) => {
          const sent = changes.reduce<unknown>((value, [where, replacement]) => {
            const all = places(value);
            return put(value, all[where % all.length] ?? [], (present) => oddFor(present, replacement));
          }, draft);
          // Filled again as fast as it is used: the pace of one person is not what is tried here.
          app.clock.forward(0.1 / 3600);
          const body = { id: randomUUID(), draft: sent, evidence: [] };
          const answer = await person.visitor.post('/api/own-materials', body);
          const what = `${JSON.stringify(sent)} ${answer.text.slice(0, 500)}`;
          expect([201, 422], what).toContain(answer.status);
          if (answer.status === 422) {
            taken.no += 1;
            return;
          }
          taken.yes += 1;
          const { net_MJ_kg, low_MJ_kg, high_MJ_kg } = answer.body as Record<string, number>;
          for (const value of [net_MJ_kg, low_MJ_kg, high_MJ_kg]) expect(Number.isFinite(value), what).toBe(true);
          expect(net_MJ_kg, what).toBeGreaterThanOrEqual(low_MJ_kg ?? NaN);
          expect(net_MJ_kg, what).toBeLessThanOrEqual(high_MJ_kg ?? NaN);
          expect(high_MJ_kg, what).toBeLessThanOrEqual(150);
          expect(answer.text).not.toMatch(/NaN|Infinity/);
        },
      ),
      { numRuns: 1200, seed: 20300131 },
    );
    expect(Math.min(taken.yes, taken.no)).toBeGreaterThan(100);
  }, 180_000);
});
