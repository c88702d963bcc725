import type { RoomUncertainty } from '@embertally/shared/uncertainty/room-uncertainty';
import { USUAL_SAMPLING } from '@embertally/shared/uncertainty/usual-sampling';
import { useLayoutEffect, useMemo, useRef, useState } from 'react';
import { BarFigure } from '../../../components/chart/bar-figure.tsx';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import type { Calculation } from '../../session/use-calculation.ts';
import { Figure } from '../figure.tsx';
import { fileSlug } from '../file-slug.ts';
import { TallySection } from '../tally-section.tsx';
import { BandTable } from './band-table.tsx';
import { shareChart } from './share-chart.ts';
import { ShareTable } from './share-table.tsx';

const SAMPLES = USUAL_SAMPLING.samples.toLocaleString('en-GB').replace(',', '\u202f');

interface HowSureProps {
  readonly sure: Calculation<'uncertainty'>;
  /** Of the room, for the names of saved files. */
  readonly name: string;
  readonly onPick?: ((entryId: string) => void) | undefined;
}

/** How sure the numbers are, what that comes from and what would make them surer. */
export function HowSure({ sure, name, onPick }: HowSureProps) {
  const { state, fraction, message, value, stop, again } = sure;
  const uncertainty = value?.uncertainty;
  const answer = useRef<HTMLDivElement>(null);
  const [height, setHeight] = useState(0);
  // While the samples are drawn again the page below keeps its place.
  useLayoutEffect(() => {
    if (uncertainty !== undefined && answer.current !== null) setHeight(answer.current.offsetHeight);
  }, [uncertainty]);
  const drawing = state === 'waiting' || state === 'running';
  return (
    <TallySection title="How sure">
      {drawing && (
        <div className="flex flex-wrap items-center gap-x-4 text-small text-soft">
          <p>
            Drawing {SAMPLES} samples… <span aria-hidden="true">{Math.floor(fraction * 100)} %</span>
          </p>
          <Button look="quiet" className="text-small" onClick={stop}>
            Stop
          </Button>
        </div>
      )}
      {state === 'stopped' && (
        <p className="flex flex-wrap items-center gap-x-4 text-small">
          Stopped: the band above is the first-order one.
          <Button look="quiet" className="text-small" onClick={again}>
            Draw the samples
          </Button>
        </p>
      )}
      {state === 'failed' && (
        <Notice tone="problem" title="The samples could not be drawn">
          <p>{message} The band above is the first-order one; nothing else is touched.</p>
          <Button size="small" onClick={again}>
            Try again
          </Button>
        </Notice>
      )}
      <div ref={answer} style={drawing ? { minHeight: `${height}px` } : undefined}>
        {uncertainty !== undefined && <Answer uncertainty={uncertainty} name={name} onPick={onPick} />}
      </div>
    </TallySection>
  );
}

function Answer({
  uncertainty,
  name,
  onPick,
}: Pick<HowSureProps, 'name' | 'onPick'> & { uncertainty: RoomUncertainty }) {
  const { bands, shares, advice, seed } = uncertainty;
  const chart = useMemo(() => shareChart(shares, `${fileSlug(name)}-what-matters-most`), [shares, name]);
  if (chart === null) return <p className="text-small text-soft">Nothing is recorded that could be unsure.</p>;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      <div>
        <p className="mb-1 max-w-[72ch] text-small">
          {SAMPLES} samples, seed {seed}: masses by how each entry is known, one heat for each material, what a survey
          overlooks, floor, openings and height. It says how well the amounts are known, not how they change from day to
          day.
        </p>
        <BandTable bands={bands} />
      </div>
      <BarFigure chart={chart} table={<ShareTable shares={shares} onPick={onPick} />} />
      {advice.length > 0 && (
        <ul className="grid max-w-[72ch] gap-1 text-small" aria-label="What would make it surer">
          {advice.map(({ text, p5, p95 }, index) => (
            <li key={text}>
              {text}{' '}
              <span className="text-soft">
                Then nine times in ten between{' '}
                <Figure path={`uncertainty.advice.${index}.p5`} estimate={p5} unit="bare" /> and{' '}
                <Figure path={`uncertainty.advice.${index}.p95`} estimate={p95} />, to first order.
              </span>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
