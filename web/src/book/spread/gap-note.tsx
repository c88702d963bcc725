import type { Shown } from '../../lib/use-quantity.ts';
import type { ShownGap } from './spread-play.ts';

interface GapNoteProps {
  readonly gap: ShownGap;
  readonly nameOf: (id: string) => string;
  readonly show: (value: number, unit: string) => Shown;
}

/** The gap that is drawn on the plan, in words. */
export function GapNote({ gap, nameOf, show }: GapNoteProps) {
  const length = (m: number): string => {
    const { text, unit } = show(m, 'm');
    return `${text} ${unit}`;
  };
  return (
    <p className="spread-words">
      <strong>
        {nameOf(gap.from)} to {nameOf(gap.to)}
      </strong>
      : {gap.gap_m > 0 ? `${length(gap.gap_m)} apart` : 'no gap'}.{' '}
      {gap.enough_m === null
        ? 'No gap would be enough.'
        : `${length(gap.enough_m)} would be enough: ${nameOf(gap.to)} would stand where the dashed outline is.`}
    </p>
  );
}
