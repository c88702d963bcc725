import { describe, expect, it } from 'vitest';
import { ignitionOf } from '@embertally/shared/spread/ignition-class';
import { simulateSpread, UnknownFirstEntryError, type SpreadInput } from '@embertally/shared/spread/simulate-spread';
import { areaOf, HALL, spreadCase, spreadEntry, ULTRA_FAST_KW_S2 } from '../../support/spread-samples.ts';

const CLOSED = { ...HALL, factorBefore: 0, factorAfter: 0 };

function run(input: SpreadInput) {
  const result = simulateSpread(input);
  if (!result) throw new Error('Nothing burns.');
  return result;
}

describe('the first entry', () => {
  it('is the given one', () => {
    const { events, chosen, first } = run(
      spreadCase([spreadEntry('a', [0, 0]), spreadEntry('b', [9, 0])], { first: 'b' }),
    );
    expect(first).toBe('b');
    expect(chosen).toEqual({ by: 'given' });
    expect(events).toEqual([{ id: 'b', t: 0, cause: 'first', flux_kW_m2: null, from: null, nearField: false }]);
  });

  it('that nobody knows is said, not guessed', () => {
    expect(() => simulateSpread(spreadCase([spreadEntry('a', [0, 0])], { first: 'z' }))).toThrow(
      UnknownFirstEntryError,
    );
  });

  it.each([
    ['sealed', { enclosure: 'sealed' as const }],
    ['without heat', { heat_MJ: 0 }],
    ['without a peak', { peak_kW: 0 }],
  ])('that is %s makes no fire', (_name, change) => {
    const entries = [spreadEntry('a', [0, 0], change)];
    expect(simulateSpread(spreadCase(entries))).toBeUndefined();
    expect(simulateSpread(spreadCase(entries, { first: null }))).toBeUndefined();
  });

  it('is looked for when none is given: no fire without entries', () => {
    expect(simulateSpread(spreadCase([], { first: null }))).toBeUndefined();
  });
});

describe('a closed room', () => {
  const entries = [spreadEntry('a', [0, 0], { heat_MJ: 500, peak_kW: 1000, growth: { by: 'step' } })];

  it('starves when its air is used up, and says what is left', () => {
    const result = run(spreadCase(entries, { room: { ...CLOSED, oxygenLimitedHeat_MJ: 120 } }));
    expect(result.stopped).toBe('starved');
    expect(result.released_MJ).toBeCloseTo(120, 6);
    expect(result.unburnt_MJ).toBeCloseTo(380, 6);
    expect(result.end_s).toBeCloseTo(120, 6);
    expect(result.events.at(-1)).toMatchObject({ id: null, cause: 'starved', t: result.end_s });
    expect(areaOf(result.curve)).toBeCloseTo(120, 6);
  });

  it('burns out where its air suffices or is not known, with nothing holding it back', () => {
    for (const oxygenLimitedHeat_MJ of [501, null]) {
      const result = run(spreadCase(entries, { room: { ...CLOSED, oxygenLimitedHeat_MJ } }));
      expect(result).toMatchObject({ stopped: 'burnt-out', peak_kW: 1000, atCap_s: 0 });
      expect(result.end_s).toBeCloseTo(500, 6);
    }
  });

  it('does not starve while anything is open', () => {
    expect(run(spreadCase(entries, { room: { ...HALL, oxygenLimitedHeat_MJ: 120 } })).stopped).toBe('burnt-out');
  });
});

describe('openings', () => {
  it('hold the fire back without losing heat', () => {
    const burning = spreadEntry('a', [0, 0], { heat_MJ: 900, peak_kW: 3000, growth: { by: 'step' } });
    const result = run(spreadCase([burning], { room: { ...HALL, factorBefore: 1, factorAfter: 1 } }));
    expect(result.peak_kW).toBe(1500);
    expect(result.atCap_s).toBeCloseTo(600, 6);
    expect(result.end_s).toBeCloseTo(600, 6);
    expect(areaOf(result.curve)).toBeCloseTo(900, 6);
  });

  it('end the book-keeping after four hours, with the rest unburnt', () => {
    const burning = spreadEntry('a', [0, 0], { heat_MJ: 9000, peak_kW: 3000, growth: { by: 'step' } });
    const result = run(spreadCase([burning], { room: { ...HALL, factorBefore: 0.2, factorAfter: 0.2 } }));
    expect(result).toMatchObject({ stopped: 'four-hours', end_s: 14_400 });
    expect(result.released_MJ).toBeCloseTo((300 * 14_400) / 1000, 6);
    expect(result.released_MJ + result.unburnt_MJ).toBeCloseTo(9000, 6);
  });

  it('give more air after flashover, when the glass is broken', () => {
    const burning = spreadEntry('a', [0, 0], { heat_MJ: 5000, peak_kW: 6000, growth: { by: 'step' } });
    const room = { ...HALL, factorBefore: 1, factorAfter: 2, flashover_kW: 1000 };
    const result = run(spreadCase([burning, spreadEntry('b', [50, 0], { enclosure: 'cabinet' })], { room }));
    expect(result.flashover_s).toBe(0);
    expect(result.events[1]).toMatchObject({ id: 'b', cause: 'flashover', t: 0 });
    expect(result.peak_kW).toBe(3000);
  });
});

