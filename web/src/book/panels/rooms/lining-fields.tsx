import { LININGS } from '@embertally/shared/catalogue/linings';
import type { Done, Refusal } from '@embertally/shared/survey/command';
import type { Lining, LiningSurface } from '@embertally/shared/survey/survey-document';
import { CommandChoice } from '../command-choice.tsx';
import { surfaceWords } from './room-words.ts';

const SURFACES = [
  { name: 'walls', label: 'Walls' },
  { name: 'ceiling', label: 'Ceiling' },
  { name: 'floor', label: 'Floor' },
] as const;
const UNKNOWN = '';
const OWN = 'own layers';

interface LiningFieldsProps {
  readonly lining: Lining;
  readonly run: (lining: Lining) => Done | Refusal;
}

const valueOf = (surface: LiningSurface | null): string =>
  surface === null ? UNKNOWN : 'key' in surface ? surface.key : OWN;

/** What walls, ceiling and floor are made of; layers a person has recorded stay until another answer is chosen. */
export function LiningFields({ lining, run }: LiningFieldsProps) {
  return (
    <>
      {SURFACES.map(({ name, label }) => {
        const surface = lining[name];
        const options = [
          { value: UNKNOWN, label: 'Not known' },
          ...(valueOf(surface) === OWN ? [{ value: OWN, label: surfaceWords(surface) }] : []),
          ...LININGS.map((row) => ({ value: row.key, label: row.label })),
        ];
        return (
          <CommandChoice
            key={name}
            label={`Lining of the ${label.toLowerCase()}`}
            value={valueOf(surface)}
            options={options}
            run={(key) => run({ ...lining, [name]: key === UNKNOWN ? null : key === OWN ? surface : { key } })}
          />
        );
      })}
    </>
  );
}
