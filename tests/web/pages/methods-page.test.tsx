import { METHODS, MODELS } from '@embertally/shared/methods/registry';
import { MethodsPage } from '@embertally/web/src/pages/methods-page.tsx';
import { fireEvent, render, screen } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { describe, expect, it } from 'vitest';

function show(): void {
  render(
    <MemoryRouter>
      <MethodsPage />
    </MemoryRouter>,
  );
}
const find = (text: string) => {
  fireEvent.change(screen.getByLabelText('Find a method'), { target: { value: text } });
};
const count = () => screen.getByRole('status').textContent;

describe('all methods', () => {
  it('are each there once with relation, range and source', () => {
    show();
    const total = METHODS.length + MODELS.length;
    expect(count()).toBe(`${total} methods`);
    const refs = [...METHODS, ...MODELS].map(({ ref }) => ref);
    const page = document.body.textContent;
    expect(refs.filter((ref) => !page.includes(ref))).toEqual([]);
    expect(page).not.toMatch(/Infinity|undefined|NaN/);
  });

  it('are found by title, source and name', () => {
    show();
    find('flashover thomas');
    expect(count()).toMatch(/^1 of /);
    expect(screen.getByText('Flashover after Thomas')).toBeTruthy();
    find('heskestad');
    expect(Number(count()?.split(' ')[0])).toBeGreaterThan(3);
  });

  it('say when none fits and come back', () => {
    show();
    find('zzz');
    expect(screen.getByText('No method fits “zzz”')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Show all methods' }));
    expect(count()).not.toMatch(/ of /);
  });
});
