import type { CalorimeterChoices, Delimiter } from '@embertally/shared/calorimeter/calorimeter-choices';
import { COLUMN_UNITS, ROLE_WORDS, type Role } from '@embertally/shared/calorimeter/column-units';
import type { CalorimeterDescription } from '@embertally/shared/calorimeter/describe-calorimeter-csv';
import { ChoiceField } from '../../../components/choice-field.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { NumberChoice } from './number-choice.tsx';

interface CurveColumnsProps {
  readonly description: CalorimeterDescription;
  readonly choices: CalorimeterChoices;
  readonly onChoices: (choices: CalorimeterChoices) => void;
  readonly onDelimiter: (delimiter: Delimiter) => void;
}

const DELIMITERS = [
  { value: ',', label: 'Commas' },
  { value: ';', label: 'Semicolons' },
  { value: '\t', label: 'Tabs' },
] as const;
const DECIMALS = [
  { value: '', label: 'Not known: ask' },
  { value: 'point', label: 'A point: 1.5' },
  { value: 'comma', label: 'A comma: 1,5' },
] as const;
const ROLES_OF: Readonly<Record<CalorimeterChoices['from'], readonly Role[]>> = {
  rate: ['time', 'rate', 'mass', 'massLoss'],
  gases: ['time', 'oxygen', 'carbonDioxide', 'carbonMonoxide', 'flow', 'mass', 'massLoss'],
};
const NEEDED: ReadonlySet<Role> = new Set<Role>(['time', 'rate', 'oxygen', 'flow']);
const UNIT_WORDS: Readonly<Record<string, string>> = {
  'kW/m2': 'kW/m²',
  'W/m2': 'W/m²',
  'MW/m2': 'MW/m²',
  fraction: 'parts of 1',
  clock: 'h:mm:ss',
};

/** Which column is what, and in which unit: proposed from the headers, changed by the person. */
export function CurveColumns({ description, choices, onChoices, onDelimiter }: CurveColumnsProps) {
  const columns = [
    { value: '', label: 'Not in this file' },
    ...description.columns.map(({ index, name, unitText, samples }) => ({
      value: String(index),
      label: `${index + 1}. ${name}${unitText === '' ? '' : ` (${unitText})`}${samples.length === 0 ? ', empty' : `: ${samples.join(', ')}`}`,
    })),
  ];
  const choose = (role: Role, value: string): void => {
    const { [role]: _column, ...others } = choices.columns;
    const { [role]: _unit, ...otherUnits } = choices.units;
    if (value === '') {
      onChoices({ ...choices, columns: others, units: otherUnits });
      return;
    }
    const index = Number(value);
    const unit = description.columns.find((column) => column.index === index)?.unit ?? null;
    const fitting = unit !== null && unit in COLUMN_UNITS[role] ? unit : choices.units[role];
    onChoices({
      ...choices,
      columns: { ...others, [role]: index },
      units: fitting === undefined ? otherUnits : { ...otherUnits, [role]: fitting },
    });
  };
  return (
    <div className="grid gap-4">
      <div className="flex flex-wrap items-end gap-4">
        <SelectField
          label="Cells are parted by"
          width="short"
          value={choices.delimiter}
          options={DELIMITERS}
          onChange={onDelimiter}
        />
        {choices.delimiter === ',' ? null : (
          <SelectField
            label="Decimals begin with"
            width="short"
            value={choices.decimal ?? ''}
            options={DECIMALS}
            onChange={(value) => {
              onChoices({ ...choices, decimal: value === '' ? null : value });
            }}
          />
        )}
        <NumberChoice
          label="Readings begin in line"
          value={choices.firstLine}
          onChoose={(line) => {
            if (line !== undefined && Number.isInteger(line) && line >= 1) onChoices({ ...choices, firstLine: line });
          }}
        />
      </div>
      <ChoiceField
        legend="The heat release rate"
        value={choices.from}
        choices={[
          { value: 'rate', label: 'is a column of the file' },
          { value: 'gases', label: 'is worked out from oxygen and the flow in the duct' },
        ]}
        onChange={(from) => {
          onChoices({ ...choices, from });
        }}
      />
      {ROLES_OF[choices.from].map((role) => (
        <div key={role} className="flex flex-wrap items-end gap-x-4 gap-y-2">
          <div className="w-full max-w-96">
            <SelectField
              label={`Column of ${ROLE_WORDS[role]}`}
              optional={!NEEDED.has(role)}
              value={choices.columns[role] === undefined ? '' : String(choices.columns[role])}
              options={columns}
              onChange={(value) => {
                choose(role, value);
              }}
            />
          </div>
          {choices.columns[role] === undefined ? null : (
            <SelectField
              label={`Unit of ${ROLE_WORDS[role]}`}
              width="short"
              value={choices.units[role] ?? ''}
              options={[
                ...(choices.units[role] === undefined ? [{ value: '', label: 'Choose' }] : []),
                ...Object.keys(COLUMN_UNITS[role]).map((unit) => ({ value: unit, label: UNIT_WORDS[unit] ?? unit })),
              ]}
              onChange={(unit) => {
                onChoices({ ...choices, units: { ...choices.units, [role]: unit } });
              }}
            />
          )}
        </div>
      ))}
    </div>
  );
}
