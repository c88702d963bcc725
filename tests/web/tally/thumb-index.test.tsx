import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { RoomsList } from '@embertally/web/src/book/tally/rooms-list.tsx';
import { ThumbIndex } from '@embertally/web/src/book/tally/thumb-index.tsx';
import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../support/survey-builder.ts';
import { dock, limitOn, renderBookPart } from './render-book-part.tsx';

function rooms(count: number): SurveyDocument {
  let document = groundFloor();
  for (let index = 0; index < count; index += 1) {
    document = withRoom(document, `R${index}`, box((index % 10) * 6, -Math.floor(index / 10) * 4, 6, 4));
  }
  return document;
}

const tabs = () => within(screen.getByRole('navigation', { name: 'Rooms of this storey' })).queryAllByRole('listitem');

describe('the thumb index', () => {
  it('says so where there is no room', () => {
    renderBookPart(<ThumbIndex />, groundFloor());
    expect(screen.getByText('No room on this storey yet.')).toBeTruthy();
  });

  it('has one tab per room, with figure and standing in words', () => {
    renderBookPart(<ThumbIndex />, dock(), { limits: [limitOn('Dock', { bound: 80 })] });
    expect(tabs()).toHaveLength(1);
    expect(tabs()[0]?.textContent).toBe('Dock85.0 MJ/m² over');
  });

  it('is one stop of the Tab key, and the arrow keys go on from there', () => {
    const session = renderBookPart(<ThumbIndex />, rooms(60));
    expect(tabs()).toHaveLength(60);
    const stops = () => tabs().filter((tab) => within(tab).getByRole('button').tabIndex === 0);
    expect(stops()).toHaveLength(1);
    const first = within(tabs()[0] as HTMLElement).getByRole('button');
    fireEvent.keyDown(first, { key: 'ArrowDown' });
    expect(session.state.roomInHand).toBe(uid('R1'));
    expect(document.activeElement?.textContent).toContain('R1');
    fireEvent.keyDown(document.activeElement as Element, { key: 'End' });
    expect(session.state.roomInHand).toBe(uid('R59'));
    fireEvent.keyDown(document.activeElement as Element, { key: 'ArrowDown' });
    expect(session.state.roomInHand).toBe(uid('R59'));
    fireEvent.keyDown(document.activeElement as Element, { key: 'Home' });
    expect(session.state.roomInHand).toBe(uid('R0'));
  });

  it('marks the room in hand', () => {
    renderBookPart(<ThumbIndex />, rooms(3));
    expect(screen.getAllByRole('button', { current: true }).map((button) => button.textContent)).toEqual([
      expect.stringContaining('R0'),
    ]);
  });
});

describe('the list of rooms', () => {
  const find = (text: string) => {
    fireEvent.change(screen.getByLabelText('Find a room, an entry, a material'), { target: { value: text } });
  };

  it('finds an entry by its material and takes its room in hand', () => {
    const document = withEntries(
      withRoom(dock(), 'Loft', box(6, 0, 6, 4)),
      crate('Old sofa', 'Loft', 8, 2, {
        parts: [{ ...crate('x', 'Loft', 8, 2).parts[0]!, label: 'Polyurethane foam' }],
      }),
    );
    const session = renderBookPart(<RoomsList />, document);
    find('FOAM');
    expect(screen.getByText('1 found')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: /Old sofa/ }));
    expect(session.state.roomInHand).toBe(uid('Loft'));
    expect(session.state.selection).toEqual([{ kind: 'entry', id: uid('Old sofa') }]);
  });

  it('says that nothing was found, keeping what was typed', () => {
    renderBookPart(<RoomsList />, dock());
    find('battery');
    expect(screen.getByText(/Nothing in this building holds “battery”/)).toBeTruthy();
    expect(screen.getByLabelText<HTMLInputElement>('Find a room, an entry, a material').value).toBe('battery');
  });

  it('counts the rooms that still have nothing recorded', () => {
    renderBookPart(<RoomsList />, rooms(3));
    expect(screen.getByText('3 rooms · 3 without contents')).toBeTruthy();
  });
});
