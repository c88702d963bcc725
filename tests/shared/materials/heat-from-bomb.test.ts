import { describe, expect, it } from 'vitest';
import { derived, faultsOf } from './derived.ts';

const E_MJ_K = 0.01;
const FUSE_MJ = 0.00005;

/** A run of a sample with a known gross heat at constant volume: ΔT = (m H + fuse)/E. */
const run = (mass_kg: number, gross: number, more: object = {}) => ({
  mass_kg,
  rise_K: (mass_kg * gross + FUSE_MJ) / E_MJ_K,
  fuse_MJ: FUSE_MJ,
  ...more,
});
const given = { by: 'given', water_equivalent_MJ_K: E_MJ_K };
const bomb = (runs: readonly object[], more: object = {}) => ({
  way: 'bomb',
  calibration: given,
  runs,
  hydrogen: { by: 'content', hydrogen_pct: 6 },
  ...more,
});
const runsOf = (gross: number) => [run(0.0005, gross), run(0.00051, gross), run(0.00049, gross)];

describe('a material from bomb runs', () => {
  it('isooctane: 47.712 MJ/kg in the bomb is 47.81 gross and 44.34 net at constant pressure', () => {
    const material = derived(bomb(runsOf(47.712), { hydrogen: { by: 'formula' }, formula: 'C8H18' }));
    expect(material.gross_MJ_kg).toBeCloseTo(47.81, 2);
    expect(material.net_MJ_kg).toBeCloseTo(44.34, 2);
    expect(material.basis?.finding).toBe('plausible');
    expect(material.range_basis).toMatch(/3 %/);
    expect(material.heat_source).toMatch(/3 bomb runs/);
  });

  it('benzoic acid: certified 26.434 MJ/kg in the bomb, calibrated with itself', () => {
    const calibration = {
      by: 'runs',
      runs: [1, 2, 3, 4, 5].map((k) => run(0.0009 + k * 0.00002, 26.434)),
    };
    const material = derived(bomb(runsOf(26.434), { calibration, hydrogen: { by: 'formula' }, formula: 'C6H5COOH' }));
    // CRC Handbook: 3226.9 kJ/mol, 26.42 MJ/kg gross at constant pressure; standard state apart from bomb conditions.
    expect(material.gross_MJ_kg).toBeCloseTo(26.43, 1);
    expect(material.net_MJ_kg).toBeCloseTo(25.35, 1);
    expect(material.warnings).toEqual([]);
  });

  it('the water weighed after a run stands in for hydrogen: 20.0 gross and 0.536 kg/kg make 18.691 net', () => {
    const material = derived(bomb(runsOf(20), { hydrogen: { by: 'condensate', water_kg_kg: 0.536 } }));
    expect(material.net_MJ_kg).toBeCloseTo(18.691, 3);
    expect(material.warnings.map(({ code }) => code)).toEqual(['CONSTANT_VOLUME']);
  });

  it('a moist sample is brought to dry, and to the water it has where it lies', () => {
    const analysed = { pct: 12.5, per: 'wet' };
    const straw = derived(bomb(runsOf(16.98), { analysed, hydrogen: { by: 'content', hydrogen_pct: 5.8 } }));
    // Phyllis2 record 1303: 16.98 as received, 19.41 dry, 12.5 % water; net about 15.5 MJ/kg.
    expect(straw.gross_MJ_kg).toBeCloseTo(16.98, 2);
    expect(straw.net_MJ_kg).toBeCloseTo(15.57, 1);
    expect(straw.moisture_pct_wet).toBeCloseTo(12.5, 9);
    const dried = derived(
      bomb(runsOf(16.98), {
        analysed,
        received: { pct: 0, per: 'wet' },
        hydrogen: { by: 'content', hydrogen_pct: 5.8 },
      }),
    );
    expect(dried.gross_MJ_kg).toBeCloseTo(19.41, 2);
  });

  it('condensate of a moist sample counts its own water once', () => {
    const dry = derived(bomb(runsOf(20), { hydrogen: { by: 'condensate', water_kg_kg: 0.54 } }));
    const moist = derived(
      bomb(runsOf(18), {
        analysed: { pct: 10, per: 'wet' },
        received: { pct: 0, per: 'wet' },
        hydrogen: { by: 'condensate', water_kg_kg: 0.9 * 0.54 + 0.1 },
      }),
    );
    expect(moist.net_MJ_kg).toBeCloseTo(dry.net_MJ_kg, 6);
  });

  it('aid and acid are taken off', () => {
    const aided = [0.0004, 0.00041, 0.00042].map((mass_kg) => ({
      mass_kg,
      aid_kg: 0.0005,
      acid_MJ: 0.00006,
      fuse_MJ: FUSE_MJ,
      rise_K: (mass_kg * 18 + 0.0005 * 26.434 + 0.00006 + FUSE_MJ) / E_MJ_K,
    }));
    expect(derived(bomb(aided)).gross_MJ_kg).toBeCloseTo(18, 6);
  });

  it('masses noted at half their value are found with the formula, and the correction is the person’s', () => {
    const halved = runsOf(47.712).map((one) => ({ ...one, mass_kg: one.mass_kg / 2 }));
    const stated = bomb(halved, { hydrogen: { by: 'formula' }, formula: 'C8H18' });
    const { basis } = derived(stated);
    expect(basis?.finding).toBe('wrong-mole-basis');
    expect(basis?.text).toMatch(/masses of the runs/);
    const accepted = { finding: 'wrong-mole-basis', factor: basis?.proposal?.factor };
    // Half the pressure term is halved too: 0.05 MJ/kg below the true 44.34.
    expect(derived({ ...stated, accepted }).net_MJ_kg).toBeCloseTo(44.3, 1);
  });

  it('widens the range by runs and calibration that scatter', () => {
    const scattered = [run(0.0005, 19.6), run(0.0005, 20), run(0.0005, 20.4)];
    const calibration = { by: 'runs', runs: [run(0.001, 26.434), { ...run(0.001, 26.434), rise_K: 2.7 }] };
    const material = derived(bomb(scattered, { calibration }));
    expect(material.high_MJ_kg / material.net_MJ_kg - 1).toBeGreaterThan(0.03);
    expect(material.warnings.map(({ code }) => code)).toContain('CALIBRATION');
  });

  it('counts what hardly burns as nothing and says so', () => {
    const material = derived(bomb(runsOf(-0.05)));
    expect(material).toMatchObject({ net_MJ_kg: 0, low_MJ_kg: 0, high_MJ_kg: 0.2 });
    expect(material.warnings.map(({ code }) => code)).toContain('NO_HEAT');
  });

  it('refuses runs that cannot be a result, each with what to do', () => {
    const codes = (stated: object) => faultsOf({ ...stated }).map(({ pointer, code }) => `${pointer} ${code}`);
    expect(codes(bomb(runsOf(20).slice(0, 2)))).toEqual(['/runs too_few_runs']);
    expect(codes(bomb([...runsOf(20), run(0.0005, 24)]))).toEqual(['/runs runs_disagree']);
    expect(faultsOf(bomb([...runsOf(20), run(0.0005, 24)]))[0]?.message).toMatch(/Run 4 \(24\.0 MJ\/kg\)/);
    expect(codes(bomb(runsOf(20).map((one, i) => (i === 1 ? { ...one, rise_K: 0 } : one))))).toEqual([
      '/runs/1/rise_K no_rise',
    ]);
    expect(codes(bomb(runsOf(20).map((one, i) => (i === 2 ? { ...one, mass_kg: 0 } : one))))).toEqual([
      '/runs/2/mass_kg too_small',
    ]);
    expect(codes(bomb(runsOf(20), { hydrogen: { by: 'formula' } }))).toEqual(['/formula missing']);
    expect(codes(bomb(runsOf(20), { hydrogen: { by: 'elements' } }))).toEqual(['/elements missing']);
    expect(
      codes(bomb(runsOf(20), { analysed: { pct: 30, per: 'wet' }, hydrogen: { by: 'condensate', water_kg_kg: 0.2 } })),
    ).toEqual(['/hydrogen/water_kg_kg too_little_water']);
    expect(codes(bomb(runsOf(20), { analysed: { pct: 120, per: 'wet' } }))).toEqual(['/analysed/pct too_wet']);
  });

  it('leaves a run out only where a person says why, and shows it', () => {
    const material = derived(bomb([...runsOf(20), run(0.0005, 24, { left_out: 'crucible tipped over' })]));
    expect(material.gross_MJ_kg).toBeCloseTo(20, 6);
    expect(material.warnings).toContainEqual({
      code: 'RUN_LEFT_OUT',
      text: 'Run 4 does not count: crucible tipped over',
    });
  });
});
