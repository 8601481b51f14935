import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { Role } from '#contracts/words.ts';

export const Person = defineEntity({
  name: 'Person',
  tableName: 'person',
  properties: {
    id: p.integer().primary(),
    handle: p.string().unique(),
    name: p.string(),
    about: p.text().default(''),
    /** Lower case; compared as stored. */
    email: p.string().unique(),
    emailConfirmedAt: p.datetime().nullable(),
    /** argon2id, PHC string; absent for people who only sign in with a provider. */
    passwordHash: p.string().nullable().hidden(),
    githubId: p.string().nullable().unique(),
    role: p.string().$type<Role>().default('member'),
    suspendedUntil: p.datetime().nullable(),
    suspendedReason: p.text().nullable(),
    /** Last number given out to an entry, receipt or shelf act of their builds and shed: one sequence for all, since builds share the shed. */
    sequence: p.integer().default(0),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type Person = InferEntity<typeof Person>;
