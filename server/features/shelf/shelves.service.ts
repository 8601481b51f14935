import { Shelf, type Build, type Person } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';

/** The shelf of a build. Every build is started with one. */
export function shelfOfBuild(em: Em, build: Pick<Build, 'id'>): Promise<Shelf> {
  return em.findOneOrFail(Shelf, { build: build.id });
}

/** A person's shed in one currency, when there is one. */
export function findShed(em: Em, person: Pick<Person, 'id'>, currency: string): Promise<Shelf | null> {
  return em.findOne(Shelf, { person: person.id, currency });
}

/** A person's shed in one currency, made when it is first needed; the unique index closes the race. */
export async function shedOf(em: Em, person: Person, currency: string): Promise<Shelf> {
  const there = await findShed(em, person, currency);
  if (there) return there;
  const shed = em.create(Shelf, { person, currency });
  await em.persist(shed).flush();
  return shed;
}
