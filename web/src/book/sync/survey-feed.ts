import { readEvents } from '@embertally/shared/contracts/surveys';
import { contractUrl } from '../../lib/contract-url.ts';

/**
 * Tells when others have changed the survey. One tab of the browser holds the stream (a browser allows few connections)
 * and passes the word on to the others; when it closes the next tab takes over.
 * @param heard Called on every word; the listener fetches what changed.
 * @returns Stops listening.
 */
export function surveyFeed(surveyId: string, heard: () => void): () => void {
  const stop = new AbortController();
  const channel = new BroadcastChannel(`embertally-survey-${surveyId}`);
  channel.addEventListener('message', heard);
  const leave = new Promise<void>((resolve) => {
    stop.signal.addEventListener('abort', () => {
      resolve();
    });
  });
  const lead = async () => {
    const events = new EventSource(contractUrl(readEvents, { surveyId }, undefined));
    const pass = () => {
      heard();
      channel.postMessage('changed');
    };
    events.addEventListener('message', pass);
    events.addEventListener('change-set', pass);
    // After a lost connection something may have been missed.
    events.addEventListener('open', heard);
    await leave;
    events.close();
  };
  navigator.locks.request(`embertally-survey-${surveyId}`, { signal: stop.signal }, lead).catch((error: unknown) => {
    if (!stop.signal.aborted) throw error;
  });
  const lookAgain = () => {
    if (document.visibilityState === 'visible') heard();
  };
  document.addEventListener('visibilitychange', lookAgain);
  window.addEventListener('online', heard);
  return () => {
    stop.abort();
    channel.close();
    document.removeEventListener('visibilitychange', lookAgain);
    window.removeEventListener('online', heard);
  };
}
