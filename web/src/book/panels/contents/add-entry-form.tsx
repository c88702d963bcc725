import { type PlaceableHit, searchCatalogue } from '@embertally/shared/catalogue/search-catalogue';
import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { countedAnew } from '@embertally/shared/survey/counted-anew';
import { freePlace } from '@embertally/shared/survey/derive/free-place';
import type { Entry, EntryPart, Room } from '@embertally/shared/survey/survey-document';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Combobox } from '../../../components/combobox.tsx';
import { ErrorSummary } from '../../../components/error-summary.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { type FieldErrors, useForm } from '../../../components/use-form.ts';
import { useUnits } from '../../../lib/units-context.ts';
import { catalogueItem } from '../../plan/catalogue-item.ts';
import { readCount } from '../../plan/read-count.ts';
import { withMass } from '../../plan/with-mass.ts';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { FormQuantity } from '../form-quantity.tsx';
import { readQuantity, type ReadQuantity } from '../read-quantity.ts';
import { refusalFields } from '../refusal-fields.ts';
import { entryMass } from './entry-mass.ts';
import { entryOfHit } from './entry-of-hit.ts';
import { EVIDENCE, KEEPING } from './entry-choices.ts';
import { MEASURE_WORDS } from './measure-words.ts';

interface Values {
  readonly what: string;
  readonly heat: string;
  readonly amount: string;
  readonly count: string;
  readonly mass: string;
  readonly keeping: string;
  readonly evidence: string;
}

const START: Values = {
  what: '',
  heat: '',
  amount: '',
  count: '1',
  mass: '',
  keeping: 'stored',
  evidence: 'counted',
};
const FIELDS = { label: 'what', count: 'count', parts: 'mass', mass_kg: 'mass', keeping: 'keeping' } as const;
const NOWHERE = { id: '', room_id: '', x_m: 0, y_m: 0, recorded_by: null, recorded_at: null };

