import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import type { Estimate } from '@embertally/shared/methods/estimate';

interface Changes {
  readonly side?: readonly [number, number];
  readonly height_m?: number;
  readonly protection?: object | null;
  readonly peak_kW?: number;
  readonly base_m?: number;
  readonly options?: object;
  readonly contents?: readonly object[];
}

/** One stack that burns fast, EN convention, with air and heat enough for the whole growth. */
function tally({
  side = [20, 20],
  height_m = 6,
  protection = null,
  peak_kW = 6000,
  base_m,
  options,
  contents,
}: Changes) {
  const [w, d] = side;
  const result = parseRoomInput({
    room: {
      name: 'Store',
      ring_m: [
        [0, 0],
        [w, 0],
        [w, d],
        [0, d],
      ],
      height_m,
      openings: [{ width_m: 4, height_m: Math.min(4, height_m), state: 'open' }],
      protection,
    },
    contents: contents ?? [
      {
        id: 'stack',
        count: 1,
        parts: [{ net_heat_MJ_kg: 18, mass_kg: 2000 }],
        peak_kW,
        width_m: 2,
        depth_m: 2,
        ...(base_m !== undefined && { base_height_m: base_m }),
      },
    ],
    options: { growth: 'fast', ...options },
  });
  if (!result.ok) throw new Error(JSON.stringify(result.errors));
  return estimateRoom(result.value, { spread: false, workings: true });
}

const codes = (one: Estimate | undefined) => one?.warnings.map(({ code }) => code) ?? [];
const SPRINKLERS = { rti: 50, activation_C: 68, distance_m: 3 };

/** Alpert's jet under 3 m of ceiling 5 m away, and a device of 65 °C and RTI 50, in steps of 1 ms. */
function heatDetectorByHand(): number {
  const [H, r] = [3, 5];
  let rise = 0;
  let t = 0;
  for (; rise < 45; t += 0.001) {
    const Q = 1000 * ((t + 0.0005) / 150) ** 2;
    const gas = (5.38 * (Q / r) ** (2 / 3)) / H;
    const u = (0.195 * Q ** (1 / 3) * Math.sqrt(H)) / r ** (5 / 6);
    rise += ((Math.sqrt(u) * (gas - rise)) / 50) * 0.001;
  }
  return t;
}

describe('sprinklers', () => {
  it('respond to a fast fire under 6 m, 3 m off the axis, at 191.9 s in the NFPA convention (independent: ODE)', () => {
    const { response } = tally({ protection: { sprinklers: SPRINKLERS }, options: { growth_convention: 'NFPA' } });
    expect(Math.abs((response.sprinkler?.value ?? 0) - 191.92)).toBeLessThan(0.5);
    expect(response.sprinkler).toMatchObject({ unit: 's', method: 'plume.detector-response@1', warnings: [] });
  });

  it('respond later where nothing is said of their distance, and the working says so', () => {
    const stated = tally({ protection: { sprinklers: { ...SPRINKLERS, distance_m: 2.5 } } }).response.sprinkler;
    const assumed = tally({ protection: { sprinklers: { rti: 50, activation_C: 68 } } }).response.sprinkler;
    expect(assumed?.value).toBe(stated?.value);
    expect(codes(assumed)).toEqual(['DISTANCE_ASSUMED']);
    expect(assumed?.inputs?.find(({ name }) => name === 'r')).toMatchObject({ value: 2.5, origin: 'default' });
  });

  it('are nowhere farther from the fire than the room is large', () => {
    const { response } = tally({ side: [1.8, 2.4], protection: { sprinklers: { rti: 50, activation_C: 68 } } });
    expect(response.sprinkler?.inputs?.find(({ name }) => name === 'r')?.value).toBeCloseTo(1.5, 9);
  });

  it('never respond to a small fire, and the reason stands beside it', () => {
    const { response } = tally({ peak_kW: 100, protection: { sprinklers: SPRINKLERS } });
    expect(response.sprinkler?.value).toBeNull();
    expect(response.sprinkler?.never).toMatch(/warms by .+ K at most; it responds at 48 K/);
  });

  it('respond sooner to a first entry that stands high', () => {
    const protection = { sprinklers: SPRINKLERS };
    const low = tally({ protection, base_m: 3 }).response.sprinkler?.value ?? 0;
    const high = tally({ protection, base_m: 3, options: { first_entry: 'stack' } }).response.sprinkler?.value ?? 0;
    expect(high).toBeLessThan(low - 10);
  });
});

