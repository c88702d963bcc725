import { FURTHER_RANGES, USUAL_FURTHER, type FurtherAsked } from '@embertally/shared/further/further-asked';
import type { FurtherReading, FurtherTopic } from '@embertally/shared/further/further-reading';
import { FURTHER_LABEL, furtherReadings } from '@embertally/shared/further/further-readings';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { useMemo, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { QuantityField } from '../../../components/quantity-field.tsx';
import { FurtherRow } from './further-row.tsx';

interface FurtherPartProps {
  readonly input: RoomInput;
  /** Of the same input. */
  readonly tally: RoomTally;
}

const TOPICS: Readonly<Record<FurtherTopic, string>> = {
  load: 'The load, counted otherwise',
  openings: 'The openings, counted otherwise',
  'one fire': 'One entry burning alone',
  'large room': 'A large room',
  smoke: 'Smoke',
  'burn-out': 'Burn-out, by other relations',
  'next door': 'Next door',
  goods: 'Goods that do not behave like their heat',
  sprinklers: 'Sprinklers',
  water: 'Water',
};

const FIELDS = [
  { key: 'opposite_m', label: 'To what stands opposite', unit: 'm' },
  { key: 'aside_m', label: 'To who or what stands aside', unit: 'm' },
  { key: 'minutes', label: 'Time on nominal curves', unit: 'min' },
] as const satisfies readonly { key: keyof FurtherAsked; label: string; unit: string }[];

/** What other methods say of the room: variants and further looks, none of them used in the tally. */
export function FurtherPart({ input, tally }: FurtherPartProps) {
  const [asked, setAsked] = useState<FurtherAsked>(USUAL_FURTHER);
  const [unfolded, setUnfolded] = useState(false);
  const readings = useMemo(() => furtherReadings(input, tally, asked), [input, tally, asked]);
  const topics = Object.keys(TOPICS) as FurtherTopic[];
  const silent = readings.filter(({ numbers }) => numbers.length === 0);
  return (
    <section aria-labelledby="workings-further">
      <div className="part-heading">
        <h2 id="workings-further" className="text-lead">
          Further readings
        </h2>
        <Button
          look="quiet"
          className="not-on-paper"
          aria-pressed={unfolded}
          onClick={() => {
            setUnfolded(!unfolded);
          }}
        >
          {unfolded ? 'Fold the workings' : 'Unfold all workings, to print'}
        </Button>
      </div>
      <p className="max-w-[72ch]">
        What other methods say of this room. Each is a {FURTHER_LABEL}: it may differ from it, and none is mixed with
        it.
      </p>
      <div className="not-on-paper mt-3 flex flex-wrap gap-x-6 gap-y-3">
        {FIELDS.map(({ key, label, unit }) => (
          <QuantityField
            key={key}
            label={label}
            unit={unit}
            value={asked[key]}
            minimum={FURTHER_RANGES[key].least}
            maximum={FURTHER_RANGES[key].most}
            compact
            onCommit={(value) => {
              if (value !== null) setAsked({ ...asked, [key]: value });
            }}
          />
        ))}
      </div>
      {topics.map((topic) => (
        <Topic
          key={topic}
          title={TOPICS[topic]}
          unfolded={unfolded}
          readings={readings.filter((reading) => reading.topic === topic && reading.numbers.length > 0)}
        />
      ))}
      {silent.length > 0 && (
        <>
          <h3 className="mt-6 font-bold">What does not apply here, and why</h3>
          <ul className="mt-1 grid gap-1 text-small">
            {silent.map(({ id, title, why }) => (
              <li key={id}>
                {title}: <span className="text-soft">{why}</span>
              </li>
            ))}
          </ul>
        </>
      )}
    </section>
  );
}

interface TopicProps {
  readonly title: string;
  readonly unfolded: boolean;
  readonly readings: readonly FurtherReading[];
}

function Topic({ title, unfolded, readings }: TopicProps) {
  if (readings.length === 0) return null;
  return (
    <>
      <h3 className="mt-6 border-b border-ink pb-1 font-bold">{title}</h3>
      {readings.map((reading) => (
        <FurtherRow key={reading.id} reading={reading} unfolded={unfolded} />
      ))}
    </>
  );
}
