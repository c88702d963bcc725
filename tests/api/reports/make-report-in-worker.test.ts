import { describe, expect, it } from 'vitest';
import { RoomGoneError } from '../../../api/src/reports/build-report-book.ts';
import {
  makeReportInWorker,
  ReportFailedError,
  ReportStoppedError,
} from '../../../api/src/reports/make-report-in-worker.ts';
import { makeReport } from '../../../api/src/reports/make-report.ts';
import { uid } from '../../support/survey-builder.ts';
import { sampleInput } from './sample-report.ts';

describe('makeReportInWorker', () => {
  it('gives the bytes the report has without a thread, and tells how far it is', async () => {
    const seen: number[] = [];
    const bytes = await makeReportInWorker(sampleInput(), (fraction) => seen.push(fraction));
    expect(Buffer.compare(Buffer.from(bytes), Buffer.from(await makeReport(sampleInput())))).toBe(0);
    expect(seen[0]).toBe(0);
    expect(seen.at(-1)).toBe(1);
  });

  it('stops on the way', async () => {
    const stop = new AbortController();
    const seen: number[] = [];
    const report = makeReportInWorker(
      sampleInput(),
      (fraction) => {
        seen.push(fraction);
        stop.abort();
      },
      stop.signal,
    );
    await expect(report).rejects.toThrow(ReportStoppedError);
    expect(seen).toEqual([0]);
  });

  it('does not start when it was stopped before', async () => {
    await expect(makeReportInWorker(sampleInput(), () => {}, AbortSignal.abort())).rejects.toThrow(ReportStoppedError);
  });

  it('tells a room that is gone from a fault', async () => {
    const gone = sampleInput(undefined, { kind: 'room-tally', room_id: uid('nowhere') });
    await expect(makeReportInWorker(gone)).rejects.toThrow(RoomGoneError);
    const failing = makeReportInWorker(sampleInput(undefined, { time_zone: 'Nowhere/Else' }));
    await expect(failing).rejects.toThrow(ReportFailedError);
    await expect(failing).rejects.toThrow('The survey is unchanged.');
  });
});
