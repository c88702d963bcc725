import type { MethodSource } from './working.ts';

/** EN 1991-1-2 in its first edition. What was not read again for this book is marked as taken from memory. */
export function en1991(locator: string, fromMemory = true): MethodSource {
  return {
    title: 'EN 1991-1-2 Eurocode 1: Actions on structures exposed to fire',
    edition: '2002',
    locator,
    ...(fromMemory ? { fromMemory } : {}),
  };
}

/** The fire document of the Spanish building code, Annex B, which prints many of the same relations. */
export function dbSi(locator: string): MethodSource {
  return { title: 'CTE DB-SI, Spanish building code, fire, Annex B', edition: 'consolidated March 2025', locator };
}

export function italianDecree(locator: string): MethodSource {
  return { title: 'DM 9 March 2007, Italian decree on fire resistance', edition: '2007', locator };
}

export function jcss(locator: string): MethodSource {
  return { title: 'JCSS Probabilistic Model Code, part 2.20 Fire', locator };
}

export function gum(locator: string): MethodSource {
  return { title: 'JCGM 100 Guide to the expression of uncertainty in measurement', edition: '2008', locator };
}

/** A value or relation taken from memory of a paper or handbook. */
export function recalled(title: string, locator: string, edition?: string): MethodSource {
  return { title, locator, fromMemory: true, ...(edition === undefined ? {} : { edition }) };
}

/** A definition, an identity or plain arithmetic. */
export function definition(locator: string): MethodSource {
  return { title: 'Definition', locator };
}
