import { useSyncExternalStore } from 'react';

const QUERY = '(prefers-reduced-motion: reduce)';

function subscribe(changed: () => void): () => void {
  const query = matchMedia(QUERY);
  query.addEventListener('change', changed);
  return () => {
    query.removeEventListener('change', changed);
  };
}

/** Whether this person has asked their system for less motion: nothing runs by itself then. */
export function useStillness(): boolean {
  return useSyncExternalStore(subscribe, () => matchMedia(QUERY).matches);
}
