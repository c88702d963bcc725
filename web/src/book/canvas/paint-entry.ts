import { isCovering } from '@embertally/shared/survey/derive/is-covering';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { footprint, type Footprint } from '@embertally/shared/geometry/footprint';
import { at, CASING_PX, SANS, traceRing, type Pen } from './pen.ts';

const LABEL_PX = 12;
/** Smaller than this on screen an entry is only its outline, px. */
const DIAGONAL_FROM_PX = 10;

export type PaintedEntry = Footprint & Pick<Entry, 'label' | 'keeping' | 'height_m' | 'base_height_m'>;

/** One entry: a pale rectangle with a casing, its diagonal, and its label when there is space for it. */
export function paintEntry(pen: Pen, entry: PaintedEntry): void {
  const { context, palette, camera } = pen;
  const corners = footprint(entry);
  context.beginPath();
  traceRing(pen, corners);
  const covering = isCovering(entry);
  context.globalAlpha = covering ? 0.3 : 0.9;
  context.fillStyle = palette.page;
  context.fill();
  context.globalAlpha = 1;
  context.lineJoin = 'miter';
  context.strokeStyle = palette.page;
  context.lineWidth = 1.25 + 2 * CASING_PX;
  context.stroke();
  const wide = entry.width_m * camera.pxPerM;
  const deep = entry.depth_m * camera.pxPerM;
  if (!covering && Math.min(wide, deep) >= DIAGONAL_FROM_PX && !paintLabel(pen, entry, wide, deep)) {
    const [a, , c] = corners.map((corner) => at(pen, corner));
    if (a !== undefined && c !== undefined) {
      context.beginPath();
      context.moveTo(a.x, a.y);
      context.lineTo(c.x, c.y);
      context.strokeStyle = palette.ink;
      context.globalAlpha = 0.35;
      context.lineWidth = 1;
      context.stroke();
      context.globalAlpha = 1;
    }
  }
  context.beginPath();
  traceRing(pen, corners);
  context.strokeStyle = palette.ink;
  context.lineWidth = 1.25;
  // How an entry is kept shows in its edge: part of the building is heavy, here for a while is dashed.
  if (entry.keeping === 'fixed' && !covering) context.lineWidth = 2.5;
  if (entry.keeping === 'passing') context.setLineDash([5, 3]);
  context.stroke();
  context.setLineDash([]);
}

function paintLabel(pen: Pen, entry: Footprint & Pick<Entry, 'label'>, wide: number, deep: number): boolean {
  const { context, palette } = pen;
  const along = Math.max(wide, deep);
  if (Math.min(wide, deep) < LABEL_PX + 6 || along < 44) return false;
  context.font = `${LABEL_PX}px ${SANS}`;
  const fits = context.measureText(entry.label).width <= along - 10;
  if (!fits) return false;
  const centre = at(pen, entry);
  let angle = -entry.rotation_deg + (deep > wide ? 90 : 0);
  angle = ((((angle + 90) % 180) + 180) % 180) - 90;
  context.save();
  context.translate(centre.x, centre.y);
  context.rotate((angle * Math.PI) / 180);
  context.fillStyle = palette.ink;
  context.textAlign = 'center';
  context.textBaseline = 'middle';
  context.fillText(entry.label, 0, 0);
  context.restore();
  return true;
}
