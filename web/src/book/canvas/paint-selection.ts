import { footprint } from '@embertally/shared/geometry/footprint';
import type { Point } from '@embertally/shared/geometry/point';
import { insetRing } from '@embertally/shared/geometry/inset-ring';
import { signedArea } from '@embertally/shared/geometry/signed-area';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { handlesOf } from '../interaction/handles.ts';
import { sceneOf } from '../interaction/scene.ts';
import type { Selected } from '../session/book-state.ts';
import { wallWidth_px } from './paint-walls.ts';
import { lengthPlace, paintText, type LengthPlace } from './paint-text.ts';
import type { RoomPlate } from './room-plates.ts';
import { at, CASING_PX, SANS, traceLine, traceRing, type Pen } from './pen.ts';

export interface SelectionLook {
  readonly document: SurveyDocument;
  readonly storeyId: string;
  readonly selection: readonly Selected[];
  /** Length in the person's units. */
  readonly lengthText: (length_m: number) => string;
  readonly canEdit: boolean;
  /** The room whose tally is read: a line around it ties the two pages together. */
  readonly roomInHand: string | null;
  /** Lengths stand clear of them. */
  readonly plates: readonly RoomPlate[];
}

const FONT = `13px ${SANS}`;
const IN_HAND_PX = 2;
const LENGTH_AWAY_PX = 16;
const LENGTH_HEIGHT_PX = 16;

/** What is picked, in indigo: outline, handles and lengths. */
export function paintSelection(pen: Pen, look: SelectionLook): void {
  const scene = sceneOf(look.document, look.storeyId);
  if (scene === null) return;
  const inHand = scene.rooms.find(({ room }) => room.id === look.roomInHand);
  if (inHand !== undefined) {
    // Within the walls: they and their openings stay as they are drawn.
    const within_px = wallWidth_px(pen, scene.storey.wall_thickness_m) / 2 + IN_HAND_PX + CASING_PX;
    const within = insetRing(inHand.ring, within_px / pen.camera.pxPerM) ?? inHand.ring;
    outline(
      pen,
      () => {
        traceRing(pen, within);
      },
      IN_HAND_PX,
    );
  }
  for (const picked of look.selection) {
    switch (picked.kind) {
      case 'room': {
        const shape = scene.rooms.find(({ room }) => room.id === picked.id);
        if (shape === undefined) break;
        outline(pen, () => {
          traceRing(pen, shape.ring);
          for (const hole of shape.holes) traceRing(pen, hole);
        });
        for (const [a, b] of outsideEdges(shape.ring))
          clearLength(
            pen,
            [
              [a, b],
              [b, a],
            ],
            look,
          );
        if (look.canEdit) for (const corner of shape.ring) paintHandle(pen, corner, 'round');
        break;
      }
      case 'wall': {
        const wall = scene.walls.find(({ id }) => id === picked.id);
        if (wall === undefined) break;
        outline(pen, () => {
          traceLine(pen, wall.a, wall.b);
        });
        lengthBeside(pen, wall.a, wall.b, look.lengthText);
        if (look.canEdit) for (const corner of [wall.a, wall.b]) paintHandle(pen, corner, 'round');
        break;
      }
      case 'corner': {
        const corner = look.document.corners.get(picked.id);
        if (corner !== undefined) paintHandle(pen, corner, 'filled');
        break;
      }
      case 'opening': {
        const shape = scene.openings.find(({ opening }) => opening.id === picked.id);
        if (shape === undefined) break;
        outline(pen, () => {
          traceLine(pen, shape.a, shape.b);
        });
        lengthBeside(pen, shape.a, shape.b, look.lengthText);
        break;
      }
      case 'entry': {
        const entry = look.document.entries.get(picked.id);
        if (entry === undefined) break;
        const ring = footprint(entry);
        outline(pen, () => {
          traceRing(pen, ring);
        });
        if (look.selection.length > 1) break;
        const [first, second, third, fourth] = outsideEdges(ring);
        if (first === undefined || second === undefined || third === undefined || fourth === undefined) break;
        clearLength(pen, [first, third], look);
        clearLength(pen, [second, fourth], look);
        if (!look.canEdit) break;
        for (const handle of handlesOf(entry, pen.camera.pxPerM))
          paintHandle(pen, handle.at, handle.action === 'turn' ? 'knob' : 'square');
        break;
      }
    }
  }
}

