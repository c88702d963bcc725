import { footprint } from '@embertally/shared/geometry/footprint';
import type { Point } from '@embertally/shared/geometry/point';
import { signedArea } from '@embertally/shared/geometry/signed-area';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { handlesOf } from '../interaction/handles.ts';
import { sceneOf } from '../interaction/scene.ts';
import type { Selected } from '../session/book-state.ts';
import { paintLength } from './paint-text.ts';
import { at, CASING_PX, FIGURES, traceLine, traceRing, type Pen } from './pen.ts';

export interface SelectionLook {
  readonly document: SurveyDocument;
  readonly storeyId: string;
  readonly selection: readonly Selected[];
  /** Length in the person's units. */
  readonly lengthText: (length_m: number) => string;
  readonly canEdit: boolean;
  /** The room whose tally is read: a line around it ties the two pages together. */
  readonly roomInHand: string | null;
}

const FONT = `13px ${FIGURES}`;
const LENGTH_AWAY_PX = 16;

/** What is picked, in indigo: outline, handles and lengths. */
export function paintSelection(pen: Pen, look: SelectionLook): void {
  const scene = sceneOf(look.document, look.storeyId);
  if (scene === null) return;
  const inHand = scene.rooms.find(({ room }) => room.id === look.roomInHand);
  if (inHand !== undefined)
    outline(
      pen,
      () => {
        traceRing(pen, inHand.ring);
      },
      1.5,
    );
  for (const picked of look.selection) {
    switch (picked.kind) {
      case 'room': {
        const shape = scene.rooms.find(({ room }) => room.id === picked.id);
        if (shape === undefined) break;
        outline(pen, () => {
          traceRing(pen, shape.ring);
          for (const hole of shape.holes) traceRing(pen, hole);
        });
        paintRingLengths(pen, shape.ring, look.lengthText);
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
        paintRingLengths(pen, ring.slice(0, 3), look.lengthText, 2);
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

/** Lengths stand outside the ring, whichever way round it runs. */
function paintRingLengths(
  pen: Pen,
  ring: readonly Point[],
  lengthText: SelectionLook['lengthText'],
  edges = ring.length,
): void {
  const anticlockwise = signedArea(ring) > 0;
  for (const [index, a] of ring.slice(0, edges).entries()) {
    const b = ring[(index + 1) % ring.length] ?? a;
    if (anticlockwise) lengthBeside(pen, b, a, lengthText);
    else lengthBeside(pen, a, b, lengthText);
  }
}

export function lengthBeside(pen: Pen, a: Point, b: Point, lengthText: SelectionLook['lengthText']): void {
  const length_m = Math.hypot(b.x_m - a.x_m, b.y_m - a.y_m);
  paintLength(pen, lengthText(length_m), at(pen, a), at(pen, b), FONT, pen.palette.indigo, LENGTH_AWAY_PX);
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
