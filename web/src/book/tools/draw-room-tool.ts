import type { Point } from '@embertally/shared/geometry/point';
import { drawRoom, type DrawRoomInput } from '@embertally/shared/survey/commands/draw-room';
import { parseQuantity } from '@embertally/shared/units/parse-quantity';
import { NO_PREVIEW, type Preview } from '../interaction/preview.ts';
import { snapPoint } from '../interaction/snap-point.ts';
import type { Snapped } from '../interaction/snap.ts';
import { sceneOf } from '../interaction/scene.ts';
import { towards } from '../interaction/vector.ts';
import { snapSettings, snapTargets } from './snap-targets.ts';
import { dragStartPx, marginPx, type Tool, type ToolKey, type ToolPointer, type ToolPorts } from './tool.ts';

type State =
  | { readonly is: 'idle' }
  /** The first corner is pressed: a drag makes a rectangle, a press starts an outline. */
  | { readonly is: 'first corner'; readonly from: Point; readonly pressed: ToolPointer }
  | { readonly is: 'rectangle'; readonly from: Point; readonly to: Point }
  | { readonly is: 'outline'; readonly points: readonly Point[]; readonly next: Point; readonly typed: string };

const TYPED = /^[\d.,'"x× a-z]$/i;

/**
 * Draws a room: drag for a rectangle, or press corner after corner and close on the first one, with Enter or by pressing
 * the last corner again. While an outline is open a length can be typed ("4.2", "7 ft 10 in"), after the first corner also
 * both sides of a rectangle ("6 x 4").
 */
export function drawRoomTool(ports: ToolPorts): Tool {
  const { session } = ports;
  let state: State = { is: 'idle' };
  let byKeyboard = false;

  const snap = (pointer: ToolPointer): Snapped => {
    const { document, storeyId } = session.state;
    const scene = storeyId === null ? null : sceneOf(document, storeyId);
    const drawn = state.is === 'outline' ? state.points : state.is === 'idle' ? [] : [state.from];
    const settings = snapSettings(session.state, pointer);
    return snapPoint(
      pointer.point,
      scene === null ? { corners: [], walls: [], drawn } : snapTargets(scene, drawn),
      settings,
    );
  };

  const show = (snapped: Snapped | null) => {
    const preview: Preview =
      snapped === null ? {} : { guides: snapped.guides, snap: { at: snapped.point, why: snapped.why } };
    ports.show({ ...preview, ...drawingOf(state) });
  };

  const become = (next: State, snapped: Snapped | null = null) => {
    state = next;
    if (next.is === 'idle') ports.show(NO_PREVIEW);
    else show(snapped);
  };

  const commit = (points: readonly Point[]): boolean => {
    const { storeyId } = session.state;
    if (storeyId === null) {
      session.say({ kind: 'refusal', text: 'There is no storey to draw on yet. Add one first.' });
      return false;
    }
    const input: DrawRoomInput = {
      room_id: session.newId(),
      storey_id: storeyId,
      points,
      corner_ids: points.map(() => session.newId()),
    };
    return run(input);
  };

  const run = (input: DrawRoomInput): boolean => {
    const result = session.run(drawRoom, input, 'Drew a room', { refusal: 'returned' });
    if (result.refused) {
      const choice = result.code === 'ROOM_INSIDE_ROOM' || result.code === 'ROOM_AROUND_ROOM';
      session.say({
        kind: 'refusal',
        text: result.message,
        refusal: result,
        ...(choice ? { offer: { label: 'Cut it out', run: () => void run({ ...input, cut_out: true }) } } : {}),
      });
      return choice;
    }
    become({ is: 'idle' });
    session.setTool('select');
    session.select([{ kind: 'room', id: input.room_id }]);
    return true;
  };

  const press = (points: readonly Point[], at: Point, pointer: ToolPointer) => {
    const first = points[0];
    const last = points.at(-1);
    const margin = marginPx(pointer.type) / session.state.camera.pxPerM;
    const near = (a: Point | undefined, reach: number) =>
      a !== undefined && Math.hypot(a.x_m - at.x_m, a.y_m - at.y_m) <= reach;
    const ends = near(first, margin) || near(last, pointer.type === 'keyboard' ? 0.0005 : margin / 2);
    if (points.length >= 3 && ends) {
      if (commit(points) && state.is === 'outline') become({ is: 'idle' });
      return;
    }
    if (near(last, 0.0005)) return;
    become({ is: 'outline', points: [...points, at], next: at, typed: '' });
  };

  const takeTyped = (outline: Extract<State, { is: 'outline' }>) => {
    const { units } = session.state;
    const sides = outline.typed.split(/\s*[x×]\s*/i);
    const lengths = sides.map((text) =>
      parseQuantity(text, { unit: 'm', system: units, name: 'Length', minimum: 0.05 }),
    );
    const wrong = lengths.find((length) => !length.ok);
    if (wrong !== undefined && !wrong.ok) {
      session.say({ kind: 'refusal', text: wrong.message });
      return;
    }
    const [first, second] = lengths.map((length) => (length.ok ? length.value : 0));
    const last = outline.points.at(-1);
    if (first === undefined || last === undefined) return;
    if (second !== undefined && outline.points.length === 1) {
      const right = outline.next.x_m >= last.x_m ? 1 : -1;
      const up = outline.next.y_m >= last.y_m ? 1 : -1;
      const far = { x_m: last.x_m + right * first, y_m: last.y_m + up * second };
      if (commit(rectangle(last, far)) && state.is === 'outline') become({ is: 'idle' });
      return;
    }
    if (Math.hypot(outline.next.x_m - last.x_m, outline.next.y_m - last.y_m) < 0.001) {
      session.say({ kind: 'refusal', text: 'Point in the direction of the wall first, then type its length.' });
      return;
    }
    const next = towards(last, outline.next, first);
    become({ is: 'outline', points: [...outline.points, next], next, typed: '' });
  };

  return {
    name: 'draw-room',
    state: () => state.is,
    down(pointer) {
      byKeyboard = pointer.type === 'keyboard';
      if (state.is === 'idle') {
        const snapped = snap(pointer);
        become({ is: 'first corner', from: snapped.point, pressed: pointer }, snapped);
      }
    },
    move(pointer) {
      byKeyboard = pointer.type === 'keyboard';
      const snapped = snap(pointer);
      switch (state.is) {
        case 'idle':
          show(snapped);
          break;
        case 'first corner': {
          const moved = Math.hypot(pointer.at.x - state.pressed.at.x, pointer.at.y - state.pressed.at.y);
          if (moved >= dragStartPx(pointer.type))
            become({ is: 'rectangle', from: state.from, to: snapped.point }, snapped);
          break;
        }
        case 'rectangle':
          become({ ...state, to: snapped.point }, snapped);
          break;
        case 'outline':
          become({ ...state, next: snapped.point }, snapped);
          break;
      }
    },
    up(pointer) {
      const snapped = snap(pointer);
      switch (state.is) {
        case 'idle':
          break;
        case 'first corner':
          become({ is: 'outline', points: [state.from], next: state.from, typed: '' });
          session.announce('First corner placed');
          break;
        case 'rectangle': {
          const points = rectangle(state.from, snapped.point);
          become({ is: 'idle' });
          commit(points);
          break;
        }
        case 'outline':
          press(state.points, snapped.point, pointer);
          break;
      }
    },
    key({ key }: ToolKey) {
      if (state.is !== 'outline') return false;
      if (key === 'Backspace') {
        if (state.typed !== '') become({ ...state, typed: state.typed.slice(0, -1) });
        else if (state.points.length > 1) become({ ...state, points: state.points.slice(0, -1) });
        else become({ is: 'idle' });
        return true;
      }
      if (key === 'Enter') {
        if (state.typed !== '') {
          takeTyped(state);
          return true;
        }
        const last = state.points.at(-1);
        const moved = last !== undefined && (last.x_m !== state.next.x_m || last.y_m !== state.next.y_m);
        if (byKeyboard && moved) return false;
        if (state.points.length < 3) return false;
        if (commit(state.points)) become({ is: 'idle' });
        return true;
      }
      // A letter begins nothing: only after a digit may it be a unit or the x of "6 x 4".
      if (!TYPED.test(key) || (state.typed === '' && !/\d/.test(key))) return false;
      become({ ...state, typed: state.typed + key });
      return true;
    },
    cancel() {
      become({ is: 'idle' });
    },
  };
}

function rectangle(a: Point, b: Point): readonly Point[] {
  return [a, { x_m: b.x_m, y_m: a.y_m }, b, { x_m: a.x_m, y_m: b.y_m }];
}

function drawingOf(state: State): Pick<Preview, 'drawing' | 'typed'> {
  switch (state.is) {
    case 'idle':
      return {};
    case 'first corner':
      return { drawing: { points: [state.from], next: null, closes: false } };
    case 'rectangle':
      return { drawing: { points: rectangle(state.from, state.to), next: null, closes: true } };
    case 'outline':
      return {
        drawing: { points: state.points, next: state.next, closes: false },
        ...(state.typed === '' ? {} : { typed: { at: state.next, text: state.typed } }),
      };
  }
}
