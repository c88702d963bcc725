import { lazy, Suspense, useState, type ComponentType } from 'react';
import { Disclosure } from '../../../components/disclosure.tsx';
import { Skeleton } from '../../../components/skeleton.tsx';
import { useRoomInput } from '../../session/use-room-input.ts';
import { TallySection } from '../tally-section.tsx';
import type { QuestionFormProps } from './question-form-props.ts';

const HowManyForm = lazy(() => import('./how-many-form.tsx').then((module) => ({ default: module.HowManyForm })));
const GapForm = lazy(() => import('./gap-form.tsx').then((module) => ({ default: module.GapForm })));
const ChangeForm = lazy(() => import('./change-form.tsx').then((module) => ({ default: module.ChangeForm })));

/** Questions that run the tally backwards: what fits, what gap does, what would change a reading. */
export function AskSection({ roomId }: { readonly roomId: string }) {
  const input = useRoomInput(roomId);
  if (input === null) return null;
  return (
    <div className="print:hidden">
      <TallySection title="Ask">
        <Question title="How many more fit?" form={HowManyForm} input={input} />
        <Question title="What gap is enough?" form={GapForm} input={input} />
        <Question title="What would change it?" form={ChangeForm} input={input} />
      </TallySection>
    </div>
  );
}

interface QuestionProps extends QuestionFormProps {
  readonly title: string;
  readonly form: ComponentType<QuestionFormProps>;
}

/** A question is fetched when it is first unfolded, and keeps what was asked when it is folded again. */
function Question({ title, form: Form, input }: QuestionProps) {
  const [opened, setOpened] = useState(false);
  return (
    <Disclosure
      title={title}
      onOpen={() => {
        setOpened(true);
      }}
    >
      {opened && (
        <Suspense fallback={<Skeleton label={title} lines={3} />}>
          <Form input={input} />
        </Suspense>
      )}
    </Disclosure>
  );
}
