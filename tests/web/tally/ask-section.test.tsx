import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import { AskSection } from '@embertally/web/src/book/tally/questions/ask-section.tsx';
import { act, fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { crate, uid, withEntries } from '../../support/survey-builder.ts';
import { dock, limitOn, press, renderBookPart, write } from './render-book-part.tsx';

async function unfold(title: string): Promise<void> {
  const fold = screen.getByText(title).closest('details');
  if (fold === null) throw new Error(`There is no question ${title}.`);
  fold.open = true;
  fireEvent(fold, new Event('toggle'));
  await within(fold).findByRole('button', { name: 'Work it out' });
}

/** Types and takes the first that fits. */
async function pick(text: string): Promise<void> {
  const box = screen.getByLabelText('What is added');
  fireEvent.focus(box);
  fireEvent.change(box, { target: { value: text } });
  await screen.findByRole('listbox');
  // The list settles on where it stands.
  await act(async () => {
    fireEvent.keyDown(box, { key: 'Enter' });
    await Promise.resolve();
  });
}

const choose = (label: string, value: string) => {
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
};
const said = () => screen.getByRole('status').textContent.replaceAll(/\s+/g, ' ');

describe('questions of a room', () => {
  it('says how much of a material fits under the limit that is set', async () => {
    renderBookPart(<AskSection roomId={uid('Dock')} />, dock(), { limits: [limitOn('Dock')] });
    await unfold('How many more fit?');
    await pick('timber as used');
    press('Work it out');
    // (90 − 85) MJ/m² × 24 m² = 120 MJ; 85 is 94 % of 90, so the room is near already.
    expect(said()).toMatch(/more of .*: fire load density stays at or under 90\.0 MJ\/m²/);
    expect(said()).toMatch(/at 90 % of 90 MJ\/m² or above already/);
    press(/^How much more of .* fits: .*Show its working$/);
    expect((await screen.findByRole('dialog')).textContent).toMatch(/question\.how-many@1/);
  });

  it('asks for what is lacking and loses nothing', async () => {
    renderBookPart(<AskSection roomId={uid('Dock')} />, dock());
    await unfold('How many more fit?');
    press('Work it out');
    expect(screen.getByText('Choose a kind or a material of the list')).toBeTruthy();
    expect(screen.getByText('Enter the bound to hold to')).toBeTruthy();
    await pick('timber as used');
    write(/^Bound/, '170');
    press('Work it out');
    expect(said()).toMatch(/stays at or under 170 MJ\/m²/);
  });

  it('keeps an old answer beside the word that the room has changed', async () => {
    const session = renderBookPart(<AskSection roomId={uid('Dock')} />, dock());
    await unfold('What would change it?');
    choose('By', 'room');
    choose('What shall be another one', 'regime');
    press('Work it out');
    expect(said()).toMatch(
      /Now, at 3\.00 m: one room that can fill with a hot layer\.\s*From 6\.00 m on: a large room/,
    );
    act(() => {
      session.run(editRoom, { room_id: uid('Dock'), patch: { height_m: 4 } }, 'Measured again');
    });
    expect(said()).toMatch(/The room has changed since this was asked/);
    press('Work it out');
    expect(said()).toMatch(/^Now, at 4\.00 m/);
  });

  it('tells the gap of a pair, or what it lacks', async () => {
    renderBookPart(
      <AskSection roomId={uid('Dock')} />,
      withEntries(dock(), crate('Drapes', 'Dock', 4, 2, { count: 2 })),
    );
    await unfold('What gap is enough?');
    press('Work it out');
    expect(said()).toMatch(/As they stand.*Just not lit.*Enough: not lit by twice the radiation/);
    choose('To be kept from lighting', uid('Flats'));
    press('Work it out');
    expect(said()).toMatch(/Choose two different entries/);
  });

  it('needs two entries for a gap', async () => {
    renderBookPart(<AskSection roomId={uid('Dock')} />, dock());
    const fold = screen.getByText('What gap is enough?').closest('details');
    if (fold === null) throw new Error('The question is there.');
    fold.open = true;
    fireEvent(fold, new Event('toggle'));
    expect(await within(fold).findByText('A gap needs two entries in the room.')).toBeTruthy();
  });
});
