import { listMaterials } from '@embertally/shared/contracts/materials';
import { OfflineError } from '../lib/api-errors.ts';
import { call } from '../lib/api-client.ts';
import type { BookSession } from './session/book-session.ts';

/**
 * Brings the approved materials of the person's organisation into an open Book, and looks again when the page is returned to
 * or the network is back: a newer version may have been approved meanwhile.
 *
 * @returns Stops looking.
 */
export function keepOwnMaterials(session: BookSession): () => void {
  const stop = new AbortController();
  const { signal } = stop;
  const read = async (): Promise<void> => {
    try {
      const { items } = await call(listMaterials, { query: { of: 'own' }, signal });
      session.provideOwnMaterials(items);
    } catch (error) {
      // Without a network the built-in ones are there, and what was read before.
      if (!signal.aborted && !(error instanceof OfflineError)) reportError(error);
    }
  };
  const lookAgain = (): void => {
    if (document.visibilityState === 'visible') void read();
  };
  document.addEventListener('visibilitychange', lookAgain, { signal });
  window.addEventListener('online', lookAgain, { signal });
  void read();
  return () => {
    stop.abort();
  };
}
