import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import type { LineGoes } from '#contracts/words.ts';
import { Material } from './material.ts';
import { Receipt } from './receipt.ts';

export const ReceiptLine = defineEntity({
  name: 'ReceiptLine',
  tableName: 'receipt_line',
  uniques: [{ properties: ['receipt', 'line'] }],
  properties: {
    id: p.integer().primary(),
    receipt: () => p.manyToOne(Receipt).deleteRule('cascade'),
    line: p.string(),
    position: p.integer(),
    label: p.string(),
    material: () => p.manyToOne(Material).nullable().index(),
    /** As typed, and exact in the material's base unit. */
    typed: p.string(),
    amount: p.string().nullable(),
    /** Value on the paper, minor units of the receipt's currency. */
    own: p.integer(),
    /** Cost to the door, minor units of the build's currency. */
    door: p.integer(),
    goes: p.string().$type<LineGoes>(),
    /** The day it reached the shelf; nothing while it is on order. */
    arrivedOn: p.string().nullable(),
  },
});
export type ReceiptLine = InferEntity<typeof ReceiptLine>;
