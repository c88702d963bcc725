import { methodSummaries } from '../features/methods/method-summaries.ts';
import { MethodsTable } from '../features/methods/methods-table.tsx';
import { useState } from 'react';
import { EmptyState } from '../components/empty-state.tsx';
import { Button } from '../components/button.tsx';
import { Page } from '../components/page.tsx';
import { Part } from '../components/part.tsx';
import { TextField } from '../components/text-field.tsx';

const ALL = methodSummaries();

/** Every method of the book with its relation, range and source. */
export function MethodsPage() {
  const [typed, setTyped] = useState('');
  const wanted = typed.trim().toLowerCase().split(/\s+/).filter(Boolean);
  const topics = ALL.map(({ title, methods }) => ({
    title,
    methods: methods.filter(({ words }) => wanted.every((word) => words.includes(word))),
  })).filter(({ methods }) => methods.length > 0);
  const total = ALL.reduce((sum, { methods }) => sum + methods.length, 0);
  const found = topics.reduce((sum, { methods }) => sum + methods.length, 0);
  return (
    <Page
      title="Methods"
      lead="Every relation the results are made with, and those that stand beside them. A result outside a method’s range says so next to the number, or is not given."
    >
      <div className="mb-4 max-w-96 print:hidden">
        <TextField label="Find a method" value={typed} onChange={setTyped} />
      </div>
      <p role="status" className="mb-4 text-small text-soft">
        {found === total ? `${total} methods` : `${found} of ${total} methods`}
      </p>
      {topics.length === 0 ? (
        <EmptyState
          title={`No method fits “${typed}”`}
          action={
            <Button
              onClick={() => {
                setTyped('');
              }}
            >
              Show all methods
            </Button>
          }
        >
          Try a word of its title, its source or its name: flashover, EN 1991, smoke.
        </EmptyState>
      ) : (
        topics.map(({ title, methods }) => (
          <Part key={title} title={title}>
            <MethodsTable caption={title} methods={methods} />
          </Part>
        ))
      )}
    </Page>
  );
}
