import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { CalculationContext } from '@embertally/web/src/book/session/calculation-context.ts';
import type { CalculationTask } from '@embertally/web/src/book/session/calculation-message.ts';
import {
  CalculationStoppedError,
  type CalculationThread,
} from '@embertally/web/src/book/session/calculation-thread.ts';
import { useBook } from '@embertally/web/src/book/session/use-book.ts';
import { useRoomUncertainty } from '@embertally/web/src/book/session/use-room-uncertainty.ts';
import { HowSure } from '@embertally/web/src/book/tally/uncertainty/how-sure.tsx';
import { withSamples } from '@embertally/web/src/book/tally/with-samples.ts';
import { TallyHeadline } from '@embertally/web/src/book/tally/tally-headline.tsx';
import { useRoomTally } from '@embertally/web/src/book/session/use-room-tally.ts';
import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import { act, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { uid } from '../../support/survey-builder.ts';
import { dock, press, renderBookPart } from './render-book-part.tsx';

interface Held {
  readonly task: CalculationTask;
  readonly answer: () => void;
  readonly fail: (message: string) => void;
  readonly progress: (fraction: number) => void;
  readonly stopped: () => boolean;
}

/** A thread of the test's own: it answers when it is told to, with the real calculation. */
function heldThread(): { held: Held[]; make: () => CalculationThread } {
  const held: Held[] = [];
  const make = (): CalculationThread => ({
    run: (task, onProgress, signal) =>
      new Promise((resolve, reject) => {
        signal.addEventListener('abort', () => reject(new CalculationStoppedError()));
        held.push({
          task,
          answer: () => {
            const tally = estimateRoom(task.input, { workings: true, spread: false });
            resolve({ uncertainty: tally.uncertainty, band: tally.load.band, missing: tally.missing } as never);
          },
          fail: (message) => reject(new Error(message)),
          progress: onProgress,
          stopped: () => signal.aborted,
        });
      }),
    close: () => undefined,
  });
  return { held, make };
}

function Part() {
  const roomId = useBook((state) => state.roomInHand);
  const tally = useRoomTally(roomId);
  const sure = useRoomUncertainty(roomId);
  if (tally === null) return null;
  return (
    <>
      <TallyHeadline tally={withSamples(tally, sure.value)} limits={[]} />
      <HowSure sure={sure} name="Dock" />
    </>
  );
}

async function opened() {
  const thread = heldThread();
  const session = renderBookPart(
    <CalculationContext value={thread.make}>
      <Part />
    </CalculationContext>,
    dock(),
  );
  await waitFor(() => expect(thread.held).toHaveLength(1), { timeout: 5000 });
  return { ...thread, session };
}
const tell = async (run: () => void) => {
  await act(async () => {
    run();
    await Promise.resolve();
  });
};

describe('how sure a room is', () => {
  it('stands to first order at once and from samples when they are drawn', async () => {
    const { held } = await opened();
    expect(screen.getByText(/to first order\.$/)).toBeTruthy();
    expect(held[0]?.task).toMatchObject({ kind: 'uncertainty', input: { options: { samples: 20_000, seed: 1 } } });
    await tell(() => held[0]?.progress(0.4));
    expect(screen.getByText('40 %')).toBeTruthy();
    await tell(() => held[0]?.answer());
    expect(await screen.findByText(/from samples\.$/)).toBeTruthy();
    const bands = screen.getByRole('table', { name: /How sure each number is/ });
    expect(within(bands).getByRole('row', { name: /^Fire load density/ })).toBeTruthy();
    expect(screen.getByText(/^What matters most: .+ % of the variance\.$/)).toBeTruthy();
  });

  it('lets go of an answer that came too late, and asks again', async () => {
    const { held, session } = await opened();
    await tell(() => {
      session.run(editEntries, { entry_ids: [uid('Flats')], patch: { evidence: 'hearsay' } }, 'Changed an entry');
    });
    expect(held[0]?.stopped()).toBe(true);
    await tell(() => held[0]?.answer());
    expect(screen.getByText(/to first order\.$/)).toBeTruthy();
    await waitFor(() => expect(held).toHaveLength(2), { timeout: 5000 });
    await tell(() => held[1]?.answer());
    expect(await screen.findByText(/from samples\.$/)).toBeTruthy();
  });

  it('can be stopped, keeps the first-order band and can be drawn after all', async () => {
    const { held } = await opened();
    press('Stop');
    expect(held[0]?.stopped()).toBe(true);
    expect(screen.getByText(/Stopped: the band above is the first-order one/)).toBeTruthy();
    press('Draw the samples');
    await waitFor(() => expect(held).toHaveLength(2), { timeout: 5000 });
  });

  it('says what went wrong and what is kept', async () => {
    const { held } = await opened();
    await tell(() => held[0]?.fail('The thread ended.'));
    expect(await screen.findByText(/The thread ended\. The band above is the first-order one/)).toBeTruthy();
    press('Try again');
    await waitFor(() => expect(held).toHaveLength(2), { timeout: 5000 });
  });
});
