import { bandScale } from './band-scale.ts';

export interface BandBarLimit {
  readonly id: string;
  readonly bound: number;
  readonly label: string;
  readonly standing: 'within' | 'near' | 'over' | 'no limit set';
}

interface BandBarProps {
  readonly value: number;
  readonly low: number;
  readonly high: number;
  readonly lowLabel: string;
  readonly highLabel: string;
  readonly limits: readonly BandBarLimit[];
}

const WIDTH = 300;
const LINE = 30;
const TONES = { within: 'var(--ink)', near: 'var(--ochre)', over: 'var(--madder)', 'no limit set': 'var(--ink)' };

/** Keeps a centred word inside the picture. */
const anchorAt = (x: number): 'start' | 'middle' | 'end' => (x < 40 ? 'start' : x > WIDTH - 40 ? 'end' : 'middle');

/** The density on a short number line: how sure it is, and where the limits stand. Said in words beside it. */
export function BandBar({ value, low, high, lowLabel, highLabel, limits }: BandBarProps) {
  const scale = bandScale(
    [low, high],
    limits.map((limit) => limit.bound),
  );
  const x = (at: number): number => scale.at(at) * WIDTH;
  const shown = limits.filter((limit) => limit.bound <= scale.to).sort((a, b) => a.bound - b.bound);
  const apart = x(high) - x(low) > 76;
  return (
    <svg viewBox={`0 0 ${WIDTH} 58`} className="block w-full max-w-[21rem]" aria-hidden="true" focusable="false">
      <line x1={0} x2={WIDTH} y1={LINE} y2={LINE} stroke="var(--soft)" strokeWidth={1} />
      <rect
        x={x(low)}
        width={Math.max(2, x(high) - x(low))}
        y={LINE - 7}
        height={14}
        fill="color-mix(in srgb, var(--load-2) 42%, var(--page))"
      />
      {[low, high].map((end, index) => (
        <line key={index} x1={x(end)} x2={x(end)} y1={LINE - 7} y2={LINE + 7} stroke="var(--ink)" strokeWidth={1.5} />
      ))}
      <line x1={x(value)} x2={x(value)} y1={LINE - 12} y2={LINE + 12} stroke="var(--ink)" strokeWidth={3} />
      {shown.map((limit, index) => (
        <g key={limit.id} stroke={TONES[limit.standing]} fill={TONES[limit.standing]}>
          <line
            x1={x(limit.bound)}
            x2={x(limit.bound)}
            y1={16}
            y2={LINE + 12}
            strokeWidth={2}
            strokeDasharray={limit.standing === 'over' ? '7 2' : '4 3'}
          />
          {index === 0 && (
            <text x={x(limit.bound)} y={12} fontSize={14} stroke="none" textAnchor={anchorAt(x(limit.bound))}>
              {limit.label}
            </text>
          )}
        </g>
      ))}
      <text x={x(low)} y={56} fontSize={14} fill="var(--soft)" textAnchor={apart ? anchorAt(x(low)) : 'end'}>
        {lowLabel}
      </text>
      <text x={x(high)} y={56} fontSize={14} fill="var(--soft)" textAnchor={apart ? anchorAt(x(high)) : 'start'}>
        {highLabel}
      </text>
    </svg>
  );
}
