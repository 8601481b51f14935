import { defineEntity, p, type InferEntity } from '@mikro-orm/core';

/** Work to be done after the request that caused it, written in the same flush as its cause. */
export const Job = defineEntity({
  name: 'Job',
  tableName: 'job',
  indexes: [{ properties: ['doneAt', 'runAt'] }],
  properties: {
    id: p.integer().primary(),
    kind: p.string(),
    payload: p.json<Record<string, unknown>>(),
    runAt: p.datetime().onCreate(() => new Date()),
    attempts: p.integer().default(0),
    /** Set while a runner holds it; an old one is taken over after a crash. */
    claimedAt: p.datetime().nullable(),
    doneAt: p.datetime().nullable(),
    givenUpAt: p.datetime().nullable(),
    failure: p.text().nullable(),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type Job = InferEntity<typeof Job>;
