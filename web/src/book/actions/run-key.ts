import type { ActionWorld } from './action.ts';
import { keyName, type PressedKey } from './key-name.ts';
import { ALL_ACTIONS } from './plan-actions.ts';

/** Runs the action of a pressed key. Returns false when no action has it or none is available now. */
export function runKey(event: PressedKey, world: ActionWorld): boolean {
  const name = keyName(event);
  const action = ALL_ACTIONS.find((candidate) => candidate.keys.includes(name));
  if (action === undefined || !action.isAvailable(world.session.state)) return false;
  action.run(world);
  return true;
}
