import type { Role } from '#contracts/words.ts';
import { Person } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';

export interface NewPerson {
  readonly handle: string;
  readonly name: string;
  readonly email: string;
  /** Made by `hashPassword`, outside any transaction: it is slow on purpose. */
  readonly passwordHash?: string | null;
  readonly githubId?: string | null;
  readonly emailConfirmedAt?: Date | null;
  readonly about?: string;
  readonly role?: Role;
}

/** Puts a person into the unit of work; the caller's flush writes them. */
export function createPerson(em: Em, { handle, name, email, passwordHash = null, githubId = null, emailConfirmedAt = null, about = '', role = 'member' }: NewPerson): Person {
  // the ORM brands a column it never serialises; the text is the same
  const person = em.create(Person, { handle, name, email, passwordHash: passwordHash as Person['passwordHash'], githubId, emailConfirmedAt, about, role });
  em.persist(person);
  return person;
}
