import { describe, expect, it } from 'vitest';
import { PdfFile } from '../../../../api/src/reports/pdf/pdf-file.ts';
import { fillBand } from '../../../../api/src/reports/plan/fill-band.ts';
import { pageImages } from '../../../support/poppler.ts';

const BANDS = [0, 1, 2, 3, 4, 5];

describe('fillBand', () => {
  it('makes each band darker than the one before and hatches it more densely', async () => {
    const file = await PdfFile.create('');
    const hatchLines = BANDS.map((band) => {
      const sheet = file.addSheet(200, 200);
      const ring = [
        [0, 0],
        [200, 0],
        [200, 200],
        [0, 200],
      ] as const;
      fillBand(sheet, [ring], band);
      return sheet.content.split('\n').filter((line) => line.includes(' S Q')).length;
    });
    const pdf = await file.finish({ title: '', author: '', subject: '', made: new Date(0) });
    const means = pageImages(pdf, 72).map(({ grey }) => grey.reduce((sum, value) => sum + value, 0) / grey.length);
    for (const band of BANDS.slice(1)) {
      expect(means[band]).toBeLessThan(means[band - 1] ?? 0);
      expect(hatchLines[band]).toBeGreaterThan(hatchLines[band - 1] ?? 0);
    }
    expect(hatchLines[0]).toBe(0);
  });
});
