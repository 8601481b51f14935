import type { Person } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { hashPassword } from './password.ts';
import { createPerson } from './people.ts';

/** Made-up people, one of each kind; `key` is also the first half of their address. */
export const demoPeople = [
  { key: 'restorer', handle: 'marlow', name: 'Marlow Finch', role: 'member', about: 'Small boats and the tools that made them. Shed at the end of the garden, stove lit from October.' },
  { key: 'crew', handle: 'ines', name: 'Ines Tarn', role: 'member', about: 'Holds the dolly, keeps the time, reads the drawing twice.' },
  { key: 'reader', handle: 'harker', name: 'Odd Harker', role: 'member', about: 'Reading up before the first cut.' },
  { key: 'moderator', handle: 'petra', name: 'Petra Lumm', role: 'moderator', about: '' },
  { key: 'administrator', handle: 'sol', name: 'Sol Wray', role: 'administrator', about: '' },
] as const;
export type DemoKey = (typeof demoPeople)[number]['key'];

export function demoAddress(key: DemoKey): string {
  return `${key}@demo.example`;
}

/** Puts the demo people in, all with one password, hashed once. They are written by the caller's flush. */
export async function createDemoPeople(em: Em, password: string, confirmedAt: Date): Promise<Record<DemoKey, Person>> {
  const passwordHash = await hashPassword(password);
  const made = demoPeople.map(({ key, handle, name, role, about }) =>
    [key, createPerson(em, { handle, name, role, about, email: demoAddress(key), passwordHash, emailConfirmedAt: confirmedAt })] as const);
  return Object.fromEntries(made) as Record<DemoKey, Person>;
}
