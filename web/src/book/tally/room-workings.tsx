import type { Limit } from '@embertally/shared/contracts/limits';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { roomInput } from '@embertally/shared/survey/room-input';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { lazy, Suspense, useMemo } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths.ts';
import { Skeleton } from '../../components/skeleton.tsx';
import { allEstimates, GAPS_WORKED_OUT, type NamedEstimate } from './all-estimates.ts';
import { FlashoverTable } from './flashover-table.tsx';
import { MissingList } from './missing-list.tsx';
import { TallyCautions } from './tally-cautions.tsx';
import { WorkingView } from '../../components/working/working-view.tsx';
import './tally.css';

const FurtherPart = lazy(() =>
  import('./further/further-part.tsx').then((module) => ({ default: module.FurtherPart })),
);

interface RoomWorkingsProps {
  readonly document: SurveyDocument;
  readonly roomId: string;
  readonly limits: readonly Limit[];
}

/** Every number of a room with its whole working, one after the other; then what is missing, further readings, cautions. */
export function RoomWorkings({ document, roomId, limits }: RoomWorkingsProps) {
  const input = useMemo(() => roomInput(document, roomId, limits), [document, roomId, limits]);
  const tally = useMemo(() => estimateRoom(input, { workings: true }), [input]);
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
            <a href="#workings-further" className="inline-block py-1">
              Further readings
            </a>
          </li>
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
          {section.key === 'room' && (
            <div className="mt-3">
              <FlashoverTable flashover={tally.room.flashover} />
              <p className="mt-2 max-w-[72ch] text-small text-soft">
                The three differ because each was fitted to other tests: Thomas balances heat in rooms of ordinary size,
                Babrauskas takes half of what the openings can feed, the third follows the rise of a hot layer and knows
                the linings. The lowest that applies is used.
              </p>
            </div>
          )}
          {section.key === 'spread' && (tally.spread?.gaps?.length ?? 0) > GAPS_WORKED_OUT && (
            <p className="mt-3 max-w-[72ch] text-soft">
              {`Of ${tally.spread?.pairsShort ?? 0} pairs that stand too near, the ${GAPS_WORKED_OUT} that lack most are worked out here.`}
            </p>
          )}
          {section.estimates.map(({ path, name, estimate }) => (
            <article key={path} className="working-block" aria-labelledby={`working-${path}`}>
              <h3 id={`working-${path}`} className="text-body font-bold">
                {name}
              </h3>
              <WorkingView
                estimate={estimate}
                name={name}
                level={4}
                sameAs={firstOfItsMethod(section.estimates, path, estimate.method)}
              />
            </article>
          ))}
        </section>
      ))}
      <MissingList missing={tally.missing} />
      <Suspense fallback={<Skeleton label="Working out further readings" lines={6} />}>
        <FurtherPart input={input} tally={tally} />
      </Suspense>
      <div id="workings-cautions">
        <TallyCautions ids={tally.cautions} />
      </div>
      <p className="text-small text-soft">
        <span className="figure">Computed by {tally.engine}</span>{' '}
        <Link to={paths.methods()} className="not-on-paper">
          All methods
        </Link>
      </p>
    </div>
  );
}

/** Rows of a list share their method: the first row says where it comes from for all of them. */
function firstOfItsMethod(estimates: readonly NamedEstimate[], path: string, method: string): string | undefined {
  if (!/\.\d+\./.test(path)) return undefined;
  const first = estimates.find((one) => one.estimate.method === method);
  return first === undefined || first.path === path ? undefined : first.name;
}
