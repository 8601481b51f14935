import { AppError } from '#contracts/errors.ts';
import type { GithubOutcome } from '#contracts/github-outcomes.ts';
import { Person } from '#server/entities/index.ts';
import type { Caller, Em, Joining } from '#server/http/context.ts';
import { insertPerson, refuse } from './accounts.service.ts';
import { handleFrom, handleProblem } from './handles.ts';

/** What GitHub says of the person it sends back. */
export interface GithubProfile {
  readonly githubId: string;
  readonly login: string;
  readonly name: string;
  /** The one they use there, if GitHub has confirmed it. */
  readonly email: string | null;
}

/** Who came back from GitHub: somebody of ours, somebody on the way to becoming one, or why neither. */
export type Arrival = { readonly person: Person } | { readonly joining: Joining } | { readonly outcome: GithubOutcome };

/** A GitHub account signs in whoever joined it, and nobody else: an equal address is no proof. */
export async function arriveFromGithub(em: Em, { githubId, login, name, email }: GithubProfile): Promise<Arrival> {
  const person = await em.findOne(Person, { githubId });
  if (person) return { person };
  if (email === null) return { outcome: 'no-address' };
  if (await em.count(Person, { email })) return { outcome: 'address-taken' };
  return { joining: { githubId, email, name, handle: handleFrom(login) } };
}

/** Joins a GitHub account to the account somebody is signed in to. */
export async function joinGithub(em: Em, caller: Caller, { githubId }: GithubProfile): Promise<GithubOutcome> {
  if (caller.suspended) return 'suspended';
  return em.transactional(async (inner) => {
    const holder = await inner.findOne(Person, { githubId });
    if (holder) return holder.id === caller.id ? 'joined' : 'someone-else';
    const person = await inner.findOneOrFail(Person, { id: caller.id });
    if (person.githubId != null) return 'another-joined';
    person.githubId = githubId;
    return 'joined';
  });
}

/** Finishes what `arriveFromGithub` began, with the handle and name the person chose. */
export async function openGithubAccount(em: Em, joining: Joining | null, { handle, name }: { handle: string; name: string }, now: Date): Promise<Person> {
  if (!joining) throw new AppError('bad-input', 'This sign-up was begun too long ago. Start again with GitHub.');
  refuse({ handle: await handleProblem(em, handle) });
  if (await em.count(Person, { $or: [{ email: joining.email }, { githubId: joining.githubId }] })) {
    throw new AppError('already-taken', 'There is an account with the address GitHub gives for you. Sign in first, then join GitHub in settings.');
  }
  return insertPerson(em, { handle, name, email: joining.email, githubId: joining.githubId, emailConfirmedAt: now });
}

export async function partGithubFrom(em: Em, caller: Caller): Promise<void> {
  await em.transactional(async (inner) => {
    const person = await inner.findOneOrFail(Person, { id: caller.id });
    if (person.passwordHash == null) throw new AppError('in-use', 'Set a password first. Without one and without GitHub you could not sign in again.');
    person.githubId = null;
  });
}
