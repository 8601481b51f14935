import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Build } from './build.ts';

/** Every slug a build has ever had: an old one redirects, and none is given to another build. */
export const BuildAddress = defineEntity({
  name: 'BuildAddress',
  tableName: 'build_address',
  properties: {
    slug: p.string().primary(),
    build: () => p.manyToOne(Build).deleteRule('cascade'),
  },
});
export type BuildAddress = InferEntity<typeof BuildAddress>;
