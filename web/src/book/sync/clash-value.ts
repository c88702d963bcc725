/** A stored value in words short enough for a table cell. */
export function clashValue(value: unknown): string {
  if (value === null || value === undefined || value === '') return '–';
  if (typeof value === 'string') return value;
  if (typeof value === 'number') return String(value);
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (Array.isArray(value)) return value.map(clashPart).join(', ');
  return clashPart(value);
}

function clashPart(value: unknown): string {
  if (typeof value !== 'object' || value === null) return clashValue(value);
  const row = value as Readonly<Record<string, unknown>>;
  if (typeof row['label'] === 'string' && typeof row['mass_kg'] === 'number')
    return `${row['label']} ${row['mass_kg']} kg`;
  return Object.entries(row)
    .map(([name, inner]) => `${name.replaceAll('_', ' ')} ${clashValue(inner)}`)
    .join('; ');
}
