import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Person } from './person.ts';

/** A signed-in browser. The id is stored hashed, so that a copy of the database opens no session. */
export const HttpSession = defineEntity({
  name: 'HttpSession',
  tableName: 'http_session',
  properties: {
    sid: p.string().primary(),
    data: p.text(),
    person: () => p.manyToOne(Person).nullable().deleteRule('cascade'),
    expiresAt: p.datetime().index(),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type HttpSession = InferEntity<typeof HttpSession>;
