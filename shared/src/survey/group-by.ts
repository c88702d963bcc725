/** Groups the rows of a document's map by a field, once per map: maps never change, so the answer is kept with them. */
export function groupBy<R>(
  keyOf: (row: R) => string,
): (rows: ReadonlyMap<string, R>) => ReadonlyMap<string, readonly R[]> {
  const known = new WeakMap<ReadonlyMap<string, R>, ReadonlyMap<string, readonly R[]>>();
  return (rows) => {
    const found = known.get(rows);
    if (found !== undefined) return found;
    const groups = new Map<string, R[]>();
    for (const row of rows.values()) {
      const key = keyOf(row);
      const group = groups.get(key);
      if (group === undefined) groups.set(key, [row]);
      else group.push(row);
    }
    known.set(rows, groups);
    return groups;
  };
}
