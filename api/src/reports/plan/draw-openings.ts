import { openingPosition } from '@embertally/shared/survey/derive/opening-position';
import type { Opening, SurveyDocument } from '@embertally/shared/survey/survey-document';
import { INK, PAGE } from '../layout/theme.ts';
import type { Point, Sheet, Stroke } from '../pdf/sheet.ts';
import type { PlanFrame } from './plan-frame.ts';

const LINE: Stroke = { colour: INK, width: 0.7 };
const LONGEST_LEAF = 28;

/** Cuts the openings of a storey into its walls; every kind has its own sign. */
export function drawOpenings(
  sheet: Sheet,
  frame: PlanFrame,
  document: SurveyDocument,
  openings: readonly Opening[],
  wallWidth: number,
): void {
  for (const opening of openings) {
    const position = openingPosition(document, opening.id);
    if (position === null) continue;
    drawOpening(sheet, frame.at(position.from), frame.at(position.to), opening, wallWidth / 2 + 1);
  }
}

/** One opening from `from` to `to` on the sheet, `half` points to each side of the wall's middle. */
export function drawOpening(
  sheet: Sheet,
  from: Point,
  to: Point,
  { kind, state }: Pick<Opening, 'kind' | 'state'>,
  half: number,
): void {
  const span = Math.hypot(to[0] - from[0], to[1] - from[1]);
  if (span === 0) return;
  const [ux, uy] = [(to[0] - from[0]) / span, (to[1] - from[1]) / span];
  /** A place `along` the opening and `across` the wall. */
  const at = (along: number, across: number): Point => [
    from[0] + ux * along - uy * across,
    from[1] + uy * along + ux * across,
  ];
  const draw = (...points: Point[]) => sheet.line(points, LINE);
  sheet.polygon([[at(0, -half), at(span, -half), at(span, half), at(0, half)]], { fill: PAGE });
  draw(at(0, -half), at(0, half));
  draw(at(span, -half), at(span, half));
  switch (kind) {
    case 'window':
      draw(at(0, -half * 0.4), at(span, -half * 0.4));
      draw(at(0, half * 0.4), at(span, half * 0.4));
      break;
    case 'door':
      if (state === 'open') draw(at(0, -half), at(0, -half - Math.min(span, LONGEST_LEAF)));
      else draw(at(0, 0), at(span, 0));
      break;
    case 'shutter':
      draw(at(0, 0), at(span, 0));
      for (let along = 2; along < span; along += 3) draw(at(along, -half * 0.5), at(along, half * 0.5));
      break;
    case 'vent':
      for (let along = 0; along < span; along += 4) {
        draw(at(along, half * 0.7), at(Math.min(span, along + 3), -half * 0.7));
      }
      break;
    case 'gap':
      break;
  }
}
