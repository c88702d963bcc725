import type { FontBook, Weight } from './font-book.ts';
import type { FontFace } from './font-face.ts';

export type Colour = readonly [red: number, green: number, blue: number];
export type Point = readonly [x: number, y: number];

export interface TextStyle {
  readonly size: number;
  readonly colour: Colour;
  readonly weight?: Weight;
  /** Where `x` stands in the text; default `left`. */
  readonly align?: 'left' | 'right' | 'centre';
  /** Degrees, anticlockwise; default 0. */
  readonly angle?: number;
}

export interface Stroke {
  readonly colour: Colour;
  readonly width: number;
  readonly dash?: readonly number[];
  readonly cap?: 'butt' | 'round' | 'square';
}

export interface Paint {
  readonly fill?: Colour;
  readonly stroke?: Stroke;
}

export interface SheetLink {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  readonly target: Sheet;
}

const number = (value: number) => (Number.isFinite(value) ? String(Math.round(value * 1000) / 1000) : '0');
const CAPS = { butt: 0, round: 1, square: 2 };
/** Distance of the control points of a quarter circle drawn as one curve, as a share of the radius. */
const QUARTER_CIRCLE = 0.5523;

/** One page. Lengths in points (1/72 inch), x to the right and y **down** from the top left corner of the paper. */
export class Sheet {
  readonly width: number;
  readonly height: number;
  readonly faces = new Set<FontFace>();
  readonly links: SheetLink[] = [];
  private readonly book: FontBook;
  private readonly operations: string[] = [];

  constructor(book: FontBook, width: number, height: number) {
    this.book = book;
    this.width = width;
    this.height = height;
  }

  get content(): string {
    return this.operations.join('\n');
  }

  /** One line of text with its baseline at `y`. Returns its width. */
  text(text: string, x: number, y: number, style: TextStyle): number {
    const glyphs = this.book.set(text, style.weight ?? 'regular');
    const wide = (glyphs.reduce((sum, glyph) => sum + glyph.advance, 0) * style.size) / 1000;
    if (glyphs.length === 0) return 0;
    const shift = style.align === 'right' ? wide : style.align === 'centre' ? wide / 2 : 0;
    const angle = ((style.angle ?? 0) * Math.PI) / 180;
    const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
    const startX = x - shift * cos;
    const startY = this.height - y - shift * sin;
    const parts = [`BT ${fill(style.colour)} ${[cos, sin, -sin, cos, startX, startY].map(number).join(' ')} Tm`];
    for (let at = 0; at < glyphs.length;) {
      const face = glyphs[at]?.face;
      let hex = '';
      while (at < glyphs.length && glyphs[at]?.face === face) hex += glyphs[at++]?.hex ?? '';
      if (face === undefined) break;
      this.faces.add(face);
      parts.push(`/${face.key} ${number(style.size)} Tf <${hex}> Tj`);
    }
    this.operations.push(`${parts.join(' ')} ET`);
    return wide;
  }

  line(points: readonly Point[], stroke: Stroke): void {
    this.operations.push(`q ${this.pen(stroke)} ${this.path(points)} S Q`);
  }

  rect(x: number, y: number, width: number, height: number, paint: Paint): void {
    this.paint(`${[x, this.height - y - height, width, height].map(number).join(' ')} re`, paint);
  }

  /** Closed rings; where they lie inside each other the inner one is a hole. */
  polygon(rings: readonly (readonly Point[])[], paint: Paint): void {
    this.paint(rings.map((ring) => `${this.path(ring)} h`).join(' '), paint);
  }

  circle(x: number, y: number, radius: number, paint: Paint): void {
    const [k, top] = [radius * QUARTER_CIRCLE, this.height - y];
    const curve = (...values: number[]) => `${values.map(number).join(' ')} c`;
    this.paint(
      [
        `${number(x + radius)} ${number(top)} m`,
        curve(x + radius, top + k, x + k, top + radius, x, top + radius),
        curve(x - k, top + radius, x - radius, top + k, x - radius, top),
        curve(x - radius, top - k, x - k, top - radius, x, top - radius),
        curve(x + k, top - radius, x + radius, top - k, x + radius, top),
        'h',
      ].join(' '),
      paint,
    );
  }

  /** What `draw` draws shows only inside the rings (the inner of two nested rings is a hole). */
  inside(rings: readonly (readonly Point[])[], draw: () => void): void {
    this.operations.push(`q ${rings.map((ring) => `${this.path(ring)} h`).join(' ')} W* n`);
    draw();
    this.operations.push('Q');
  }

  /** Pressing the rectangle opens `target`. */
  link(x: number, y: number, width: number, height: number, target: Sheet): void {
    this.links.push({ x, y, width, height, target });
  }

  private paint(path: string, paint: Paint): void {
    if (paint.fill === undefined && paint.stroke === undefined) return;
    const operator = paint.stroke === undefined ? 'f*' : paint.fill === undefined ? 'S' : 'B*';
    const inks = [
      paint.fill === undefined ? '' : fill(paint.fill),
      paint.stroke === undefined ? '' : this.pen(paint.stroke),
    ];
    this.operations.push(`q ${inks.join(' ')} ${path} ${operator} Q`);
  }

  private pen(stroke: Stroke): string {
    const dash = stroke.dash === undefined ? '' : `[${stroke.dash.map(number).join(' ')}] 0 d`;
    return `${stroke.colour.map(number).join(' ')} RG ${number(stroke.width)} w ${CAPS[stroke.cap ?? 'butt']} J ${dash}`;
  }

  private path(points: readonly Point[]): string {
    return points
      .map(([x, y], index) => `${number(x)} ${number(this.height - y)} ${index === 0 ? 'm' : 'l'}`)
      .join(' ');
  }
}

function fill(colour: Colour): string {
  return `${colour.map(number).join(' ')} rg`;
}
