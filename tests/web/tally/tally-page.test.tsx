import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import { TallyPage } from '@embertally/web/src/book/tally/tally-page.tsx';
import { act, cleanup, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
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
import { dock, limitOn, press, renderBookPart } from './render-book-part.tsx';

const headings = () => screen.getAllByRole('heading').map((heading) => heading.textContent);

describe('the tally of a room', () => {
  it('reads from top to bottom as an argument', async () => {
    renderBookPart(<TallyPage />, dock());
    await screen.findByRole('heading', { name: 'What sets what alight' });
    expect(headings()).toEqual([
      'Dock',
      'What it is made of',
      'How sure',
      'How fast it could come out',
      'When it would be noticed',
      'What the room does',
      'What sets what alight',
      'Smoke and air',
      'Ask',
      'What is not here, and why',
      'Cautions',
    ]);
  });

  it('opens with the density worked by hand, and each number is a button', () => {
    renderBookPart(<TallyPage />, dock());
    // 12 × 10 kg × 17 MJ/kg ÷ (6 m × 4 m)
    const density = screen.getByRole('button', { name: /^Fire load density: 85\.0 MJ\/m²/ });
    expect(density.textContent).toContain('85.0');
    expect(screen.getByRole('button', { name: /^Heat kept in this room: 2.040 MJ/ })).toBeTruthy();
    expect(screen.getByText(/Room 1 of 1 · 24\.0 m² · 3\.00 m high · used as office/i)).toBeTruthy();
  });

  it('shows US customary units where the person reads in them', () => {
    renderBookPart(<TallyPage />, dock(), { units: 'US' });
    // 85 MJ/m² ÷ 0.01135653 MJ/m² per Btu/ft² = 7485 Btu/ft²
    expect(
      screen.getByRole('button', { name: /^Fire load density: 7.480 Btu\/ft²|^Fire load density: 7.490 Btu\/ft²/ }),
    ).toBeTruthy();
    expect(screen.getByText(/258 ft² · 9\.84 ft high/)).toBeTruthy();
  });

  it('moves with the survey', () => {
    const session = renderBookPart(<TallyPage />, dock());
    act(() => {
      session.run(editEntries, { entry_ids: [uid('Flats')], patch: { count: 24 } }, 'Counted again');
    });
    expect(screen.getByRole('button', { name: /^Fire load density: 170 MJ\/m²/ })).toBeTruthy();
  });

  it('sums the ledger line by line and rules it off with the total', () => {
    const document = withEntries(dock(), crate('Drapes', 'Dock', 4, 2, { count: 2, evidence: 'estimated' }));
    renderBookPart(<TallyPage />, document);
    const ledger = screen.getByRole('table', { name: /Contents of the room/ });
    const [, first, second, total] = within(ledger).getAllByRole('row');
    expect(first?.textContent).toMatch(/Flats.*12 × 10 kg.*stored.*counted/);
    // 2 × 10 kg × 17 MJ/kg = 340 MJ; 2040 + 340 = 2380 MJ
    expect(within(second as HTMLElement).getByRole('button', { name: /^Heat in Drapes: 340 MJ/ })).toBeTruthy();
    expect(second?.textContent).toMatch(/estimated/);
    expect(second?.textContent).toMatch(/2.380$/);
    expect(total?.textContent).toMatch(/Heat kept in this room2.380 MJ/);
  });

  it('says how the room stands, whose limit it is, and since when', () => {
    renderBookPart(<TallyPage />, dock(), { limits: [limitOn('Dock')] });
    // 85 ÷ 90 = 94 %
    expect(screen.getByText('94 % of the permit’s 90.0 MJ/m², Harbourwell Fire Office, March 2026')).toBeTruthy();
    expect(screen.getByText('near')).toBeTruthy();
  });

  it('never calls a room without a limit anything but that', () => {
    renderBookPart(<TallyPage />, dock());
    expect(screen.getByText(/^No limit set/)).toBeTruthy();
    expect(document.body.textContent).not.toMatch(/\bsafe\b/i);
  });

  it('opens the working of a number: relation, inputs with origin, source, reason', async () => {
    renderBookPart(<TallyPage />, dock());
    press(/^Fire load density: /);
    const dialog = await screen.findByRole('dialog', { name: 'Fire load density' });
    const inputs = within(dialog).getByRole('table', { name: /What went into/ });
    expect(inputs.textContent).toMatch(/2040.*MJ/);
    expect(inputs.textContent).toMatch(/24.*m2/);
    expect(within(dialog).getByRole('heading', { name: 'Where it comes from' })).toBeTruthy();
    expect(dialog.textContent).toMatch(/EN 1991-1-2/);
    expect(within(dialog).getByRole('heading', { name: 'Why this method' })).toBeTruthy();
    expect(dialog.textContent).toMatch(/Method load\.per-floor@\d/);
  });

  it('keeps the working in step with the survey while it is open', async () => {
    const session = renderBookPart(<TallyPage />, dock());
    press(/^Fire load density: /);
    const dialog = await screen.findByRole('dialog', { name: 'Fire load density' });
    act(() => {
      session.run(editEntries, { entry_ids: [uid('Flats')], patch: { count: 24 } }, 'Counted again');
    });
    await waitFor(() => expect(dialog.textContent).toMatch(/4080/));
  });

  it('puts the burn-out as kept before the design load', () => {
    renderBookPart(<TallyPage />, dock());
    const table = screen.getByRole('table', { name: 'If everything here burns out' });
    const columns = within(table)
      .getAllByRole('columnheader')
      .map((cell) => cell.textContent);
    expect(columns.slice(1)).toEqual(['As kept', 'Design load']);
  });

  it('tells the burn-out before any glass breaks only where some would', () => {
    const name = /before any glass breaks/;
    renderBookPart(<TallyPage />, dock());
    expect(screen.queryByRole('table', { name })).toBeNull();
    cleanup();
    const plain = dock();
    const wall = wallBetween(plain, [0, 4], [6, 4]);
    renderBookPart(
      <TallyPage />,
      withOpening(
        plain,
        door(wall, 1, { id: uid('window'), kind: 'window', state: 'fails', sill_m: 0.9, height_m: 1.2 }),
      ),
    );
    const table = screen.getByRole('table', { name });
    expect(
      within(table).getByRole('button', { name: /Equivalent time of exposure, as kept, before any glass/ }),
    ).toBeTruthy();
  });

  it('shows the flashover criteria side by side with their ranges', () => {
    renderBookPart(<TallyPage />, dock());
    const table = screen.getByRole('table', { name: /would flash over/ });
    expect(table.textContent).toMatch(/Thomas/);
    expect(table.textContent).toMatch(/Babrauskas/);
  });

  it('shows the cautions that stand with the results', () => {
    renderBookPart(<TallyPage />, dock());
    expect(screen.getByText('Figures for planning, not permission')).toBeTruthy();
  });
});

describe('the tally where something is wanting', () => {
  it('says what to do first where there is no room', () => {
    const session = renderBookPart(<TallyPage />, groundFloor());
    expect(screen.getByText('No room on this storey yet')).toBeTruthy();
    press('Add a room by its measures');
    expect(session.state.tables).toBe(true);
  });

  it('offers nothing to change to somebody who may only read', () => {
    renderBookPart(<TallyPage />, groundFloor(), { canEdit: false });
    expect(screen.queryByRole('button')).toBeNull();
  });

  it('waits for the engine in words', () => {
    renderBookPart(<TallyPage />, dock(), { engine: 'on its way' });
    expect(screen.getByText('Adding up Dock')).toBeTruthy();
  });

  it('says that a room without openings cannot be fed, and where to give one', () => {
    const document = withEntries(
      withRoom(groundFloor(), 'Dock', box(0, 0, 6, 4), { room: { use: 'office' } }),
      crate('Flats', 'Dock', 2, 2),
    );
    const session = renderBookPart(<TallyPage />, document);
    expect(screen.getByText(/No opening feeds this room/)).toBeTruthy();
    act(() => {
      screen.getAllByRole('button', { name: /^Go to the openings/ })[0]?.click();
    });
    expect(session.state.tables).toBe(true);
  });

  it('says that nothing is recorded yet', () => {
    renderBookPart(<TallyPage />, withRoom(groundFloor(), 'Dock', box(0, 0, 6, 4)));
    expect(screen.getByText(/Nothing is recorded in this room yet/)).toBeTruthy();
    expect(screen.getByRole('button', { name: /^Fire load density: 0 MJ/ })).toBeTruthy();
  });

  it('says which entries add no heat', () => {
    const weightless = crate('Steel rack', 'Dock', 4, 2);
    const document = withEntries(dock(), {
      ...weightless,
      parts: weightless.parts.map((part) => ({ ...part, net_heat_MJ_kg: 0, low_MJ_kg: 0, high_MJ_kg: 0 })),
    });
    renderBookPart(<TallyPage />, document);
    expect(screen.getByText(/One entry adds no heat/)).toBeTruthy();
  });
});
