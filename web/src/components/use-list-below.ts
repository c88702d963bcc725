import { type RefObject, useLayoutEffect } from 'react';

const GAP_PX = 4;
const MOST_PX = 352;
/** With less than this below it the list stands above its field, if there is more. */
const LEAST_PX = 160;

/**
 * Keeps an open list at its field: below it, or above it where there is more space, as wide as the field. The list is one
 * of the browser's popovers, so that no frame around it cuts it off.
 */
export function useListBelow(field: RefObject<HTMLElement | null>, list: RefObject<HTMLElement | null>, open: boolean) {
  useLayoutEffect(() => {
    const shown = list.current;
    if (!open || shown === null) return;
    shown.showPopover();
    const place = (): void => {
      const box = field.current?.getBoundingClientRect();
      if (box === undefined) return;
      const below = window.innerHeight - box.bottom - 2 * GAP_PX;
      const above = box.top - 2 * GAP_PX;
      const goesUp = below < LEAST_PX && above > below;
      shown.style.left = `${box.left}px`;
      shown.style.width = `${box.width}px`;
      shown.style.maxHeight = `${Math.min(MOST_PX, goesUp ? above : below)}px`;
      shown.style.top = goesUp ? 'auto' : `${box.bottom + GAP_PX}px`;
      shown.style.bottom = goesUp ? `${window.innerHeight - box.top + GAP_PX}px` : 'auto';
    };
    place();
    window.addEventListener('scroll', place, { capture: true, passive: true });
    window.addEventListener('resize', place);
    return () => {
      window.removeEventListener('scroll', place, { capture: true });
      window.removeEventListener('resize', place);
    };
  }, [field, list, open]);
}
