import type { Limit, LimitQuantity } from '@embertally/shared/contracts/limits';
import { limitNames } from '@embertally/shared/limits/limit-names';
import { standingSentence } from '@embertally/shared/limits/standing-sentence';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { StandingMark } from '../../components/standing-mark.tsx';
import { BandBar } from './band-bar.tsx';
import { Figure } from './figure.tsx';
import { FigureNotes } from './figure-notes.tsx';
import { useQuantity } from '../../lib/use-quantity.ts';

interface TallyHeadlineProps {
  readonly tally: RoomTally;
  /** Of this room, in the order they were given to the tally. */
  readonly limits: readonly Limit[];
}

/** The density of the fire load with how sure it is, and how the room stands. */
export function TallyHeadline({ tally, limits }: TallyHeadlineProps) {
  const show = useQuantity();
  const { perFloor, band } = tally.load;
  if (perFloor === undefined || perFloor.value === null) {
    return <p className="my-4">The density cannot be computed yet; what is missing stands further down.</p>;
  }
  const low = band?.p5.value ?? null;
  const high = band?.p95.value ?? null;
  const bounds = tally.limits.flatMap((stood, index) =>
    stood.quantity === 'load_per_floor_MJ_m2'
      ? [
          {
            id: limits[index]?.id ?? String(index),
            bound: stood.bound,
            label: `limit ${show(stood.bound, 'MJ/m2').text}`,
            standing: stood.standing,
          },
        ]
      : [],
  );
  return (
    <div className="border-y border-rule py-4">
      <div className="tally-headline">
        <p className="whitespace-nowrap">
          <Figure
            path="load.perFloor"
            estimate={perFloor}
            className="text-display font-bold"
            unitClassName="text-lead font-normal"
          />
        </p>
        {low !== null && high !== null && high > 0 && band !== undefined && (
          <div className="min-w-0">
            <BandBar
              value={perFloor.value}
              low={low}
              high={high}
              lowLabel={show(low, 'MJ/m2').text}
              highLabel={show(high, 'MJ/m2').text}
              limits={bounds}
            />
            <p className="text-small text-soft">
              Nine times in ten between <Figure path="load.band.p5" estimate={band.p5} unit="bare" /> and{' '}
              <Figure path="load.band.p95" estimate={band.p95} />, going by how each entry is known
              {tally.uncertainty === undefined ? ', to first order' : ', from samples'}.
            </p>
          </div>
        )}
      </div>
      <ul className="mt-2 grid gap-1">
        {tally.limits.map((stood, index) => (
          <li key={limits[index]?.id ?? index} className="standing-line" data-standing={stood.standing}>
            <StandingMark standing={stood.standing} />{' '}
            <span>
              {stood.quantity !== 'load_per_floor_MJ_m2' && `${limitNames[stood.quantity as LimitQuantity]}: `}
              {standingSentence(stood, limits[index], show)}
            </span>
          </li>
        ))}
        {tally.limits.length === 0 && (
          <li className="text-soft">No limit set: nobody has said how much this room may hold.</li>
        )}
      </ul>
      <FigureNotes of={[perFloor, band?.p95]} />
    </div>
  );
}
