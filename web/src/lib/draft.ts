/** What was typed into a form that was not sent, kept for this window until it is: a reload or the way back lose nothing. */
export interface Draft<V> {
  readonly read: () => Partial<V>;
  readonly keep: (values: Partial<V>) => void;
  readonly forget: () => void;
}

/** A draft kept under a name. Where the browser forbids storage it keeps nothing and says nothing: typing goes on. */
export function draftOf<V extends { readonly [K in keyof V]: string }>(name: string): Draft<V> {
  const key = `embertally.draft.${name}`;
  return {
    read() {
      try {
        const stored: unknown = JSON.parse(window.sessionStorage.getItem(key) ?? '{}');
        if (typeof stored !== 'object' || stored === null) return {};
        return Object.fromEntries(
          Object.entries(stored).filter(([, value]) => typeof value === 'string'),
        ) as Partial<V>;
      } catch {
        // Forbidden storage or a damaged draft: an empty form is the honest answer.
        return {};
      }
    },
    keep(values) {
      try {
        window.sessionStorage.setItem(key, JSON.stringify(values));
      } catch {
        // Forbidden or full: the form itself still holds what was typed.
      }
    },
    forget() {
      try {
        window.sessionStorage.removeItem(key);
      } catch {
        // Forbidden storage never held it.
      }
    },
  };
}
