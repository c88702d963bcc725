import type { Point, Ring } from './point.ts';
import { ringEdges } from './ring-edges.ts';
import { selfCrossing } from './self-crossing.ts';
import { signedArea } from './signed-area.ts';

/** One edge of the ring and the line its wall face runs on. */
interface Face {
  /** A place on the face. */
  readonly x_m: number;
  readonly y_m: number;
  /** Direction of the edge, length 1. */
  readonly ux: number;
  readonly uy: number;
  readonly length_m: number;
}

/** Directions closer to parallel than this (sine of the angle) are treated as parallel. */
const PARALLEL = 1e-6;
/** A face corner is cut square where the mitre would reach further than this many times the shift. */
const LONGEST_MITRE = 6;

/**
 * A ring with every edge moved to its own inner side by `shift_m` and mitred: the clear ring of a room whose walls run
 * on the centre lines. A negative shift moves the edges outwards, as for the ring of a pillar or courtyard.
 *
 * Edges shorter than their mitres allow (a recess narrower than the wall, a splayed corner) vanish, shortest-lived
 * first, and their neighbours meet. Keeps the direction the ring runs in.
 *
 * @param ring a ring that does not meet itself, either way round
 * @param shift_m −10 to 10 m; 0 gives the ring itself
 * @returns null where nothing is left or the walls close a passage and part the room: no clear ring exists
 */
export function insetRing(ring: Ring, shift_m: number): Ring | null {
  if (shift_m === 0) return ring;
  const area = signedArea(ring);
  if (area === 0) return null;
  // Left of the edge is inside when the ring runs counter-clockwise.
  const toLeft = area > 0 ? shift_m : -shift_m;
  let faces = ringEdges(ring).map(([a, b]) => faceOf(a, b, toLeft));
  for (;;) {
    faces = withoutFoldedFaces(withoutParallelRuns(faces));
    if (faces.length < 3) return null;
    const doomed = shortestLived(faces, toLeft);
    if (doomed === null) break;
    faces = faces.filter((_, index) => index !== doomed);
  }
  const inset = faces.flatMap((face, index) => meeting(faces.at(index - 1) as Face, face, toLeft));
  if (signedArea(inset) * area <= 0 || selfCrossing(inset) !== null) return null;
  return inset;
}

function faceOf(a: Point, b: Point, toLeft: number): Face {
  const length_m = Math.hypot(b.x_m - a.x_m, b.y_m - a.y_m);
  const ux = (b.x_m - a.x_m) / length_m;
  const uy = (b.y_m - a.y_m) / length_m;
  return { x_m: a.x_m - uy * toLeft, y_m: a.y_m + ux * toLeft, ux, uy, length_m };
}

function sine(a: Face, b: Face): number {
  return a.ux * b.uy - a.uy * b.ux;
}

function cosine(a: Face, b: Face): number {
  return a.ux * b.ux + a.uy * b.uy;
}

/** How far to the left of face `a` the face `b` runs, when both have the same direction. */
function gap(a: Face, b: Face): number {
  return (b.y_m - a.y_m) * a.ux - (b.x_m - a.x_m) * a.uy;
}

/** Edges that go on in the same line are one face. */
function withoutParallelRuns(faces: readonly Face[]): Face[] {
  const kept: Face[] = [];
  for (const face of faces) {
    const last = kept.at(-1);
    if (last !== undefined && isContinued(last, face)) kept[kept.length - 1] = joined(last, face);
    else kept.push(face);
  }
  const first = kept[0];
  const last = kept.at(-1);
  if (first !== undefined && last !== undefined && kept.length > 1 && isContinued(last, first)) {
    kept[0] = joined(last, first);
    kept.pop();
  }
  return kept;
}

function isContinued(a: Face, b: Face): boolean {
  return Math.abs(sine(a, b)) < PARALLEL && cosine(a, b) > 0 && Math.abs(gap(a, b)) < 1e-4;
}

function joined(a: Face, b: Face): Face {
  return { ...a, length_m: a.length_m + b.length_m };
}

/** Two neighbours that face one another after what lay between them vanished: the shorter one goes as well. */
function withoutFoldedFaces(faces: readonly Face[]): Face[] {
  const kept = [...faces];
  for (let index = 0; index < kept.length && kept.length >= 3;) {
    const face = kept[index] as Face;
    const nextIndex = (index + 1) % kept.length;
    const next = kept[nextIndex] as Face;
    if (Math.abs(sine(face, next)) < PARALLEL && cosine(face, next) < 0) {
      kept.splice(face.length_m <= next.length_m ? index : nextIndex, 1);
      index = 0;
    } else index += 1;
  }
  return kept;
}

/** The face that, as the walls thicken from nothing to the shift, is the first to shrink to nothing; null when none is. */
function shortestLived(faces: readonly Face[], toLeft: number): number | null {
  let doomed: number | null = null;
  let soonest = Infinity;
  faces.forEach((face, index) => {
    const from = crossing(faces.at(index - 1) as Face, face);
    const to = crossing(face, faces[(index + 1) % faces.length] as Face);
    if (from === null || to === null) return;
    const length = (to.x_m - from.x_m) * face.ux + (to.y_m - from.y_m) * face.uy;
    if (length > 0) return;
    // The length falls in proportion to the shift; where it passes 0 tells how long the face lives.
    const before = lengthWithoutWalls(
      faces.at(index - 1) as Face,
      face,
      faces[(index + 1) % faces.length] as Face,
      toLeft,
    );
    const life = before <= 0 ? before : before / (before - length);
    if (life < soonest) {
      soonest = life;
      doomed = index;
    }
  });
  return doomed;
}

function lengthWithoutWalls(previous: Face, face: Face, next: Face, toLeft: number): number {
  const from = crossing(movedBack(previous, toLeft), movedBack(face, toLeft));
  const to = crossing(movedBack(face, toLeft), movedBack(next, toLeft));
  if (from === null || to === null) return face.length_m;
  return (to.x_m - from.x_m) * face.ux + (to.y_m - from.y_m) * face.uy;
}

function movedBack(face: Face, toLeft: number): Face {
  return { ...face, x_m: face.x_m + face.uy * toLeft, y_m: face.y_m - face.ux * toLeft };
}

/** Where two face lines cross; the start of the second when they run on parallel. */
function crossing(a: Face, b: Face): Point | null {
  const across = sine(a, b);
  if (Math.abs(across) < PARALLEL) return cosine(a, b) > 0 ? { x_m: b.x_m, y_m: b.y_m } : null;
  const along = ((b.x_m - a.x_m) * b.uy - (b.y_m - a.y_m) * b.ux) / across;
  return { x_m: a.x_m + along * a.ux, y_m: a.y_m + along * a.uy };
}

/** The corner between two faces: one mitred place, or two where a knife-thin wall end would reach far into the room. */
function meeting(a: Face, b: Face, toLeft: number): Point[] {
  const mitre = crossing(a, b);
  if (mitre === null) return [];
  const centre = crossing(movedBack(a, toLeft), movedBack(b, toLeft));
  if (centre === null) return [mitre];
  const bendsAway = sine(a, b) * toLeft < 0;
  const reach = Math.hypot(mitre.x_m - centre.x_m, mitre.y_m - centre.y_m);
  if (!bendsAway || reach <= LONGEST_MITRE * Math.abs(toLeft)) return [mitre];
  return [
    { x_m: centre.x_m - a.uy * toLeft, y_m: centre.y_m + a.ux * toLeft },
    { x_m: centre.x_m - b.uy * toLeft, y_m: centre.y_m + b.ux * toLeft },
  ];
}
