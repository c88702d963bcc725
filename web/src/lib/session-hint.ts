const KEY = 'embertally.signed-in';

/**
 * Whether this browser has signed in and not signed out since. Carries no authority: it only spares a question whose
 * answer is known, so that a first visit to sign-in does not begin with a refused request.
 */
export const sessionHint = {
  /** True also where the browser forbids storage: then only the server knows. */
  mayBeSignedIn(): boolean {
    try {
      return window.localStorage.getItem(KEY) !== null;
    } catch {
      return true;
    }
  },
  set(signedIn: boolean): void {
    try {
      if (signedIn) window.localStorage.setItem(KEY, 'yes');
      else window.localStorage.removeItem(KEY);
    } catch {
      // Forbidden storage: the server is asked each time instead.
    }
  },
};
