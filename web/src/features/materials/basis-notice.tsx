import type { MaterialBasis } from '@embertally/shared/materials/derived-material';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { Button } from '../../components/button.tsx';
import { Notice } from '../../components/notice.tsx';
import { useUnits } from '../../lib/units-context.ts';

interface BasisNoticeProps {
  readonly basis: MaterialBasis;
  /** Takes the proposal over; absent where nothing can be changed. */
  readonly onTake?: () => void;
  readonly onPutBack?: () => void;
}

const TITLES: Readonly<Record<MaterialBasis['finding'], string>> = {
  plausible: 'The heat fits the oxygen it takes up',
  'genuine-exception': 'An unusual heat that is genuine',
  'own-oxygen': 'It may carry oxygen of its own',
  'wrong-mole-basis': 'The heat may belong to another number of moles',
  'gross-for-net': 'This may be the gross heat',
  implausible: 'The heat does not fit the oxygen it takes up',
  'not-covered': 'The heat cannot be held against oxygen',
  'dry-for-received': 'This may be the heat of the dry material',
};
const QUIET: ReadonlySet<MaterialBasis['finding']> = new Set([
  'plausible',
  'genuine-exception',
  'own-oxygen',
  'not-covered',
]);

/** What the check of the basis found. It proposes; only a person takes a proposal over, and can put it back. */
export function BasisNotice({ basis, onTake, onPutBack }: BasisNoticeProps) {
  const units = useUnits();
  const heat = (value: number): string => {
    const { text, unit } = formatQuantity(value, 'MJ/kg', units);
    return `${text} ${unit}`;
  };
  const { proposal, accepted, finding } = basis;
  return (
    <Notice tone={QUIET.has(finding) ? 'plain' : 'caution'} title={TITLES[finding]}>
      <p>{basis.text}</p>
      {proposal === null || onTake === undefined ? null : (
        <Button className="mt-2" onClick={onTake}>
          Use {heat(proposal.net_MJ_kg)} instead
        </Button>
      )}
      {accepted === null ? null : (
        <>
          <p>
            A person took the correction over: {heat(accepted.stated_net_MJ_kg)} was stated, multiplied by{' '}
            {String(Number(accepted.factor.toPrecision(4)))}.
          </p>
          {onPutBack === undefined ? null : (
            <Button className="mt-2" onClick={onPutBack}>
              Put {heat(accepted.stated_net_MJ_kg)} back
            </Button>
          )}
        </>
      )}
    </Notice>
  );
}
