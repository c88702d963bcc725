import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** A page as it looks: grey values row by row, 0 black to 255 white. */
export interface PageImage {
  readonly width: number;
  readonly height: number;
  readonly grey: Uint8Array;
}

let found = false;

/** Debian's poppler-utils, installed when absent, so that what a PDF shows is read by a program that is not ours. */
function ensurePoppler(): void {
  if (found) return;
  if (spawnSync('pdftotext', ['-v']).error !== undefined) {
    const install = spawnSync('apt-get', ['install', '-yq', '--no-install-recommends', 'poppler-utils']);
    if (install.status !== 0) {
      throw new Error('These tests read PDF files with poppler-utils. Install it: sudo apt-get install poppler-utils');
    }
  }
  found = true;
}

function run(tool: string, pdf: Uint8Array, before: readonly string[], after: readonly string[] = []): Buffer {
  ensurePoppler();
  const folder = mkdtempSync(join(tmpdir(), 'embertally-pdf-'));
  try {
    const file = join(folder, 'report.pdf');
    writeFileSync(file, pdf);
    const result = spawnSync(tool, [...before, file, ...after], { maxBuffer: 1 << 30 });
    if (result.status !== 0) throw new Error(`${tool}: ${result.stderr.toString()}`);
    return result.stdout;
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** The text of every page, in the order it is read, with its columns apart. */
export function pageTexts(pdf: Uint8Array): string[] {
  return run('pdftotext', pdf, ['-layout', '-enc', 'UTF-8'], ['-']).toString('utf8').split('\f').slice(0, -1);
}

/** What the file says about itself: title, author, pages, dates, page size. */
export function pdfFacts(pdf: Uint8Array): Map<string, string> {
  const lines = run('pdfinfo', pdf, ['-isodates']).toString('utf8').split('\n');
  return new Map(lines.map((line) => [line.slice(0, line.indexOf(':')), line.slice(line.indexOf(':') + 1).trim()]));
}

export interface PdfFont {
  readonly name: string;
  readonly embedded: boolean;
  readonly subset: boolean;
  readonly unicode: boolean;
}

export function pdfFonts(pdf: Uint8Array): PdfFont[] {
  const lines = run('pdffonts', pdf, []).toString('utf8').split('\n').slice(2);
  return lines.filter(Boolean).map((line) => {
    const [embedded, subset, unicode] = line.trim().split(/\s+/).slice(-5);
    return {
      name: line.split(' ')[0] ?? '',
      embedded: embedded === 'yes',
      subset: subset === 'yes',
      unicode: unicode === 'yes',
    };
  });
}

/** Pages `from` to `to` (from 1) as they look at `dpi`. */
export function pageImages(pdf: Uint8Array, dpi: number, from = 1, to = 10_000): PageImage[] {
  const bytes = run('pdftoppm', pdf, ['-gray', '-r', String(dpi), '-f', String(from), '-l', String(to)]);
  const images: PageImage[] = [];
  for (let at = 0; at < bytes.length;) {
    const head = /^P5\s(\d+)\s(\d+)\s255\s/.exec(bytes.subarray(at, at + 40).toString('latin1'));
    if (head === null) throw new Error('pdftoppm gave no picture');
    const [width, height] = [Number(head[1]), Number(head[2])];
    const start = at + head[0].length;
    images.push({ width, height, grey: bytes.subarray(start, start + width * height) });
    at = start + width * height;
  }
  return images;
}

/** Share of a picture's pixels that are darker than `below`. */
export function inkShare({ grey }: PageImage, below = 160): number {
  return grey.reduce((dark, value) => dark + (value < below ? 1 : 0), 0) / grey.length;
}
