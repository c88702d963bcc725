import { describe, expect, it } from 'vitest';
import { makeReport } from '../../../api/src/reports/make-report.ts';
import { pageTexts } from '../../support/poppler.ts';
import { uid } from '../../support/survey-builder.ts';
import { sampleDocument, sampleInput } from './sample-report.ts';

async function tallyOf(room: string): Promise<string> {
  const input = sampleInput(sampleDocument(), { kind: 'room-tally', room_id: uid(room) });
  return pageTexts(await makeReport(input))
    .join(' ')
    .replaceAll(/\s+/gu, ' ');
}

describe('a room that burns out, on paper', () => {
  it('says what it would be before the window breaks', async () => {
    const text = await tallyOf('Workshop');
    // O = 0.015 m^½ with only the door open: the parametric curve begins at 0.02, so it has no row.
    expect(text).toMatch(/Equivalent time, before any glass breaks [\d.]+ min \S* [\d.]+ min/);
    expect(text).not.toContain('Highest gas temperature, before any glass breaks');
  });

  it('shows the hydrocarbon curve where liquids and plastics burn', async () => {
    // EN 1991-1-2 3.2.3 after the rated hour: 1080 (1 − 0.325 exp(−10.02) − 0.675 exp(−150)) + 20 = 1100 °C
    expect(await tallyOf('Paint shop')).toMatch(/By the hydrocarbon curve: 1 100 °C \S+ after 60\.0 min/);
  });

  it('says neither where neither applies', async () => {
    const text = await tallyOf('Archive');
    expect(text).not.toContain('before any glass');
    expect(text).not.toContain('By the hydrocarbon curve');
  });
});
