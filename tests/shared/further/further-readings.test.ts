import { describe, expect, it } from 'vitest';
import { USUAL_FURTHER } from '@embertally/shared/further/further-asked';
import type { FurtherReading } from '@embertally/shared/further/further-reading';
import { furtherReadings } from '@embertally/shared/further/further-readings';
import { methodByRef } from '@embertally/shared/methods/registry';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomInput, RoomInputEntry } from '@embertally/shared/tally/room-input';
import { expectFinite } from '../tally/expect-finite.ts';
import { ODD_ROOMS } from '../tally/odd-rooms.ts';
import { SCENERY_DOCK } from '../tally/scenery-dock.ts';

const further = (input: RoomInput, asked = USUAL_FURTHER) =>
  furtherReadings(input, estimateRoom(input, { spread: false }), asked);

function reading(readings: readonly FurtherReading[], id: string): FurtherReading {
  const found = readings.find((one) => one.id.startsWith(id));
  if (!found) throw new Error(`There is no reading ${id}.`);
  return found;
}
function number(readings: readonly FurtherReading[], id: string, name: RegExp): number {
  const { numbers, why } = reading(readings, id);
  const found = numbers.find((one) => name.test(one.name))?.estimate.value;
  if (found == null) throw new Error(`${id} has no ${String(name)}: ${why ?? 'other numbers'}.`);
  return found;
}
const entry = (id: string, more: Partial<RoomInputEntry>): RoomInputEntry => ({
  id,
  label: id,
  count: 1,
  parts: [],
  ...more,
});

/** One of everything that does not behave like its megajoules. */
const STORE: RoomInput = {
  ...SCENERY_DOCK,
  contents: [
    ...SCENERY_DOCK.contents,
    entry('petrol', { parts: [{ material: 'petrol', mass_kg: 14.8 }] }),
    entry('cells', { parts: [{ material: 'lithium-ion-cell', mass_kg: 20 }] }),
    entry('bottle', { count: 2, parts: [{ material: 'propane', mass_kg: 11 }] }),
    entry('sawdust', { parts: [{ material: 'sawdust', mass_kg: 30 }] }),
  ],
};

