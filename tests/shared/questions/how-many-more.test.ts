import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { kindByKey } from '@embertally/shared/catalogue/kinds';
import { furtherOfKind, furtherOfMaterial } from '@embertally/shared/questions/further-entry';
import { howManyMore } from '@embertally/shared/questions/how-many-more';
import { materialByKey } from '@embertally/shared/catalogue/materials';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { SCENERY_DOCK } from '../tally/scenery-dock.ts';
import { expectFinite } from '../tally/expect-finite.ts';

const piece = { id: 'further', label: 'Crate', count: 1, parts: [{ mass_kg: 20, net_heat_MJ_kg: 17.5 }] };
const floor = (bound: number) => ({ quantity: 'load_per_floor_MJ_m2', bound }) as const;
const EMPTY: RoomInput = { ...SCENERY_DOCK, contents: [] };
const NO_OPENING: RoomInput = { ...SCENERY_DOCK, room: { ...SCENERY_DOCK.room, openings: [] } };

describe('how many more fit', () => {
  it('is the closed form of the load for any bound and any piece', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20, max: 900, noNaN: true }),
        fc.double({ min: 1, max: 400, noNaN: true }),
        (bound, kg) => {
          const further = { ...piece, parts: [{ mass_kg: kg, net_heat_MJ_kg: 17.5 }] };
          const { estimate } = howManyMore(EMPTY, { further, by: 'pieces', limit: floor(bound), keep: 'not over' });
          const exact = (bound * 96) / (kg * 17.5);
          expect(Math.abs((estimate.value ?? -1) - Math.floor(exact))).toBeLessThanOrEqual(
            Math.abs(exact - Math.round(exact)) < 1e-6 ? 1 : 0,
          );
        },
      ),
      { numRuns: 15 },
    );
  });

  it('shows both sides of the bound and a working', () => {
    const { estimate, before, after } = howManyMore(SCENERY_DOCK, {
      further: piece,
      by: 'pieces',
      limit: floor(200),
      keep: 'not over',
    });
    expect(before.value).toBeLessThanOrEqual(200);
    expect(after.value).toBeGreaterThan(200);
    expect(estimate.method).toBe('question.how-many@1');
    expect(estimate.steps?.length).toBeGreaterThan(2);
    expect(estimate.inputs?.map(({ quantity }) => quantity)).toContain('Mass of one');
    expectFinite(estimate);
  });

  it('says so when the bound is passed already, and when it is 90 % of it that is', () => {
    const over = howManyMore(SCENERY_DOCK, { further: piece, by: 'pieces', limit: floor(100), keep: 'not over' });
    expect(over.estimate).toMatchObject({
      value: null,
      never: expect.stringMatching(/is over 100 MJ\/m2 already/) as string,
    });
    const near = howManyMore(SCENERY_DOCK, { further: piece, by: 'pieces', limit: floor(145), keep: 'within' });
    expect(near.estimate.never).toMatch(/at 90 % of 145 MJ\/m2 or above already/);
  });

  it('answers nought when the next piece would be one too many', () => {
    const { estimate } = howManyMore(SCENERY_DOCK, {
      further: piece,
      by: 'pieces',
      limit: floor(140),
      keep: 'not over',
    });
    expect(estimate.value).toBe(0);
  });

  it('says so when no amount brings the room to its bound', () => {
    const steel = { ...piece, parts: [{ mass_kg: 20, net_heat_MJ_kg: 0 }] };
    const { estimate } = howManyMore(SCENERY_DOCK, {
      further: steel,
      by: 'pieces',
      limit: floor(900),
      keep: 'not over',
    });
    expect(estimate.value).toBeNull();
    expect(estimate.never).toMatch(/none of them brings the room/);
  });

  it('says so when what is bounded cannot be computed', () => {
    const { estimate } = howManyMore(NO_OPENING, {
      further: piece,
      by: 'pieces',
      limit: { quantity: 'equivalent_time_min', bound: 60 },
      keep: 'not over',
    });
    expect(estimate.never).toMatch(/cannot be computed/);
  });

  it('adds up the peaks of the pieces', () => {
    const { estimate } = howManyMore(
      { ...SCENERY_DOCK, options: { ...SCENERY_DOCK.options, fire_area_m2: null } },
      {
        further: {
          ...piece,
          peak_kW: 500,
          width_m: 0.1,
          depth_m: 0.1,
          parts: [{ mass_kg: 200, net_heat_MJ_kg: 17.5 }],
        },
        by: 'pieces',
        limit: { quantity: 'peak_kW', bound: 4600 },
        keep: 'not over',
      },
    );
    // 2500 kW stand there: four more at 500 kW make 4500 kW.
    expect(estimate.value).toBe(4);
  });

  it('takes kinds and materials of the catalogue', () => {
    const kind = kindByKey('pallet-stack');
    const material = materialByKey('timber');
    if (!kind || !material) throw new Error('The catalogue has both.');
    const pieces = howManyMore(SCENERY_DOCK, {
      further: furtherOfKind(kind),
      by: 'pieces',
      limit: floor(900),
      keep: 'not over',
    });
    expect(pieces.estimate.value).toBeGreaterThan(0);
    const mass = howManyMore(SCENERY_DOCK, {
      further: furtherOfMaterial(material),
      by: 'mass',
      limit: floor(900),
      keep: 'not over',
    });
    expect(mass.estimate.value).toBeCloseTo((900 * 96 - 13_400) / material.net_heat_MJ_kg, 1);
    expect(mass.estimate.unit).toBe('kg');
  });
});
