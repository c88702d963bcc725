import { Layer } from 'konva/lib/Layer';
import { Shape } from 'konva/lib/Shape';
import type { Stage } from 'konva/lib/Stage';
import { useEffect, useLayoutEffect, useRef } from 'react';
import type { View } from '../interaction/camera.ts';
import type { Camera } from '../session/book-state.ts';
import type { Palette } from './palette.ts';
import type { Pen } from './pen.ts';

interface PaintingProps {
  readonly stage: Stage;
  readonly camera: Camera;
  readonly view: View;
  readonly palette: Palette;
  readonly paint: (pen: Pen) => void;
}

/**
 * One layer of the plan, drawn by a painter at the next frame after a render. Nothing on it listens: what is under the
 * pointer is our own question.
 */
export function Painting({ stage, camera, view, palette, paint }: PaintingProps) {
  const layer = useRef<Layer | null>(null);
  const latest = useRef<(context: CanvasRenderingContext2D) => void>(() => undefined);
  useEffect(() => {
    const made = new Layer({ listening: false });
    made.add(
      new Shape({
        listening: false,
        perfectDrawEnabled: false,
        sceneFunc: (konva) => {
          const context = konva._context;
          context.save();
          latest.current(context);
          context.restore();
        },
      }),
    );
    stage.add(made);
    layer.current = made;
    made.batchDraw();
    return () => {
      layer.current = null;
      made.destroy();
    };
  }, [stage]);
  useLayoutEffect(() => {
    latest.current = (context) => {
      paint({ context, camera, view, palette });
    };
    layer.current?.batchDraw();
  });
  return null;
}
