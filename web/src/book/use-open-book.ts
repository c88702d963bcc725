import { readCurrentSession } from '@embertally/shared/contracts/sessions';
import { useEffect, useState } from 'react';
import { call } from '../lib/api-client.ts';
import { keepOwnMaterials } from './keep-own-materials.ts';
import { openBook, type OpenBook } from './open-book.ts';
import { surveyFeed } from './sync/survey-feed.ts';

export type Opening =
  | { readonly state: 'opening' }
  | { readonly state: 'failed'; readonly error: Error; readonly retry: () => void }
  | ({ readonly state: 'open' } & OpenBook);

/** Opens the Book of a survey and keeps it in step with the server until the page is left. */
export function useOpenBook(surveyId: string): Opening {
  const [opening, setOpening] = useState<Opening>({ state: 'opening' });
  const [attempt, setAttempt] = useState(0);

  useEffect(() => {
    const stop = new AbortController();
    let leave = () => {
      stop.abort();
    };
    const open = async () => {
      setOpening({ state: 'opening' });
      const me = await call(readCurrentSession, { signal: stop.signal });
      const book = await openBook(surveyId, me, stop.signal);
      const silence = surveyFeed(surveyId, () => {
        book.sync.retryNow();
        void book.sync.catchUp();
      });
      const forget = keepOwnMaterials(book.session);
      leave = () => {
        forget();
        silence();
        book.sync.stop();
      };
      if (stop.signal.aborted) {
        leave();
        return;
      }
      setOpening({ state: 'open', ...book });
      // The engine and its catalogue come after the plan: one can draw before they are here.
      const { estimateRoom } = await import('@embertally/shared/tally/estimate-room');
      book.session.provideEngine((input) => estimateRoom(input, { spread: false }));
    };
    open().catch((error: unknown) => {
      if (stop.signal.aborted) return;
      setOpening({
        state: 'failed',
        error: error instanceof Error ? error : new Error(String(error)),
        retry: () => {
          setAttempt((count) => count + 1);
        },
      });
    });
    return () => {
      stop.abort();
      leave();
    };
  }, [surveyId, attempt]);

  return opening;
}
