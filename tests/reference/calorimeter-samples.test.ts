import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { preview, reading } from '../shared/calorimeter/calorimeter-files.ts';

/** Real files nobody here made; they stay beside the repository, with their licences. */
const folder = join(import.meta.dirname, '..', '..', '..', 'shared', 'samples', 'calorimeter');
const there = existsSync(folder);
const read = (name: string) => readFileSync(join(folder, name), 'utf8');

describe.runIf(there)('files of real calorimeters give what a careful reader gets from them', () => {
  it('sofa in a room: 902 MJ, 2,751 kW at 438 s', () => {
    const sofa = preview(read('Overstuffed_Open_Back_1.csv'));
    expect(sofa.heat_MJ).toBeCloseTo(902, 0);
    expect(sofa.peak).toBeCloseTo(2751, 0);
    expect(sofa.peak_s).toBe(438);
    expect(sofa.curve?.points.length).toBeLessThanOrEqual(300);
  });

  it('chair in a room: no heat release column, so no curve', () => {
    const chair = reading(read('RedAccent_Open_Center_1.csv'));
    expect(chair).toMatchObject({ ok: false, faults: [{ line: null, code: 'no_rate' }] });
  });

  it('plywood in a cone: 96.25 MJ/m², 0.9625 MJ; its gases make 0.962 MJ', () => {
    const text = read('plywood-bryant2013characterizing-25-r1-horiz.csv');
    const plywood = preview(text, { specimen_m2: 0.01 });
    expect(plywood.per).toBe('m2');
    expect(plywood.heat_MJ).toBeCloseTo(96.25, 2);
    expect(plywood.piece_heat_MJ).toBeCloseTo(0.9625, 4);
    expect(plywood.notes).toContainEqual({ code: 'BLANK_END', text: 'The last 12 readings are blank and left off.' });
    expect(preview(text, { from: 'gases' }).heat_MJ).toBeCloseTo(0.962, 3);
  });

  it('foam in a cone: 0.2271 MJ, 26.7 MJ/kg with the 8.5 g that burnt', () => {
    const text = read('PUFoam-NBSMonograph173_Cone_25kW_hor_50mm-Spk-nF-nG_R1.csv');
    const foam = preview(text, { burnt_kg: 0.0085 });
    expect(foam.heat_MJ).toBeCloseTo(0.2271, 4);
    expect(foam.effective_MJ_kg).toBeCloseTo(26.7, 1);
    // The file's own loss rate would make 57.6 MJ/kg, more than any foam has.
    expect(preview(text)).toMatchObject({ burnt_kg: null });
  });
});

describe.skipIf(there)('files of real calorimeters', () => {
  it('are not beside this copy of the repository: nothing to read, nothing claimed', () => {
    expect(there).toBe(false);
  });
});
