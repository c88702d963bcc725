import type { Estimate } from '@embertally/shared/methods/estimate';
import { WarningList } from '../../components/working/warning-list.tsx';

/** The notes of several numbers, each said once, right below them. */
export function FigureNotes({ of }: { readonly of: readonly (Estimate | undefined)[] }) {
  const warnings = of.flatMap((estimate) => estimate?.warnings ?? []);
  return warnings.length === 0 ? null : (
    <div className="mt-2 text-soft">
      <WarningList warnings={warnings} />
    </div>
  );
}
