import { createLimit, deleteLimit, editLimit, listLimits } from '@embertally/shared/contracts/limits';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import { openingsOfRoom } from '@embertally/shared/survey/derive/openings-of-room';
import { roomArea } from '@embertally/shared/survey/derive/room-area';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { TablesPage } from '@embertally/web/src/book/panels/tables-page.tsx';
import { act, fireEvent, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { fakeServer } from '../../support/fake-server.ts';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../support/survey-builder.ts';
import { dock, limitOn, type PartOptions, press, renderBookPart, write } from '../tally/render-book-part.tsx';

/** The tabs and dialogs of the headless kit settle a task later than they are drawn. */
const settled = () => waitFor(() => expect(screen.getByRole('tab', { selected: true })).toBeTruthy());
const openTables = async (document: SurveyDocument, options: PartOptions = {}) => {
  const session = renderBookPart(<TablesPage />, document, options);
  await settled();
  return session;
};
const turnTo = async (name: string) => {
  fireEvent.click(screen.getByRole('tab', { name }));
  await settled();
};
const choose = (label: string | RegExp, value: string) => {
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
};
const roomNames = (document: SurveyDocument) => [...document.rooms.values()].map((room) => room.name);
const loft = () => withRoom(dock(), 'Loft', box(6, 0, 3, 4));

describe('the table of rooms', () => {
  it('adds a room by its measures and takes it in hand', async () => {
    const session = await openTables(groundFloor());
    write(/^Name/, 'Archive');
    write(/^Width/, '5 m');
    write(/^Depth/, '400 cm');
    press('Add the room');
    await waitFor(() => expect(roomNames(session.state.document)).toEqual(['Archive']));
    const made = session.state.roomInHand ?? '';
    expect(roomArea(session.state.document, made)).toBeCloseTo(20, 6);
    expect(within(screen.getByRole('table')).getByText('20.0')).toBeTruthy();
  });

  it('adds a room beside another one, sharing its wall', async () => {
    const session = await openTables(dock());
    choose('Where', uid('Dock'));
    choose('Which side', 'right');
    write(/^Width/, '3');
    write(/^Depth/, '4');
    press('Add the room');
    await waitFor(() => expect(session.state.document.rooms.size).toBe(2));
    // Four corners of the dock and two new ones: the wall between is shared.
    expect(session.state.document.corners.size).toBe(6);
  });

  it('refuses at the field, says why in the summary too, and keeps what was typed', async () => {
    const session = await openTables(dock());
    choose('Where', 'point');
    write(/^Width/, 'wide');
    write(/^Depth/, '4');
    press('Add the room');
    const width = screen.getByLabelText<HTMLInputElement>(/^Width/);
    await waitFor(() => expect(width.getAttribute('aria-invalid')).toBe('true'));
    expect(width.value).toBe('wide');
    expect(screen.getAllByText(/^Width must be a number, like 12\.5/)).toHaveLength(2);
    expect(document.activeElement?.textContent).toMatch(/There is a problem/);
    expect(session.state.document.rooms.size).toBe(1);
  });

  it('says whose floor a new room would lie over', async () => {
    await openTables(dock());
    choose('Where', 'point');
    write(/^Left edge/, '3');
    write(/^Bottom edge/, '2');
    write(/^Width/, '6');
    write(/^Depth/, '4');
    press('Add the room');
    const said = await screen.findAllByText(/Rooms must not overlap.*Dock/);
    expect(said).toHaveLength(2);
    expect(screen.getByLabelText<HTMLInputElement>(/^Left edge/).value).toBe('3');
  });

  it('names what goes with a room before it is deleted, and undo brings it back', async () => {
    const session = await openTables(loft());
    press('Delete Dock');
    const dialog = await screen.findByRole('dialog', { name: 'Delete Dock' });
    expect(dialog.textContent).toMatch(/Its one entry goes with it/);
    fireEvent.click(within(dialog).getByRole('button', { name: 'Delete the room' }));
    await settled();
    expect(roomNames(session.state.document)).toEqual(['Loft']);
    act(() => {
      session.undo();
    });
    expect(roomNames(session.state.document).sort()).toEqual(['Dock', 'Loft']);
    expect(entriesOfRoom(session.state.document, uid('Dock'))).toHaveLength(1);
  });

  it('shows a reader the same rows and nothing to change them with', async () => {
    await openTables(dock(), { canEdit: false });
    expect(screen.getByRole('button', { name: /^Dock/ })).toBeTruthy();
    expect(screen.queryByRole('button', { name: /^Delete/ })).toBeNull();
    expect(screen.queryByRole('form')).toBeNull();
  });
});

describe('what is known of a room', () => {
  it('saves each field when it is left', async () => {
    const session = await openTables(dock());
    await turnTo('This room');
    write(/^Clear height/, '12 ft');
    choose('Lining of the walls', 'concrete');
    choose('Detection', 'smoke');
    const room = session.state.document.rooms.get(uid('Dock'));
    // 12 ft × 0.3048 m
    expect(room?.height_m).toBeCloseTo(3.6576, 6);
    expect(room?.lining.walls).toEqual({ key: 'concrete' });
    expect(room?.protection.detection).toBe('smoke');
  });

  it('keeps a refused answer in its field beside the reason', async () => {
    const session = await openTables(dock());
    await turnTo('This room');
    // The door is 2 m high.
    write(/^Clear height/, '1.5');
    const height = screen.getByLabelText<HTMLInputElement>(/^Clear height/);
    expect(height.value).toBe('1.5');
    expect(height.getAttribute('aria-invalid')).toBe('true');
    expect(session.state.document.rooms.get(uid('Dock'))?.height_m).toBeNull();
  });
});

describe('the table of openings', () => {
  it('adds a window and puts it in the middle of its wall', async () => {
    const session = await openTables(withRoom(groundFloor(), 'Dock', box(0, 0, 6, 4)));
    await turnTo('Openings');
    choose('What', 'window');
    expect(screen.getByLabelText<HTMLInputElement>(/^Width/).value).toBe('1.2');
    press('Add the opening');
    await waitFor(() => expect(openingsOfRoom(session.state.document, uid('Dock'))).toHaveLength(1));
    const [window] = openingsOfRoom(session.state.document, uid('Dock'));
    // (6.0 − 1.2) ÷ 2
    expect(window).toMatchObject({ kind: 'window', state: 'fails', offset_m: 2.4 });
  });

  it('refuses an opening wider than its wall at the field', async () => {
    const session = await openTables(withRoom(groundFloor(), 'Dock', box(0, 0, 6, 4)));
    await turnTo('Openings');
    write(/^Width/, '7');
    press('Add the opening');
    await waitFor(() => expect(screen.getByRole('alert').textContent).toMatch(/There is a problem/));
    expect(screen.getByLabelText<HTMLInputElement>(/^Width/).value).toBe('7');
    expect(session.state.document.openings.size).toBe(0);
  });

  it('changes and deletes where it stands, and the focus stays in the table', async () => {
    const session = await openTables(dock());
    await turnTo('Openings');
    choose('State of Door', 'closed');
    expect(session.state.document.openings.get(uid('door'))?.state).toBe('closed');
    press('Delete Door');
    expect(session.state.document.openings.size).toBe(0);
    expect(screen.getByText(/Dock has no opening/)).toBeTruthy();
  });
});

describe('the table of contents', () => {
  const open = async (document = dock(), options: PartOptions = {}) => {
    const session = await openTables(document, options);
    await turnTo('Contents');
    return session;
  };
  const labels = (document: SurveyDocument) => entriesOfRoom(document, uid('Dock')).map((entry) => entry.label);

  it('adds something of the catalogue by count and mass', async () => {
    const session = await open();
    const what = screen.getByRole('combobox', { name: 'What it is' });
    fireEvent.focus(what);
    fireEvent.change(what, { target: { value: 'upholstered' } });
    const [option] = within(await screen.findByRole('listbox')).getAllByRole('option');
    if (option === undefined) throw new Error('the catalogue offers nothing');
    const label = option.querySelector('span')?.textContent ?? '';
    fireEvent.click(option);
    await waitFor(() => expect(screen.queryByLabelText(/^Net heat/)).toBeNull());
    write('Count', '3');
    press('Add to Dock');
    await waitFor(() => expect(labels(session.state.document)).toEqual(['Flats', label]));
    const [, added] = entriesOfRoom(session.state.document, uid('Dock'));
    expect(added).toMatchObject({ count: 3, evidence: 'counted', recorded_by: 'Ines Okoro' });
    expect(added?.kind).not.toBeNull();
  });

  it('adds something of one’s own with its heat', async () => {
    const session = await open();
    fireEvent.change(screen.getByRole('combobox', { name: 'What it is' }), { target: { value: 'Stage snow' } });
    write(/^Net heat/, '20');
    write('Count', '2');
    write(/^Mass of one \(/, '5');
    press('Add to Dock');
    await waitFor(() => expect(labels(session.state.document)).toEqual(['Flats', 'Stage snow']));
    // 2 × 5 kg × 20 MJ/kg = 200 MJ
    expect(session.tally(uid('Dock'))?.load.total.value).toBeCloseTo(2240, 6);
  });

  it('lists everything that is wrong and loses nothing', async () => {
    await open();
    fireEvent.change(screen.getByRole('combobox', { name: 'What it is' }), { target: { value: 'Stage snow' } });
    write('Count', 'many');
    write(/^Mass of one \(/, '-4');
    press('Add to Dock');
    const summary = await screen.findByRole('alert');
    expect(summary.textContent).toMatch(/Enter the net heat/);
    expect(summary.textContent).toMatch(/Count must be a number, like 3/);
    expect(summary.textContent).toMatch(/Mass of one must be between 0 kg/);
    expect(screen.getByLabelText<HTMLInputElement>('Count').value).toBe('many');
  });

  it('changes count, mass and keeping where they stand', async () => {
    const session = await open();
    write('Count of Flats', '10');
    write(/^Mass of one Flats/, '20');
    choose('How Flats is kept', 'fixed');
    const entry = session.state.document.entries.get(uid('Flats'));
    expect(entry).toMatchObject({ count: 10, keeping: 'fixed' });
    expect(entry?.parts[0]?.mass_kg).toBe(20);
    // 10 × 20 kg × 17 MJ/kg
    expect(session.tally(uid('Dock'))?.load.fixed.value).toBeCloseTo(3400, 6);
  });

  it('refuses an absurd mass at its field and keeps the text', async () => {
    const session = await open();
    write(/^Mass of one Flats/, '2000000');
    const mass = screen.getByLabelText<HTMLInputElement>(/^Mass of one Flats/);
    expect(mass.value).toBe('2000000');
    expect(mass.getAttribute('aria-invalid')).toBe('true');
    expect(session.state.document.entries.get(uid('Flats'))?.parts[0]?.mass_kg).toBe(10);
  });

  it('duplicates an entry beside itself', async () => {
    const session = await open();
    press('More of Flats');
    fireEvent.click(await screen.findByRole('button', { name: 'Duplicate' }));
    await settled();
    const [flats, copy] = entriesOfRoom(session.state.document, uid('Dock'));
    expect(copy).toMatchObject({ label: 'Flats', count: 12, x_m: (flats?.x_m ?? 0) + 0.2 });
  });

  it('moves an entry to a free place of another room', async () => {
    const session = await open(loft());
    press('More of Flats');
    fireEvent.change(await screen.findByLabelText('Room'), { target: { value: uid('Loft') } });
    await settled();
    expect(session.state.document.entries.get(uid('Flats'))?.room_id).toBe(uid('Loft'));
  });

  it('keeps the focus on the next row when one is deleted', async () => {
    const session = await open(withEntries(dock(), crate('Drapes', 'Dock', 4, 2)));
    press('Delete Flats');
    expect(labels(session.state.document)).toEqual(['Drapes']);
    expect((document.activeElement as HTMLElement).getAttribute('aria-label')).toBe('More of Drapes');
  });

  it('copies what stands in another room', async () => {
    const session = await open(withEntries(loft(), crate('Drapes', 'Dock', 4, 2)));
    act(() => {
      session.takeRoom(uid('Loft'));
    });
    expect(await screen.findByText('Nothing is recorded in Loft yet.')).toBeTruthy();
    press('Copy to Loft');
    const copies = entriesOfRoom(session.state.document, uid('Loft'));
    expect(copies.map((entry) => entry.label).sort()).toEqual(['Drapes', 'Flats']);
    expect(labels(session.state.document)).toHaveLength(2);
  });

  it('holds 5,000 rows with only those in sight in the page', async () => {
    const many = new Map(
      Array.from({ length: 5000 }, (_, index) => {
        const entry = crate(`E${index}`, 'Dock', 2, 2);
        return [entry.id, entry] as const;
      }),
    );
    await open({ ...dock(), entries: many });
    const table = screen.getByRole('table', { name: /5000 entries in Dock/ });
    expect(table.getAttribute('aria-rowcount')).toBe('5001');
    expect(table.querySelectorAll('tr').length).toBeLessThan(120);
    expect(screen.queryByRole('button', { name: 'E2500' })).toBeNull();

    const box = screen.getByRole('region', { name: 'Contents of Dock' });
    box.scrollTop = 2500 * 46;
    fireEvent.scroll(box);
    expect(screen.getByRole('button', { name: 'E2500' })).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'E0' })).toBeNull();
    expect(table.querySelectorAll('tr').length).toBeLessThan(120);
  });
});

