import { EntryStrip } from '@embertally/web/src/book/plan/entry-strip.tsx';
import { BookProvider } from '@embertally/web/src/book/session/book-provider.tsx';
import type { BookSession } from '@embertally/web/src/book/session/book-session.ts';
import { useBook } from '@embertally/web/src/book/session/use-book.ts';
import { act, fireEvent, render, screen } from '@testing-library/react';
import { expect, test } from 'vitest';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../../support/survey-builder.ts';
import { openedBook } from '../book-driver.ts';

function Strip() {
  const entry = useBook((state) => state.document.entries.get(uid('a')));
  return entry === undefined ? <p>gone</p> : <EntryStrip entry={entry} />;
}

function shown(): {
  session: BookSession;
  entry: () => ReturnType<BookSession['state']['document']['entries']['get']>;
} {
  const document = withEntries(withRoom(groundFloor(), 'store', box(0, 0, 6, 4)), crate('a', 'store', 2, 2));
  const { session } = openedBook(document);
  session.select([{ kind: 'entry', id: uid('a') }]);
  render(
    <BookProvider session={session}>
      <Strip />
    </BookProvider>,
  );
  return { session, entry: () => session.state.document.entries.get(uid('a')) };
}

function type(label: RegExp, text: string, key = 'Enter'): HTMLInputElement {
  const field = screen.getByLabelText<HTMLInputElement>(label);
  fireEvent.change(field, { target: { value: text } });
  fireEvent.keyDown(field, { key });
  return field;
}

test('a field commits on Enter, as one step', () => {
  const { session, entry } = shown();
  type(/Count/, '3');
  expect(entry()?.count).toBe(3);
  expect(session.state.canUndo).toMatch(/Counted/);
});

test('a mass in other units is taken in kilograms', () => {
  const { entry } = shown();
  type(/Mass each/, '22 lb');
  expect(entry()?.parts[0]?.mass_kg).toBeCloseTo(22 * 0.45359237, 6);
});

test('what is refused is said at its field and stays as it was typed', () => {
  const { entry } = shown();
  const field = type(/Mass each/, '1500 t');
  expect(entry()?.parts[0]?.mass_kg).toBe(10);
  expect(field.value).toBe('1500 t');
  expect(field).toHaveProperty('ariaInvalid', 'true');
  expect(screen.getByRole('alert').textContent).not.toBe('');
});

test('Escape restores what stands in the document', () => {
  const { entry } = shown();
  const field = type(/Count/, '99', 'Escape');
  expect(field.value).toBe('1');
  expect(entry()?.count).toBe(1);
});

test('delete takes the entry, undo brings it back', () => {
  const { session } = shown();
  fireEvent.click(screen.getByRole('button', { name: 'Delete' }));
  expect(screen.getByText('gone')).toBeTruthy();
  act(() => {
    session.undo();
  });
  expect(screen.getByLabelText<HTMLInputElement>(/Count/).value).toBe('1');
});
