import type { Palette } from './palette.ts';

/** Side of the hatch's repeating square by band, px: denser with more load. Band 0 carries none. */
const SIDE_PX = [0, 26, 18, 13, 9, 6] as const;
const FIRST_DARK_BAND = 4;

const made = new Map<string, CanvasPattern | null>();

/**
 * The hatch of a load band, so that shading never speaks by colour alone. The pattern is kept; `x, y` is where a fixed
 * point of the plan lies in the view, so that the hatch moves with the plan.
 */
export function hatchOf(
  context: CanvasRenderingContext2D,
  band: number,
  palette: Palette,
  x: number,
  y: number,
): CanvasPattern | null {
  const side = SIDE_PX[band] ?? 0;
  if (side === 0) return null;
  const key = `${band} ${palette.load[band] ?? ''}`;
  let pattern = made.get(key);
  if (pattern === undefined) {
    pattern = makePattern(context, side, band);
    made.set(key, pattern);
  }
  pattern?.setTransform(new DOMMatrix([1, 0, 0, 1, x % side, y % side]));
  return pattern;
}

function makePattern(target: CanvasRenderingContext2D, side: number, band: number): CanvasPattern | null {
  const tile = document.createElement('canvas');
  tile.width = side;
  tile.height = side;
  const context = tile.getContext('2d');
  if (context === null) return null;
  context.strokeStyle = band >= FIRST_DARK_BAND ? 'rgb(255 255 255 / 0.2)' : 'rgb(27 33 39 / 0.17)';
  context.lineWidth = 1;
  context.beginPath();
  for (const shift of [-side, 0, side]) {
    context.moveTo(shift - 1, side + 1);
    context.lineTo(shift + side + 1, -1);
  }
  context.stroke();
  return target.createPattern(tile, 'repeat');
}
