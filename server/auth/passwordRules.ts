import { commonPasswords } from './commonPasswords.ts';

const minCharacters = 12;
/** bcrypt ignores what lies beyond. */
export const maxPasswordBytes = 72;

/**
 * Why a password cannot be chosen; null when it can.
 *
 * @param about - the person's name and e-mail, which a password must not be built from
 */
export function passwordProblem(
  password: string,
  about: { name: string; email: string },
): string | null {
  if ([...password].length < minCharacters) return `must have ${minCharacters} characters or more`;
  if (isTooLong(password)) return `must have at most ${maxPasswordBytes} bytes`;
  const folded = password.toLowerCase().replace(/\s+/g, ' ').trim();
  if (commonPasswords().has(folded)) return 'is one of the passwords that everybody tries first';
  const words = [...about.name.split(/\s+/), ...about.email.split(/[@.]/), 'tautline']
    .map((word) => word.toLowerCase())
    .filter((word) => word.length >= 4);
  if (words.some((word) => isMostly(folded, word))) {
    return 'must not be built from your name, your address or the name of this product';
  }
  return null;
}

export function isTooLong(password: string): boolean {
  return Buffer.byteLength(password, 'utf8') > maxPasswordBytes;
}

/** Whether little but the word is left: digits and signs around a name add nothing. */
function isMostly(password: string, word: string): boolean {
  if (!password.includes(word)) return false;
  return password.replaceAll(word, '').replace(/[^\p{L}]/gu, '').length < 6;
}
