import { formatQuantity } from '@embertally/shared/units/format-quantity';
import type { Stage } from 'konva/lib/Stage';
import { sceneOf } from '../interaction/scene.ts';
import { useBook } from '../session/use-book.ts';
import { spreadMoment } from '../spread/spread-moment.ts';
import { useSpreadPlay } from '../spread/use-spread-play.ts';
import { paintFire } from './paint-fire.ts';
import { paintGap } from './paint-gap.ts';
import { Painting } from './painting.tsx';
import type { Palette } from './palette.ts';
import type { Pen } from './pen.ts';

interface SpreadLayerProps {
  readonly stage: Stage;
  readonly palette: Palette;
}

/** A fire that is played, or a gap that is asked about, over the plan. */
export function SpreadLayer({ stage, palette }: SpreadLayerProps) {
  const camera = useBook((state) => state.camera);
  const view = useBook((state) => state.view);
  const units = useBook((state) => state.units);
  const document = useBook((state) => state.document);
  const storeyId = useBook((state) => state.storeyId);
  const { fire, gap, at_s } = useSpreadPlay((state) => state);
  const scene = storeyId === null ? null : sceneOf(document, storeyId);
  const words = (value: number, unit: string): string => {
    const { text, unit: symbol } = formatQuantity(value, unit, units);
    return `${text} ${symbol}`;
  };

  const paint = (pen: Pen): void => {
    const shape = scene?.rooms.find(({ room }) => room.id === (fire ?? gap)?.roomId);
    if (shape === undefined) return;
    if (fire !== null) {
      const moment = spreadMoment(fire, at_s);
      const in_s = (moment.next[0]?.t_s ?? at_s) - at_s;
      paintFire(pen, { entries: document.entries, moment, room: shape.ring, nextText: `in ${words(in_s, 's')}` });
    }
    const from = document.entries.get(gap?.from ?? '');
    const to = document.entries.get(gap?.to ?? '');
    if (gap === null || from === undefined || to === undefined) return;
    paintGap(pen, { from, to, gap_m: gap.gap_m, enough_m: gap.enough_m, lengthText: (m) => words(m, 'm') });
  };

  return <Painting stage={stage} camera={camera} view={view} palette={palette} paint={paint} />;
}
