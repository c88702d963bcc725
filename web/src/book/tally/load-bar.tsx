import { loadBand } from '@embertally/shared/tally/density-band';

/** Everything from here on fills the bar: the deepest band begins at it. */
const FULL_MJ_M2 = 1600;

/** A small bar for the density of a room, in the colour of its band. The figure beside it says the same. */
export function LoadBar({ density_MJ_m2 }: { readonly density_MJ_m2: number | null }) {
  const density = density_MJ_m2 ?? 0;
  const share = Math.min(1, density / FULL_MJ_M2);
  return (
    <svg className="load-bar" viewBox="0 0 100 6" preserveAspectRatio="none" aria-hidden="true">
      <rect
        width={100}
        height={6}
        fill="var(--page)"
        stroke="var(--rule)"
        strokeWidth={1}
        vectorEffect="non-scaling-stroke"
      />
      <rect width={share * 100} height={6} fill={`var(--load-${String(loadBand(density))})`} />
      {density > 0 && (
        <line
          x1={share * 100}
          x2={share * 100}
          y1={0}
          y2={6}
          stroke="var(--ink)"
          strokeWidth={1}
          vectorEffect="non-scaling-stroke"
        />
      )}
    </svg>
  );
}
