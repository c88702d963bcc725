import { describe, expect, it } from 'vitest';
import { derived, faultsOf } from './derived.ts';

const CELLULOSE = { carbon_pct: 44.45, hydrogen_pct: 6.22, oxygen_pct: 49.34 };
const POLYETHYLENE = { carbon_pct: 85.63, hydrogen_pct: 14.37 };
const ultimate = (elements: object, more: object = {}) => ({
  way: 'ultimate',
  elements,
  of: 'dry',
  correlation: 'channiwala-parikh',
  ...more,
});

describe('a material from an ultimate analysis', () => {
  it.each(['channiwala-parikh', 'boie'])('%s meets measured heats within its 3 %%', (correlation) => {
    // Cellulose 17.2 to 17.5 MJ/kg gross, dry (biomass tables); polyethylene 46.2 gross (FAA report, literature).
    const cellulose = derived(ultimate(CELLULOSE, { correlation }));
    expect(Math.abs((cellulose.gross_MJ_kg ?? 0) / 17.35 - 1)).toBeLessThan(0.03);
    const polyethylene = derived(ultimate(POLYETHYLENE, { correlation }));
    expect(Math.abs((polyethylene.gross_MJ_kg ?? 0) / 46.2 - 1)).toBeLessThan(0.03);
    expect(polyethylene.basis?.finding).toBe('plausible');
  });

  it('takes oxygen as the rest', () => {
    const { carbon_pct, hydrogen_pct } = CELLULOSE;
    const rest = derived(ultimate({ carbon_pct, hydrogen_pct }));
    expect(rest.gross_MJ_kg).toBeCloseTo(derived(ultimate(CELLULOSE)).gross_MJ_kg ?? 0, 1);
  });

  it('gives one material whether its shares are dry, free of ash or as received', () => {
    const dry = { carbon_pct: 45, hydrogen_pct: 5.5, oxygen_pct: 39.5, ash_pct: 10 };
    const free = { carbon_pct: 50, hydrogen_pct: 5.5 / 0.9, oxygen_pct: 39.5 / 0.9, ash_pct: 10 };
    const received = { carbon_pct: 36, hydrogen_pct: 4.4, oxygen_pct: 31.6, ash_pct: 8 };
    const moisture = { pct: 20, per: 'wet' };
    const heats = [
      derived(ultimate(dry, { moisture })),
      derived(ultimate(free, { of: 'dry-ash-free', moisture })),
      derived(ultimate(received, { of: 'as-received', moisture })),
    ].map(({ net_MJ_kg }) => net_MJ_kg);
    expect(heats[1]).toBeCloseTo(heats[0] ?? 0, 9);
    expect(heats[2]).toBeCloseTo(heats[0] ?? 0, 9);
  });

  it('says where the correlation leaves its range, and widens the band', () => {
    const material = derived(ultimate({ carbon_pct: 96, hydrogen_pct: 2 }));
    expect(material.warnings.map(({ code }) => code)).toContain('OUT_OF_RANGE');
    expect(material.high_MJ_kg / material.net_MJ_kg - 1).toBeCloseTo(0.07, 6);
    const chlorinated = derived(ultimate({ carbon_pct: 38.4, hydrogen_pct: 4.8, chlorine_pct: 56.7 }));
    expect(chlorinated.warnings.map(({ code }) => code)).toContain('CHLORINE');
    // Chlorine binds hydrogen that then forms no water: gross and net of PVC lie 0.7 MJ/kg apart, not 1.05.
    expect((chlorinated.gross_MJ_kg ?? 0) - chlorinated.net_MJ_kg).toBeCloseTo(0.7, 1);
  });

  it('refuses shares that do not add up, or that cannot burn', () => {
    const codes = (elements: object, more: object = {}) =>
      faultsOf(ultimate(elements, more)).map(({ pointer, code }) => `${pointer} ${code}`);
    expect(codes({ carbon_pct: 90, hydrogen_pct: 20 })).toEqual(['/elements sum']);
    expect(codes({ carbon_pct: 50, hydrogen_pct: 6, oxygen_pct: 20 })).toEqual(['/elements sum']);
    expect(codes({ carbon_pct: 0, hydrogen_pct: 0, ash_pct: 100 })).toEqual(['/elements nothing_burns']);
    expect(codes({ carbon_pct: 5, hydrogen_pct: 1, oxygen_pct: 94 })).toEqual(['/elements not_possible']);
    expect(
      codes({ carbon_pct: 50, hydrogen_pct: 6 }, { of: 'as-received', moisture: { pct: 60, per: 'wet' } }),
    ).toEqual(['/elements sum']);
    expect(codes({ carbon_pct: -1, hydrogen_pct: 6 })).toEqual(['/elements/carbon_pct too_small']);
  });
});
