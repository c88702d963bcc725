import { HISTORY_ACTIONS, TOOL_ACTIONS } from '@embertally/web/src/book/actions/plan-actions.ts';
import { PlanHost } from '@embertally/web/src/book/interaction/plan-host.ts';
import { PlanVerbs } from '@embertally/web/src/book/plan/plan-verbs.tsx';
import { useBookSession } from '@embertally/web/src/book/session/use-book-session.ts';
import { screen } from '@testing-library/react';
import { useState } from 'react';
import { expect, test } from 'vitest';
import { dock, renderBookPart } from '../../tally/render-book-part.tsx';

function Verbs() {
  const session = useBookSession();
  const [host] = useState(() => new PlanHost(session));
  return <PlanVerbs actions={[...TOOL_ACTIONS, ...HISTORY_ACTIONS]} world={{ session, host }} keysShown={false} />;
}

const verbs = () => screen.getAllByRole('button').map((button) => button.textContent);

test('a person who may only read is offered nothing that would be refused', () => {
  renderBookPart(<Verbs />, dock(), { canEdit: false });
  expect(verbs()).toEqual(['Measure']);
});

test('an inspector is offered every verb', () => {
  renderBookPart(<Verbs />, dock());
  expect(verbs()).toEqual(['Draw room', 'Opening', 'Place contents', 'Measure', 'Undo', 'Redo']);
});
