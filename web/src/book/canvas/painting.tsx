import type { Context } from 'konva/lib/Context';
import { Layer, Shape } from 'react-konva/lib/ReactKonvaCore';
import type { View } from '../interaction/camera.ts';
import type { Camera } from '../session/book-state.ts';
import type { Palette } from './palette.ts';
import type { Pen } from './pen.ts';

interface PaintingProps {
  readonly camera: Camera;
  readonly view: View;
  readonly palette: Palette;
  readonly paint: (pen: Pen) => void;
}

/** One layer of the plan, drawn by a painter. Nothing on it listens: what is under the pointer is our own question. */
export function Painting({ camera, view, palette, paint }: PaintingProps) {
  return (
    <Layer listening={false}>
      <Shape
        listening={false}
        perfectDrawEnabled={false}
        sceneFunc={(konva: Context) => {
          const context = konva._context;
          context.save();
          paint({ context, camera, view, palette });
          context.restore();
        }}
      />
    </Layer>
  );
}
