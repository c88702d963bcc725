/** A failure whose message is already written for the person: what happened, what is kept, what to do. */
export class ToldError extends Error {
  override readonly name = 'ToldError';
}
