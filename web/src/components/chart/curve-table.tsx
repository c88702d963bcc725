import type { CurveChart } from './curve-chart.ts';
import { curveRows } from './curve-rows.ts';

const figure = (value: number | null): string =>
  value === null ? '–' : value.toLocaleString('en-GB', { maximumSignificantDigits: 3 }).replaceAll(',', '\u202f');

/** The same numbers as the chart, as a table. */
export function CurveTable({ chart }: { readonly chart: CurveChart }) {
  const rows = curveRows(chart);
  const levels = [...chart.thresholds, ...(chart.moments ?? [])];
  return (
    <div className="max-h-72 overflow-auto" role="region" tabIndex={0} aria-label={`Table: ${chart.title}`}>
      <table className="w-full text-small">
        <caption className="unseen">{chart.title}</caption>
        <thead className="sticky top-0 bg-page">
          <tr className="border-b border-ink">
            <th scope="col" className="py-1 text-right font-normal text-soft">
              {chart.x.label} ({chart.x.unit})
            </th>
            {chart.series.map((series) => (
              <th key={series.id} scope="col" className="py-1 pl-4 text-right font-normal text-soft">
                {chart.series.length > 1 ? series.label : chart.y.label} ({chart.y.unit})
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.x} className="border-b border-rule">
              <th scope="row" className="figure py-0.5 text-right font-normal">
                {figure(row.x)}
              </th>
              {row.values.map((value, index) => (
                <td key={chart.series[index]?.id} className="figure py-0.5 pl-4 text-right">
                  {figure(value)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
        {levels.length > 0 && (
          <tfoot>
            {levels.map((level) => (
              <tr key={level.id}>
                <td className="py-0.5 text-soft" colSpan={chart.series.length + 1}>
                  {level.label}
                </td>
              </tr>
            ))}
          </tfoot>
        )}
      </table>
    </div>
  );
}
