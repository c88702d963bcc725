import type { Refusal } from './command.ts';

/** A command's "no": a code, one sentence, and what it is about. */
export function refuse(
  code: string,
  message: string,
  about: { field?: string; ids?: readonly string[] } = {},
): Refusal {
  return { refused: true, code, message, ...about };
}
