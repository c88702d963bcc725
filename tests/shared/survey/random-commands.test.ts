import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Ring } from '@embertally/shared/geometry/point';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import { checkInvariants } from '@embertally/shared/survey/check-invariants';
import { invertChanges } from '@embertally/shared/survey/invert-changes';
import { mergeChangeSet } from '@embertally/shared/survey/merge-change-set';
import { parseChanges } from '@embertally/shared/survey/parse-changes';
import { fromStored, toStored } from '@embertally/shared/survey/stored';
import { undoChanges } from '@embertally/shared/survey/undo-changes';
import { surveyDocument } from '@embertally/shared/survey/versions/v2';
import { groundFloor } from '../../support/survey-builder.ts';
import { stepsToEdge, windsRound } from '../geometry/winding.ts';
import { runSteps, step } from './random-commands.ts';

const RUNS = { numRuns: 200, seed: 20260101 };
const steps = fc.array(step, { minLength: 30, maxLength: 30 });

test('after every command of a random sequence the rules hold, and the changes fit the schemas', () => {
  const seen = new Map<string, number>();
  let changed = 0;
  fc.assert(
    fc.property(steps, (sequence) => {
      const { refusals } = runSteps(groundFloor(), sequence, 's', (document, changes) => {
        changed += 1;
        expect(checkInvariants(document)).toEqual([]);
        expect(parseChanges(changes)).toMatchObject({ ok: true });
      });
      for (const { code, message } of refusals) {
        seen.set(code, (seen.get(code) ?? 0) + 1);
        expect(message).toMatch(/^[A-Z“].*\.$/u);
        expect(message).not.toMatch(/NaN|undefined|Infinity/);
      }
    }),
    RUNS,
  );
  // The sequences would prove little if most steps were refused or the hard cases never came up.
  expect(changed).toBeGreaterThan(200 * 6);
  for (const code of [
    'ROOM_OVERLAPS',
    'CORNER_IN_OPENING',
    'OPENING_TOO_WIDE',
    'ENTRY_OUTSIDE_ROOM',
    'ROOM_TOO_NARROW',
  ]) {
    expect(seen.get(code) ?? 0, code).toBeGreaterThan(0);
  }
}, 120_000);

test('no floor is counted twice: a place lies in one room at most, told by winding numbers', () => {
  let insideOne = 0;
  fc.assert(
    fc.property(steps, (sequence) => {
      const { document } = runSteps(groundFloor(), sequence, 's');
      const places = (loop: readonly string[]): Ring =>
        loop.map((id) => document.corners.get(id) ?? { x_m: 0, y_m: 0 });
      for (const storeyId of document.storeys.keys()) {
        const rooms = [...document.rooms.values()]
          .filter((room) => room.storey_id === storeyId)
          .map((room) => ({ ring: places(room.ring), holes: room.holes.map(places) }));
        for (let x_m = -1.97; x_m < 6; x_m += 0.31) {
          for (let y_m = -1.93; y_m < 6; y_m += 0.37) {
            const point = { x_m, y_m };
            const here = rooms.filter(
              ({ ring, holes }) => windsRound(point, ring) && !holes.some((hole) => windsRound(point, hole)),
            );
            const onWall = here.length > 1 && rooms.some(({ ring }) => stepsToEdge(point, ring) < 0.02);
            if (!onWall) expect(here.length).toBeLessThanOrEqual(1);
            insideOne += here.length;
          }
        }
      }
    }),
    { ...RUNS, numRuns: 60 },
  );
  expect(insideOne).toBeGreaterThan(1000);
}, 120_000);

test('inverting every change set, last first, returns to the start', () => {
  fc.assert(
    fc.property(steps, (sequence) => {
      const start = groundFloor();
      const { document, done } = runSteps(start, sequence, 's');
      const back = done.reduceRight((now, changes) => applyChanges(now, invertChanges(changes)), document);
      expect(back).toEqual(start);
    }),
    RUNS,
  );
}, 120_000);

test('undoing step by step returns to the start, nothing skipped, the rules holding at every stop', () => {
  fc.assert(
    fc.property(steps, (sequence) => {
      const start = groundFloor();
      const { document, done } = runSteps(start, sequence, 's');
      const back = done.reduceRight((now, changes) => {
        const undone = undoChanges(now, changes);
        if (undone.refused) throw new Error(undone.message);
        expect(undone.skipped).toEqual([]);
        const next = applyChanges(now, undone.changes);
        expect(checkInvariants(next)).toEqual([]);
        return next;
      }, document);
      expect(back).toEqual(start);
    }),
    { ...RUNS, numRuns: 200 },
  );
}, 120_000);

test('merging one’s own change set gives what was done; merging it again does nothing', () => {
  fc.assert(
    fc.property(steps, (sequence) => {
      let before = groundFloor();
      runSteps(before, sequence, 's', (after, changes) => {
        const merged = mergeChangeSet(before, changes);
        if (!merged.ok) throw new Error(JSON.stringify(merged.clashes));
        expect(merged.document).toEqual(after);
        const again = mergeChangeSet(after, changes);
        expect(again).toMatchObject({ ok: true, changes: [] });
        before = after;
      });
    }),
    { ...RUNS, numRuns: 200 },
  );
}, 120_000);

test('two people’s edits of one state merge to the same document whichever arrives first, or clash either way', () => {
  let merged = 0;
  let clashed = 0;
  fc.assert(
    fc.property(steps, step, step, (sequence, mine, theirs) => {
      const { document: base } = runSteps(groundFloor(), sequence.slice(0, 12), 's');
      const [a] = runSteps(base, [mine], 'm').done;
      const [b] = runSteps(base, [theirs], 't').done;
      if (a === undefined || b === undefined) return;
      const bAfterA = mergeChangeSet(applyChanges(base, a), b);
      const aAfterB = mergeChangeSet(applyChanges(base, b), a);
      // A room drawn onto a corner needs that corner: when the room it came from was deleted first, it is gone; the other
      // way round the corner stays for the new room.
      const goneCorner = [bAfterA, aAfterB].some(
        (one) => !one.ok && one.clashes.every(({ reason, kind }) => reason === 'gone' && kind === 'corner'),
      );
      if (!goneCorner) expect(bAfterA.ok).toBe(aAfterB.ok);
      if (bAfterA.ok && aAfterB.ok) {
        merged += 1;
        expect(bAfterA.document).toEqual(aAfterB.document);
        expect(checkInvariants(bAfterA.document)).toEqual([]);
      } else clashed += 1;
    }),
    { ...RUNS, numRuns: 1200 },
  );
  expect(merged).toBeGreaterThan(50);
  expect(clashed).toBeGreaterThan(10);
}, 120_000);

test('a document survives being stored and read back', () => {
  fc.assert(
    fc.property(steps, (sequence) => {
      const { document } = runSteps(groundFloor(), sequence, 's');
      const stored: unknown = JSON.parse(JSON.stringify(toStored(document)));
      expect(fromStored(surveyDocument.parse(stored))).toEqual(document);
    }),
    { ...RUNS, numRuns: 50 },
  );
}, 120_000);
