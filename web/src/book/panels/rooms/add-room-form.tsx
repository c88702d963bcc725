import { drawRoom, type DrawRoomInput } from '@embertally/shared/survey/commands/draw-room';
import { nextRoomName } from '@embertally/shared/survey/derive/next-room-name';
import { roomsOfStorey } from '@embertally/shared/survey/derive/rooms-of-storey';
import { Button } from '../../../components/button.tsx';
import { ErrorSummary } from '../../../components/error-summary.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { type FieldErrors, useForm } from '../../../components/use-form.ts';
import { useUnits } from '../../../lib/units-context.ts';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { FormQuantity } from '../form-quantity.tsx';
import { readQuantity } from '../read-quantity.ts';
import { refusalFields } from '../refusal-fields.ts';
import { besideRoom, rectangle, type Side, SIDES } from './room-outline.ts';

interface Values {
  readonly name: string;
  readonly where: string;
  readonly side: string;
  readonly x: string;
  readonly y: string;
  readonly width: string;
  readonly depth: string;
}

const SIDE_WORDS: Readonly<Record<Side, string>> = {
  right: 'its right side',
  left: 'its left side',
  above: 'above it',
  below: 'below it',
};
const AT_A_POINT = 'point';
const START: Values = { name: '', where: AT_A_POINT, side: 'right', x: '0', y: '0', width: '', depth: '' };

/** Adds a rectangular room from typed lengths: at a point of the plan, or sharing a wall with a room. */
export function AddRoomForm() {
  const session = useBookSession();
  const units = useUnits();
  const document = useBook((state) => state.document);
  const storeyId = useBook((state) => state.storeyId);
  const rooms = storeyId === null ? [] : roomsOfStorey(document, storeyId);
  const thick = (document.storeys.get(storeyId ?? '')?.wall_thickness_m ?? 0) > 0;

  const inputOf = (values: Values): { input: DrawRoomInput } | { errors: FieldErrors<Values> } => {
    const length = (text: string, name: string) =>
      readQuantity(text, { name, unit: 'm', system: units, minimum: 0.05, maximum: 1000 });
    const place = (text: string, name: string) =>
      readQuantity(text, { name, unit: 'm', system: units, minimum: -10_000, maximum: 10_000 });
    const width = length(values.width, 'Width');
    const depth = length(values.depth, 'Depth');
    const atPoint = values.where === AT_A_POINT;
    const x = atPoint ? place(values.x, 'Left edge') : { value: 0 };
    const y = atPoint ? place(values.y, 'Bottom edge') : { value: 0 };
    if ('error' in width || 'error' in depth || 'error' in x || 'error' in y) {
      const error = (read: typeof width) => ('error' in read ? read.error : undefined);
      const found = { width: error(width), depth: error(depth), x: error(x), y: error(y) };
      return { errors: found };
    }
    const corner = atPoint
      ? { x_m: x.value, y_m: y.value }
      : besideRoom(document, values.where, values.side as Side, width.value, depth.value);
    if (corner === null) return { errors: { where: 'This room is not in the survey any more. Choose another one.' } };
    return {
      input: {
        room_id: session.newId(),
        storey_id: storeyId ?? '',
        name: values.name.trim() === '' ? nextRoomName(document) : values.name.trim(),
        points: rectangle(corner.x_m, corner.y_m, width.value, depth.value),
        corner_ids: Array.from({ length: 4 }, session.newId),
      },
    };
  };

  const form = useForm<Values>({
    name: 'add-room',
    initial: { ...START, where: rooms.at(-1)?.id ?? AT_A_POINT },
    validate: (values) => {
      const read = inputOf(values);
      if ('errors' in read) return read.errors;
      return refusalFields(drawRoom(document, read.input), { name: 'name', points: 'width' }, 'width');
    },
    submit: (values) => {
      const read = inputOf(values);
      if ('errors' in read) return Promise.resolve();
      const result = session.run(drawRoom, read.input, `Added ${read.input.name ?? 'a room'}`, { refusal: 'returned' });
      if (!result.refused) {
        session.takeRoom(read.input.room_id);
        form.fill({ ...START, where: read.input.room_id });
      }
      return Promise.resolve();
    },
  });
  const atPoint = form.values.where === AT_A_POINT;

  return (
    <form noValidate onSubmit={form.onSubmit} className="grid gap-4 pb-2" aria-label="Add a room">
      <ErrorSummary {...form.summary} />
      <div className="flex flex-wrap items-start gap-4">
        <TextField
          label="Name"
          hint="Left empty, it gets the next number."
          optional
          {...form.field('name')}
          width="medium"
        />
        <SelectField
          label="Where"
          {...form.field('where')}
          options={[
            { value: AT_A_POINT, label: 'At a point of the plan' },
            ...rooms.map((room) => ({ value: room.id, label: `Beside ${room.name}` })),
          ]}
        />
        {atPoint ? (
          <>
            <FormQuantity label="Left edge" unit="m" field={form.field('x')} />
            <FormQuantity label="Bottom edge" unit="m" field={form.field('y')} />
          </>
        ) : (
          <SelectField
            label="Which side"
            {...form.field('side')}
            options={SIDES.map((side) => ({ value: side, label: SIDE_WORDS[side] }))}
          />
        )}
        <FormQuantity
          label="Width"
          unit="m"
          {...(thick ? { hint: 'Between the middles of the walls.' } : {})}
          field={form.field('width')}
        />
        <FormQuantity
          label="Depth"
          unit="m"
          {...(thick ? { hint: 'Between the middles of the walls.' } : {})}
          field={form.field('depth')}
        />
      </div>
      <Button type="submit" look="primary" className="justify-self-start">
        Add the room
      </Button>
    </form>
  );
}