describe('the table of limits', () => {
  const atBuilding = { buildingId: uid('building') };

  it('sets a limit and the standing follows', async () => {
    const server = fakeServer();
    server.answer(createLimit, atBuilding, (request) => ({
      ...limitOn('Dock'),
      ...(request.body as object),
      version: 1,
    }));
    const session = await openTables(dock());
    await turnTo('Limits');
    write(/^At most/, '80');
    write('Set by', 'permit 12/7');
    press('Set the limit');
    await waitFor(() => expect(session.state.limits).toHaveLength(1));
    expect(server.requests[0]?.body).toMatchObject({ room_id: uid('Dock'), bound: 80, source: 'permit' });
    expect(await screen.findByText('over')).toBeTruthy();
  });

  it('asks for a real date and a name before it sends anything', async () => {
    const server = fakeServer();
    await openTables(dock());
    await turnTo('Limits');
    write(/^At most/, '80');
    write('Since', '2026-02-31');
    press('Set the limit');
    const summary = await screen.findByRole('alert');
    expect(summary.textContent).toMatch(/Since must be a real date/);
    expect(summary.textContent).toMatch(/Enter who set it/);
    expect(server.requests).toHaveLength(0);
  });

  it('changes a limit with the version it read, and says so when somebody was faster', async () => {
    const server = fakeServer();
    const limit = limitOn('Dock');
    server.refuse(editLimit, { limitId: limit.id }, 412, 'Changed meanwhile.');
    server.answer(listLimits, atBuilding, { items: [{ ...limit, bound: 120, version: 2 }] });
    const session = await openTables(dock(), { limits: [limit] });
    await turnTo('Limits');
    press(/^Edit the limit/);
    const form = screen.getByRole('form', { name: 'Change a limit' });
    fireEvent.change(within(form).getByLabelText(/^At most/), { target: { value: '100' } });
    press('Change the limit');
    expect(await screen.findByText(/Somebody has changed this limit meanwhile/)).toBeTruthy();
    expect(server.requests[0]?.headers.get('if-match')).toBe('"v1"');
    expect(within(form).getByLabelText<HTMLInputElement>(/^At most/).value).toBe('100');
    expect(session.state.limits[0]?.bound).toBe(120);
    // What was typed can be sent again over what is there now.
    server.answer(editLimit, { limitId: limit.id }, { ...limit, bound: 100, version: 3 });
    press('Change the limit');
    await waitFor(() => expect(session.state.limits[0]?.bound).toBe(100));
    expect(server.requests.at(-1)?.headers.get('if-match')).toBe('"v2"');
  });

  it('takes a limit away only after asking', async () => {
    const server = fakeServer();
    const limit = limitOn('Dock');
    server.answer(deleteLimit, { limitId: limit.id }, undefined);
    const session = await openTables(dock(), { limits: [limit] });
    await turnTo('Limits');
    press(/^Take away the limit/);
    expect(server.requests).toHaveLength(0);
    press('Take it away');
    await waitFor(() => expect(session.state.limits).toHaveLength(0));
    expect(server.requests[0]?.headers.get('if-match')).toBe('"v1"');
  });
});

describe('the table of storeys', () => {
  it('adds a storey on top of the highest, renames it, and says how thick its walls are', async () => {
    const session = await openTables(groundFloor());
    await turnTo('Storeys');
    press('Add a storey');
    const added = [...session.state.document.storeys.values()][1];
    expect(added).toMatchObject({ name: 'Storey 2', level_m: 3, height_m: 3 });
    write('Name of Storey 2', 'Loft');
    write(/^Wall thickness of Loft/, '20 cm');
    expect(session.state.document.storeys.get(added?.id ?? '')).toMatchObject({ name: 'Loft', wall_thickness_m: 0.2 });
  });

  it('does not take a name away', async () => {
    const session = await openTables(groundFloor());
    await turnTo('Storeys');
    write('Name of Ground floor', '');
    const field = screen.getByLabelText<HTMLInputElement>('Name of Ground floor');
    expect(field.getAttribute('aria-invalid')).toBe('true');
    expect([...session.state.document.storeys.values()][0]?.name).toBe('Ground floor');
  });
});
