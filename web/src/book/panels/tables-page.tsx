import { useContext } from 'react';
import { Button } from '../../components/button.tsx';
import { type TabPage, Tabs } from '../../components/tabs.tsx';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { ContentsPart } from './contents/contents-part.tsx';
import { LimitsPart } from './limits/limits-part.tsx';
import { OpeningsPart } from './openings/openings-part.tsx';
import { RoomPart } from './rooms/room-part.tsx';
import { RoomsPart } from './rooms/rooms-part.tsx';
import { StoreysPart } from './storeys/storeys-part.tsx';
import { type TablePart, TablesContext } from './tables-context.ts';
import './tables.css';

const TABS: readonly TabPage<TablePart>[] = [
  { id: 'rooms', label: 'Rooms', content: <RoomsPart /> },
  { id: 'room', label: 'This room', content: <RoomPart /> },
  { id: 'openings', label: 'Openings', content: <OpeningsPart /> },
  { id: 'contents', label: 'Contents', content: <ContentsPart /> },
  { id: 'limits', label: 'Limits', content: <LimitsPart /> },
  { id: 'storeys', label: 'Storeys', content: <StoreysPart /> },
];

/** Everything on the plan as rows: read, added, changed and taken away without the plan. */
export function TablesPage() {
  const session = useBookSession();
  const { part, open } = useContext(TablesContext);
  const room = useBook((state) => state.document.rooms.get(state.roomInHand ?? '')?.name);
  const storey = useBook((state) => state.document.storeys.get(state.storeyId ?? '')?.name);
  const tabs = TABS.map((tab) => (tab.id === part ? tab : { ...tab, content: null }));
  return (
    <div className="tables-page">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 className="text-lead">
          Tables
          <span className="text-body font-normal text-soft">
            {' '}
            · {storey}
            {room === undefined ? '' : ` · ${room}`}
          </span>
        </h2>
        <Button
          look="quiet"
          onClick={() => {
            session.showTables(false);
          }}
        >
          Back to the plan
        </Button>
      </div>
      <Tabs label="Tables of the survey" tabs={tabs} chosen={part} onChoose={open} />
    </div>
  );
}
