import { describe, expect, it } from 'vitest';
import { buildReportBook } from '../../../api/src/reports/build-report-book.ts';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../support/survey-builder.ts';
import { sampleInput } from './sample-report.ts';

function row(rooms: number) {
  let document = groundFloor({ wall_thickness_m: 0.2 });
  for (let at = 0; at < rooms; at++) {
    document = withRoom(document, `Cell ${at}`, box(at * 4, 0, 4, 4));
    document = withEntries(document, crate(`Crate ${at}`, `Cell ${at}`, at * 4 + 2, 2));
  }
  return document;
}

const samplesOf = (rooms: number, more: Parameters<typeof sampleInput>[1] = {}) =>
  buildReportBook(sampleInput(row(rooms), { limits: [], ...more })).rooms.map(
    ({ tally }) => tally.uncertainty?.samples,
  );

describe('a report', () => {
  it('samples as the screen does, up to twenty rooms', () => {
    expect(new Set(samplesOf(20))).toEqual(new Set([20_000]));
  });

  it('samples less for more rooms, but not for one of them alone', () => {
    expect(new Set(samplesOf(21))).toEqual(new Set([5_000]));
    expect(samplesOf(21, { kind: 'room-tally', room_id: uid('Cell 3') })).toEqual([20_000]);
  });
});
