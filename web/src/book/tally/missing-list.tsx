import type { Missing } from '@embertally/shared/tally/room-tally';
import { missingGroups } from './missing-groups.ts';
import { TallySection } from './tally-section.tsx';

/** What is not computed for this room, why, and so which input would give it. */
export function MissingList({ missing }: { readonly missing: readonly Missing[] }) {
  const groups = missingGroups(missing);
  if (groups.length === 0) return null;
  return (
    <TallySection title="What is not here">
      <dl className="text-small">
        {groups.map((group) => (
          <div key={group.why} className="border-b border-rule py-1.5">
            <dt className="font-bold">{group.why}</dt>
            <dd className="text-soft">{group.names.join(', ')}</dd>
          </div>
        ))}
      </dl>
    </TallySection>
  );
}
