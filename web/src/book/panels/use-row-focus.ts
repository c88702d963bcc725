import { useEffect, useRef, type RefObject } from 'react';

interface RowFocus<E extends HTMLElement> {
  /** Goes on the table's frame, which must be focusable by script. */
  readonly rootRef: RefObject<E | null>;
  /** Call before deleting a row: focus goes to the next row's own button, else the one before, else the frame. */
  readonly focusAfter: (rowId: string) => void;
}

/** Keeps the focus in the table when the row it stood in goes. A row's button carries `data-row-action` with its id. */
export function useRowFocus<E extends HTMLElement>(): RowFocus<E> {
  const rootRef = useRef<E>(null);
  const wanted = useRef<readonly string[] | null>(null);
  useEffect(() => {
    if (wanted.current === null) return;
    const buttons = [...(rootRef.current?.querySelectorAll<HTMLElement>('[data-row-action]') ?? [])];
    const target = wanted.current
      .map((id) => buttons.find((button) => button.dataset.rowAction === id))
      .find((button) => button !== undefined);
    wanted.current = null;
    (target ?? rootRef.current)?.focus();
  });
  return {
    rootRef,
    focusAfter: (rowId) => {
      const ids = [...(rootRef.current?.querySelectorAll<HTMLElement>('[data-row-action]') ?? [])].map(
        (button) => button.dataset.rowAction ?? '',
      );
      const at = ids.indexOf(rowId);
      wanted.current = [...ids.slice(at + 1, at + 2), ...ids.slice(Math.max(0, at - 1), at)];
    },
  };
}
