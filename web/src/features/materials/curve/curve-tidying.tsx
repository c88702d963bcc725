import type { CalorimeterChoices } from '@embertally/shared/calorimeter/calorimeter-choices';
import { perArea } from '@embertally/shared/calorimeter/column-units';
import { NumberChoice } from './number-choice.tsx';

interface CurveTidyingProps {
  readonly choices: CalorimeterChoices;
  readonly onChoices: (choices: CalorimeterChoices) => void;
}

type Tidying = 'negatives' | 'blanks' | 'order';
const TIDYING: readonly { readonly key: Tidying; readonly on: string; readonly label: string }[] = [
  { key: 'negatives', on: 'zero', label: 'Readings below 0 are set to 0' },
  { key: 'blanks', on: 'bridge', label: 'Blank readings are passed over' },
  { key: 'order', on: 'mend', label: 'Readings are put in order of time' },
];

/** What a person decides about an untidy file, and what the file does not say. Nothing of it is done unasked. */
export function CurveTidying({ choices, onChoices }: CurveTidyingProps) {
  const set = (key: 'specimen_m2' | 'burnt_kg' | 'start_s' | 'humidity', value: number | undefined): void => {
    const { [key]: _before, ...rest } = choices;
    onChoices(value === undefined ? rest : { ...rest, [key]: value });
  };
  return (
    <div className="grid gap-4">
      <fieldset className="choices">
        <legend className="font-bold">If the file is not tidy</legend>
        {TIDYING.map(({ key, on, label }) => (
          <label key={key} className="choice">
            <input
              type="checkbox"
              checked={choices[key] === on}
              onChange={(event) => {
                const { [key]: _before, ...rest } = choices;
                onChoices(event.target.checked ? { ...rest, [key]: on } : rest);
              }}
            />
            <span>{label}</span>
          </label>
        ))}
      </fieldset>
      <div className="flex flex-wrap items-end gap-4">
        <NumberChoice
          label="The fire starts at"
          unit="s"
          optional
          value={choices.start_s}
          onChoose={(value) => {
            set('start_s', value);
          }}
        />
        {choices.from === 'rate' && perArea(choices.units.rate ?? '') ? (
          <NumberChoice
            label="Exposed area of the test piece"
            unit="m²"
            optional
            value={choices.specimen_m2}
            onChoose={(value) => {
              set('specimen_m2', value);
            }}
          />
        ) : null}
        <NumberChoice
          label="Mass that burnt"
          unit="kg"
          optional
          value={choices.burnt_kg}
          onChoose={(value) => {
            set('burnt_kg', value);
          }}
        />
        {choices.from === 'gases' ? (
          <NumberChoice
            label="Water vapour of the air"
            hint="Parts of 1, 0 to 0.1."
            optional
            value={choices.humidity}
            onChoose={(value) => {
              set('humidity', value);
            }}
          />
        ) : null}
      </div>
    </div>
  );
}
