/** One or two letters for a person: the first of the first and of the last word of the name. */
export function initials(name: string): string {
  const words = name.trim().split(/\s+/);
  const first = [...(words[0] ?? '')][0] ?? '?';
  const last = words.length > 1 ? ([...(words.at(-1) ?? '')][0] ?? '') : '';
  return (first + last).toLocaleUpperCase();
}
