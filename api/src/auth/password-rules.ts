import { dictionary } from '@zxcvbn-ts/language-common';
import type { InputFault } from '../fault.ts';

const MIN_CHARACTERS = 15;
/** argon2 would take more, but a body of megabytes must not reach it. */
export const MAX_PASSWORD_BYTES = 256;

/** Only long ones can be chosen at all, but a common one doubled or padded is still common. */
const COMMON: ReadonlySet<string> = new Set(dictionary['passwords-common'].map((word) => word.toLowerCase()));

const letters = (text: string): string => text.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '');

/** Words of at least four letters in a name or an address. */
const words = (text: string): string[] => text.split(/[^\p{L}\p{N}]+/u).filter((word) => word.length >= 4);

/** The common password a text is made of, once or repeated, or padded with digits and signs; null when it is not. */
function commonCore(password: string): string | null {
  const text = password.toLowerCase();
  const bare = text.replace(/^[^\p{L}]+|[^\p{L}]+$/gu, '');
  const squeezed = letters(text);
  for (const candidate of [text, bare, squeezed, bare.replaceAll('0', 'o').replaceAll('@', 'a')]) {
    if (candidate !== '' && COMMON.has(candidate)) return candidate;
  }
  for (const candidate of [squeezed, letters(bare)]) {
    for (let length = 1; length <= candidate.length / 2; length += 1) {
      const part = candidate.slice(0, length);
      if (candidate.length % length === 0 && part.repeat(candidate.length / length) === candidate) return part;
    }
  }
  return null;
}

/**
 * Why a new password will not do; null when it will. Any characters, any mix: only length and being guessable count.
 * @param about words a guesser would try first: the e-mail address, the person's and the organisation's name
 */
export function passwordFault(
  password: string,
  about: { readonly email: string; readonly name: string; readonly organisation: string },
  pointer: string,
): InputFault | null {
  const fault = (code: string, message: string): InputFault => ({ pointer, code, message });
  if (Buffer.byteLength(password) > MAX_PASSWORD_BYTES)
    return fault('PASSWORD_TOO_LONG', `Enter a password of at most ${MAX_PASSWORD_BYTES} bytes.`);
  if ([...password].length < MIN_CHARACTERS)
    return fault(
      'PASSWORD_TOO_SHORT',
      `Enter a password of at least ${MIN_CHARACTERS} characters; a few words will do.`,
    );
  if (commonCore(password) !== null)
    return fault('PASSWORD_COMMON', 'This password is one that many people use; choose one of your own.');
  const own = [...words(about.email), ...words(about.name), ...words(about.organisation), 'embertally'];
  const rest = own.reduce((text, word) => text.replaceAll(letters(word), ''), letters(password));
  if (rest.length < 8)
    return fault(
      'PASSWORD_ABOUT_YOU',
      'This password is mostly your name, your address, your organisation or ours; choose words nobody would guess.',
    );
  return null;
}
