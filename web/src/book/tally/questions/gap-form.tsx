import { enoughGap, type GapAnswer, type GapResult } from '@embertally/shared/questions/enough-gap';
import { type SubmitEvent, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { AnswerBox } from './answer-box.tsx';
import { AnswerFigure } from './answer-figure.tsx';
import type { QuestionFormProps } from './question-form-props.ts';
import { useAsked } from './use-asked.ts';

const STANDINGS: Readonly<Record<GapAnswer['standing'], string>> = {
  enough: 'They stand far enough apart, by this model.',
  'too small': 'They stand nearer than what is enough.',
  'no gap helps': 'No gap is enough.',
};

/** What gap would keep one entry from lighting another. */
export function GapForm({ input }: QuestionFormProps) {
  const entries = input.contents.map(({ id, label }) => ({ value: id, label: label ?? id }));
  const [from, setFrom] = useState(entries[0]?.value ?? '');
  const [to, setTo] = useState(entries[1]?.value ?? '');
  const { answer, isStale, ask, forget } = useAsked<GapResult>(input);
  if (entries.length < 2) return <p className="text-soft">A gap needs two entries in the room.</p>;
  const known = (id: string, other: number) =>
    entries.some(({ value }) => value === id) ? id : (entries[other]?.value ?? '');
  const [burning, kept] = [known(from, 0), known(to, 1)];
  const onSubmit = (event: SubmitEvent) => {
    event.preventDefault();
    ask((room) => enoughGap(room, burning, kept));
  };
  return (
    <form className="grid grid-cols-[minmax(0,1fr)] gap-3" onSubmit={onSubmit}>
      <SelectField
        label="Burning"
        value={burning}
        options={entries}
        onChange={(value) => {
          setFrom(value);
          forget();
        }}
      />
      <SelectField
        label="To be kept from lighting"
        value={kept}
        options={entries}
        onChange={(value) => {
          setTo(value);
          forget();
        }}
      />
      <div>
        <Button type="submit">Work it out</Button>
      </div>
      {answer !== null && (
        <AnswerBox isStale={isStale}>
          {'why' in answer ? <p>{answer.why}</p> : <GapFigures answer={answer.answer} />}
        </AnswerBox>
      )}
    </form>
  );
}

function GapFigures({ answer }: { readonly answer: GapAnswer }) {
  const rows = [
    ['As they stand', answer.gap],
    ['Just not lit', answer.justNot],
    ['Enough: not lit by twice the radiation', answer.enough],
    ['Enough however long it burns', answer.longExposure],
  ] as const;
  return (
    <>
      <p>
        <strong>{STANDINGS[answer.standing]}</strong>
      </p>
      <dl className="text-small">
        {rows.map(([label, estimate]) => (
          <div key={label} className="flex items-baseline justify-between gap-4 border-b border-rule py-1">
            <dt>{label}</dt>
            <dd className="text-right">
              {estimate.never !== undefined && <span className="mr-2 text-soft">{estimate.never}</span>}
              <AnswerFigure estimate={estimate} name={label} />
            </dd>
          </div>
        ))}
      </dl>
      <p className="text-small text-soft">
        Clear distances on the plan. A gap on paper is no barrier and no substitute for the separation the fire code
        asks for: things fall, are moved and are put in between.
      </p>
    </>
  );
}
