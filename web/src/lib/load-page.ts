import { PageNotLoadedError } from './page-not-loaded.ts';

/**
 * A lazy route: fetches the script of a page and hands its component to the router. A script that cannot be fetched
 * becomes a `PageNotLoadedError`, which the root error page knows how to recover from.
 */
export function loadPage<M, C extends React.ComponentType>(
  load: () => Promise<M>,
  pick: (module: M) => C,
): () => Promise<{ Component: C }> {
  return async () => {
    try {
      return { Component: pick(await load()) };
    } catch (error) {
      throw new PageNotLoadedError({ cause: error });
    }
  };
}