describe('flashover', () => {
  it('makes what it lights grow at least ultra-fast, and leaves what grows faster', () => {
    const slow = { by: 't-squared', alpha_kW_s2: 0.003 } as const;
    const faster = { by: 't-squared', alpha_kW_s2: 4 * ULTRA_FAST_KW_S2 } as const;
    const peakAfter = (growth: typeof slow | typeof faster) => {
      const first = spreadEntry('a', [0, 0], { heat_MJ: 1, peak_kW: 1000, growth: { by: 'step' } });
      const lit = spreadEntry('b', [90, 0], { heat_MJ: 1e6, peak_kW: 1000, growth });
      const room = { ...HALL, flashover_kW: 1000 };
      const { curve } = run(spreadCase([first, lit], { room }));
      return curve.find(([t, rate]) => t > 1 && rate >= 999)![0];
    };
    expect(peakAfter(slow)).toBeCloseTo(75, 0);
    expect(peakAfter(faster)).toBeCloseTo(37.5, 0);
  });

  it('does not come while no criterion applies', () => {
    const big = spreadEntry('a', [0, 0], { peak_kW: 40_000, heat_MJ: 50_000 });
    expect(run(spreadCase([big, spreadEntry('b', [99, 0])])).flashover_s).toBeNull();
  });
});

describe('curves of entries', () => {
  it('of liquids stand at their peak from the start', () => {
    const { curve } = run(
      spreadCase([spreadEntry('a', [0, 0], { heat_MJ: 30, peak_kW: 1000, growth: { by: 'step' } })]),
    );
    expect(curve[0]).toEqual([0, 1000]);
    expect(curve.at(-1)![0]).toBeCloseTo(30, 9);
  });

  it('that were measured keep their rates and are stretched to the heat', () => {
    const points = [
      [0, 0],
      [100, 400],
      [200, 0],
    ] as const;
    const measured = spreadEntry('a', [0, 0], { heat_MJ: 80, peak_kW: 400, growth: { by: 'measured', points } });
    const { curve, peak_kW, end_s } = run(spreadCase([measured]));
    expect(peak_kW).toBeCloseTo(400, 6);
    expect(end_s).toBeCloseTo(400, 6);
    expect(areaOf(curve)).toBeCloseTo(80, 6);
  });
});

describe('the simple variant', () => {
  /** Both burn at their peak from the start, so the flux is there from the first second. */
  const source = (seconds: number) =>
    spreadEntry('a', [0, 0], { heat_MJ: seconds, peak_kW: 1000, growth: { by: 'step' }, radiativeFraction: 0.4 });
  /** χQ/(4πR²) = 21 kW/m² at R = 1.231 m from the centre. */
  const target = spreadEntry('b', [0.5 + 1.231, 0], { size: [1, 1] });
  const lights = (seconds: number, entry = target) =>
    run(spreadCase([source(seconds), entry], { ignition: 'held' })).exposures[1]!.ignited_s;

  it('lights when its flux has been held for half a minute', () => {
    expect(lights(40)).toBeCloseTo(30, 6);
    expect(lights(29)).toBeNull();
  });

  it('asks each class for its own flux', () => {
    expect(lights(40, { ...target, ignition: ignitionOf('easy') })).toBeCloseTo(30, 6);
    expect(lights(40, { ...target, ignition: ignitionOf('hard') })).toBeNull();
    expect(lights(40, { ...target, ignition: ignitionOf('normal', 35) })).toBeCloseTo(30, 6);
  });
});

describe('what cannot be reached by radiation', () => {
  it('an entry that is not on the plan lights by the layer or at flashover only', () => {
    const first = spreadEntry('a', [0, 0], { peak_kW: 3000, heat_MJ: 3000 });
    const nowhere = { ...spreadEntry('b', [0, 0]), place: null };
    expect(run(spreadCase([first, nowhere])).exposures[1]!.highestFlux_kW_m2).toBe(0);
    const layers = [{ thickness_m: 0.02, conductivity_W_mK: 0.5, density_kg_m3: 1000, specific_heat_J_kgK: 900 }];
    const room = { ...HALL, factorBefore: 2, factorAfter: 2, liningArea_m2: 80, surfaces: [{ area_m2: 80, layers }] };
    const { events, layerIncluded } = run(spreadCase([first, nowhere], { room }));
    expect(layerIncluded).toBe(true);
    expect(events[1]).toMatchObject({ id: 'b', cause: 'layer', from: null, nearField: false });
    expect(run(spreadCase([first, nowhere], { room: { ...room, large: true } })).layerIncluded).toBe(false);
  });

  it('a flux does not pass 120 kW/m² per source, however near', () => {
    const near = spreadCase([
      spreadEntry('a', [0, 0], { peak_kW: 9000, growth: { by: 'step' } }),
      spreadEntry('b', [1.01, 0], { ignition: ignitionOf('resistant') }),
    ]);
    expect(run(near).exposures[1]!.highestFlux_kW_m2).toBe(120);
    expect(run({ ...near, fluxFactor: 2 }).exposures[1]!.highestFlux_kW_m2).toBe(240);
  });
});

describe('near field', () => {
  it.each([
    [2.4, true],
    [2.6, false],
  ])('at %f diameters of the source is marked %s', (diameters, marked) => {
    const D = Math.sqrt(4 / Math.PI);
    const result = run(
      spreadCase([
        spreadEntry('a', [0, 0], { peak_kW: 20_000, heat_MJ: 20_000 }),
        spreadEntry('b', [diameters * D + 0.5, 0]),
      ]),
    );
    expect(result.events[1]).toMatchObject({ id: 'b', cause: 'radiation', from: 'a', nearField: marked });
  });
});
