import { listLimits } from '@embertally/shared/contracts/limits';
import { readDocument, readSurvey } from '@embertally/shared/contracts/surveys';
import { toStored } from '@embertally/shared/survey/stored';
// Read beforehand: the page fetches this part only once its numbers stand.
import '@embertally/web/src/book/tally/further/further-part.tsx';
import { createQueryClient } from '@embertally/web/src/lib/query-client.ts';
import { WorkingsPage } from '@embertally/web/src/pages/workings-page.tsx';
import { QueryClientProvider } from '@tanstack/react-query';
import { fireEvent, render, screen, within } from '@testing-library/react';
import { MemoryRouter, Route, Routes } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { type FakeServer, fakeServer } from '../../support/fake-server.ts';
import { uid } from '../../support/survey-builder.ts';
import { surveySample } from '../book/book-driver.ts';
import { dock, limitOn } from './render-book-part.tsx';

const SURVEY = { surveyId: uid('survey') };

function answering(): FakeServer {
  const server = fakeServer();
  server.answer(readSurvey, SURVEY, surveySample());
  server.answer(readDocument, SURVEY, toStored(dock()));
  server.answer(listLimits, { buildingId: uid('building') }, { items: [limitOn('Dock')] });
  return server;
}

function open(room: string): void {
  render(
    <QueryClientProvider client={createQueryClient({ retryDelay_ms: 1 })}>
      <MemoryRouter initialEntries={[`/surveys/${uid('survey')}/rooms/${uid(room)}/workings`]}>
        <Routes>
          <Route path="/surveys/:surveyId/rooms/:roomId/workings" element={<WorkingsPage />} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
}

describe('the workings of a room', () => {
  it('lay every number out with its relation, inputs and source, and end with the cautions', async () => {
    answering();
    open('Dock');
    expect(await screen.findByRole('heading', { level: 1, name: 'Workings: Dock' })).toBeTruthy();
    const numbers = screen.getAllByRole('article');
    expect(numbers.length).toBeGreaterThan(30);
    for (const number of numbers) {
      expect(within(number).getByRole('heading', { name: 'The relation' })).toBeTruthy();
      expect(within(number).getByRole('heading', { name: 'Where it comes from' })).toBeTruthy();
    }
    const density = screen.getByRole('article', { name: 'Fire load density' });
    expect(density.textContent).toMatch(/85\.0 MJ\/m/);
    expect(density.textContent).toMatch(/recorded|computed/);
    expect(screen.getByText('Figures for planning, not permission')).toBeTruthy();
  });

  it('end with further readings that are not used in the tally', async () => {
    answering();
    open('Dock');
    expect(await screen.findByText(/variant, not used in the tally/, undefined, { timeout: 15_000 })).toBeTruthy();
  });

  it('put the three flashover criteria side by side and say why they differ', async () => {
    answering();
    open('Dock');
    expect(await screen.findByText('Heat release at which the room would flash over')).toBeTruthy();
    expect(screen.getByText(/The three differ because/)).toBeTruthy();
  });

  it('say that this is the working survey and not an issue of it', async () => {
    answering();
    open('Dock');
    expect(await screen.findByText(/Working survey, not issued/)).toBeTruthy();
  });

  it('say when the room is not there any more', async () => {
    answering();
    open('Loft');
    expect(await screen.findByRole('heading', { level: 1, name: 'There is no such room' })).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Back to the Book' })).toBeTruthy();
  });

  it('tell a stranger nothing', async () => {
    answering().refuse(readSurvey, SURVEY, 404, 'There is no such survey.');
    open('Dock');
    expect(await screen.findByRole('heading', { level: 1, name: 'There is no such survey' })).toBeTruthy();
    expect(document.body.textContent).not.toMatch(/Saltmarsh/);
  });

  it('can be asked for again when they could not be read', async () => {
    const server = answering();
    server.refuse(readDocument, SURVEY, 503, 'The database is away.');
    open('Dock');
    expect(await screen.findByText('The workings could not be read')).toBeTruthy();
    server.answer(readDocument, SURVEY, toStored(dock()));
    fireEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('heading', { level: 1, name: 'Workings: Dock' })).toBeTruthy();
  });
});
