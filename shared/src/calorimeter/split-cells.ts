/** Cells of one line of CSV, trimmed; quotes around a cell are taken off, doubled ones inside stand for one. */
export function splitCells(line: string, delimiter: string): string[] {
  if (!line.includes('"')) return line.split(delimiter).map((cell) => cell.trim());
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (let at = 0; at < line.length; at += 1) {
    const sign = line[at] ?? '';
    if (sign === '"' && quoted && line[at + 1] === '"') {
      cell += '"';
      at += 1;
    } else if (sign === '"') quoted = !quoted;
    else if (sign === delimiter && !quoted) {
      cells.push(cell.trim());
      cell = '';
    } else cell += sign;
  }
  return [...cells, cell.trim()];
}
