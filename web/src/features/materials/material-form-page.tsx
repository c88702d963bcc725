import type { ReactNode } from 'react';
import { Button } from '../../components/button.tsx';
import { ErrorSummary } from '../../components/error-summary.tsx';
import { Page } from '../../components/page.tsx';
import { Part } from '../../components/part.tsx';
import type { TrailStep } from '../../components/trail.tsx';
import { CurveReader } from './curve/curve-reader.tsx';
import { EvidenceField } from './evidence-field.tsx';
import { MaterialSections } from './form/material-sections.tsx';
import type { MaterialForm } from './form/use-material-form.ts';
import { sectionsOf } from './form/ways/sections-of.ts';
import { OutcomePanel } from './outcome-panel.tsx';

interface MaterialFormPageProps {
  readonly title: string;
  readonly lead: ReactNode;
  readonly trail: readonly TrailStep[];
  readonly material: MaterialForm;
  /** What happens next, under the button. */
  readonly next: string;
  readonly verb: string;
}

/** The form at the left, what it comes to at the right. */
export function MaterialFormPage({ title, lead, trail, material, next, verb }: MaterialFormPageProps) {
  const { form, way } = material;
  const sections = sectionsOf(way);
  return (
    <Page
      title={title}
      lead={lead}
      trail={trail}
      right={
        // Stays in sight beside a long form.
        <div className="wide:sticky wide:top-4 wide:max-h-[calc(100dvh-2rem)] wide:overflow-y-auto">
          <OutcomePanel material={material} />
        </div>
      }
    >
      <form noValidate onSubmit={form.onSubmit} className="grid grid-cols-[minmax(0,1fr)] gap-6">
        <ErrorSummary {...form.summary} />
        <MaterialSections material={material} sections={sections.slice(0, -1)} />
        <Part title="A measured curve">
          <CurveReader material={material} />
        </Part>
        <MaterialSections material={material} sections={sections.slice(-1)} />
        <Part title="Evidence">
          <EvidenceField material={material} />
        </Part>
        <div className="grid justify-items-start gap-2">
          <Button type="submit" look="primary" busy={form.busy}>
            {verb}
          </Button>
          <p className="max-w-[60ch] text-small text-soft">{next}</p>
        </div>
      </form>
    </Page>
  );
}