function outline(pen: Pen, trace: () => void, width = 3): void {
  const { context, palette } = pen;
  context.lineJoin = 'round';
  context.beginPath();
  trace();
  context.strokeStyle = palette.page;
  context.lineWidth = width + 2 * CASING_PX;
  context.stroke();
  context.strokeStyle = palette.indigo;
  context.lineWidth = width;
  context.stroke();
}

type Edge = readonly [Point, Point];

/** The edges of a ring, each turned so that what stands on its left stands outside, whichever way round the ring runs. */
function outsideEdges(ring: readonly Point[]): readonly Edge[] {
  const anticlockwise = signedArea(ring) > 0;
  return ring.map((a, index) => {
    const b = ring[(index + 1) % ring.length] ?? a;
    return anticlockwise ? [b, a] : [a, b];
  });
}

/** A length at the first of its edges where it stands clear of every plate; at the first edge when none is clear. */
function clearLength(pen: Pen, edges: readonly Edge[], look: SelectionLook): void {
  const [first] = edges;
  if (first === undefined) return;
  const words = look.lengthText(lengthOf(first));
  pen.context.font = FONT;
  const width = pen.context.measureText(words).width;
  const places = edges.flatMap(([a, b]) => lengthPlace(at(pen, a), at(pen, b), LENGTH_AWAY_PX) ?? []);
  const place =
    places.find((candidate) => !look.plates.some((plate) => meets(pen, candidate, width, plate))) ?? places[0];
  if (place !== undefined) paintText(pen, words, place.at, FONT, pen.palette.indigo, place.angle);
}

/** Whether words of this width would touch a plate. */
function meets(pen: Pen, { at: middle, angle }: LengthPlace, width: number, plate: RoomPlate): boolean {
  const centre = at(pen, plate.centre);
  const across = Math.abs(Math.cos(angle)) * width + Math.abs(Math.sin(angle)) * LENGTH_HEIGHT_PX;
  const down = Math.abs(Math.sin(angle)) * width + Math.abs(Math.cos(angle)) * LENGTH_HEIGHT_PX;
  return (
    Math.abs(middle.x - centre.x) < (across + plate.width_px) / 2 &&
    Math.abs(middle.y - centre.y) < (down + plate.height_px) / 2
  );
}

function lengthOf([a, b]: Edge): number {
  return Math.hypot(b.x_m - a.x_m, b.y_m - a.y_m);
}

export function lengthBeside(pen: Pen, a: Point, b: Point, lengthText: SelectionLook['lengthText']): void {
  const place = lengthPlace(at(pen, a), at(pen, b), LENGTH_AWAY_PX);
  if (place !== null) paintText(pen, lengthText(lengthOf([a, b])), place.at, FONT, pen.palette.indigo, place.angle);
}

export function paintHandle(pen: Pen, point: Point, look: 'round' | 'square' | 'knob' | 'filled'): void {
  const { context, palette } = pen;
  const { x, y } = at(pen, point);
  context.beginPath();
  if (look === 'square') context.rect(x - 4.5, y - 4.5, 9, 9);
  else context.arc(x, y, look === 'knob' ? 5 : 6, 0, 2 * Math.PI);
  context.fillStyle = look === 'filled' ? palette.indigo : palette.page;
  context.fill();
  context.strokeStyle = palette.indigo;
  context.lineWidth = 2;
  context.stroke();
}
