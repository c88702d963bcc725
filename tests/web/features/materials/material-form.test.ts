import type { MaterialDraft } from '@embertally/shared/materials/material-draft';
import { placeFault } from '@embertally/web/src/features/materials/form/place-fault.ts';
import { readDraft } from '@embertally/web/src/features/materials/form/read-draft.ts';
import { valuesOfDraft } from '@embertally/web/src/features/materials/form/values-of-draft.ts';
import { sectionsOf } from '@embertally/web/src/features/materials/form/ways/sections-of.ts';
import { describe, expect, it } from 'vitest';

const NAMED = { label: 'Moth balls', source: 'Report 12, page 3' };

describe('what is typed about a material', () => {
  it('is read in the units of a laboratory, with commas and units as people write them', () => {
    const read = readDraft(
      'bomb',
      {
        ...NAMED,
        'calibration/by': 'given',
        'calibration/water_equivalent_MJ_K': '10,05 kJ/K',
        'runs.count': '1',
        'runs/0/mass_kg': '1,0021',
        'runs/0/rise_K': '2.498 K',
        'runs/0/fuse_MJ': '50',
        'hydrogen/by': 'content',
        'hydrogen/hydrogen_pct': '8.4 %',
      },
      {},
      'US',
    );
    expect(read.ok && read.draft).toMatchObject({
      way: 'bomb',
      ...NAMED,
      hydrogen: { by: 'content', hydrogen_pct: 8.4 },
    });
    if (!read.ok || read.draft.way !== 'bomb' || read.draft.calibration.by !== 'given') throw new Error('not read');
    // 10.05 kJ/K = 0.01005 MJ/K; 1.0021 g = 0.0010021 kg; 50 J = 0.00005 MJ.
    expect(read.draft.calibration.water_equivalent_MJ_K).toBeCloseTo(0.01005, 12);
    expect(read.draft.runs[0]?.mass_kg).toBeCloseTo(0.0010021, 12);
    expect(read.draft.runs[0]?.rise_K).toBe(2.498);
    expect(read.draft.runs[0]?.fuse_MJ).toBeCloseTo(0.00005, 12);
  });

  it.each([
    ['nothing at all', {}, 'formula', /^Enter the chemical formula$/],
    ['a word for a number', { formation_kJ_mol: 'many' }, 'formation_kJ_mol', /must be a number in kJ\/mol/],
    ['a number of two meanings', { formation_kJ_mol: '1,234' }, 'formation_kJ_mol', /write 1234 or 1\.234/],
    ['far out of range', { formation_kJ_mol: '1e9' }, 'formation_kJ_mol', /must be 1000000 kJ\/mol or less/],
    ['too long a name', { label: 'x'.repeat(201) }, 'label', /200 characters or fewer; it has 201/],
  ])('is said at its field: %s', (_, typed, field, message) => {
    const read = readDraft('formula', typed, {}, 'SI');
    expect(read.ok ? '' : read.errors[field]).toMatch(message);
  });

  it('names the line a fault stands in', () => {
    const read = readDraft('bomb', { ...NAMED, 'runs.count': '2', 'runs/1/mass_kg': 'x' }, {}, 'SI');
    expect(read.ok ? '' : read.errors['runs/0/mass_kg']).toBe('Run 1: enter the mass');
    expect(read.ok ? '' : read.errors['runs/1/mass_kg']).toMatch(/^Run 2, mass/);
  });

  it('asks only for what the answers call for', () => {
    const read = readDraft('supplier', { ...NAMED, heat_MJ: '24.6', per: 'L' }, {}, 'SI');
    expect(read.ok ? {} : read.errors).toEqual({ density_kg_m3: 'Enter the density' });
    expect(readDraft('supplier', { ...NAMED, heat_MJ: '24.6', per: 'kg' }, {}, 'SI').ok).toBe(true);
  });
});

const DRAFTS: readonly MaterialDraft[] = [
  { way: 'formula', ...NAMED, formula: 'C8H18', formation_kJ_mol: -250.1, phase: 'liquid', density_kg_m3: 703 },
  {
    way: 'equation',
    ...NAMED,
    formula: 'C8H18',
    water: 'liquid',
    heat: { as: 'equation', moles: 2, enthalpy_kJ: -10_942 },
    synonyms: ['petrol', 'spirit'],
    hazards: ['liquid', 'foam'],
    cellulosic: false,
  },
  {
    way: 'supplier',
    ...NAMED,
    heat_MJ: 17.2,
    per: 'kg',
    heat: 'gross',
    state: 'dry',
    hydrogen_pct: 6.1,
    moisture: { pct: 12, per: 'dry' },
    range: { by: 'sheet', low_MJ: 16.8, high_MJ: 17.9 },
  },
  {
    way: 'composition',
    ...NAMED,
    parts: [
      { material: 'timber', version: null, mass_pct: 60 },
      { material: 'a0000000-0000-4000-8000-000000000001', version: 3, mass_pct: 30 },
    ],
    inert_pct: 10,
  },
];

describe('a version begun from another', () => {
  it.each(DRAFTS.flatMap((draft) => [[draft.way, 'SI', draft] as const, [draft.way, 'US', draft] as const]))(
    'states the same again: %s, %s',
    (way, units, draft) => {
      const values = valuesOfDraft(draft, units, (key) => `the ${key}`);
      const read = readDraft(way, values, {}, units);
      if (!read.ok) throw new Error(JSON.stringify(read.errors));
      const { density_kg_m3: before, ...stated } = draft;
      const { density_kg_m3: after, ...again } = read.draft;
      expect(again).toEqual(stated);
      expect(after ?? 0).toBeCloseTo(before ?? 0, 6);
    },
  );
});

describe('where a fault of the server stands', () => {
  const values = { 'runs.count': '2' };
  it.each([
    ['/draft/runs/1/mass_kg', 'runs/1/mass_kg'],
    ['/runs/1/mass_kg', 'runs/1/mass_kg'],
    ['/runs/7/mass_kg', 'runs'],
    ['/runs', 'runs'],
    ['/hydrogen', 'hydrogen/by'],
    ['/label', 'label'],
    ['/evidence', null],
  ])('%s belongs to %s', (pointer, name) => {
    expect(placeFault(pointer, sectionsOf('bomb'), values)).toBe(name);
  });
});
