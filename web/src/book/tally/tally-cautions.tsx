import { CAUTIONS } from '@embertally/shared/cautions/cautions';
import { TallySection } from './tally-section.tsx';

/** The cautions that stand with what is shown above them, in full. */
export function TallyCautions({ ids }: { readonly ids: readonly string[] }) {
  return (
    <TallySection title="Cautions">
      <dl className="grid max-w-[72ch] gap-2 text-small">
        {CAUTIONS.filter((caution) => ids.includes(caution.id)).map((caution) => (
          <div key={caution.id}>
            <dt className="font-bold">{caution.title}</dt>
            <dd className="text-soft">{caution.text}</dd>
          </div>
        ))}
      </dl>
    </TallySection>
  );
}
