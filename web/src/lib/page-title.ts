import { useEffect } from 'react';

const shown = { title: '', forms: new Set<symbol>() };

function write(): void {
  if (shown.title === '') return;
  document.title = `${shown.forms.size > 0 ? 'Error: ' : ''}${shown.title} – Embertally`;
}

/** Names the screen in the window's title: the page first, then the product. */
export function usePageTitle(title: string): void {
  useEffect(() => {
    shown.title = title;
    write();
  }, [title]);
}

/** While a form on the screen has errors, the title begins with "Error: ", so that a screen reader says so first. */
export function useErrorTitle(hasErrors: boolean): void {
  useEffect(() => {
    if (!hasErrors) return undefined;
    const form = Symbol('form with errors');
    shown.forms.add(form);
    write();
    return () => {
      shown.forms.delete(form);
      write();
    };
  }, [hasErrors]);
}
