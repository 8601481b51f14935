import { dictionary } from '@zxcvbn-ts/language-common';

const siteName = 'tallywright';
const common = new Set(dictionary['passwords-common']);

/** Letters and figures only, so that spaces, case and marks do not make a name a different one. */
function bare(text: string): string {
  return text.toLowerCase().replaceAll(/[^\p{L}\p{N}]/gu, '');
}
const withoutFigures = (text: string) => text.replaceAll(/^\p{N}+|\p{N}+$/gu, '');

export interface PasswordOwner {
  readonly handle: string;
  readonly name: string;
  readonly email: string;
}

/** A common password with figures hung on it, or one short piece over and over, is tried as early as the common ones. */
function asGoodAsCommon(password: string): boolean {
  const core = withoutFigures(password.toLowerCase());
  return common.has(core) || /^(.{1,4})\1+$/s.test(password.toLowerCase());
}

/** What is wrong with a password of the right length and how to mend it; nothing when it will do. */
export function passwordProblem(password: string, { handle, name, email }: PasswordOwner): string | undefined {
  if (common.has(password.toLowerCase()) || asGoodAsCommon(password)) return 'This is on the list of common passwords, which are tried first. Take another.';
  const own = [handle, name, email, email.split('@')[0] ?? '', siteName].map((text) => withoutFigures(bare(text)));
  if (own.includes(withoutFigures(bare(password)))) return 'A password is not your name, your handle, your address or the name of this site. Take another.';
  return undefined;
}
