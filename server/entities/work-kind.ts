import { defineEntity, p, type InferEntity } from '@mikro-orm/core';

/** A kind of work that can be counted: steamed rib, panel coated, metre of seam. The list grows as people type. */
export const WorkKind = defineEntity({
  name: 'WorkKind',
  tableName: 'work_kind',
  properties: {
    id: p.integer().primary(),
    /** Lower case, singular: "steamed rib". */
    one: p.string().unique(),
    many: p.string(),
    createdAt: p.datetime().onCreate(() => new Date()),
  },
});
export type WorkKind = InferEntity<typeof WorkKind>;
