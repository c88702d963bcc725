import { applyChanges } from '@embertally/shared/survey/apply-changes';
import type { Changes } from '@embertally/shared/survey/change';
import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { addOpening } from '@embertally/shared/survey/commands/add-opening';
import { drawRoom } from '@embertally/shared/survey/commands/draw-room';
import type { Entry, SurveyDocument } from '@embertally/shared/survey/survey-document';
import { box, crate, done, door, drawing, wallBetween } from './survey-builder.ts';

/** 16 mm of gypsum plaster. */
const PLASTER = {
  layers: [
    { label: 'Plaster', thickness_m: 0.016, conductivity_W_mK: 0.48, density_kg_m3: 1440, specific_heat_J_kgK: 840 },
  ],
};
/** Share of the heat that counts in a closed cabinet. */
const CABINET = 0.85;
/** Combustion factor of what is not said to be anything else. */
const COMBUSTION = 0.8;

interface Piece extends Pick<Entry, 'x_m' | 'y_m' | 'width_m' | 'depth_m' | 'peak_kW' | 'growth'> {
  readonly heat_MJ: number;
  readonly lights?: Entry['ignition_class'];
  readonly kept?: Partial<Entry>;
}

const PIECES: Readonly<Record<string, Piece>> = {
  Sofa: { x_m: 0.6, y_m: 0.6, width_m: 0.9, depth_m: 0.9, heat_MJ: 300, peak_kW: 1500, growth: 'fast' },
  Bed: { x_m: 2.6, y_m: 0.6, width_m: 2, depth_m: 0.9, heat_MJ: 800, peak_kW: 2500, growth: 'fast' },
  Boards: {
    x_m: 4.7,
    y_m: 3,
    width_m: 0.4,
    depth_m: 1.8,
    heat_MJ: 1500,
    peak_kW: 1200,
    growth: 'medium',
    lights: 'hard',
  },
  Drum: {
    ...{ x_m: 0.5, y_m: 3.6, width_m: 0.8, depth_m: 0.6, heat_MJ: 900, peak_kW: 800, growth: 'medium' },
    kept: { enclosure: 'sealed', sealed_rating_min: 60 },
  },
  Cupboard: {
    ...{ x_m: 2, y_m: 3.7, width_m: 1, depth_m: 0.5, heat_MJ: 600 / CABINET, peak_kW: 900, growth: 'medium' },
    kept: { enclosure: 'cabinet' },
  },
};

/**
 * A room of 5 × 4 × 2.7 m with an open door in plaster, and five things in it. Worked out outside this project with
 * ordinary differential equations (case S6 in tests/reference/rows/spread-rows.ts): the worst first is the sofa; it
 * lights the bed after 140.57 s; at 183.10 s the room flashes over, which lights boards and cupboard; the rated sealed
 * drum never burns; in all 3200 MJ come out.
 */
export function chainRoom(document: SurveyDocument, storeyId: string): Changes {
  const changes: Changes[number][] = [];
  let now = document;
  const run = (next: Changes): void => {
    changes.push(...next);
    now = applyChanges(now, next);
  };
  const room = { height_m: 2.7, lining: { walls: PLASTER, ceiling: PLASTER, floor: PLASTER } };
  run(done(now, drawRoom, { ...drawing('Den', box(0, 0, 5, 4), { room }), storey_id: storeyId }).changes);
  const way = door(wallBetween(now, [0, 0], [5, 0]), 2, {
    storey_id: storeyId,
    width_m: 0.9,
    height_m: 2,
    state: 'open',
  });
  run(done(now, addOpening, { opening: way }).changes);
  const entries = Object.entries(PIECES).map(([name, { heat_MJ, lights = 'normal', kept, ...piece }]) => {
    const { x_m, y_m, ...rest } = piece;
    const plain = crate(name, 'Den', x_m, y_m, { ...rest, radiative_fraction: 0.35, ignition_class: lights, ...kept });
    const parts = plain.parts.map((part) => ({
      ...part,
      net_heat_MJ_kg: 20,
      low_MJ_kg: 19,
      high_MJ_kg: 21,
      mass_kg: heat_MJ / COMBUSTION / 20,
    }));
    return { ...plain, parts };
  });
  run(done(now, addEntries, { entries }).changes);
  return changes;
}