describe('further readings of a room', () => {
  it('count the load in wood, by the grading and by other schemes', () => {
    const readings = further(SCENERY_DOCK);
    expect(number(readings, 'wood-equivalent', /Wood/)).toBeCloseTo(13_400 / 96 / 16.7, 6);
    expect(number(readings, 'grading-class', /low/)).toBe(60);
    // 139.583 MJ/m² × 1 × 1 × 0.60 water × 0.85 detection, 96 m² in the first step.
    expect(number(readings, 'scheme-it', /Specific/)).toBeCloseTo((13_400 / 96) * 0.6 * 0.85, 6);
    // m 0.8, δq1 1.10 + 0.40 (96 − 25)/225, water 0.61, detection and transmission 0.87 each.
    const size = 1.1 + (0.4 * 71) / 225;
    expect(number(readings, 'scheme-es', /Design/)).toBeCloseTo((13_400 / 96) * 0.8 * size * 0.61 * 0.87 * 0.87, 6);
  });

  it('read the nominal curves at the time that is said', () => {
    // ISO 834 after 30 and 60 min: 842 and 945 °C.
    expect(number(further(SCENERY_DOCK), 'nominal-curves', /Standard/)).toBeCloseTo(842, 0);
    expect(number(further(SCENERY_DOCK, { ...USUAL_FURTHER, minutes: 60 }), 'nominal-curves', /Standard/)).toBeCloseTo(
      945,
      0,
    );
  });

  it('put the older forms of the equivalent time side by side', () => {
    const readings = further(SCENERY_DOCK);
    const A_v = 4.8;
    const law = (96 * (13_400 / 96)) / (17 * Math.sqrt(A_v * (336 - 96 - A_v)));
    expect(number(readings, 'equivalent-time-older', /Law/)).toBeCloseTo(law, 6);
    const O = (A_v * Math.sqrt(2.4)) / 336;
    expect(number(readings, 'equivalent-time-older', /Pettersson/)).toBeCloseTo(
      (0.067 * (13_400 / 336)) / Math.sqrt(O),
      6,
    );
    expect(number(readings, 'equivalent-time-small-room', /Ventilation/)).toBeCloseTo(96 / (Math.sqrt(O) * 336), 6);
  });

  it('look at the strongest entry alone', () => {
    const readings = further(SCENERY_DOCK);
    const D = Math.sqrt((4 * 2.4 * 1.2) / Math.PI);
    expect(number(readings, 'flame-and-plume', /Flame/)).toBeCloseTo(0.235 * 2500 ** 0.4 - 1.02 * D, 6);
    // By the annex the flame is −1.02 D + 0.0148 Q^0.4 = 3.41 m: below the ceiling at 3.6 m.
    expect(number(readings, 'localised-fire', /Flame/)).toBeCloseTo(-1.02 * D + 0.0148 * 2.5e6 ** 0.4, 6);
    expect(reading(readings, 'localised-fire').numbers.map(({ name }) => name)).toContain('Gas under the ceiling');
    expect(number(readings, 'point-source', /Radiation/)).toBeCloseTo((0.35 * 2500) / (4 * Math.PI * 9), 6);
  });

  it('look next door through the largest opening that is not closed', () => {
    const readings = further(SCENERY_DOCK);
    // 2.0 × 2.4 m at 4 m: F 0.0867, 7.3 and 14.6 kW/m².
    expect(number(readings, 'radiation-opposite', /seen/)).toBeCloseTo(0.0867, 4);
    expect(number(readings, 'radiation-opposite', /reduced/)).toBeCloseTo(7.3, 1);
    expect(number(readings, 'radiation-opposite', /standard/)).toBeCloseTo(14.6, 1);
    const shut: RoomInput = {
      ...SCENERY_DOCK,
      room: { ...SCENERY_DOCK.room, openings: [{ width_m: 2, height_m: 2.4, kind: 'door' }] },
    };
    expect(reading(further(shut), 'radiation-opposite').why).toMatch(/No opening to the outside/);
  });

  it('see liquids, batteries, cylinders and dust in the contents', () => {
    const readings = further(STORE);
    // 14.8 kg of petrol at 740 kg/m³ are 20 L: 28 m² on a level floor.
    expect(number(readings, 'liquid-petrol', /Area/)).toBeCloseTo(28, 6);
    expect(number(readings, 'liquid-petrol', /thin spill/)).toBeLessThan(
      number(readings, 'liquid-petrol', /deep pool of/),
    );
    // 20 kg of cells at 0.15 kWh/kg: 3 kWh.
    expect(number(readings, 'battery', /Heat, low/)).toBeCloseTo(45, 6);
    // One bottle of 11 kg: 5.8 × 11^(1/3) m.
    expect(number(readings, 'cylinder', /Diameter/)).toBeCloseTo(12.9, 1);
    expect(number(readings, 'dust', /explosion/)).toBeCloseTo(0.004 * 96 * 3.6, 6);
    expect(further(SCENERY_DOCK).some(({ topic }) => topic === 'goods')).toBe(false);
  });

  it('say why a reading does not apply', () => {
    const bare: RoomInput = { ...SCENERY_DOCK, contents: [], room: { ...SCENERY_DOCK.room, openings: [], use: null } };
    const readings = further(bare);
    expect(reading(readings, 'kawagoe').why).toMatch(/No opening/);
    expect(reading(readings, 'flame-and-plume').why).toMatch(/give width and depth/);
    expect(reading(readings, 'travelling-fire').why).toMatch(/not large/);
    expect(reading(readings, 'fractiles').why).toMatch(/use of the room is not stated/);
    expect(reading(readings, 'layer-filling').why).toMatch(/no design curve/);
  });

  it('travel through a hall', () => {
    const hall: RoomInput = {
      ...SCENERY_DOCK,
      room: {
        ...SCENERY_DOCK.room,
        ring_m: [
          [0, 0],
          [50, 0],
          [50, 20],
          [0, 20],
        ],
        height_m: 8,
      },
    };
    const readings = further(hall);
    const burning = 13_400 / 250 / 60;
    expect(number(readings, 'travelling-fire', /One place/)).toBeCloseTo((burning * 1000) / 1000, 6);
    expect(number(readings, 'travelling-fire', /whole fire/)).toBeCloseTo(burning * 11, 6);
  });

  it('open the working of every number, with a source and an origin for every input', () => {
    for (const { numbers } of [...further(STORE), ...further(SCENERY_DOCK)]) {
      for (const { estimate, name } of numbers) {
        expect(estimate.equation, name).toBeTruthy();
        expect(estimate.sources?.length, name).toBeGreaterThan(0);
        expect(
          estimate.inputs?.every(({ origin }) => origin !== undefined),
          name,
        ).toBe(true);
        expect(methodByRef(estimate.method), estimate.method).toBeDefined();
      }
    }
  });

  it('never calls anything safe or required', () => {
    const words = JSON.stringify([further(STORE), further(SCENERY_DOCK)]);
    expect(words).not.toMatch(/\bsafe\b|\bsafety factor of 1\b|required supply is/i);
  });

  it.each(Object.entries(ODD_ROOMS))('holds no number that is none: %s', (_name, input) => {
    for (const asked of [USUAL_FURTHER, { opposite_m: 0.5, aside_m: 0.5, minutes: 360 }]) {
      const readings = further(input, asked);
      expectFinite(readings);
      for (const { id, numbers, why } of readings) expect(numbers.length > 0 || why !== undefined, id).toBe(true);
    }
  });
});
