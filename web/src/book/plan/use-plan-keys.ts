import { useEffect, type RefObject } from 'react';
import type { ActionWorld } from '../actions/action.ts';
import { keyName } from '../actions/key-name.ts';
import { runKey } from '../actions/run-key.ts';

/**
 * Undo and redo answer everywhere in the Book; all other keys while the plan page has the focus, or nothing a person
 * chose has it: a Book just opened, with the focus on its heading or nowhere, answers to its keys.
 */
const EVERYWHERE = new Set(['Control+Z', 'Control+Shift+Z', 'Control+Y']);

/** Listens for the keys of the plan; never while somebody types. */
export function usePlanKeys(page: RefObject<HTMLElement | null>, world: ActionWorld, showKeys: () => void): void {
  const { session, host } = world;
  useEffect(() => {
    const listen = (event: KeyboardEvent) => {
      const { target } = event;
      if (event.defaultPrevented || (target instanceof Element && isTyping(target))) return;
      const name = keyName(event);
      const onPlan = target instanceof Element && (hasNoFocus(target) || (page.current?.contains(target) ?? false));
      if (!onPlan && !EVERYWHERE.has(name)) return;
      // A button is pressed with Enter and Space; its arrows and letters still belong to the plan.
      if (name === '?') showKeys();
      else if (name === 'Escape') host.cancel();
      else if (!runKey(event, { session, host })) return;
      event.preventDefault();
    };
    window.addEventListener('keydown', listen);
    return () => {
      window.removeEventListener('keydown', listen);
    };
  }, [page, session, host, showKeys]);
}

function hasNoFocus(target: Element): boolean {
  return ['BODY', 'MAIN', 'H1'].includes(target.tagName);
}

function isTyping(target: Element): boolean {
  return (
    target.closest('input:not([type="radio"]), textarea, select, [contenteditable="true"], [role="dialog"]') !== null
  );
}
