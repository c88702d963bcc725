import { curveHeat } from '../methods/calorimetry/curve-heat.ts';
import { effectiveHeat } from '../methods/calorimetry/effective-heat.ts';
import type { DerivedCurve } from './derived-material.ts';
import { DraftRefused } from './draft-refused.ts';
import type { CurveDraft } from './drafts/curve-draft.ts';
import type { Workbook } from './workbook.ts';

/** Totals of a measured curve. @throws DraftRefused where times do not rise or nothing was released */
export function deriveCurve(book: Workbook, curve: CurveDraft): DerivedCurve {
  const { points } = curve;
  const backwards = points.findIndex(([t], i) => i > 0 && t <= points[i - 1]![0]);
  if (backwards > 0)
    throw DraftRefused.at(
      `/curve/points/${backwards}`,
      'not_rising',
      'Each time of the curve must be later than the one before it.',
    );
  const t = points.map(([time]) => time);
  const q = points.map(([, rate]) => rate);
  const heat = book.run(curveHeat, { t, q }, { at: '/curve/points' }, { origins: { t: 'measured', q: 'measured' } });
  if (!(heat > 0)) throw DraftRefused.at('/curve/points', 'no_heat', 'The curve holds no heat: every rate is 0.');
  const peak = Math.max(...q);
  return {
    per: curve.per,
    points,
    heat_MJ: heat,
    peak,
    peak_s: t[q.indexOf(peak)] ?? 0,
    effective_MJ_kg: effectiveOf(book, curve, heat),
  };
}

function effectiveOf(book: Workbook, { per, specimen_m2, burnt_kg }: CurveDraft, heat: number): number | null {
  if (burnt_kg === undefined || (per === 'm2' && specimen_m2 === undefined)) return null;
  return book.run(
    effectiveHeat,
    { Q: per === 'm2' ? heat * (specimen_m2 ?? 0) : heat, m_0: burnt_kg, m_1: 0 },
    { at: '/curve/burnt_kg' },
    { origins: { m_0: { origin: 'measured', note: 'mass that burnt' }, m_1: 'default' } },
  );
}
