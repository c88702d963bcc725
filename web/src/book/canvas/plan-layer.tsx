import { isCovering } from '@embertally/shared/survey/derive/is-covering';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import type { Stage } from 'konva/lib/Stage';
import { useMemo, useState, useSyncExternalStore } from 'react';
import type { PlanHost } from '../interaction/plan-host.ts';
import { sceneOf } from '../interaction/scene.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { loadBand } from '@embertally/shared/tally/density-band';
import { EntryTiles } from './entry-tiles.ts';
import { paintOpenings } from './paint-openings.ts';
import { PLATE_FONTS, paintPlates } from './paint-plates.ts';
import { paintRooms } from './paint-rooms.ts';
import { paintWalls, wallWidth_px } from './paint-walls.ts';
import { Painting } from './painting.tsx';
import type { Palette } from './palette.ts';
import type { Pen } from './pen.ts';
import type { PlateAsked, PlateText, RoomPlates } from './room-plates.ts';
import { useSettled } from './use-settled.ts';
import { worstStanding } from './worst-standing.ts';

const NONE: ReadonlySet<string> = new Set();
const SHARP_AFTER_MS = 140;

interface PlanLayerProps {
  readonly stage: Stage;
  readonly host: PlanHost;
  readonly palette: Palette;
  readonly plates: RoomPlates;
}

/** Rooms, contents, walls, openings and plates of the storey in view. */
export function PlanLayer({ stage, host, palette, plates }: PlanLayerProps) {
  const session = useBookSession();
  const document = useBook((state) => state.document);
  const storeyId = useBook((state) => state.storeyId);
  const camera = useBook((state) => state.camera);
  const view = useBook((state) => state.view);
  const units = useBook((state) => state.units);
  useBook((state) => state.engineReady);
  useBook((state) => state.limits);
  const changes = useSyncExternalStore(host.preview.subscribe, () => host.preview.get().changes);
  const moving = useSyncExternalStore(host.preview.subscribe, () => host.preview.get().entries);
  const movingIds = moving?.map((entry) => entry.id).join(' ') ?? '';
  const hidden = useMemo(() => (movingIds === '' ? NONE : new Set(movingIds.split(' '))), [movingIds]);
  const shown = useMemo(
    () => (changes === undefined ? document : applyChanges(document, changes)),
    [document, changes],
  );
  const [tiles] = useState(() => new EntryTiles());
  const sharp = useSettled(camera.pxPerM, SHARP_AFTER_MS);
  const scene = storeyId === null ? null : sceneOf(shown, storeyId);

  const textOf = (roomId: string, name: string): PlateText => {
    const tally = session.tally(roomId);
    const density = tally?.load.perFloor?.value;
    if (tally === null || density == null) return { name, figure: null, standing: 'no limit set' };
    const { text, unit } = formatQuantity(density, 'MJ/m2', units);
    return { name, figure: `${text} ${unit}`, standing: worstStanding(tally) };
  };

  const paint = (pen: Pen) => {
    if (scene === null) return;
    const thickness = scene.storey.wall_thickness_m;
    paintRooms(pen, scene.rooms, (roomId) => {
      const density = session.tally(roomId)?.load.perFloor?.value;
      return density == null ? null : loadBand(density);
    });
    tiles.paint(pen, scene.entries, hidden, sharp);
    paintWalls(pen, scene.rooms, thickness);
    paintOpenings(pen, scene.openings, thickness);
    const measure: PlateAsked['measure'] = (words, of, size) => {
      pen.context.font = PLATE_FONTS[size][of];
      return pen.context.measureText(words).width;
    };
    const width = wallWidth_px(pen, thickness);
    const asked = scene.rooms.map((shape) => {
      const { id, name } = shape.room;
      const entries = entriesOfRoom(shown, id).filter((entry) => !isCovering(entry));
      const text = textOf(id, name);
      return { shape, entries, text, pxPerM: camera.pxPerM, wallWidth_px: width, settled: sharp, measure };
    });
    paintPlates(pen, plates.place(asked));
  };

  return <Painting stage={stage} camera={camera} view={view} palette={palette} paint={paint} />;
}
