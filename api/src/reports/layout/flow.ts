import type { PdfFile } from '../pdf/pdf-file.ts';
import type { Sheet } from '../pdf/sheet.ts';
import { MARGIN, PAPER_LONG, PAPER_SHORT } from './theme.ts';

export interface FlowPage {
  readonly sheet: Sheet;
  /** What the page belongs to, for the running header: "Tally · Scenery dock". */
  readonly section: string;
}

/** Fills pages from top to bottom: knows the page in hand, where the next thing goes and when a new page is due. */
export class Flow {
  readonly file: PdfFile;
  readonly pages: FlowPage[] = [];
  /** Top of the free space on the page in hand, in points from the top edge. */
  y = 0;
  private section = '';
  private orientation: 'portrait' | 'landscape' = 'portrait';
  private readonly waiting: (() => void)[] = [];
  private current: Sheet | undefined;

  constructor(file: PdfFile) {
    this.file = file;
  }

  get sheet(): Sheet {
    if (this.current === undefined) throw new Error('A page is started before anything is drawn on it.');
    return this.current;
  }

  get left(): number {
    return MARGIN.left;
  }

  get right(): number {
    return this.sheet.width - MARGIN.right;
  }

  get width(): number {
    return this.right - this.left;
  }

  get bottom(): number {
    return this.sheet.height - MARGIN.bottom;
  }

  /** Height that is left on the page in hand. */
  get free(): number {
    return this.bottom - this.y;
  }

  /** Height of an empty page of the section in hand. */
  get fullHeight(): number {
    return (this.orientation === 'portrait' ? PAPER_LONG : PAPER_SHORT) - MARGIN.top - MARGIN.bottom;
  }

  /** Starts a page that opens a section; later pages of the section start by themselves. */
  startSection(section: string, orientation: 'portrait' | 'landscape' = 'portrait'): Sheet {
    this.section = section;
    this.orientation = orientation;
    return this.startPage();
  }

  startPage(): Sheet {
    const [width, height] = this.orientation === 'portrait' ? [PAPER_SHORT, PAPER_LONG] : [PAPER_LONG, PAPER_SHORT];
    this.current = this.file.addSheet(width, height);
    this.pages.push({ sheet: this.current, section: this.section });
    this.y = MARGIN.top;
    return this.current;
  }

  /** Makes sure `height` points are free below `y`; true when that took a new page. */
  need(height: number): boolean {
    if (height <= this.free) return false;
    this.startPage();
    return true;
  }

  gap(height: number): void {
    this.y += height;
  }

  /** Number of a page, from 1. */
  pageOf(sheet: Sheet): number {
    return this.pages.findIndex((page) => page.sheet === sheet) + 1;
  }

  /** Draws something once all pages are there, as page numbers of later pages. */
  later(draw: () => void): void {
    this.waiting.push(draw);
  }

  drawWaiting(): void {
    for (const draw of this.waiting.splice(0)) draw();
  }
}
