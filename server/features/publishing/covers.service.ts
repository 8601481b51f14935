import type { PictureView } from '#contracts/pictures.ts';
import { Build, PublishedPicture } from '#server/entities/index.ts';
import { pictureView } from '#server/features/media/pictures.service.ts';
import type { Em } from '#server/http/context.ts';
import { groupedBy } from './grouping.ts';

export interface EntryPictures {
  readonly cover: PictureView | null;
  readonly count: number;
}

/** The cover (the one marked, else the first) and the number of pictures of each published entry. */
export async function picturesOfEntries(em: Em, entryIds: readonly number[]): Promise<Map<number, EntryPictures>> {
  const rows = await em.find(PublishedPicture, { entry: { $in: [...entryIds] } }, { populate: ['picture'], orderBy: { position: 'asc' } });
  const byEntry = groupedBy(rows, (row) => row.entry.id);
  return new Map([...byEntry].map(([id, shown]) => {
    const cover = shown.find((row) => row.cover) ?? shown[0];
    return [id, { cover: cover ? pictureView(cover.picture, { alt: cover.alt, caption: '' }) : null, count: shown.length }];
  }));
}

/** The picture each build's latest published day opens with. Picked in SQL, one a build: a list of big builds has thousands. */
async function latestShown(em: Em, buildIds: readonly number[]): Promise<PublishedPicture[]> {
  if (buildIds.length === 0) return [];
  const rows = await em.execute<{ shown: number | null }[]>(
    `select (select s.id from published_picture s join entry e on e.id = s.entry_id where e.build_id = b.id
       order by e.day desc, e.sequence desc, s.cover desc, s.position limit 1) as shown
     from build b where b.id in (${buildIds.map(() => '?').join(', ')})`, [...buildIds],
  );
  return em.find(PublishedPicture, { id: { $in: rows.flatMap(({ shown }) => shown ?? []) } }, { populate: ['picture'] });
}

/** A picture for each build: how it stands now if the restorer picked one, else the cover of its latest published day. */
export async function coversOfBuilds(em: Em, buildIds: readonly number[]): Promise<Map<number, PictureView>> {
  const builds = await em.find(Build, { id: { $in: [...buildIds] } }, { populate: ['afterPicture', 'beforePicture'] });
  const covers = new Map<number, PictureView>();
  for (const build of builds) {
    const picked = build.afterPicture ?? build.beforePicture;
    if (picked) covers.set(build.id, pictureView(picked, { alt: `${build.title}, how it stands`, caption: '' }));
  }
  const without = builds.filter((build) => !covers.has(build.id)).map((build) => build.id);
  for (const { picture, alt } of await latestShown(em, without)) covers.set(picture.build.id, pictureView(picture, { alt, caption: '' }));
  return covers;
}
