import { z } from 'zod/mini';
import { Fault } from '../fault.ts';

const place = z.tuple([z.string(), z.uuid()]);

/** A place in a list sorted by name and id, as text the client hands back unread. */
export function writeCursor(after: readonly [name: string, id: string]): string {
  return Buffer.from(JSON.stringify(after)).toString('base64url');
}

/** @throws Fault 422 when the text is none that was handed out */
export function readCursor(text: string | undefined): readonly [string, string] | null {
  if (text === undefined) return null;
  const refused = Fault.invalid([
    {
      pointer: '/query/cursor',
      code: 'CURSOR_UNKNOWN',
      message: 'This place in the list is not known; start from the first page.',
    },
  ]);
  let raw: unknown;
  try {
    raw = JSON.parse(Buffer.from(text, 'base64url').toString('utf8'));
  } catch (error) {
    if (error instanceof SyntaxError) throw refused;
    throw error;
  }
  const parsed = place.safeParse(raw);
  if (!parsed.success || parsed.data[0].includes('\0')) throw refused;
  return parsed.data;
}
