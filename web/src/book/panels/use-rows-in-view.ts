import { type RefObject, useLayoutEffect, useState } from 'react';

/** Before a row has been drawn its height is not known. */
const FIRST_GUESS_PX = 46;
/** Rows drawn above and below what is in sight; the part in sight moves in steps of it. */
const AROUND = 12;

interface RowsInView {
  /** First row in the page, and the one after the last. */
  readonly from: number;
  readonly to: number;
  /** What stands for the rows that are left out. */
  readonly before_px: number;
  readonly after_px: number;
}

/**
 * Which rows of a long table are drawn: those in sight and a few around them.
 * @param scroll The box that scrolls, with the table in it; the first row drawn says how tall a row is.
 */
export function useRowsInView(scroll: RefObject<HTMLElement | null>, count: number): RowsInView {
  const [seen, setSeen] = useState({ step: 0, rows: AROUND, row_px: FIRST_GUESS_PX });
  useLayoutEffect(() => {
    const box = scroll.current;
    if (box === null) return;
    const look = (): void => {
      const drawn = box.querySelector('tbody > tr:not([aria-hidden])')?.getBoundingClientRect().height ?? 0;
      setSeen((before) => {
        const row_px = drawn > 0 ? drawn : before.row_px;
        const step = Math.floor(box.scrollTop / (row_px * AROUND));
        const rows = Math.ceil(box.clientHeight / row_px);
        const same = before.step === step && before.rows === rows && before.row_px === row_px;
        return same ? before : { step, rows, row_px };
      });
    };
    look();
    box.addEventListener('scroll', look, { passive: true });
    const resized = new ResizeObserver(look);
    resized.observe(box);
    return () => {
      box.removeEventListener('scroll', look);
      resized.disconnect();
    };
  }, [scroll]);
  const from = Math.max(0, Math.min((seen.step - 1) * AROUND, count - 1));
  const to = Math.min(count, (seen.step + 2) * AROUND + seen.rows);
  return { from, to, before_px: from * seen.row_px, after_px: (count - to) * seen.row_px };
}
