import type { Estimate } from '@embertally/shared/methods/estimate';
import { Disclosure } from '../../components/disclosure.tsx';
import { WorkingView } from '../../components/working/working-view.tsx';

/** Every method that led to the heat, in order, each opened on its own; the last gives the net heat. */
export function WorkingList({ workings }: { readonly workings: readonly Estimate[] }) {
  return (
    <div className="divide-y divide-rule">
      {workings.map((working, index) => {
        const title = working.title ?? working.method;
        return (
          <Disclosure key={`${String(index)} ${working.method}`} title={`${index + 1}. ${title}`}>
            <WorkingView estimate={working} name={`${index + 1}. ${title}`} level={4} />
          </Disclosure>
        );
      })}
    </div>
  );
}
