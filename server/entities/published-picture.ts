import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Entry } from './entry.ts';
import { Picture } from './picture.ts';

/** The pictures a published document shows. A picture in none is for crew only. */
export const PublishedPicture = defineEntity({
  name: 'PublishedPicture',
  tableName: 'published_picture',
  uniques: [{ properties: ['entry', 'picture'] }],
  properties: {
    id: p.integer().primary(),
    entry: () => p.manyToOne(Entry).deleteRule('cascade'),
    picture: () => p.manyToOne(Picture).deleteRule('cascade').index(),
    position: p.integer(),
    cover: p.boolean(),
    alt: p.text(),
  },
});
export type PublishedPicture = InferEntity<typeof PublishedPicture>;
