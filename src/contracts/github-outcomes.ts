// Light: no imports.

/** How a round trip to GitHub ended, as the page it comes back to says it. */
export const githubOutcomes = {
  joined: { good: true, words: 'GitHub is joined. You can sign in with it from now on.' },
  refused: { good: false, words: 'You turned the sign-in down at GitHub, so nothing was changed.' },
  lost: { good: false, words: 'This sign-in was not begun here, or was begun too long ago. Start again.' },
  failed: { good: false, words: 'GitHub could not be asked. Wait a minute and start again.' },
  'no-address': { good: false, words: 'GitHub has no confirmed e-mail address for you. Confirm one there, or sign up with an address here.' },
  'address-taken': { good: false, words: 'There is an account with the address GitHub gives for you. Sign in first, then join GitHub in settings.' },
  'someone-else': { good: false, words: 'That GitHub account is joined to another account here. Part it there first.' },
  'another-joined': { good: false, words: 'Another GitHub account is joined already. Part that one first.' },
  suspended: { good: false, words: 'This account is suspended: you can read, and take your data away.' },
} as const;
export type GithubOutcome = keyof typeof githubOutcomes;

export function githubOutcomeOf(text: string | null): GithubOutcome | null {
  return text !== null && Object.hasOwn(githubOutcomes, text) ? (text as GithubOutcome) : null;
}
