/**
 * Visits every line of a text. A line break inside quotes belongs to its cell. Numbers count from 1, as editors show them.
 *
 * @param visit returns false to stop early
 */
export function eachLine(text: string, visit: (line: string, number: number) => boolean): void {
  // Cut at once: looking for the next break from where the last one was takes a time that grows with the square of the
  // file in some engines.
  const lines = (text.startsWith('\uFEFF') ? text.slice(1) : text).split('\n');
  if (lines.at(-1) === '') lines.pop();
  for (let at = 0; at < lines.length;) {
    const number = at + 1;
    let line = lines[at]!;
    at += 1;
    for (let open = oddQuotes(line); open && at < lines.length; at += 1) {
      const more = lines[at]!;
      line += `\n${more}`;
      if (oddQuotes(more)) open = false;
    }
    if (!visit(line.endsWith('\r') ? line.slice(0, -1) : line, number)) return;
  }
}

function oddQuotes(line: string): boolean {
  let odd = false;
  for (let at = line.indexOf('"'); at !== -1; at = line.indexOf('"', at + 1)) odd = !odd;
  return odd;
}
