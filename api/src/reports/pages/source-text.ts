import type { MethodSource } from '@embertally/shared/methods/estimate';

/** A source in one line: title, edition, clause or page; says when it was quoted from memory. */
export function sourceText({ title, edition, locator, fromMemory }: MethodSource): string {
  const named = edition === undefined ? title : `${title}, ${edition}`;
  return `${named}, ${locator}${fromMemory === true ? ' (from memory of it)' : ''}`;
}
