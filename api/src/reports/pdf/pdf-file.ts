import { deflateSync } from 'node:zlib';
import { PDFDocument, PDFHexString, PDFName, PDFNumber, PDFString, type PDFPage, type PDFRef } from 'pdf-lib';
import { FontBook } from './font-book.ts';
import { printableText } from './printable-text.ts';
import { Sheet } from './sheet.ts';

export interface PdfAbout {
  readonly title: string;
  readonly author: string;
  readonly subject: string;
  /** Moment the file was asked for; comes in, so that the same input gives the same bytes. */
  readonly made: Date;
}

interface Bookmark {
  readonly title: string;
  readonly sheet: Sheet;
  readonly under: Bookmark[];
}

/** A PDF in the making: sheets, bookmarks and fonts. The only place that knows the PDF library. */
export class PdfFile {
  readonly book: FontBook;
  readonly sheets: Sheet[] = [];
  private readonly document: PDFDocument;
  private readonly bookmarks: Bookmark[] = [];

  private constructor(document: PDFDocument, book: FontBook) {
    this.document = document;
    this.book = book;
  }

  /** `sample`: all text that may be set, so that only the fonts it needs are loaded. */
  static async create(sample: string): Promise<PdfFile> {
    const document = await PDFDocument.create({ updateMetadata: false });
    return new PdfFile(document, await FontBook.load(document.context, sample));
  }

  /** A new page of the given size in points. */
  addSheet(width: number, height: number): Sheet {
    const sheet = new Sheet(this.book, width, height);
    this.sheets.push(sheet);
    return sheet;
  }

  /** An entry of the reader's table of contents; `depth` 1 stands under the last entry of depth 0. */
  bookmark(title: string, sheet: Sheet, depth: 0 | 1 = 0): void {
    const list = depth === 0 ? this.bookmarks : (this.bookmarks.at(-1)?.under ?? this.bookmarks);
    list.push({ title, sheet, under: [] });
  }

  async finish(about: PdfAbout): Promise<Uint8Array> {
    const pages = new Map<Sheet, PDFPage>();
    for (const sheet of this.sheets) pages.set(sheet, this.document.addPage([sheet.width, sheet.height]));
    for (const [sheet, page] of pages) this.write(sheet, page, pages);
    this.writeBookmarks(pages);
    await this.book.embed(this.document.context);
    this.document.setTitle(aboutText(about.title), { showInWindowTitleBar: true });
    this.document.setAuthor(aboutText(about.author));
    this.document.setSubject(aboutText(about.subject));
    this.document.setCreator('Embertally');
    this.document.setProducer('Embertally');
    this.document.setCreationDate(about.made);
    this.document.setModificationDate(about.made);
    this.document.setLanguage('en');
    return this.document.save({ addDefaultPage: false, objectsPerTick: Infinity });
  }

  private write(sheet: Sheet, page: PDFPage, pages: ReadonlyMap<Sheet, PDFPage>): void {
    const { context } = this.document;
    for (const face of sheet.faces) page.node.setFontDictionary(PDFName.of(face.key), face.ref);
    const content = context.stream(deflateSync(sheet.content), { Filter: 'FlateDecode' });
    page.node.set(PDFName.of('Contents'), context.register(content));
    for (const { x, y, width, height, target } of sheet.links) {
      const to = pages.get(target);
      if (to === undefined) continue;
      const link = context.obj({
        Type: 'Annot',
        Subtype: 'Link',
        Rect: [x, sheet.height - y - height, x + width, sheet.height - y],
        Border: [0, 0, 0],
        Dest: [to.ref, 'XYZ', null, null, null],
      });
      page.node.addAnnot(context.register(link));
    }
  }

  private writeBookmarks(pages: ReadonlyMap<Sheet, PDFPage>): void {
    if (this.bookmarks.length === 0) return;
    const { context, catalog } = this.document;
    const root = context.nextRef();
    const write = (list: readonly Bookmark[], parent: PDFRef): { first: PDFRef; last: PDFRef } | undefined => {
      const refs = list.map(() => context.nextRef());
      for (const [at, { title, sheet, under }] of list.entries()) {
        const ref = refs[at];
        const page = pages.get(sheet);
        if (ref === undefined || page === undefined) continue;
        const item = context.obj({ Parent: parent, Dest: [page.ref, 'XYZ', null, null, null] });
        item.set(PDFName.of('Title'), PDFHexString.fromText(aboutText(title)));
        const [before, after] = [refs[at - 1], refs[at + 1]];
        if (before !== undefined) item.set(PDFName.of('Prev'), before);
        if (after !== undefined) item.set(PDFName.of('Next'), after);
        const children = write(under, ref);
        if (children !== undefined) {
          item.set(PDFName.of('First'), children.first);
          item.set(PDFName.of('Last'), children.last);
          item.set(PDFName.of('Count'), PDFNumber.of(-under.length));
        }
        context.assign(ref, item);
      }
      const [first, last] = [refs[0], refs.at(-1)];
      return first === undefined || last === undefined ? undefined : { first, last };
    };
    const ends = write(this.bookmarks, root);
    if (ends === undefined) return;
    const outline = context.obj({ Type: 'Outlines', First: ends.first, Last: ends.last });
    outline.set(PDFName.of('Count'), PDFNumber.of(this.bookmarks.length));
    context.assign(root, outline);
    catalog.set(PDFName.of('Outlines'), root);
    catalog.set(PDFName.of('PageMode'), PDFName.of('UseOutlines'));
    catalog.set(PDFName.of('Lang'), PDFString.of('en'));
  }
}

const LONGEST_ABOUT = 300;

/** Text that a reader shows outside the pages: without characters that act, and not endless. */
function aboutText(text: string): string {
  const whole = [...printableText(text)];
  return whole.length <= LONGEST_ABOUT ? whole.join('') : `${whole.slice(0, LONGEST_ABOUT - 1).join('')}…`;
}
