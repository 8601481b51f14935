import { UniqueConstraintViolationException } from '@mikro-orm/core';
import type { z } from 'zod';
import { AppError } from '#contracts/errors.ts';
import type { AccountView, changeAccount, changePassword, signIn, signUp } from '#contracts/session.ts';
import { HttpSession, Person } from '#server/entities/index.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { handleProblem } from './handles.ts';
import { passwordProblem } from './password-rules.ts';
import { hashPassword, isPassword } from './password.ts';
import { createPerson, type NewPerson } from './people.ts';

type SignIn = z.output<typeof signIn.body>;
type SignUp = z.output<typeof signUp.body>;
type AccountChange = z.output<typeof changeAccount.body>;
type PasswordChange = z.output<typeof changePassword.body>;

/** The person these belong to. An address nobody has gets the same words after the same work. */
export async function checkSignIn(em: Em, { email, password }: SignIn): Promise<Person> {
  const person = await em.findOne(Person, { email });
  const right = await isPassword(person?.passwordHash, password);
  if (!person || !right) throw new AppError('wrong-sign-in', 'This address and this password do not go together. Check both and try again.');
  return person;
}

/** The words for an address that somebody has: they do not say whether that is so. */
const unusable = { email: 'That cannot be used to sign up. If the address is yours, sign in instead.' };

export async function openAccount(em: Em, input: SignUp): Promise<Person> {
  const { handle, name, email, password } = input;
  const problems = { handle: await handleProblem(em, handle), password: passwordProblem(password, input) };
  refuse(problems);
  // before the address is looked at, so that one in use costs the same
  const passwordHash = await hashPassword(password);
  if (await em.count(Person, { email })) throw new AppError('bad-input', unusable.email, unusable);
  return insertPerson(em, { handle, name, email, passwordHash });
}

/** Throws what is wrong beside its fields, where anything is. */
export function refuse(problems: Readonly<Record<string, string | undefined>>): void {
  const fields = Object.fromEntries(Object.entries(problems).filter((entry): entry is [string, string] => entry[1] !== undefined));
  if (Object.keys(fields).length > 0) throw new AppError('bad-input', 'Some of this needs mending.', fields);
}

/** Writes a person down; of two who ask for one handle or address at once, one is told. */
export async function insertPerson(em: Em, person: NewPerson): Promise<Person> {
  try {
    return await em.transactional(async (inner) => createPerson(inner, person));
  } catch (error) {
    if (!(error instanceof UniqueConstraintViolationException)) throw error;
    const fields = error.message.includes('person.handle') ? { handle: 'This handle is taken. Try another.' } : unusable;
    throw new AppError('bad-input', 'Some of this needs mending.', fields);
  }
}

export async function accountOf(em: Em, caller: Caller, storedSession: string | null, now: Date): Promise<AccountView> {
  const person = await em.findOneOrFail(Person, { id: caller.id });
  const sessions = await em.find(HttpSession, { person: caller.id, expiresAt: { $gt: now } }, { orderBy: { createdAt: 'desc' } });
  return {
    handle: person.handle, name: person.name, about: person.about, email: person.email,
    github: person.githubId != null, password: person.passwordHash != null,
    sessions: sessions.map(({ sid, createdAt }) => ({ current: sid === storedSession, since: createdAt.toISOString() })),
  };
}

export async function changeProfile(em: Em, caller: Caller, { name, about }: AccountChange): Promise<void> {
  await em.transactional(async (inner) => {
    const person = await inner.findOneOrFail(Person, { id: caller.id });
    if (name !== undefined) person.name = name;
    if (about !== undefined) person.about = about;
  });
}

/** Sets a new password and ends every session of the person but this one. */
export async function replacePassword(em: Em, caller: Caller, storedSession: string | null, { current, password }: PasswordChange): Promise<void> {
  const person = await em.findOneOrFail(Person, { id: caller.id });
  const known = person.passwordHash == null || (await isPassword(person.passwordHash, current));
  if (!known) throw new AppError('wrong-sign-in', 'This is not your current password.', { current: 'This is not your current password.' });
  refuse({ password: passwordProblem(password, person) });
  const passwordHash = await hashPassword(password);
  await em.transactional(async (inner) => {
    await inner.nativeUpdate(Person, { id: caller.id }, { passwordHash });
    await endSessions(inner, caller, storedSession);
  });
}

/** Signs the person out everywhere but here; gives back in how many places that was. */
export async function endOthers(em: Em, caller: Caller, storedSession: string | null): Promise<number> {
  return em.transactional((inner) => endSessions(inner, caller, storedSession));
}

function endSessions(em: Em, caller: Caller, but: string | null): Promise<number> {
  return em.nativeDelete(HttpSession, { person: caller.id, ...(but === null ? {} : { sid: { $ne: but } }) });
}
