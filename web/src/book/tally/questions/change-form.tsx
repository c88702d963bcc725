import type { Answer } from '@embertally/shared/questions/answer';
import { roomHeightLever, storageHeightLever } from '@embertally/shared/questions/height-lever';
import type { Lever } from '@embertally/shared/questions/lever';
import { openingLever, type OpeningVaried } from '@embertally/shared/questions/opening-lever';
import { READINGS, type ReadingName } from '@embertally/shared/questions/reading';
import { whatChanges } from '@embertally/shared/questions/what-changes';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { type SubmitEvent, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { SelectField, type SelectOption } from '../../../components/select-field.tsx';
import { WarningList } from '../../../components/working/warning-list.tsx';
import { useQuantity } from '../../../lib/use-quantity.ts';
import { plainUnits } from '../../../lib/plain-units.ts';
import { AnswerBox } from './answer-box.tsx';
import { AnswerFigure } from './answer-figure.tsx';
import type { QuestionFormProps } from './question-form-props.ts';
import { useAsked } from './use-asked.ts';

interface BothWays {
  readonly lever: Pick<Lever, 'title' | 'now' | 'unit'>;
  readonly reading: ReadingName;
  readonly more: Answer;
  readonly less: Answer;
}

const READING_OPTIONS = (Object.keys(READINGS) as ReadingName[]).map((value) => ({
  value,
  label: READINGS[value].title,
}));
const VARIED: readonly SelectOption<OpeningVaried>[] = [
  { value: 'width', label: 'its width' },
  { value: 'height', label: 'its height' },
  { value: 'number', label: 'how many there are of it' },
];
const FURTHER = 'opening further';

/** What could be varied: every opening, one that is not there yet, the room's height, the height of each entry. */
function things({ room, contents }: RoomInput): SelectOption<string>[] {
  return [
    ...(room.openings ?? []).map(({ label, kind, state }, place) => ({
      value: `opening ${place}`,
      label: `${label == null || label === '' ? `${capitalised(kind ?? 'opening')} ${place + 1}` : label}${state === 'closed' ? ', closed' : ''}`,
    })),
    { value: FURTHER, label: 'A further opening to the outside' },
    { value: 'room', label: 'The height of the room' },
    ...contents.flatMap(({ id, label, height_m }) =>
      height_m == null ? [] : [{ value: `entry ${id}`, label: `How high ${label ?? id} is stored` }],
    ),
  ];
}

function capitalised(word: string): string {
  return word.charAt(0).toUpperCase() + word.slice(1);
}

function leverOf(input: RoomInput, thing: string, varied: OpeningVaried): Lever | undefined {
  if (thing === 'room') return roomHeightLever(input);
  if (thing.startsWith('entry ')) return storageHeightLever(input, thing.slice('entry '.length));
  return openingLever(input, thing === FURTHER ? null : Number(thing.slice('opening '.length)), varied);
}

/** From which size of an opening, or from which height on, a reading of the room is another one. */
export function ChangeForm({ input }: QuestionFormProps) {
  const options = things(input);
  const [reading, setReading] = useState<ReadingName>('governed-by');
  const [chosen, setChosen] = useState('');
  const [varied, setVaried] = useState<OpeningVaried>('width');
  const { answer, isStale, ask, forget } = useAsked<BothWays | null>(input);
  const openings = input.room.openings ?? [];
  const firstOpen = openings.findIndex(({ state }) => state !== 'closed');
  const usual = firstOpen < 0 ? FURTHER : `opening ${firstOpen}`;
  const thing = options.some(({ value }) => value === chosen) ? chosen : usual;
  const isClosed = openings.some(({ state }, place) => state === 'closed' && thing === `opening ${place}`);
  const onSubmit = (event: SubmitEvent) => {
    event.preventDefault();
    ask((room) => {
      const lever = leverOf(room, thing, varied);
      if (lever === undefined) return null;
      const { title, now, unit } = lever;
      const towards = (direction: 'more' | 'less') => whatChanges(lever, reading, direction);
      return { lever: { title, now, unit }, reading, more: towards('more'), less: towards('less') };
    });
  };
  return (
    <form className="grid grid-cols-[minmax(0,1fr)] gap-3" onSubmit={onSubmit}>
      <SelectField
        label="What shall be another one"
        value={reading}
        options={READING_OPTIONS}
        onChange={(value) => {
          setReading(value);
          forget();
        }}
      />
      <SelectField
        label="By"
        value={thing}
        {...(isClosed && { hint: 'It is closed, so its size changes nothing until it is set open.' })}
        options={options}
        onChange={(value) => {
          setChosen(value);
          forget();
        }}
      />
      {thing.startsWith('opening ') && (
        <SelectField
          label="What of it"
          value={varied}
          options={VARIED}
          onChange={(value) => {
            setVaried(value);
            forget();
          }}
        />
      )}
      <div>
        <Button type="submit">Work it out</Button>
      </div>
      {answer !== null && (
        <AnswerBox isStale={isStale}>
          <ChangeAnswer {...answer} />
        </AnswerBox>
      )}
    </form>
  );
}

function ChangeAnswer({ lever, more, less }: BothWays) {
  const show = useQuantity();
  const count = lever.unit === '' ? { text: String(lever.now), unit: '' } : show(lever.now, lever.unit);
  const found = [more, less].filter(({ estimate }) => estimate.value !== null);
  return (
    <>
      <p>
        Now, at {`${count.text} ${count.unit}`.trim()}:{' '}
        {more.estimate.value === null ? less.before.state : more.before.state}.
      </p>
      {[more, less].map((answer, index) => (
        <OneWay key={index === 0 ? 'more' : 'less'} answer={answer} title={lever.title} upwards={index === 0} />
      ))}
      <WarningList warnings={found.flatMap(({ estimate }) => estimate.warnings)} />
    </>
  );
}

interface OneWayProps {
  readonly answer: Answer;
  readonly title: string;
  readonly upwards: boolean;
}

function OneWay({ answer: { estimate, before, after, readingUnit }, title, upwards }: OneWayProps) {
  const show = useQuantity();
  if (estimate.value === null) return <p className="text-soft">{plainUnits(estimate.never ?? '')}</p>;
  const reads = (value: number | null) => {
    if (value === null) return null;
    const { text, unit } = show(value, readingUnit);
    return `${text} ${unit}`.trim();
  };
  const [from, to] = [reads(before.value), reads(after.value)];
  return (
    <p>
      {upwards ? 'From' : 'Down at'} <AnswerFigure estimate={estimate} name={title} />
      {upwards ? ' on' : ''}: {after.state}
      {from !== null && to !== null && from !== to && ` (${from} before, ${to} after)`}.
    </p>
  );
}
