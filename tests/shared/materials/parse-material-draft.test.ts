import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseMaterialDraft } from '@embertally/shared/materials/parse-material-draft';
import '../../support/property-seed.ts';

const SOUND = {
  way: 'formula',
  label: 'Octane',
  source: 'CRC Handbook',
  formula: 'C8H18',
  formation_kJ_mol: -250.1,
  phase: 'liquid',
};
const faults = (candidate: unknown) => {
  const parsed = parseMaterialDraft(candidate);
  return parsed.ok ? [] : parsed.faults.map(({ pointer, message }) => `${pointer} ${message}`);
};

describe('the fields of a draft', () => {
  it('reads a sound one unchanged', () => {
    expect(parseMaterialDraft(SOUND)).toEqual({ ok: true, draft: SOUND });
  });

  it('lists every field that does not fit, in plain words', () => {
    expect(faults({ ...SOUND, label: '', formation_kJ_mol: 'much', density_kg_m3: -1 })).toEqual([
      '/label Enter the name.',
      '/density_kg_m3 Enter the density in kg/m³ above 0.',
      '/formation_kJ_mol Enter the enthalpy of formation in kJ/mol as a number, like 12.5.',
    ]);
    expect(faults({ ...SOUND, formation_kJ_mol: undefined })).toEqual([
      '/formation_kJ_mol Enter the enthalpy of formation in kJ/mol.',
    ]);
    expect(faults({ ...SOUND, net_MJ_kg: 44 })).toEqual([
      '/net_MJ_kg “net_MJ_kg” does not belong to this way. Remove it.',
    ]);
    expect(faults({ ...SOUND, phase: 'plasma' })).toEqual(['/phase Choose one of: gas, liquid, solid.']);
    expect(faults({ ...SOUND, formation_kJ_mol: Number.NaN })[0]).toMatch(/as a number/);
    expect(faults({ ...SOUND, way: 'guess' })).toEqual(['/way Choose what applies here.']);
  });

  it('refuses a curve that no entry could carry', () => {
    const curve = (points: unknown) =>
      faults({ ...SOUND, curve: { per: 'piece', points } }).map((one) => one.split(' ')[0]);
    expect(curve([[0, 0]])).toEqual(['/curve/points']);
    expect(
      curve([
        [0, 0],
        [1, -1],
      ]),
    ).toEqual(['/curve/points/1/1']);
    expect(curve(Array.from({ length: 301 }, (_, i) => [i, 1]))).toEqual(['/curve/points']);
  });

  it('answers anything at all with sentences, and never throws', () => {
    fc.assert(
      fc.property(fc.jsonValue(), fc.jsonValue(), (part, other) => {
        for (const candidate of [part, { ...SOUND, ...(part as object) }, { way: other, runs: part, heat: other }]) {
          const parsed = parseMaterialDraft(candidate);
          if (!parsed.ok) for (const { message } of parsed.faults) expect(message).toMatch(/^.{5,}[.]$/s);
        }
      }),
      { numRuns: 300 },
    );
  });
});
