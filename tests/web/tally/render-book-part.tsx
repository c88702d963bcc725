import type { Limit } from '@embertally/shared/contracts/limits';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { TablesProvider } from '@embertally/web/src/book/panels/tables-provider.tsx';
import { BookProvider } from '@embertally/web/src/book/session/book-provider.tsx';
import type { BookSession } from '@embertally/web/src/book/session/book-session.ts';
import { UnitsContext, type UnitSystem } from '@embertally/web/src/lib/units-context.ts';
import { fireEvent, render, screen } from '@testing-library/react';
import type { ReactNode } from 'react';
import { MemoryRouter } from 'react-router-dom';
import {
  box,
  crate,
  door,
  groundFloor,
  uid,
  wallBetween,
  withEntries,
  withOpening,
  withRoom,
} from '../../support/survey-builder.ts';
import { openedBook } from '../book/book-driver.ts';

export interface PartOptions {
  readonly canEdit?: boolean;
  readonly limits?: readonly Limit[];
  readonly units?: UnitSystem;
  readonly engine?: 'here' | 'on its way';
}

/** A part of the Book over a real session and the real engine. */
export function renderBookPart(part: ReactNode, document: SurveyDocument, options: PartOptions = {}): BookSession {
  const { session } = openedBook(document, {
    canEdit: options.canEdit ?? true,
    limits: options.limits ?? [],
  });
  if (options.engine !== 'on its way') session.provideEngine((input) => estimateRoom(input, { spread: false }));
  render(
    <MemoryRouter>
      <UnitsContext value={options.units ?? 'SI'}>
        <BookProvider session={session}>
          <TablesProvider>{part}</TablesProvider>
        </BookProvider>
      </UnitsContext>
    </MemoryRouter>,
  );
  return session;
}

/**
 * A room of 6 × 4 m, 3 m high, with an open door, holding 12 × 10 kg at 17 MJ/kg:
 * 2040 MJ over 24 m² are 85.0 MJ/m².
 */
export function dock(): SurveyDocument {
  const room = withRoom(groundFloor(), 'Dock', box(0, 0, 6, 4), { room: { use: 'office' } });
  const opened = withOpening(room, door(wallBetween(room, [0, 0], [6, 0]), 1, { state: 'open' }));
  return withEntries(opened, crate('Flats', 'Dock', 2, 2, { count: 12 }));
}

export function limitOn(room: string, more: Partial<Limit> = {}): Limit {
  return {
    id: uid(`limit ${room}`),
    building_id: uid('building'),
    room_id: uid(room),
    quantity: 'load_per_floor_MJ_m2',
    bound: 90,
    source: 'permit',
    set_by: 'Harbourwell Fire Office',
    since: '2026-03-12',
    entered_by: 'Ines Okoro',
    entered_at: '2026-03-12T09:00:00.000Z',
    version: 1,
    ...more,
  };
}

export function press(name: string | RegExp): void {
  fireEvent.click(screen.getByRole('button', { name }));
}

/** Types into a field and leaves it. */
export function write(label: string | RegExp, text: string): void {
  const field = screen.getByLabelText(label);
  fireEvent.change(field, { target: { value: text } });
  fireEvent.blur(field);
}
