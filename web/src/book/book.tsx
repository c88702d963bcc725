import { useEffect, useState, type ReactNode } from 'react';
import { HeaderSlot } from '../components/header-slots.tsx';
import './book.css';
import { PlanHost } from './interaction/plan-host.ts';
import { Announcer } from './plan/announcer.tsx';
import { BookTabs } from './plan/book-tabs.tsx';
import { BookTrail } from './plan/book-trail.tsx';
import { PlanPage } from './plan/plan-page.tsx';
import { SavingLine } from './plan/saving-line.tsx';
import { TallySheet } from './plan/tally-sheet.tsx';
import { ReportButton } from './report/report-button.tsx';
import { useBook } from './session/use-book.ts';
import { useBookSession } from './session/use-book-session.ts';
import type { SurveySync } from './sync/survey-sync.ts';

interface BookProps {
  readonly sync: SurveySync;
  /** The tally of the room in hand, with the cautions at its foot. */
  readonly tally: ReactNode;
  /** One tab per room at the outer edge. */
  readonly index: ReactNode;
  /** The rooms as a list, for a narrow screen. */
  readonly rooms: ReactNode;
  /** Tables of rooms, openings and contents: everything without the plan. */
  readonly tables: ReactNode;
}

/** The open ledger: plan on the left page, tally on the right, one tab per room at the edge. */
export function Book({ sync, tally, index, rooms, tables }: BookProps) {
  const session = useBookSession();
  const page = useBook((state) => state.page);
  const showsTables = useBook((state) => state.tables);
  const name = useBook((state) => state.survey.building.name);
  const [host] = useState(() => new PlanHost(session));
  useEffect(
    () => () => {
      host.cancel();
    },
    [host],
  );
  return (
    <div className="book" data-page={page}>
      <HeaderSlot name="trail">
        <BookTrail />
      </HeaderSlot>
      <HeaderSlot name="actions">
        <SavingLine sync={sync} />
        <ReportButton />
      </HeaderSlot>
      <h1 className="unseen" tabIndex={-1}>
        {name}: the Book
      </h1>
      <section className="book-left" aria-label={showsTables ? 'Tables' : 'Plan'}>
        {showsTables ? tables : <PlanPage host={host} />}
      </section>
      <TallySheet>{tally}</TallySheet>
      <div className="book-index">{index}</div>
      <section className="book-rooms" aria-label="Rooms">
        <div className="book-page-body">{rooms}</div>
      </section>
      <BookTabs />
      <Announcer />
    </div>
  );
}
