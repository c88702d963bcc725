interface Named {
  readonly label: string;
  readonly synonyms: readonly string[];
  readonly group: string;
  readonly hazards: readonly string[];
}

function fold(text: string): string {
  return text
    .normalize('NFD')
    .replaceAll(/\p{Diacritic}/gu, '')
    .toLowerCase();
}

/** The rows in which every typed word begins a word of the name, a synonym, the group or a hazard. Order is kept. */
export function matches<Row extends Named>(rows: readonly Row[], typed: string): readonly Row[] {
  const wanted = fold(typed)
    .split(/\s+/)
    .filter((word) => word !== '');
  if (wanted.length === 0) return rows;
  return rows.filter((row) => {
    const words = fold([row.label, ...row.synonyms, row.group, ...row.hazards].join(' ')).split(/[^\p{L}\p{N}]+/u);
    return wanted.every((part) => words.some((word) => word.startsWith(part)));
  });
}
