import { createLimit, editLimit, type Limit, type LimitQuantity } from '@embertally/shared/contracts/limits';
import { limitNames, limitSourceNames } from '@embertally/shared/limits/limit-names';
import { limitUnits } from '@embertally/shared/limits/limit-units';
import type { Room } from '@embertally/shared/survey/survey-document';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { Button } from '../../../components/button.tsx';
import { ErrorSummary } from '../../../components/error-summary.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { TextField } from '../../../components/text-field.tsx';
import { type FieldErrors, useForm } from '../../../components/use-form.ts';
import { call } from '../../../lib/api-client.ts';
import { StaleError } from '../../../lib/api-errors.ts';
import { ToldError } from '../../../lib/told-error.ts';
import { useUnits } from '../../../lib/units-context.ts';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { FormQuantity } from '../form-quantity.tsx';
import { readQuantity } from '../read-quantity.ts';
import { maySetLimit } from './may-set-limit.ts';
import { readDay } from './read-day.ts';
import { readLimits } from './read-limits.ts';

interface Values {
  readonly quantity: string;
  readonly bound: string;
  readonly source: string;
  readonly set_by: string;
  readonly since: string;
}

const QUANTITIES = Object.keys(limitNames) as LimitQuantity[];
const SOURCES = Object.keys(limitSourceNames) as Limit['source'][];

interface LimitFormProps {
  readonly room: Room;
  /** The limit to change; null to set a new one. */
  readonly limit: Limit | null;
  readonly onDone: () => void;
}

/** Sets a limit on a room, or changes one: what it bounds, how much, who set it and since when. */
export function LimitForm({ room, limit, onDone }: LimitFormProps) {
  const session = useBookSession();
  const units = useUnits();
  const survey = useBook((state) => state.survey);
  const sources = SOURCES.filter((source) => maySetLimit(survey, source));
  const today = session.now().slice(0, 10);
  const boundOf = (values: Values) => {
    const unit = limitUnits[values.quantity as LimitQuantity];
    return readQuantity(values.bound, { name: 'Limit', unit, system: units, minimum: 1e-6, maximum: 1e9 });
  };

  const form = useForm<Values>({
    name: limit === null ? 'set-limit' : 'edit-limit',
    initial:
      limit === null
        ? { quantity: 'load_per_floor_MJ_m2', bound: '', source: sources[0] ?? 'house-rule', set_by: '', since: today }
        : {
            quantity: limit.quantity,
            bound: formatQuantity(limit.bound, limitUnits[limit.quantity], units, { figures: 'as entered' }).text,
            source: limit.source,
            set_by: limit.set_by,
            since: limit.since,
          },
    validate: (values): FieldErrors<Values> => {
      const bound = boundOf(values);
      return {
        ...('error' in bound ? { bound: bound.error } : {}),
        ...(values.set_by.trim() === '' ? { set_by: 'Enter who set it and where it stands, like permit 12/7' } : {}),
        ...(readDay(values.since) === null ? { since: 'Since must be a real date, like 2026-03-31' } : {}),
      };
    },
    submit: async (values) => {
      const bound = boundOf(values);
      const since = readDay(values.since);
      if ('error' in bound || since === null) return;
      const fields = { bound: bound.value, set_by: values.set_by.trim(), since };
      if (limit === null) {
        const made = await call(createLimit, {
          params: { buildingId: survey.building.id },
          body: {
            id: session.newId(),
            room_id: room.id,
            quantity: values.quantity as LimitQuantity,
            source: values.source as Limit['source'],
            ...fields,
          },
        });
        session.setLimits([...session.state.limits, made]);
        form.fill({ bound: '', set_by: '' });
      } else {
        const changed = await change(limit, fields);
        session.setLimits(session.state.limits.map((other) => (other.id === limit.id ? changed : other)));
      }
      session.announce(limit === null ? 'Set the limit' : 'Changed the limit');
      onDone();
    },
  });

  /** A limit somebody else has changed meanwhile is read anew, so that it stands beside what was typed. */
  const change = async (before: Limit, fields: Pick<Limit, 'bound' | 'set_by' | 'since'>): Promise<Limit> => {
    const current = session.state.limits.find((other) => other.id === before.id) ?? before;
    try {
      return await call(editLimit, { params: { limitId: before.id }, body: fields, ifMatch: current.version });
    } catch (error) {
      if (!(error instanceof StaleError)) throw error;
      await readLimits(session);
      throw new ToldError(
        'Somebody has changed this limit meanwhile; the table shows it as it is now. What you typed is kept: send it again to set yours in its place.',
      );
    }
  };

  return (
    <form
      noValidate
      onSubmit={form.onSubmit}
      className="grid gap-4 pb-2"
      aria-label={limit === null ? 'Set a limit' : 'Change a limit'}
    >
      <ErrorSummary {...form.summary} />
      <div className="flex flex-wrap items-start gap-4">
        {limit === null && (
          <>
            <SelectField
              label="Limit on"
              {...form.field('quantity')}
              options={QUANTITIES.map((quantity) => ({ value: quantity, label: limitNames[quantity] }))}
            />
            <SelectField
              label="Set in"
              {...form.field('source')}
              options={sources.map((source) => ({ value: source, label: limitSourceNames[source] }))}
              width="short"
            />
          </>
        )}
        <FormQuantity
          label="At most"
          unit={limitUnits[form.values.quantity as LimitQuantity]}
          field={form.field('bound')}
        />
        <TextField
          label="Set by"
          hint="Who, and where it stands."
          width="medium"
          autoComplete="off"
          {...form.field('set_by')}
        />
        <TextField
          label="Since"
          hint="Year, month, day: 2026-03-31"
          width="short"
          autoComplete="off"
          {...form.field('since')}
        />
      </div>
      <div className="flex flex-wrap gap-3">
        <Button type="submit" look="primary" busy={form.busy}>
          {limit === null ? 'Set the limit' : 'Change the limit'}
        </Button>
        {limit !== null && <Button onClick={onDone}>Keep it as it was</Button>}
      </div>
    </form>
  );
}
