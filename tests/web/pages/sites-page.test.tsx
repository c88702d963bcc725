import { readCurrentSession } from '@embertally/shared/contracts/sessions';
import { listSites, readSite } from '@embertally/shared/contracts/sites';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { beforeEach, describe, expect, it } from 'vitest';
import { fakeServer, type FakeServer } from '../../support/fake-server.ts';
import { renderApp } from '../../support/render-app.tsx';
import { sampleMe, sampleSiteSummary, uuid } from '../../support/web-samples.ts';

let server: FakeServer;
beforeEach(() => {
  server = fakeServer();
  server.answer(readCurrentSession, {}, sampleMe());
});

const names = () => screen.getAllByRole('rowheader').map((cell) => within(cell).getByRole('link').textContent);

describe('the sites page', () => {
  it('says it is reading, under its own heading', async () => {
    server.raw(listSites, {}, () => new Promise<Response>(() => undefined));
    renderApp('/sites');
    expect(await screen.findByText('Reading your sites')).toBeTruthy();
    expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Sites');
  });

  it('offers the one next step when there is nothing', async () => {
    server.answer(listSites, {}, { items: [], next_cursor: null });
    renderApp('/sites');
    await screen.findByText('No site yet');
    expect(screen.getByRole('link', { name: 'New site' }).getAttribute('href')).toBe('/sites/new');
  });

  it('says what failed and asks again on request', async () => {
    server.refuse(listSites, {}, 503, 'The database is away. Try again in a minute.');
    renderApp('/sites');
    const alert = await screen.findByRole('alert');
    expect(alert.textContent).toContain('Your sites could not be read');
    expect(alert.textContent).toContain('The database is away.');
    server.answer(listSites, {}, { items: [sampleSiteSummary(10, 'Saltmarsh Lane Store')], next_cursor: null });
    fireEvent.click(within(alert).getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('link', { name: 'Saltmarsh Lane Store' })).toBeTruthy();
  });

  it('lists every site with its standing in words', async () => {
    server.answer(
      listSites,
      {},
      {
        items: [
          sampleSiteSummary(10, 'Saltmarsh Lane Store'),
          sampleSiteSummary(11, 'Training yard', { rooms_over: 0, rooms_near: 0, rooms: 3 }),
          sampleSiteSummary(12, 'Old cannery', { rooms_over: 0, rooms_near: 0, rooms: 0 }),
        ],
        next_cursor: null,
      },
    );
    renderApp('/sites');
    const table = await screen.findByRole('table', { name: 'Sites you have a role on' });
    const rows = within(table).getAllByRole('row').slice(1);
    expect(rows.map((row) => within(row).getAllByRole('cell').at(-1)?.textContent)).toEqual([
      '1 over2 near',
      'none near or over',
      '–',
    ]);
  });

  it('sorts by a column, keeps the sort in the address, and turns round', async () => {
    server.answer(
      listSites,
      {},
      {
        items: [
          sampleSiteSummary(10, 'Bay 10', { rooms: 2 }),
          sampleSiteSummary(11, 'Bay 9', { rooms: 30 }),
          sampleSiteSummary(12, 'annexe', { rooms: 4 }),
        ],
        next_cursor: null,
      },
    );
    const app = renderApp('/sites');
    fireEvent.click(await screen.findByRole('button', { name: 'Site' }));
    expect(names()).toEqual(['annexe', 'Bay 9', 'Bay 10']);
    fireEvent.click(screen.getByRole('button', { name: 'Rooms' }));
    expect(names()).toEqual(['Bay 10', 'annexe', 'Bay 9']);
    fireEvent.click(screen.getByRole('button', { name: /^Rooms/ }));
    expect(names()).toEqual(['Bay 9', 'annexe', 'Bay 10']);
    expect(app.path()).toBe('/sites?sort=-rooms');
    expect(screen.getByRole('columnheader', { name: /Rooms/ }).getAttribute('aria-sort')).toBe('descending');
  });

  it('asks the server for what is typed and says when nothing fits', async () => {
    server.answer(listSites, {}, (request) => ({
      items: request.query.get('search') === null ? [sampleSiteSummary(10, 'Saltmarsh Lane Store')] : [],
      next_cursor: null,
    }));
    const app = renderApp('/sites');
    fireEvent.change(await screen.findByLabelText('Find a site by name or address'), { target: { value: 'quay' } });
    await screen.findByText('No site is called “quay”');
    expect(app.path()).toBe('/sites?find=quay');
    fireEvent.click(screen.getByRole('button', { name: 'Show every site' }));
    expect(await screen.findByRole('link', { name: 'Saltmarsh Lane Store' })).toBeTruthy();
  });

  it('moves focus to the heading of the next screen', async () => {
    server.answer(listSites, {}, { items: [sampleSiteSummary(10, 'Saltmarsh Lane Store')], next_cursor: null });
    server.refuse(readSite, { siteId: uuid(10) }, 404, 'There is no such site.');
    renderApp('/sites');
    fireEvent.click(await screen.findByRole('link', { name: 'Saltmarsh Lane Store' }));
    await screen.findByRole('heading', { name: 'There is no such site', level: 1 });
    await waitFor(() => {
      expect(document.activeElement?.tagName).toBe('H1');
    });
    expect(document.title).toBe('There is no such site – Embertally');
  });
});
