/** A room's name as the start of a file's name: letters and digits of any script, joined by hyphens. */
export function fileSlug(name: string): string {
  const slug = name
    .toLocaleLowerCase('en')
    .replaceAll(/[^\p{L}\p{N}]+/gu, '-')
    .replaceAll(/^-+|-+$/g, '')
    .slice(0, 60);
  return slug === '' ? 'room' : slug;
}
