import { createBuilding } from '@embertally/shared/contracts/buildings';
import { readHistory } from '@embertally/shared/contracts/history';
import { listLimits, type Limit } from '@embertally/shared/contracts/limits';
import { readCurrentSession } from '@embertally/shared/contracts/sessions';
import { editSite, giveSiteRole, readSite, takeSiteRole, type Site } from '@embertally/shared/contracts/sites';
import { listRoomSummaries, type RoomSummary } from '@embertally/shared/contracts/surveys';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { beforeEach, describe, expect, it } from 'vitest';
import { fakeServer, type FakeServer } from '../../support/fake-server.ts';
import { renderApp } from '../../support/render-app.tsx';
import { AT, sampleBuilding, sampleMe, sampleSite, uuid } from '../../support/web-samples.ts';

let server: FakeServer;
const SITE = { siteId: uuid(10) };

beforeEach(() => {
  server = fakeServer();
  server.answer(readCurrentSession, {}, sampleMe());
  server.answer(listLimits, { buildingId: uuid(20) }, { items: [] });
  server.answer(listRoomSummaries, { surveyId: uuid(120) }, { items: [] });
  server.answer(readHistory, SITE, { items: [], next_before: null });
});

function show(change: Partial<Site> = {}) {
  server.answer(readSite, SITE, sampleSite(change));
  return renderApp(`/sites/${uuid(10)}`);
}

const MANAGER = { my_role: 'manager', of_keeper: true } as const;

describe('what a role may see and do', () => {
  it('a manager of the keeper may edit the site, give and take roles, and make buildings', async () => {
    show(MANAGER);
    await screen.findByRole('heading', { name: 'Saltmarsh Lane Store', level: 1 });
    expect(screen.getByRole('button', { name: 'Edit site' })).toBeTruthy();
    expect(screen.getByText('Give a person a role')).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Take away the role manager from Mara Tidewell' })).toBeTruthy();
    expect(screen.getByRole('button', { name: 'New building' })).toBeTruthy();
  });

  it('a manager of another organisation gives no roles', async () => {
    show({ my_role: 'manager', of_keeper: false });
    await screen.findByRole('heading', { name: 'Saltmarsh Lane Store', level: 1 });
    expect(screen.queryByText('Give a person a role')).toBeNull();
    expect(screen.queryByRole('button', { name: 'Edit site' })).toBeNull();
    expect(screen.getByRole('button', { name: 'New building' })).toBeTruthy();
  });

  it('a viewer is offered nothing that would be refused', async () => {
    show({ my_role: 'viewer', building_list: [] });
    await screen.findByText('No building yet');
    expect(screen.queryByRole('button', { name: 'New building' })).toBeNull();
    expect(screen.queryByRole('button', { name: /Take away/ })).toBeNull();
  });
});

describe('the site', () => {
  it('that is not there, or not mine, says so and leads back', async () => {
    server.refuse(readSite, SITE, 404, 'There is no such site.');
    renderApp(`/sites/${uuid(10)}`);
    await screen.findByRole('heading', { name: 'There is no such site', level: 1 });
    expect(screen.getByRole('link', { name: 'Go to your sites' })).toBeTruthy();
  });

  it('makes a building with its first storey and opens its Book', async () => {
    const app = show(MANAGER);
    server.answer(createBuilding, SITE, { ...sampleBuilding(21, 'Annexe'), survey_id: uuid(121) });
    fireEvent.click(await screen.findByRole('button', { name: 'New building' }));
    const dialog = await screen.findByRole('dialog', { name: 'New building' });
    fireEvent.click(within(dialog).getByRole('button', { name: 'Make it and open its Book' }));
    expect((await within(dialog).findByRole('alert')).textContent).toContain('Enter the name of the building');
    fireEvent.change(within(dialog).getByLabelText('Name of the building'), { target: { value: ' Annexe ' } });
    fireEvent.click(within(dialog).getByRole('button', { name: 'Make it and open its Book' }));
    await waitFor(() => {
      expect(app.path()).toBe(`/surveys/${uuid(121)}`);
    });
    const sent = server.requests.find((request) => request.method === 'POST');
    expect(sent?.body).toMatchObject({ name: 'Annexe', storey_name: 'Ground floor' });
  });

  it('gives a role and says it was given', async () => {
    show(MANAGER);
    server.answer(giveSiteRole, SITE, {
      id: uuid(41),
      member_id: uuid(51),
      name: 'Rui Castellan',
      organisation_name: 'Merrow Mutual',
      role: 'reviewer',
    });
    fireEvent.change(await screen.findByLabelText('Email address'), { target: { value: 'rui@merrow.example' } });
    fireEvent.change(screen.getByLabelText('Role'), { target: { value: 'reviewer' } });
    fireEvent.click(screen.getByRole('button', { name: 'Give the role' }));
    await screen.findByText('rui@merrow.example is now reviewer here.');
    expect(screen.getByLabelText<HTMLInputElement>('Email address').value).toBe('');
  });

  it('shows the server’s refusal of a role at its field, keeping what was typed', async () => {
    show(MANAGER);
    server.refuse(giveSiteRole, SITE, 422, 'The role was not given.', {
      errors: [{ pointer: '/email', code: 'unknown', message: 'Nobody signs in with this address' }],
    });
    fireEvent.change(await screen.findByLabelText('Email address'), { target: { value: 'who@nowhere.example' } });
    fireEvent.click(screen.getByRole('button', { name: 'Give the role' }));
    const email = screen.getByLabelText<HTMLInputElement>('Email address');
    await waitFor(() => {
      expect(email.getAttribute('aria-invalid')).toBe('true');
    });
    expect(screen.getAllByText('Nobody signs in with this address')).toHaveLength(2);
    expect(email.value).toBe('who@nowhere.example');
  });

  it('asks before a role is taken away, with the way back in focus, and says why when it is refused', async () => {
    show(MANAGER);
    server.refuse(takeSiteRole, { siteId: uuid(10), roleId: uuid(40) }, 409, 'A site keeps at least one manager.');
    fireEvent.click(await screen.findByRole('button', { name: /^Take away the role manager/ }));
    const dialog = await screen.findByRole('dialog', { name: 'Take the role from Mara Tidewell' });
    await waitFor(() => {
      expect(document.activeElement?.textContent).toBe('Keep it as it is');
    });
    fireEvent.click(within(dialog).getByRole('button', { name: 'Take the role away' }));
    expect(await screen.findByText('A site keeps at least one manager.')).toBeTruthy();
  });

  it('keeps what was typed when somebody else changed the site, and saves on the version now read', async () => {
    show(MANAGER);
    fireEvent.click(await screen.findByRole('button', { name: 'Edit site' }));
    const dialog = await screen.findByRole('dialog', { name: 'Edit site' });
    fireEvent.change(within(dialog).getByLabelText('Name of the site'), { target: { value: 'Store, renamed' } });
    server.refuse(editSite, SITE, 412, 'The site was changed since.');
    server.answer(readSite, SITE, sampleSite({ ...MANAGER, version: 4, name: 'Theirs' }));
    fireEvent.click(within(dialog).getByRole('button', { name: 'Save' }));
    expect((await within(dialog).findByRole('alert')).textContent).toContain('Somebody changed this site');
    expect(within(dialog).getByLabelText<HTMLInputElement>('Name of the site').value).toBe('Store, renamed');
    server.answer(editSite, SITE, sampleSite({ ...MANAGER, version: 5, name: 'Store, renamed' }));
    fireEvent.click(within(dialog).getByRole('button', { name: 'Save' }));
    await screen.findByRole('heading', { name: 'Store, renamed', level: 1 });
    const versions = server.requests.filter((r) => r.method === 'PATCH').map((r) => r.headers.get('if-match'));
    expect(versions).toEqual(['"v3"', '"v4"']);
  });
});

