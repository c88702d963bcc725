import type { Point } from '@embertally/shared/geometry/point';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { NO_PREVIEW } from '../interaction/preview.ts';
import { sceneOf } from '../interaction/scene.ts';
import { snapPoint } from '../interaction/snap-point.ts';
import { snapSettings, snapTargets } from './snap-targets.ts';
import { type Tool, type ToolPointer, type ToolPorts } from './tool.ts';

type State = { readonly is: 'idle' } | { readonly is: 'measuring'; readonly from: Point };

/** Measures a distance: press twice or drag. The measure stays on the plan until the next one; nothing is changed. */
export function measureTool(ports: ToolPorts): Tool {
  const { session } = ports;
  let state: State = { is: 'idle' };

  const snap = (pointer: ToolPointer) => {
    const { document, storeyId } = session.state;
    const scene = storeyId === null ? null : sceneOf(document, storeyId);
    const drawn = state.is === 'measuring' ? [state.from] : [];
    return snapPoint(
      pointer.point,
      scene === null ? { corners: [], walls: [], drawn } : snapTargets(scene, drawn),
      snapSettings(session.state, pointer),
    );
  };

  const finish = (from: Point, to: Point) => {
    state = { is: 'idle' };
    ports.show({ lengths: [{ a: from, b: to }] });
    const { text, unit } = formatQuantity(Math.hypot(to.x_m - from.x_m, to.y_m - from.y_m), 'm', session.state.units);
    session.announce(`Measured ${text} ${unit}`);
  };

  return {
    name: 'measure',
    state: () => state.is,
    down(pointer) {
      if (state.is === 'measuring') return;
      const snapped = snap(pointer);
      state = { is: 'measuring', from: snapped.point };
      ports.show({ snap: { at: snapped.point, why: snapped.why }, guides: snapped.guides });
    },
    move(pointer) {
      if (state.is === 'idle') return;
      const snapped = snap(pointer);
      ports.show({
        lengths: [{ a: state.from, b: snapped.point }],
        guides: snapped.guides,
        snap: { at: snapped.point, why: snapped.why },
      });
    },
    up(pointer) {
      if (state.is === 'idle') return;
      const to = snap(pointer).point;
      const apart = Math.hypot(to.x_m - state.from.x_m, to.y_m - state.from.y_m) > 0;
      if (apart) finish(state.from, to);
    },
    key: () => false,
    cancel() {
      state = { is: 'idle' };
      ports.show(NO_PREVIEW);
    },
  };
}
