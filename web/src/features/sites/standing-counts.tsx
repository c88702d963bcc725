import { StandingMark } from '../../components/standing-mark.tsx';

interface StandingCountsProps {
  readonly rooms: number;
  readonly over: number;
  readonly near: number;
}

/** How many rooms stand over and near their limits; a dash where there is nothing to say. */
export function StandingCounts({ rooms, over, near }: StandingCountsProps) {
  if (over === 0 && near === 0) return <span className="text-soft">{rooms === 0 ? '–' : 'none near or over'}</span>;
  return (
    <span className="inline-flex flex-wrap items-center gap-1.5">
      {over > 0 ? <StandingMark standing="over" count={over} /> : null}
      {near > 0 ? <StandingMark standing="near" count={near} /> : null}
    </span>
  );
}
