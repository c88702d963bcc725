/** The script of a screen could not be fetched: a new version was put in place, or the network is away. */
export class PageNotLoadedError extends Error {
  override readonly name = 'PageNotLoadedError';
  constructor(options?: ErrorOptions) {
    super('This page could not be loaded.', options);
  }
}