describe('the limits', () => {
  const limit = (id: number, room: number, change: Partial<Limit>): Limit => ({
    id: uuid(id),
    building_id: uuid(20),
    room_id: uuid(room),
    quantity: 'load_per_floor_MJ_m2',
    bound: 680,
    source: 'permit',
    set_by: 'Harbourwell Fire Office',
    since: '2026-03-02',
    entered_by: 'Ines Orchard',
    entered_at: AT,
    version: 1,
    ...change,
  });
  const summary = (room: number, name: string, density: number): RoomSummary => ({
    room_id: uuid(room),
    storey_id: uuid(60),
    name,
    floor_area_m2: 96,
    load_total_MJ: density * 96,
    load_per_floor_MJ_m2: density,
    peak_kW: 5000,
    flashover_time_s: null,
    standing: 'near',
    ratio: 0.9,
    entries: 7,
    engine: 'e',
    stale: false,
    computed_at: null,
  });

  beforeEach(() => {
    server.answer(
      listLimits,
      { buildingId: uuid(20) },
      {
        items: [
          limit(70, 80, {}),
          limit(71, 81, { bound: 1000, source: 'policy', set_by: 'Merrow Mutual' }),
          limit(72, 82, { quantity: 'equivalent_time_min', bound: 60 }),
        ],
      },
    );
    server.answer(
      listRoomSummaries,
      { surveyId: uuid(120) },
      { items: [summary(80, 'Scenery dock', 612), summary(81, 'Paint shop', 1000.1), summary(82, 'Workshop', 540)] },
    );
  });

  it('stand with who set them and how the room stands, the most exceeded first', async () => {
    show();
    const table = await screen.findByRole('table', { name: 'Limits in Main building' });
    const rows = within(table).getAllByRole('row').slice(1);
    expect(rows.map((row) => within(row).getByRole('rowheader').textContent)).toEqual([
      'Paint shopFire load density',
      'Scenery dockFire load density',
      'WorkshopEquivalent exposure',
    ]);
    // 1000.1 of 1000 is over though it prints as 1000; 612 of 680 is exactly 0.9, which is near.
    expect(rows.map((row) => within(row).getAllByRole('cell').at(-1)?.textContent)).toEqual(['over', 'near', '–']);
    expect(rows[0]?.textContent).toContain('Merrow Mutual');
  });

  it('are read in the person’s own units', async () => {
    server.answer(readCurrentSession, {}, sampleMe({ units: 'US' }));
    show();
    const table = await screen.findByRole('table', { name: 'Limits in Main building' });
    // 680 MJ/m² × 0.09290304 m²/ft² ÷ 1055.05585262 J/Btu = 59 877 Btu/ft², three figures.
    expect(table.textContent).toMatch(/59\s?900 Btu\/ft²/);
  });
});
