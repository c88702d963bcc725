import { applyChanges } from '@embertally/shared/survey/apply-changes';
import { beforeAll, describe, expect, it } from 'vitest';
import { makeReport } from '../../../api/src/reports/make-report.ts';
import { chainRoom } from '../../support/chain-room.ts';
import { pageTexts } from '../../support/poppler.ts';
import { GROUND, groundFloor } from '../../support/survey-builder.ts';
import { sampleInput } from './sample-report.ts';

/** The room of tests/support/chain-room.ts: bed after 140.57 s, flashover after 183.10 s, found by another solver. */
describe('the order of ignition on paper', () => {
  let text = '';
  beforeAll(async () => {
    const empty = groundFloor();
    const document = applyChanges(empty, chainRoom(empty, GROUND));
    text = pageTexts(await makeReport(sampleInput(document, { limits: [] })))
      .join(' ')
      .replaceAll(/\s+/gu, ' ');
  });

  it('names what burns first and what it lights, when and by what', () => {
    expect(text).toMatch(/Sofa \(\d\) burns first: the worst of 4 tried out of 4/);
    expect(text).toMatch(/2 Bed \(\d\) radiation, most of it from Sofa \(\d\) 2 min 21 s/);
    expect(text).toMatch(/Boards \(\d\) flashover of the room 3 min 3 s/);
    expect(text).toMatch(/Heat released in all 3 200 MJ/);
    expect(text).toMatch(/Heat left unburnt 0 MJ/);
  });

  it('lists the gaps that are too small and says why no gap would do', () => {
    expect(text).toMatch(/\d+ of \d+ pairs within 10 m stand nearer than what is enough/);
    // 2.6 − 0.6 − (0.9 + 2) / 2
    expect(text).toMatch(/Sofa \(\d\) Bed \(\d\) 0\.550 never/);
    expect(text).toMatch(/alone/);
  });

  it('says what the model leaves out, and what the air can feed', () => {
    expect(text).toContain('What this leaves out: One room; nothing passes to the next.');
    expect(text).toMatch(/Heat the air can feed, [\d.]+ MJ/);
  });

  it('derives flashover and peak in the workings', () => {
    expect(text).toContain('Flashover by the order of ignition');
    expect(text).toContain('Peak heat release by the order of ignition');
  });
});
