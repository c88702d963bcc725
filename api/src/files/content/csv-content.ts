import type { ContentCheck } from './content-check.ts';

const TAB = 0x09;
const SPACE = 0x20;
const DELETE = 0x7f;
const LINE_ENDS = new Set([0x0a, 0x0d]);
const BYTE_ORDER_MARK = [0xef, 0xbb, 0xbf];
const HEAD_BYTES = 5;
/** How text begins that is something else: a page or a drawing, a report. */
const OTHER = /^(<|%PDF-)/;

/** Text in rows: no control characters but tabs and line ends, nothing of tags. Any one-byte or UTF-8 spelling is taken. */
export function csvContent(): ContentCheck {
  let at = 0;
  let head = '';
  let right = true;
  const look = (byte: number): void => {
    const isMark = BYTE_ORDER_MARK[at] === byte;
    at += 1;
    const isBlank = byte === SPACE || byte === TAB || LINE_ENDS.has(byte);
    if ((byte < SPACE && !isBlank) || byte === DELETE) right = false;
    if (head.length >= HEAD_BYTES || isMark || isBlank) return;
    head += String.fromCharCode(byte);
    if (OTHER.test(head)) right = false;
  };
  return {
    push: (piece) => {
      for (const byte of piece) look(byte);
      return right;
    },
    end: () => right && head !== '',
  };
}
