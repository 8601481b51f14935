import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { TimeKind } from '#contracts/words.ts';
import { Build } from './build.ts';
import { Entry } from './entry.ts';
import { Person } from './person.ts';
import { Stage } from './stage.ts';

/** Minutes written up in an entry; waiting (curing) is kept apart from hands-on by its kind. */
export const TimeLine = defineEntity({
  name: 'TimeLine',
  tableName: 'time_line',
  properties: {
    id: p.integer().primary(),
    build: () => p.manyToOne(Build).deleteRule('cascade').index(),
    entry: () => p.manyToOne(Entry).deleteRule('cascade').index(),
    block: p.string(),
    line: p.string(),
    day: p.string(),
    stage: () => p.manyToOne(Stage).nullable().deleteRule('set null').index(),
    person: () => p.manyToOne(Person).nullable().deleteRule('set null'),
    name: p.string(),
    minutes: p.integer(),
    what: p.string(),
    kind: p.string().$type<TimeKind>(),
  },
});
export type TimeLine = InferEntity<typeof TimeLine>;