describe('detectors', () => {
  it('of smoke: gas 13 K warmer 5 m away under 3 m of ceiling takes 97.6 kW, 46.9 s (independent: closed form)', () => {
    const { response } = tally({ side: [6, 8], height_m: 3, protection: { detection: 'smoke' } });
    expect(Math.abs((response.detector?.value ?? 0) - 46.86)).toBeLessThan(0.3);
    expect(codes(response.detector)).toContain('INDICATOR_ONLY');
    expect(response.smokeDetector).toBeUndefined();
  });

  it('are said to be as far away as half the diagonal of a room of 10 × 10 m, √50 m', () => {
    const { response } = tally({ side: [10, 10], height_m: 3, protection: { detection: 'smoke' } });
    const said = response.detector?.warnings.find(({ code }) => code === 'DISTANCE_ASSUMED');
    expect(said?.text).toContain('taken to be 7.07 m from the fire');
  });

  it('of heat: 65 °C and RTI 50, said to be assumed (independent: the same equation in steps of 1 ms)', () => {
    const { response } = tally({ height_m: 3, protection: { detection: 'heat' } });
    expect(Math.abs((response.detector?.value ?? 0) - heatDetectorByHand())).toBeLessThan(0.5);
    expect(codes(response.detector)).toEqual(['DETECTOR_ASSUMED', 'DISTANCE_ASSUMED']);
  });

  it('of both kinds: the first one counts, each is shown', () => {
    const { response } = tally({ height_m: 3, protection: { detection: 'both' } });
    expect(response.detector).toEqual(response.smokeDetector);
    expect(response.heatDetector?.value).toBeGreaterThan(response.smokeDetector?.value ?? Infinity);
  });
});

describe('what is missing', () => {
  const missing = (changes: Changes, path: string) => tally(changes).missing.find((one) => one.path === path);

  it.each<[string, Changes, string, string, RegExp]>([
    ['no sprinklers', {}, 'response.sprinkler', 'room.protection.sprinklers', /No sprinklers are recorded/],
    ['no detectors', {}, 'response.detector', 'room.protection.detection', /No detectors are recorded/],
    [
      'a ceiling above 15 m',
      { height_m: 16, protection: { sprinklers: SPRINKLERS } },
      'response.sprinkler',
      'room.height_m',
      /16 m.*0.1 to 15/,
    ],
    [
      'an index below the range',
      { protection: { sprinklers: { ...SPRINKLERS, rti: 0.5 } } },
      'response.sprinkler',
      'room.protection.sprinklers.rti',
      /1 to 1000/,
    ],
    [
      'a temperature below the range',
      { protection: { sprinklers: { ...SPRINKLERS, activation_C: 35 } } },
      'response.sprinkler',
      'room.protection.sprinklers.activation_C',
      /40 to 350/,
    ],
    [
      'air colder than the range',
      { options: { ambient_C: -50 }, protection: { detection: 'heat' } },
      'response.detector',
      'options.ambient_C',
      /-40 to 60/,
    ],
    ['no contents', { contents: [], protection: { detection: 'heat' } }, 'response.detector', 'contents', /burns/],
    [
      'a fire at the ceiling',
      { base_m: 6, options: { first_entry: 'stack' }, protection: { detection: 'smoke' } },
      'response.detector',
      'room.height_m',
      /0.1 to 15/,
    ],
  ])('%s: says which input', (_name, changes, path, input, why) => {
    expect(missing(changes, path)).toMatchObject({ section: 'response', input });
    expect(missing(changes, path)?.why).toMatch(why);
  });

  it('does not reduce the design curve by sprinklers: the design load credits them already', () => {
    const [without, withThem] = [tally({}), tally({ protection: { sprinklers: SPRINKLERS } })];
    expect(withThem.growth.curve).toEqual(without.growth.curve);
  });
});
