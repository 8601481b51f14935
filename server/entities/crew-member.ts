import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Build } from './build.ts';
import { Person } from './person.ts';

/** Somebody invited to work on one build. The owner has no row here. */
export const CrewMember = defineEntity({
  name: 'CrewMember',
  tableName: 'crew_member',
  uniques: [{ properties: ['build', 'person'] }],
  properties: {
    id: p.integer().primary(),
    build: () => p.manyToOne(Build).deleteRule('cascade'),
    person: () => p.manyToOne(Person).deleteRule('cascade').index(),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type CrewMember = InferEntity<typeof CrewMember>;
