import { describe, expect, it } from 'vitest';
import { derived, faultsOf } from './derived.ts';

const supplier = (more: object) => ({
  way: 'supplier',
  per: 'kg',
  heat: 'net',
  state: 'as-received',
  range: { by: 'class', evidence: 'class' },
  ...more,
});

describe('a material from a supplier’s sheet', () => {
  it('takes a net heat as received over as it is, with a working and the range of its evidence', () => {
    const material = derived(supplier({ heat_MJ: 42.8 }));
    expect(material.net_MJ_kg).toBe(42.8);
    expect(material.low_MJ_kg).toBeCloseTo(39.8, 1);
    expect(material.methods).toEqual(['heat.stated@1']);
    expect(material.basis).toBeNull();
  });

  it('gross to net: propane 50.34 makes 46.35 by its formula', () => {
    const material = derived(supplier({ heat_MJ: 50.34, heat: 'gross', state: 'dry', formula: 'C3H8' }));
    expect(material.net_MJ_kg).toBeCloseTo(46.35, 1);
    expect(material.gross_MJ_kg).toBeCloseTo(50.34, 9);
  });

  it('gross as received: straw of 16.98 with 12.5 % water makes about 15.5 net', () => {
    const material = derived(
      supplier({ heat_MJ: 16.98, heat: 'gross', moisture: { pct: 12.5, per: 'wet' }, hydrogen_pct: 5.8 }),
    );
    expect(material.gross_MJ_kg).toBeCloseTo(16.98, 9);
    expect(material.net_MJ_kg).toBeCloseTo(15.57, 1);
  });

  it('dry to received by the exact balance: 18.5 with 12 % of dry mass makes 16.26', () => {
    const material = derived(supplier({ heat_MJ: 18.5, state: 'dry', moisture: { pct: 12, per: 'dry' } }));
    expect(material.net_MJ_kg).toBeCloseTo(16.26, 2);
    expect(material.moisture_pct_wet).toBeCloseTo(10.71, 2);
    const unsaid = derived(supplier({ heat_MJ: 18.5, state: 'dry' }));
    expect(unsaid.net_MJ_kg).toBe(18.5);
    expect(unsaid.warnings.map(({ code }) => code)).toEqual(['NO_MOISTURE']);
  });

  it('per litre and per m³ with the density', () => {
    // Directive (EU) 2018/2001 Annex III, from memory: ethanol 21 MJ/L and 27 MJ/kg; ISO 6976 methane 33.948 MJ/m³.
    expect(derived(supplier({ heat_MJ: 21, per: 'L', density_kg_m3: 789 })).net_MJ_kg).toBeCloseTo(26.6, 1);
    expect(derived(supplier({ heat_MJ: 33.948, per: 'm3', density_kg_m3: 0.6785 })).net_MJ_kg).toBeCloseTo(50.03, 1);
  });

  it('brings low and high of the sheet the same way as the value', () => {
    const range = { by: 'sheet', low_MJ: 49, high_MJ: 51 };
    const material = derived(supplier({ heat_MJ: 50.34, heat: 'gross', state: 'dry', formula: 'C3H8', range }));
    expect(material.net_MJ_kg - material.low_MJ_kg).toBeCloseTo(1.34, 6);
    expect(material.high_MJ_kg - material.net_MJ_kg).toBeCloseTo(0.66, 6);
  });

  describe('holds a net heat against a like material of the catalogue', () => {
    const wood = (heat_MJ: number, more: object = {}) =>
      supplier({ heat_MJ, moisture: { pct: 15, per: 'wet' }, counterpart: 'timber', ...more });

    it('dry for as received', () => {
      const stated = wood(18.8);
      const { basis } = derived(stated);
      expect(basis?.finding).toBe('dry-for-received');
      // 18.8 · 0.85 − 2.442 · 0.15
      expect(basis?.proposal?.net_MJ_kg).toBeCloseTo(15.61, 2);
      const accepted = { finding: 'dry-for-received', factor: basis?.proposal?.factor };
      expect(derived({ ...stated, accepted }).net_MJ_kg).toBeCloseTo(15.61, 2);
    });

    it('gross for net', () => {
      const methane = derived(supplier({ heat_MJ: 55.5, counterpart: 'methane' }));
      expect(methane.basis?.finding).toBe('gross-for-net');
      expect(methane.basis?.proposal?.net_MJ_kg).toBeCloseTo(50.0, 1);
      const accepted = { finding: 'gross-for-net', factor: methane.basis?.proposal?.factor };
      const taken = derived(supplier({ heat_MJ: 55.5, counterpart: 'methane', accepted }));
      expect(taken.gross_MJ_kg).toBe(55.5);
      expect(taken.net_MJ_kg).toBeCloseTo(50.0, 1);
    });

    it('leaves a value alone that is near, or that no other basis explains', () => {
      expect(derived(wood(16)).basis).toBeNull();
      expect(derived(wood(11)).basis).toBeNull();
    });
  });

  it('holds a net heat against its own analysis', () => {
    const elements = { carbon_pct: 50, hydrogen_pct: 6.1, ash_pct: 0.5 };
    const { basis } = derived(supplier({ heat_MJ: 18.8, moisture: { pct: 12, per: 'dry' }, elements }));
    expect(basis?.finding).toBe('dry-for-received');
    const doubled = derived(supplier({ heat_MJ: 37, moisture: { pct: 0, per: 'dry' }, elements }));
    expect(doubled.basis?.finding).toBe('wrong-mole-basis');
    expect(doubled.basis?.proposal?.net_MJ_kg).toBeCloseTo(18.5, 6);
  });

  it('refuses what cannot be brought to a net heat per kilogram, at its field', () => {
    const codes = (more: object) => faultsOf(supplier(more)).map(({ pointer, code }) => `${pointer} ${code}`);
    expect(codes({ heat_MJ: 36, per: 'L' })).toEqual(['/density_kg_m3 missing']);
    expect(codes({ heat_MJ: 36, heat: 'gross' })).toEqual(['/hydrogen_pct missing']);
    expect(codes({ heat_MJ: 2, heat: 'gross', hydrogen_pct: 14 })).toEqual(['/heat_MJ not_possible']);
    expect(codes({ heat_MJ: 36, range: { by: 'sheet', low_MJ: 40, high_MJ: 45 } })).toEqual(['/range range']);
    expect(codes({ heat_MJ: 10_000 })).toEqual(['/heat_MJ out_of_range']);
    expect(codes({ heat_MJ: 400 })).toEqual(['/heat_MJ too_high']);
    expect(codes({ heat_MJ: 0 })).toEqual(['/heat_MJ too_small']);
    expect(codes({ heat_MJ: 16, counterpart: 'moonstone' })).toEqual(['/counterpart unknown_material']);
  });

  it('counts with nothing where the water takes more than there is', () => {
    const wet = derived(supplier({ heat_MJ: 18, state: 'dry', moisture: { pct: 94, per: 'wet' } }));
    expect(wet.net_MJ_kg).toBe(0);
    expect(wet.warnings.map(({ code }) => code)).toContain('NO_HEAT');
  });
});
