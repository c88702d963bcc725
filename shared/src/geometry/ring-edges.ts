/** The edges of a closed ring, the last corner joined to the first. Works on points and on corner ids alike. */
export function ringEdges<T>(ring: readonly T[]): [T, T][] {
  return ring.map((from, index) => [from, ring[index + 1] ?? (ring[0] as T)]);
}
