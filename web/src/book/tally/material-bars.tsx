import type { MaterialShare } from '@embertally/shared/tally/room-tally';
import { Figure } from './figure.tsx';
import { useQuantity } from '../../lib/use-quantity.ts';

const LISTED = 6;

interface MaterialBarsProps {
  readonly shares: readonly MaterialShare[];
}

/** Heat by material, the most first, a bar from zero for each; what is beyond the first six is one row. */
export function MaterialBars({ shares }: MaterialBarsProps) {
  const show = useQuantity();
  const rows = shares
    .map((share, index) => ({ ...share, index }))
    .filter((share) => (share.heat.value ?? 0) > 0)
    .sort((a, b) => (b.heat.value ?? 0) - (a.heat.value ?? 0));
  if (rows.length === 0) return null;
  const listed = rows.length > LISTED + 1 ? rows.slice(0, LISTED) : rows;
  const others = rows.slice(listed.length);
  const rest = others.reduce((sum, share) => sum + (share.heat.value ?? 0), 0);
  const most = Math.max(rows[0]?.heat.value ?? 0, rest);
  const other = show(rest, 'MJ');
  return (
    <ul className="text-small" aria-label="Heat by material">
      {listed.map((share) => (
        <Bar key={share.material} label={share.label} share={(share.heat.value ?? 0) / most}>
          <Figure path={`load.byMaterial.${share.index}.heat`} estimate={share.heat} row={share.label} />
        </Bar>
      ))}
      {others.length > 0 && (
        <Bar label={`${others.length} others`} share={rest / most}>
          <span className="figure">{other.text}</span> <span className="text-soft">{other.unit}</span>
        </Bar>
      )}
    </ul>
  );
}

function Bar({ label, share, children }: { label: string; share: number; children: React.ReactNode }) {
  return (
    <li className="grid grid-cols-[minmax(0,9.5rem)_minmax(3rem,1fr)_auto] items-center gap-x-3 py-px">
      <span className="truncate" title={label}>
        {label}
      </span>
      <svg className="block h-2.5 w-full" preserveAspectRatio="none" viewBox="0 0 1000 10" aria-hidden="true">
        <rect width={Math.max(3, share * 1000)} height={10} fill="var(--load-3)" />
      </svg>
      <span className="min-w-[5.5rem] text-right">{children}</span>
    </li>
  );
}
