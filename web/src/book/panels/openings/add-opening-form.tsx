import { addOpening } from '@embertally/shared/survey/commands/add-opening';
import { newOpening, OPENING_STARTS } from '@embertally/shared/survey/new-opening';
import type { Opening, Room } from '@embertally/shared/survey/survey-document';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { Button } from '../../../components/button.tsx';
import { ErrorSummary } from '../../../components/error-summary.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { type FieldErrors, useForm } from '../../../components/use-form.ts';
import { useUnits } from '../../../lib/units-context.ts';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { useQuantity } from '../../../lib/use-quantity.ts';
import { FormQuantity } from '../form-quantity.tsx';
import { readQuantity } from '../read-quantity.ts';
import { refusalFields } from '../refusal-fields.ts';
import { OPENING_KINDS, OPENING_STATES } from './opening-words.ts';
import { namedWalls } from './wall-words.ts';

interface Values {
  readonly kind: string;
  readonly wall: string;
  readonly offset: string;
  readonly width: string;
  readonly height: string;
  readonly sill: string;
  readonly state: string;
}

/** Puts an opening into a wall of the room in hand, from typed lengths. */
export function AddOpeningForm({ room }: { readonly room: Room }) {
  const session = useBookSession();
  const units = useUnits();
  const show = useQuantity();
  const document = useBook((state) => state.document);
  const walls = namedWalls(document, room);
  const typed = (value_m: number): string => formatQuantity(value_m, 'm', units, { figures: 'as entered' }).text;
  const startOf = (kind: Opening['kind']) => {
    const { width_m, height_m, sill_m, state } = OPENING_STARTS[kind];
    return { kind, width: typed(width_m), height: typed(height_m), sill: typed(sill_m), state };
  };

  const openingOf = (values: Values): { opening: Opening } | { errors: FieldErrors<Values> } => {
    const read = (text: string, name: string, minimum: number, maximum: number) =>
      readQuantity(text, { name, unit: 'm', system: units, minimum, maximum });
    const width = read(values.width, 'Width', 0.05, 1000);
    const height = read(values.height, 'Height', 0.05, 100);
    const sill = read(values.sill, 'Sill height', 0, 100);
    const wall = walls.find((candidate) => candidate.key === values.wall) ?? walls[0];
    const middle = 'value' in width ? Math.max(0, ((wall?.length_m ?? 0) - width.value) / 2) : 0;
    const offset = values.offset.trim() === '' ? { value: middle } : read(values.offset, 'Distance', 0, 10_000);
    if ('error' in width || 'error' in height || 'error' in sill || 'error' in offset || wall === undefined) {
      const error = (one: typeof width) => ('error' in one ? one.error : undefined);
      const errors = { width: error(width), height: error(height), sill: error(sill), offset: error(offset) };
      return { errors: errors };
    }
    return {
      opening: newOpening({
        id: session.newId(),
        storey_id: room.storey_id,
        wall: [wall.wall[0], wall.wall[1]],
        offset_m: offset.value,
        kind: values.kind as Opening['kind'],
        width_m: width.value,
        height_m: height.value,
        sill_m: sill.value,
        state: values.state as Opening['state'],
      }),
    };
  };

  const form = useForm<Values>({
    name: 'add-opening',
    initial: { ...startOf('door'), wall: walls[0]?.key ?? '', offset: '' },
    validate: (values) => {
      const read = openingOf(values);
      if ('errors' in read) return read.errors;
      const fields = {
        wall: 'wall',
        offset_m: 'offset',
        width_m: 'width',
        height_m: 'height',
        sill_m: 'sill',
        state: 'state',
      } as const;
      return refusalFields(addOpening(document, { opening: read.opening }), fields, 'wall');
    },
    submit: (values) => {
      const read = openingOf(values);
      if ('errors' in read) return Promise.resolve();
      const result = session.run(addOpening, { opening: read.opening }, `Added a ${read.opening.kind}`, {
        refusal: 'returned',
      });
      if (!result.refused) form.set('offset', '');
      return Promise.resolve();
    },
  });

  return (
    <form noValidate onSubmit={form.onSubmit} className="grid gap-4 pb-2" aria-label="Add an opening">
      <ErrorSummary {...form.summary} />
      <div className="flex flex-wrap items-start gap-4">
        <SelectField
          label="What"
          width="short"
          {...form.field('kind')}
          options={OPENING_KINDS.map((kind) => ({ value: kind.value, label: kind.label }))}
          onChange={(kind) => {
            form.fill(startOf(kind as Opening['kind']));
          }}
        />
        <SelectField
          label="In which wall"
          {...form.field('wall')}
          options={walls.map((wall, index) => {
            const length = show(wall.length_m, 'm');
            const beyond = wall.beyond.length === 0 ? 'outside' : wall.beyond.join(', ');
            return {
              value: wall.key,
              label: `${index + 1}: ${wall.side}, ${length.text} ${length.unit}, to ${beyond}`,
            };
          })}
        />
        <FormQuantity
          label="Distance from the wall’s start"
          hint="Left empty, it stands in the middle."
          optional
          unit="m"
          field={form.field('offset')}
        />
        <FormQuantity label="Width" unit="m" field={form.field('width')} />
        <FormQuantity label="Height" unit="m" field={form.field('height')} />
        <FormQuantity label="Sill height" unit="m" field={form.field('sill')} />
        <SelectField
          label="State"
          {...form.field('state')}
          options={OPENING_STATES.map((state) => ({ value: state.value, label: state.label }))}
        />
      </div>
      <Button type="submit" look="primary" className="justify-self-start">
        Add the opening
      </Button>
    </form>
  );
}
