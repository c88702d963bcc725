import { describe, expect, it } from 'vitest';
import { LAYER_ALONE } from '@embertally/shared/spread/gap-line';
import { FLASHOVER_ALONE, spreadGaps } from '@embertally/shared/spread/spread-gaps';
import { ignitionOf } from '@embertally/shared/spread/ignition-class';
import { HALL, spreadEntry } from '../../support/spread-samples.ts';

const LAYERS = [{ thickness_m: 0.02, conductivity_W_mK: 0.5, density_kg_m3: 1000, specific_heat_J_kgK: 900 }];
const ROOM = {
  ...HALL,
  factorBefore: 2,
  factorAfter: 2,
  liningArea_m2: 80,
  surfaces: [{ area_m2: 80, layers: LAYERS }],
};

describe('gaps', () => {
  it('are given for every ordered pair within 10 m, as the footprints stand', () => {
    const entries = [spreadEntry('c', [11.9, 0]), spreadEntry('a', [0, 0]), spreadEntry('b', [3, 0])];
    const gaps = spreadGaps({ room: HALL, entries, ignition: 'dose' });
    expect(gaps.map(({ from, to, gap_m }) => [from, to, Number(gap_m.toFixed(6))])).toEqual([
      ['a', 'b', 2],
      ['b', 'a', 2],
      ['b', 'c', 7.9],
      ['c', 'b', 7.9],
    ]);
  });

  it('leave out what is not on the plan, sealed, or shut in a cabinet that only flashover opens', () => {
    const entries = [
      spreadEntry('a', [0, 0]),
      { ...spreadEntry('b', [2, 0]), place: null },
      spreadEntry('c', [2, 0], { enclosure: 'sealed' }),
      spreadEntry('d', [2, 0], { enclosure: 'cabinet' }),
    ];
    expect(spreadGaps({ room: HALL, entries, ignition: 'dose' }).map(({ from, to }) => [from, to])).toEqual([
      ['d', 'a'],
    ]);
  });

  it('do not help where the hot layer alone lights the entry', () => {
    const strong = spreadEntry('a', [0, 0], { peak_kW: 2500, heat_MJ: 3000 });
    const [gap] = spreadGaps({ room: ROOM, entries: [strong, spreadEntry('b', [3, 0])], ignition: 'dose' });
    const never = { metres: null, never: LAYER_ALONE };
    expect(gap).toMatchObject({ justNot: never, enough: never, longExposureJustNot: never, longExposureEnough: never });
  });

  it('do not help where the first entry alone brings flashover', () => {
    const room = { ...HALL, flashover_kW: 1500 };
    const [gap] = spreadGaps({ room, entries: [spreadEntry('a', [0, 0]), spreadEntry('b', [3, 0])], ignition: 'dose' });
    expect(gap!.enough).toEqual({ metres: null, never: FLASHOVER_ALONE });
  });

  it('are 0 where not even contact lights the entry', () => {
    const weak = spreadEntry('a', [0, 0], { peak_kW: 20, heat_MJ: 10 });
    const [gap] = spreadGaps({ room: HALL, entries: [weak, spreadEntry('b', [3, 0])], ignition: 'dose' });
    expect(gap).toMatchObject({ justNot: { metres: 0 }, enough: { metres: 0 }, longExposureEnough: { metres: 0 } });
  });

  it('by the hot layer grow: part of the flux is there already', () => {
    const entries = [spreadEntry('a', [0, 0], { peak_kW: 700, heat_MJ: 1500 }), spreadEntry('b', [3, 0])];
    const [without] = spreadGaps({ room: HALL, entries, ignition: 'dose' });
    const [under] = spreadGaps({ room: ROOM, entries, ignition: 'dose' });
    expect(under!.enough.metres).toBeGreaterThan(without!.enough.metres! + 0.05);
  });

  it('of a turned pair are those of the pair: what counts is the way between the centres', () => {
    const at = (angle: number) => {
      const turn = (angle * Math.PI) / 180;
      const entries = [
        spreadEntry('a', [0, 0], { size: [3, 0.5], place: { rotation_deg: angle } }),
        spreadEntry('b', [2.5 * Math.cos(turn), 2.5 * Math.sin(turn)], { place: { rotation_deg: angle } }),
      ];
      return spreadGaps({ room: HALL, entries, ignition: 'dose' })[0]!.justNot.metres!;
    };
    expect(at(33)).toBeCloseTo(at(0), 2);
    expect(at(90)).toBeCloseTo(at(0), 2);
  });

  it('by the simple variant follow from the flux that has to be held', () => {
    const source = spreadEntry('a', [0, 0], {
      heat_MJ: 60,
      peak_kW: 1000,
      growth: { by: 'step' },
      radiativeFraction: 0.4,
    });
    const entries = [source, spreadEntry('b', [3, 0], { ignition: ignitionOf('normal') })];
    const [gap] = spreadGaps({ room: HALL, entries, ignition: 'held' });
    const R = Math.sqrt((0.4 * 1000) / (4 * Math.PI * 20));
    expect(gap!.justNot.metres).toBeCloseTo(R - 0.5, 2);
    expect(gap!.longExposureEnough.metres).toBeCloseTo(R * Math.SQRT2 - 0.5, 2);
  });

  it('of entries on the same centre are measured along the depth of the first', () => {
    const entries = [spreadEntry('a', [1, 1], { size: [2, 1] }), spreadEntry('b', [1, 1], { size: [0.5, 0.5] })];
    const [gap] = spreadGaps({ room: HALL, entries, ignition: 'dose' });
    expect(gap!.gap_m).toBe(0);
    expect(gap!.enough.metres).toBeGreaterThan(0.5);
  });
});
