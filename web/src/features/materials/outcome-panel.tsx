import { useMemo } from 'react';
import { ChartFigure } from '../../components/chart/chart-figure.tsx';
import { Part } from '../../components/part.tsx';
import { WarningList } from '../../components/working/warning-list.tsx';
import { useUnits } from '../../lib/units-context.ts';
import { BasisNotice } from './basis-notice.tsx';
import { curveChartOf } from './curve-chart-of.ts';
import { ACCEPTED } from './form/extras.ts';
import type { MaterialForm } from './form/use-material-form.ts';
import { HeatFigures } from './heat-figures.tsx';
import { WorkingList } from './working-list.tsx';

const MOST = 4;

/** What the typed figures come to, beside the form: the heat, its range, what the check of its basis says. */
export function OutcomePanel({ material }: { readonly material: MaterialForm }) {
  const { outcome, form } = material;
  const units = useUnits();
  const curve = outcome.kind === 'derived' ? outcome.derived.curve : null;
  const label = form.values['label']?.trim() ?? '';
  const chart = useMemo(
    () => (curve === null ? null : curveChartOf(curve, label === '' ? 'this material' : label, units)),
    [curve, label, units],
  );
  if (outcome.kind !== 'derived') {
    const { messages } = outcome;
    return (
      <Part title="What it comes to">
        <div className="grid gap-3 pt-4">
          <p className="max-w-[60ch] text-soft">
            {outcome.kind === 'unfinished'
              ? 'The heat stands here as soon as enough is filled in. Still to do:'
              : 'No heat follows from this yet:'}
          </p>
          <ul className="grid list-disc gap-1 pl-5">
            {messages.slice(0, MOST).map((message) => (
              <li key={message}>{message}</li>
            ))}
          </ul>
          {messages.length > MOST ? <p className="text-soft">and {messages.length - MOST} more</p> : null}
          {form.values[ACCEPTED] ? (
            <p>
              <button
                type="button"
                className="button"
                data-size="small"
                onClick={() => {
                  form.fill({ [ACCEPTED]: '' });
                }}
              >
                Take the correction back
              </button>
            </p>
          ) : null}
        </div>
      </Part>
    );
  }
  const { derived } = outcome;
  const { basis } = derived;
  return (
    <>
      <Part title="What it comes to">
        <div className="grid gap-4 pt-4">
          <div>
            <HeatFigures derived={derived} />
          </div>
          {basis === null ? null : (
            <BasisNotice
              basis={basis}
              onTake={() => {
                const { proposal, finding } = basis;
                if (proposal !== null) {
                  form.fill({ [ACCEPTED]: JSON.stringify({ finding, factor: proposal.factor }) });
                }
              }}
              onPutBack={() => {
                form.fill({ [ACCEPTED]: '' });
              }}
            />
          )}
          <WarningList warnings={derived.warnings.filter(({ text }) => text !== derived.basis?.text)} />
        </div>
      </Part>
      {chart === null ? null : (
        <Part title="How it burnt when it was measured">
          <div className="pt-4">
            <ChartFigure chart={chart} />
          </div>
        </Part>
      )}
      <Part title="How it was worked out">
        <WorkingList workings={derived.workings} />
      </Part>
    </>
  );
}
