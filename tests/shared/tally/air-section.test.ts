import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import type { Estimate } from '@embertally/shared/methods/estimate';

const PLASTIC = { material: 'polyethylene', net_heat_MJ_kg: 40, mass_kg: 1000 };

/** A room of 100 m³ at 20 °C; closed unless openings are given. */
function tally(parts: readonly object[], changes: { readonly room?: object; readonly options?: object } = {}) {
  const result = parseRoomInput({
    room: {
      name: 'Closed store',
      ring_m: [
        [0, 0],
        [8, 0],
        [8, 5],
        [0, 5],
      ],
      height_m: 2.5,
      ...changes.room,
    },
    contents: [{ id: 'a', count: 1, parts, peak_kW: 8000, width_m: 1, depth_m: 1, x_m: 4, y_m: 2 }],
    options: { growth: 'fast', ...changes.options },
  });
  if (!result.ok) throw new Error(JSON.stringify(result.errors));
  return estimateRoom(result.value, { spread: false });
}

const codes = (one: Estimate | undefined) => one?.warnings.map(({ code }) => code) ?? [];
const near = (one: Estimate | undefined, expected: number, share: number) => {
  expect(Math.abs((one?.value ?? NaN) / expected - 1), `${one?.value} against ${expected}`).toBeLessThan(share);
};

describe('the air of a room of 100 m³', () => {
  it('feeds 138.5 MJ to 13 % oxygen, 103.7 to 15 %, 190.9 to 10 % (independent: by hand at 1.2041 kg/m³)', () => {
    const { air } = tally([PLASTIC]);
    near(air.oxygenLimitedHeat, 138.5, 1e-3);
    near(air.oxygenLimitedHeatAt15, 103.3 * (1.2041 / 1.2), 1e-3);
    near(air.oxygenLimitedHeatAt10, 190.2 * (1.2041 / 1.2), 1e-3);
    expect(air.oxygenLimitedHeat?.unit).toBe('MJ');
  });

  it('ends a fast fire after 210.7 s (independent: αt³/3)', () => {
    const { air, growth } = tally([PLASTIC]);
    near(air.oxygenEnd, 210.68, 2e-3);
    expect(growth.governedBy).toBe('closed');
    expect(codes(air.oxygenEnd)).toContain('MAY_FLARE_UP');
  });

  it('does not end a fire with less heat, and says why', () => {
    const { air } = tally([{ ...PLASTIC, mass_kg: 2 }]);
    expect(air.oxygenEnd).toMatchObject({ value: null, never: expect.stringMatching(/less heat/) as string });
  });

  it('is the same with doors open, but then nothing ends the curve', () => {
    const openings = [{ width_m: 1, height_m: 2, state: 'open' }];
    const { air } = tally([PLASTIC], { room: { openings } });
    expect(air.oxygenLimitedHeat).toEqual(tally([PLASTIC]).air.oxygenLimitedHeat);
    expect(air.oxygenEnd).toBeUndefined();
  });

  it('is thinner when it is warmer', () => {
    const warm = tally([PLASTIC], { options: { ambient_C: 60 } }).air.oxygenLimitedHeat?.value ?? 0;
    expect(warm / (tally([PLASTIC]).air.oxygenLimitedHeat?.value ?? 1)).toBeCloseTo(293.15 / 333.15, 6);
  });
});

describe('smoke', () => {
  it('of polyethylene: 57 g hide what reflects 10 m away, 153 g what shines (independent: by hand)', () => {
    const { air } = tally([PLASTIC]);
    near(air.massForVisibility10m, 0.05747, 1e-3);
    near(air.massForVisibility10mShining, (0.05747 * 8) / 3, 1e-3);
  });

  it('of polyethylene: 714 ppm of carbon monoxide at the oxygen limit, 5950 short of air (independent: by hand)', () => {
    const { air } = tally([PLASTIC]);
    near(air.carbonMonoxide, 713.7, 2e-3);
    near(air.carbonMonoxideShortOfAir, (713.7 * 0.2) / 0.024, 2e-3);
    expect(codes(air.carbonMonoxide)).toEqual([]);
  });

  it('burns no more than there is', () => {
    const some = tally([{ ...PLASTIC, mass_kg: 1 }]).air.carbonMonoxide?.value ?? 0;
    const half = tally([{ ...PLASTIC, mass_kg: 0.5 }]).air.carbonMonoxide?.value ?? 0;
    expect(some / half).toBeCloseTo(2, 9);
  });

  it('of two materials is weighted by mass', () => {
    const { air } = tally([PLASTIC, { material: 'timber', mass_kg: 3000 }]);
    near(air.massForVisibility10m, 300 / (10 * 8700 * ((0.06 + 3 * 0.015) / 4)), 1e-6);
  });

  it('of boards and paper is that of red oak, and says so', () => {
    const { air } = tally([{ material: 'paper', mass_kg: 100 }]);
    near(air.massForVisibility10m, 300 / (10 * 8700 * 0.015), 1e-6);
    expect(codes(air.massForVisibility10m)).toEqual(['YIELDS_AS_WOOD']);
  });

  it('of a smaller part that is not known is assumed, and says so', () => {
    const { air } = tally([PLASTIC, { net_heat_MJ_kg: 18, mass_kg: 500 }]);
    near(air.massForVisibility10m, 300 / (10 * 8700 * ((0.06 * 2 + 0.07) / 3)), 1e-6);
    expect(air.carbonMonoxide?.warnings[0]?.text).toMatch(/33 % of the mass/);
  });

  it('is missing where most is not known, or where nothing burns', () => {
    const why = (parts: readonly object[]) => tally(parts).missing.find(({ path }) => path === 'air.carbonMonoxide');
    expect(why([{ net_heat_MJ_kg: 18, mass_kg: 500 }])).toMatchObject({ input: 'contents', section: 'air' });
    expect(why([{ net_heat_MJ_kg: 18, mass_kg: 500 }])?.why).toMatch(/not known for 100 % of the mass/);
    expect(why([])?.why).toMatch(/Nothing that burns/);
  });
});
