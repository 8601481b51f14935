import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { CostCategory } from '#contracts/words.ts';
import { Build } from './build.ts';
import { Entry } from './entry.ts';
import { ReceiptLine } from './receipt-line.ts';
import { Stage } from './stage.ts';

/** Money that never goes on a shelf: hire, carriage, a service, a tool, or a receipt line put straight into use. Spent and used on its day. */
export const Cost = defineEntity({
  name: 'Cost',
  tableName: 'cost',
  properties: {
    id: p.integer().primary(),
    build: () => p.manyToOne(Build).deleteRule('cascade').index(),
    entry: () => p.manyToOne(Entry).nullable().deleteRule('cascade').index(),
    receiptLine: () => p.manyToOne(ReceiptLine).nullable().deleteRule('cascade'),
    block: p.string().nullable(),
    line: p.string().nullable(),
    day: p.string(),
    sequence: p.integer(),
    stage: () => p.manyToOne(Stage).nullable().deleteRule('set null').index(),
    category: p.string().$type<CostCategory>(),
    label: p.string(),
    /** Minor units of the build's currency. */
    money: p.integer(),
  },
});
export type Cost = InferEntity<typeof Cost>;
