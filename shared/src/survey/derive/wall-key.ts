/** One name for the wall between two corners, whichever is named first. */
export function wallKey(a: string, b: string): string {
  return a < b ? `${a}|${b}` : `${b}|${a}`;
}
