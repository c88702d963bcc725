import type { ContentCheck } from './content-check.ts';

const HEAD = /^%PDF-[12]\.\d/;
const HEAD_BYTES = 8;
/** Readers look for the end mark in the last 1024 bytes (ISO 32000-1 annex H, implementation note 18). */
const TAIL_BYTES = 1024;

/** PDF: its first and its last mark. The file is stored and never opened here. */
export function pdfContent(): ContentCheck {
  let head = Buffer.alloc(0);
  let tail = Buffer.alloc(0);
  const begins = (): boolean => HEAD.test(head.toString('latin1'));
  return {
    push: (piece) => {
      if (head.length < HEAD_BYTES) head = Buffer.concat([head, piece]).subarray(0, HEAD_BYTES);
      tail = Buffer.concat([tail, piece]).subarray(-TAIL_BYTES);
      return head.length < HEAD_BYTES || begins();
    },
    end: () => begins() && tail.includes('%%EOF'),
  };
}
