import type { RoomSummary } from '@embertally/shared/contracts/surveys';

export type Standing = RoomSummary['standing'];

interface StandingMarkProps {
  readonly standing: Standing;
  /** How many rooms stand so: "2 near". */
  readonly count?: number;
}

/** How something stands against its limits, in a word and an edge: colour never speaks alone. */
export function StandingMark({ standing, count }: StandingMarkProps) {
  return (
    <span className="standing" data-standing={standing}>
      {count === undefined ? standing : `${count} ${standing}`}
    </span>
  );
}
