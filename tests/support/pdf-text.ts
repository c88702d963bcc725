import { execFileSync } from 'node:child_process';

/** The text of a PDF file as another program reads it (pdftotext of Debian's poppler-utils). */
export function pdfText(file: string): string {
  return execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 });
}
