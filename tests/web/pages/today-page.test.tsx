import { readCurrentSession } from '@embertally/shared/contracts/sessions';
import { listSites, readSite } from '@embertally/shared/contracts/sites';
import { listRoomSummaries, type RoomSummary } from '@embertally/shared/contracts/surveys';
import { screen, within } from '@testing-library/react';
import { beforeEach, describe, expect, it } from 'vitest';
import { fakeServer, type FakeServer } from '../../support/fake-server.ts';
import { renderApp } from '../../support/render-app.tsx';
import { sampleBuilding, sampleMe, sampleSite, sampleSiteSummary, uuid } from '../../support/web-samples.ts';

let server: FakeServer;
beforeEach(() => {
  server = fakeServer();
  server.answer(readCurrentSession, {}, sampleMe());
});

function room(number: number, name: string, standing: RoomSummary['standing'], ratio: number | null): RoomSummary {
  return {
    room_id: uuid(number),
    storey_id: uuid(60),
    name,
    floor_area_m2: 30,
    load_total_MJ: 18_000,
    load_per_floor_MJ_m2: 600,
    peak_kW: null,
    flashover_time_s: null,
    standing,
    ratio,
    entries: 3,
    engine: 'e',
    stale: false,
    computed_at: null,
  };
}

describe('today', () => {
  it('names the rooms over and near a limit, the most exceeded first', async () => {
    server.answer(listSites, {}, { items: [sampleSiteSummary(10, 'Saltmarsh Lane Store')], next_cursor: null });
    server.answer(readSite, { siteId: uuid(10) }, sampleSite());
    server.answer(
      listRoomSummaries,
      { surveyId: uuid(120) },
      {
        items: [
          room(80, 'Scenery dock', 'near', 0.95),
          room(81, 'Corridor', 'within', 0.2),
          room(82, 'Paint shop', 'over', 1.11),
          room(83, 'Office', 'no limit set', null),
        ],
      },
    );
    renderApp('/');
    const list = await screen.findByRole('list', { name: 'Rooms near or over a limit in Main building' });
    const rooms = within(list).getAllByRole('listitem');
    expect(rooms.map((item) => within(item).getByRole('link').textContent)).toEqual(['Paint shop', 'Scenery dock']);
    expect(rooms[0]?.textContent).toContain('over');
    expect(rooms[0]?.textContent).toContain('600 MJ/m²');
  });

  it('lists the books changed last, newest first', async () => {
    server.answer(
      listSites,
      {},
      { items: [sampleSiteSummary(10, 'Saltmarsh Lane Store', { rooms_over: 0, rooms_near: 0 })], next_cursor: null },
    );
    const buildings = [
      { ...sampleBuilding(20, 'Old barn'), updated_at: '2026-10-01T10:00:00.000Z' },
      { ...sampleBuilding(21, 'Main building'), updated_at: '2026-11-01T10:00:00.000Z' },
    ];
    server.answer(readSite, { siteId: uuid(10) }, sampleSite({ building_list: buildings }));
    renderApp('/');
    const books = await screen.findAllByRole('link', { name: /Old barn|Main building/ });
    expect(books.map((link) => link.textContent)).toEqual(['Main building', 'Old barn']);
    expect(books[0]?.getAttribute('href')).toBe(`/surveys/${uuid(121)}`);
    expect(screen.getByText(/Nothing waits for you/)).toBeTruthy();
  });

  it('teaches the first step to somebody with no site', async () => {
    server.answer(listSites, {}, { items: [], next_cursor: null });
    renderApp('/');
    await screen.findByText('The book is still empty');
    expect(screen.getByRole('link', { name: 'New site' })).toBeTruthy();
  });

  it('says when it cannot be read', async () => {
    server.refuse(listSites, {}, 500, 'Something failed on the server. Nothing you saved is lost.');
    renderApp('/');
    expect((await screen.findByRole('alert')).textContent).toContain('Something failed on the server.');
    expect(screen.getByRole('button', { name: 'Try again' })).toBeTruthy();
  });
});