/** Records an entry in the room in hand: something of the catalogue, or anything else with a heat of its own. */
export function AddEntryForm({ room }: { readonly room: Room }) {
  const session = useBookSession();
  const units = useUnits();
  const document = useBook((state) => state.document);
  const [hit, setHit] = useState<PlaceableHit | null>(null);
  const measure = hit?.type === 'kind' && hit.row.measure.by !== 'pieces' ? MEASURE_WORDS[hit.row.measure.by] : null;
  const typed = (value: number, unit: string): string =>
    formatQuantity(value, unit, units, { figures: 'as entered' }).text;

  const read = (values: Values): { entry: Entry } | { errors: FieldErrors<Values> } => {
    const quantity = (text: string, name: string, unit: string, minimum: number, maximum: number): ReadQuantity =>
      readQuantity(text, { name, unit, system: units, minimum, maximum });
    const heat = hit === null ? quantity(values.heat, 'Net heat', 'MJ/kg', 0, 150) : { value: 0 };
    const amount = measure === null ? { value: 0 } : quantity(values.amount, measure.label, measure.unit, 0.001, 1e6);
    const count = readCount(values.count);
    const mass = quantity(values.mass, 'Mass of one', 'kg', 0, 1_000_000);
    const what = values.what.trim() === '' ? 'Enter what it is' : undefined;
    if ('error' in heat || 'error' in amount || !count.ok || 'error' in mass || what !== undefined) {
      const error = (one: ReadQuantity) => ('error' in one ? one.error : undefined);
      const errors = {
        what,
        heat: error(heat),
        amount: error(amount),
        count: count.ok ? undefined : count.message,
        mass: error(mass),
      };
      return { errors: errors };
    }
    const place = {
      ...NOWHERE,
      id: session.newId(),
      room_id: room.id,
      recorded_by: session.person,
      recorded_at: session.now(),
    };
    const label = values.what.trim();
    const own: EntryPart = {
      material: null,
      material_version: null,
      label,
      net_heat_MJ_kg: heat.value,
      low_MJ_kg: heat.value,
      high_MJ_kg: heat.value,
      heat_source: `given by ${session.person}`,
      mass_kg: mass.value,
      moisture_pct: null,
    };
    const made =
      hit === null
        ? { ...entryOfOwn(own, place), label }
        : { ...entryOfHit(hit, measure === null ? null : amount.value, mass.value, place), label };
    const entry = {
      ...made,
      parts: withMass(made.parts, mass.value),
      ...countedAnew(made, count.value),
      keeping: values.keeping as Entry['keeping'],
      evidence: values.evidence as Entry['evidence'],
    };
    const free = freePlace(document, room.id, entry);
    return { entry: free === null ? entry : { ...entry, ...free } };
  };

  const form = useForm<Values>({
    name: 'add-entry',
    initial: START,
    validate: (values) => {
      const made = read(values);
      if ('errors' in made) return made.errors;
      return refusalFields(addEntries(document, { entries: [made.entry] }), FIELDS, 'what');
    },
    submit: (values) => {
      const made = read(values);
      if ('errors' in made) return Promise.resolve();
      const result = session.run(addEntries, { entries: [made.entry] }, `Recorded ${made.entry.label}`, {
        refusal: 'returned',
      });
      if (!result.refused) {
        setHit(null);
        form.fill({ ...START, keeping: values.keeping, evidence: values.evidence });
      }
      return Promise.resolve();
    },
  });

  const pick = (chosen: PlaceableHit): void => {
    setHit(chosen);
    const entry = entryOfHit(chosen, null, 0, NOWHERE);
    const kind = chosen.type === 'kind' ? chosen.row : null;
    form.fill({
      what: chosen.row.label,
      heat: '',
      mass: kind === null ? '' : typed(entryMass(entry), 'kg'),
      amount:
        kind === null || kind.measure.by === 'pieces'
          ? ''
          : typed(kind.measure.quantity, MEASURE_WORDS[kind.measure.by].unit),
      keeping: entry.keeping,
    });
  };
  /** A changed amount suggests the mass that goes with it. */
  const changeAmount = (text: string): void => {
    if (hit === null || measure === null) return;
    const amount = readQuantity(text, {
      name: measure.label,
      unit: measure.unit,
      system: units,
      minimum: 0.001,
      maximum: 1e6,
    });
    const suggested =
      'value' in amount ? { mass: typed(entryMass(entryOfHit(hit, amount.value, 0, NOWHERE)), 'kg') } : {};
    form.fill({ amount: text, ...suggested });
  };

  const ownMaterials = useBook((state) => state.ownMaterials);
  const hits = searchCatalogue(form.values.what, { limit: 12, own: ownMaterials });
  const what = form.field('what');
  return (
    <form noValidate onSubmit={form.onSubmit} className="grid gap-4 pb-2" aria-label="Add contents">
      <ErrorSummary {...form.summary} />
      <div className="flex flex-wrap items-start gap-4">
        <div className="w-full max-w-96">
          <Combobox
            id={what.id}
            label="What it is"
            hint="A kind or material of the catalogue, or a name of your own."
            error={what.error}
            value={form.values.what}
            onChange={(text) => {
              if (hit !== null && hit.row.label !== text && text === '') setHit(null);
              form.set('what', text);
            }}
            items={hits.map(catalogueItem)}
            nothing="Nothing in the catalogue answers to that: give its heat below."
            onPick={(item) => {
              const chosen = hits.find((one) => catalogueItem(one).id === item.id);
              if (chosen !== undefined) pick(chosen);
            }}
          />
          <p className="mt-1 text-small text-soft" role="status">
            {hit === null
              ? ''
              : hit.type === 'kind'
                ? `From the catalogue of kinds: ${hit.row.label}`
                : `${hit.row.own ? 'One of your own materials' : 'From the catalogue of materials'}: ${hit.row.label}`}
          </p>
        </div>
        {hit === null && <FormQuantity label="Net heat" unit="MJ/kg" field={form.field('heat')} />}
        {measure !== null && (
          <FormQuantity
            label={measure.label}
            unit={measure.unit}
            field={{ ...form.field('amount'), onChange: changeAmount }}
          />
        )}
        <TextField label="Count" width="short" autoComplete="off" {...form.field('count')} />
        <FormQuantity label="Mass of one" unit="kg" field={form.field('mass')} />
        <SelectField label="Kept" {...form.field('keeping')} options={KEEPING.map(asText)} width="short" />
        <SelectField label="How known" {...form.field('evidence')} options={EVIDENCE.map(asText)} width="short" />
      </div>
      <Button type="submit" look="primary" className="justify-self-start">
        Add to {room.name}
      </Button>
    </form>
  );
}

const asText = (choice: { readonly value: string; readonly label: string }) => choice;

/** An entry of something the catalogue does not have: one part, nothing known of how it burns. */
function entryOfOwn(
  part: EntryPart,
  place: Pick<Entry, 'id' | 'room_id' | 'x_m' | 'y_m' | 'recorded_by' | 'recorded_at'>,
): Entry {
  return {
    ...place,
    kind: null,
    label: part.label,
    parts: [part],
    count: 1,
    rotation_deg: 0,
    base_height_m: 0,
    width_m: 1,
    depth_m: 1,
    height_m: 1,
    keeping: 'stored',
    enclosure: 'open',
    sealed_rating_min: null,
    evidence: 'estimated',
    growth: null,
    peak_kW: null,
    curve: null,
    radiative_fraction: null,
    ignition_class: null,
    ignites_at_kW_m2: null,
    note: '',
    photos: [],
    measure: null,
    confirmed_by: null,
    confirmed_at: null,
  };
}
