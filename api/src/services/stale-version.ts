import { Fault } from '../fault.ts';

/** Somebody else changed the thing first: the answer carries it as it is now, so that nothing typed is lost. */
export function staleVersion(current: unknown): Fault {
  return new Fault(
    'stale',
    'changed-meanwhile',
    'Somebody else changed this after you read it, so nothing was changed. What it is now comes with this answer.',
    { extra: { current } },
  );
}
