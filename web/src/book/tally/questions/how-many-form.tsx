import { type PlaceableHit, searchCatalogue } from '@embertally/shared/catalogue/search-catalogue';
import { limitNames } from '@embertally/shared/limits/limit-names';
import { limitUnits } from '@embertally/shared/limits/limit-units';
import type { LimitQuantity } from '@embertally/shared/contracts/limits';
import type { Answer } from '@embertally/shared/questions/answer';
import { furtherOfKind, furtherOfMaterial } from '@embertally/shared/questions/further-entry';
import { howManyMore } from '@embertally/shared/questions/how-many-more';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { type SubmitEvent, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Combobox } from '../../../components/combobox.tsx';
import { QuantityField } from '../../../components/quantity-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { useUnits } from '../../../lib/units-context.ts';
import { catalogueItem } from '../../plan/catalogue-item.ts';
import { useBook } from '../../session/use-book.ts';
import { plainUnits } from '../../../lib/plain-units.ts';
import { AnswerBox } from './answer-box.tsx';
import { AnswerFigure } from './answer-figure.tsx';
import type { QuestionFormProps } from './question-form-props.ts';
import { useAsked } from './use-asked.ts';

interface Bound {
  readonly quantity: LimitQuantity;
  readonly bound: number;
}

interface Both {
  readonly bound: Bound;
  readonly what: string;
  readonly notOver: Answer;
  readonly within: Answer;
}

const QUANTITIES: readonly LimitQuantity[] = [
  'load_per_floor_MJ_m2',
  'load_total_MJ',
  'load_design_MJ_m2',
  'peak_kW',
  'equivalent_time_min',
];

/** How many pieces of a kind, or how much of a material, the room takes before a bound is passed. */
export function HowManyForm({ input }: QuestionFormProps) {
  const units = useUnits();
  const limits = input.limits ?? [];
  const [typed, setTyped] = useState('');
  const [hit, setHit] = useState<PlaceableHit | null>(null);
  const [chosen, setChosen] = useState('0');
  const [quantity, setQuantity] = useState<LimitQuantity>('load_per_floor_MJ_m2');
  const [bound, setBound] = useState<number | null>(null);
  const [lacking, setLacking] = useState<{ readonly what?: string; readonly bound?: string }>({});
  const { answer, isStale, ask, forget } = useAsked<Both>(input);
  const limit = limits[Number(chosen)];
  const own = useBook((state) => state.ownMaterials);
  const hits = searchCatalogue(typed, { limit: 12, own });
  const change = () => {
    setLacking({});
    forget();
  };

  const onSubmit = (event: SubmitEvent) => {
    event.preventDefault();
    const held: Bound | null = limit ?? (bound === null ? null : { quantity, bound });
    if (hit === null || held === null) {
      setLacking({
        ...(hit === null && { what: 'Choose a kind or a material of the list' }),
        ...(held === null && { bound: 'Enter the bound to hold to' }),
      });
      return;
    }
    const further = hit.type === 'kind' ? furtherOfKind(hit.row) : furtherOfMaterial(hit.row);
    const by = hit.type === 'kind' ? 'pieces' : 'mass';
    ask((room) => {
      const asked = (keep: 'not over' | 'within') => howManyMore(room, { further, by, limit: held, keep });
      return { bound: held, what: hit.row.label, notOver: asked('not over'), within: asked('within') };
    });
  };

  return (
    <form className="grid grid-cols-[minmax(0,1fr)] gap-3" onSubmit={onSubmit} noValidate>
      <Combobox
        label="What is added"
        value={typed}
        onChange={(text) => {
          setTyped(text);
          setHit(null);
          change();
        }}
        items={hits.map(catalogueItem)}
        nothing={typed === '' ? 'Type two letters: pa, cotton, chair' : 'Nothing in the catalogue answers to that.'}
        onPick={(item) => {
          const found = hits.find((one) => catalogueItem(one).id === item.id);
          if (found === undefined) return;
          setHit(found);
          setTyped(found.row.label);
          change();
        }}
        {...(lacking.what === undefined ? {} : { error: lacking.what })}
      />
      <SelectField
        label="Held to"
        value={limit === undefined ? 'other' : chosen}
        options={[
          ...limits.map((one, index) => {
            const { text, unit } = formatQuantity(one.bound, limitUnits[one.quantity], units);
            const setBy = one.set_by == null || one.set_by === '' ? '' : `, ${one.set_by}`;
            return { value: String(index), label: `${limitNames[one.quantity]} ${text} ${unit}${setBy}` };
          }),
          { value: 'other', label: limits.length === 0 ? 'A bound of my own: no limit is set' : 'A bound of my own' },
        ]}
        onChange={(value) => {
          setChosen(value);
          change();
        }}
      />
      {limit === undefined && (
        <div className="grid grid-cols-[minmax(0,1fr)] gap-3">
          <SelectField
            label="What it bounds"
            value={quantity}
            options={QUANTITIES.map((value) => ({ value, label: limitNames[value] }))}
            onChange={(value) => {
              setQuantity(value);
              setBound(null);
              change();
            }}
          />
          <QuantityField
            key={quantity}
            label="Bound"
            unit={limitUnits[quantity]}
            value={bound}
            minimum={0.001}
            maximum={1e9}
            optional
            onCommit={(value) => {
              setBound(value);
              change();
            }}
            {...(lacking.bound === undefined ? {} : { error: lacking.bound })}
          />
        </div>
      )}
      <div>
        <Button type="submit">Work it out</Button>
      </div>
      {answer !== null && (
        <AnswerBox isStale={isStale}>
          <HowManyAnswer both={answer} />
        </AnswerBox>
      )}
    </form>
  );
}

function HowManyAnswer({ both: { bound, what, notOver, within } }: { readonly both: Both }) {
  const units = useUnits();
  const { estimate, before, after, readingUnit } = notOver;
  if (estimate.value === null) return <p>{plainUnits(estimate.never ?? '')}</p>;
  const words = (value: number, figures: 3 | 'as entered' = 3) => {
    const { text, unit } = formatQuantity(value, readingUnit, units, { figures });
    return `${text} ${unit}`;
  };
  const at = words(bound.bound);
  // So near the bound that three figures would not tell on which side.
  const beside = (value: number) =>
    words(value) === at ? words(Number(value.toPrecision(6)), 'as entered') : words(value);
  return (
    <>
      <p>
        <AnswerFigure estimate={estimate} name={`How much more of ${what} fits`} /> more of {what}:{' '}
        {limitNames[bound.quantity].toLowerCase()} stays at or under {at}
        {before.value !== null && <> ({beside(before.value)})</>}.
        {estimate.unit === '' && after.value !== null && ` One more makes ${beside(after.value)}: over.`}
      </p>
      <p className="text-soft">
        {within.estimate.value === null ? (
          plainUnits(within.estimate.never ?? '')
        ) : (
          <>
            With <AnswerFigure estimate={within.estimate} name={`How much more of ${what} keeps the room within`} /> of
            them the room stays within, below 90 % of it.
          </>
        )}
      </p>
    </>
  );
}
