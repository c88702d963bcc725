import type { InputFault } from '../fault.ts';

const LONE_SURROGATE = /\p{Surrogate}/u;
const DEPTH = 24;

const unstorable = (text: string): boolean => text.includes('\0') || LONE_SURROGATE.test(text);

/**
 * Text that no database and no file could give back: NUL and halves of surrogate pairs, in values and in names; also
 * names that would reach into an object's prototype, and nesting nobody writes.
 */
export function textFaults(value: unknown, pointer = '', depth = 0): InputFault[] {
  const fault = (code: string, message: string): InputFault[] => [{ pointer, code, message }];
  if (typeof value === 'string') {
    return unstorable(value)
      ? fault('TEXT_UNREADABLE', 'This text holds characters that cannot be stored; type it again.')
      : [];
  }
  if (typeof value !== 'object' || value === null) return [];
  if (depth >= DEPTH) return fault('TOO_DEEP', 'This is nested deeper than anything that is known here.');
  return Object.entries(value).flatMap(([key, item]) => {
    if (key === '__proto__' || unstorable(key))
      return fault('UNKNOWN_FIELD', 'A field here has a name that cannot be used.');
    return textFaults(item, `${pointer}/${key}`, depth + 1);
  });
}
