/**
 * Visits every line of a text once, without splitting it into a list: a million lines cost no more memory than one. A line
 * break inside quotes belongs to its cell. Numbers count from 1, as editors show them.
 *
 * @param visit returns false to stop early
 */
export function eachLine(text: string, visit: (line: string, number: number) => boolean): void {
  const quotes = text.includes('"');
  let start = text.startsWith('\uFEFF') ? 1 : 0;
  let number = 1;
  while (start < text.length) {
    let end = lineEnd(text, start);
    let line = text.slice(start, end);
    let lines = 1;
    while (quotes && end < text.length && oddQuotes(line)) {
      end = lineEnd(text, end + 1);
      line = text.slice(start, end);
      lines += 1;
    }
    if (!visit(line.endsWith('\r') ? line.slice(0, -1) : line, number)) return;
    number += lines;
    start = end + 1;
  }
}

function lineEnd(text: string, from: number): number {
  const end = text.indexOf('\n', from);
  return end === -1 ? text.length : end;
}

function oddQuotes(line: string): boolean {
  let odd = false;
  for (let at = line.indexOf('"'); at !== -1; at = line.indexOf('"', at + 1)) odd = !odd;
  return odd;
}
