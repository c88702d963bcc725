import type { Limit } from '@embertally/shared/contracts/limits';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { roomInput } from '@embertally/shared/survey/room-input';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { useMemo } from 'react';
import { allEstimates } from './all-estimates.ts';
import { MissingList } from './missing-list.tsx';
import { TallyCautions } from './tally-cautions.tsx';
import { WorkingView } from '../../components/working/working-view.tsx';
import './tally.css';

interface RoomWorkingsProps {
  readonly document: SurveyDocument;
  readonly roomId: string;
  readonly limits: readonly Limit[];
}

/** Every number of a room with its whole working, one after the other, then what is missing and the cautions. */
export function RoomWorkings({ document, roomId, limits }: RoomWorkingsProps) {
  const tally = useMemo(
    () => estimateRoom(roomInput(document, roomId, limits), { workings: true }),
    [document, roomId, limits],
  );
  const sections = useMemo(() => allEstimates(tally), [tally]);
  return (
    <div className="tally grid grid-cols-[minmax(0,1fr)] gap-8">
      <nav aria-label="Parts of the workings" className="print:hidden">
        <ol className="flex flex-wrap gap-x-5 gap-y-1">
          {sections.map((section, index) => (
            <li key={section.title}>
              <a href={`#workings-${index}`} className="inline-block py-1">
                {section.title}
              </a>{' '}
              <span className="text-soft">{section.estimates.length}</span>
            </li>
          ))}
          <li>
            <a href="#workings-cautions" className="inline-block py-1">
              Cautions
            </a>
          </li>
        </ol>
      </nav>
      {sections.map((section, index) => (
        <section key={section.title} aria-labelledby={`workings-${index}`}>
          <div className="part-heading">
            <h2 id={`workings-${index}`} className="text-lead">
              {section.title}
            </h2>
          </div>
          {section.estimates.map(({ path, name, estimate }) => (
            <article key={path} className="working-block" aria-labelledby={`working-${path}`}>
              <h3 id={`working-${path}`} className="text-body font-bold">
                {name}
              </h3>
              <WorkingView estimate={estimate} name={name} level={4} />
            </article>
          ))}
        </section>
      ))}
      <MissingList missing={tally.missing} />
      <div id="workings-cautions">
        <TallyCautions ids={tally.cautions} />
      </div>
      <p className="figure text-small text-soft">Computed by {tally.engine}</p>
    </div>
  );
}
