import { applyChanges } from '@embertally/shared/survey/apply-changes';
import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { estimateSpread } from '@embertally/shared/tally/estimate-spread';
import { CalculationContext } from '@embertally/web/src/book/session/calculation-context.ts';
import type { CalculationThread } from '@embertally/web/src/book/session/calculation-thread.ts';
import { useRoomTally } from '@embertally/web/src/book/session/use-room-tally.ts';
import { useBook } from '@embertally/web/src/book/session/use-book.ts';
import { SpreadPlay } from '@embertally/web/src/book/spread/spread-play.ts';
import { SpreadPlayContext } from '@embertally/web/src/book/spread/spread-play-context.ts';
import { SpreadPlayer } from '@embertally/web/src/book/spread/spread-player.tsx';
import { type WorkingAsked, WorkingContext } from '@embertally/web/src/book/tally/working-context.ts';
import { SpreadPart } from '@embertally/web/src/book/tally/spread/spread-part.tsx';
import { act, fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { chainRoom } from '../../../support/chain-room.ts';
import { crate, GROUND, groundFloor, uid, withEntries } from '../../../support/survey-builder.ts';
import { press, renderBookPart } from '../render-book-part.tsx';

/** The real calculation, in the same thread. */
const here = (): CalculationThread => ({
  run: (task) => Promise.resolve(estimateSpread(task.input, { workings: true }) as never),
  close: () => undefined,
});

function Part() {
  const roomId = useBook((state) => state.roomInHand);
  const document = useBook((state) => state.document);
  const tally = useRoomTally(roomId);
  const room = document.rooms.get(roomId ?? '');
  if (tally === null || room === undefined) return null;
  return (
    <>
      <SpreadPart tally={tally} room={room} entries={document.entries} onGive={() => undefined} />
      <SpreadPlayer />
    </>
  );
}

function open(document: SurveyDocument) {
  const play = new SpreadPlay(() => () => undefined);
  const asked: WorkingAsked[] = [];
  const session = renderBookPart(
    <CalculationContext value={here}>
      <SpreadPlayContext value={play}>
        <WorkingContext value={(one) => asked.push(one)}>
          <Part />
        </WorkingContext>
      </SpreadPlayContext>
    </CalculationContext>,
    document,
  );
  return { session, play, asked };
}

const den = (): SurveyDocument => {
  const empty = groundFloor();
  return applyChanges(empty, chainRoom(empty, GROUND));
};
const events = () => screen.findByRole('table', { name: /What lights, when and by what/ });

describe('what sets what alight', () => {
  it('tells the order of ignition that another solver found', async () => {
    open(den());
    const rows = within(await events())
      .getAllByRole('row')
      .slice(1);
    expect(rows.map((row) => row.textContent?.replaceAll(/\s+/g, ' '))).toEqual([
      expect.stringMatching(/^1Sofa.*burns first/),
      // 140.57 s
      expect.stringMatching(/^2Bed.*radiation, most of it from Sofa.*2 min 21 s/),
      // 183.10 s, both at once and so in the order of their ids
      expect.stringMatching(/^3Cupboard.*flashover of the room.*3 min 3 s/),
      expect.stringMatching(/^4Boards.*flashover of the room.*3 min 3 s/),
    ]);
    expect(screen.getByRole('option', { name: 'The worst of all: Sofa' })).toBeTruthy();
    expect(screen.getByRole('button', { name: /^Heat released by the order of ignition: 3.200 MJ/ })).toBeTruthy();
  });

  it('follows another first entry when one is chosen', async () => {
    open(den());
    await events();
    fireEvent.change(screen.getByLabelText('What burns first'), { target: { value: uid('Bed') } });
    // Flashover from the bed: 186.75 s.
    expect(await screen.findByRole('button', { name: /^Flashover by the order of ignition: 3 min 7 s/ })).toBeTruthy();
  });

  it('shows a moment on the plan, goes from event to event and is taken off', async () => {
    const { play } = open(den());
    await events();
    press(/^Bed: show this moment on the plan/);
    const player = screen.getByRole('group', { name: 'Fire on the plan' });
    expect(player.textContent).toMatch(/2 min 20 s.*Bed is lit by radiation, most of it from Sofa · 2 entries alight/);
    fireEvent.click(within(player).getByRole('button', { name: /^On/ }));
    expect(player.textContent).toMatch(/the room has flashed over · 4 entries alight/);
    const now = within(await events())
      .getAllByRole('row')
      .map((row) => row.getAttribute('aria-current'));
    expect(now).toEqual([null, null, null, null, 'step']);
    fireEvent.keyDown(player, { key: 'Escape' });
    expect(play.get().fire).toBeNull();
  });

  it('takes the fire off the plan when the room is edited', async () => {
    const { session, play } = open(den());
    await events();
    press('Play on the plan');
    expect(play.get()).toMatchObject({ running: true });
    act(() => {
      session.run(editEntries, { entry_ids: [uid('Bed')], patch: { count: 2 } }, 'Counted again');
    });
    expect(play.get()).toMatchObject({ fire: null, running: false });
    expect(session.state.announcement.text).toMatch(/room has changed/);
  });

  it('draws a gap on the plan with the length that would be enough', async () => {
    const { play } = open(den());
    await events();
    press(/^Sofa to Bed: show the gap on the plan/);
    // 2.6 − 0.6 − (0.9 + 2) / 2 = 0.55 m
    expect(play.get().gap?.gap_m).toBeCloseTo(0.55, 9);
    expect(screen.getByRole('group', { name: 'Gap on the plan' }).textContent).toMatch(/Sofa to Bed: 0\.550 m apart/);
  });

  it('opens the working that came with the answer', async () => {
    const { asked } = open(den());
    await events();
    press(/^Time of ignition: Bed: 2 min 21 s/);
    expect(asked[0]).toMatchObject({ path: 'spread.events.1.t', name: 'Time of ignition: Bed' });
    const quantities = asked[0]?.estimate?.inputs?.map((input) => [input.symbol, input.value]);
    expect(quantities).toContainEqual(['q_cr', 10]);
    expect(quantities).toContainEqual(['dose', 6000]);
  });

  it('says which input would help where nothing has a place or nothing burns', async () => {
    const room = den();
    open({ ...room, entries: new Map() });
    expect(await screen.findByText('Nothing that burns is recorded in the room.')).toBeTruthy();
    expect(screen.getByRole('button', { name: /^Go to the contents/ })).toBeTruthy();
  });

  it('says so where one entry stands alone', async () => {
    const room = den();
    const one = crate('Chest', 'Den', 2, 2, { peak_kW: 200, growth: 'slow', ignition_class: 'hard' });
    open(withEntries({ ...room, entries: new Map() }, one));
    expect(within(await events()).getAllByRole('row')).toHaveLength(2);
    expect(screen.getByText('No two entries on the plan stand within 10 m of each other.')).toBeTruthy();
  });
});
