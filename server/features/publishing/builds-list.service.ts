import type { BuildCard, BuildsView } from '#contracts/builds.ts';
import { buildKinds, type BuildKind } from '#contracts/words.ts';
import { Build, Entry } from '#server/entities/index.ts';
import { usedOfBuilds } from '#server/features/shelf/figures.service.ts';
import type { Em } from '#server/http/context.ts';
import { groupedBy } from './grouping.ts';
import { madeInWords } from './build-page.service.ts';
import { coversOfBuilds } from './covers.service.ts';
import { pageOf } from './paging.ts';

const buildsAPage = 12;
/** What lists show: public, not archived, with a day written up. */
export const listedBuilds = { visibility: 'public' as const, archivedAt: null };

/** How many listed builds there are of each kind, in the order of the list. */
export async function countByKind(em: Em): Promise<{ kind: BuildKind; count: number }[]> {
  const rows = await em.find(Build, listedBuilds, { fields: ['kind'] });
  return buildKinds.map((kind) => ({ kind, count: rows.filter((row) => row.kind === kind).length })).filter((row) => row.count > 0);
}

/** Cards of builds; what was used in them only where costs are shown to everyone. */
export async function buildCards(em: Em, builds: readonly Build[]): Promise<BuildCard[]> {
  const ids = builds.map((build) => build.id);
  const entries = await em.find(Entry, { build: { $in: ids }, published: { $ne: null } }, { fields: ['build', 'day', 'dayTo'], orderBy: { day: 'desc' } });
  const byBuild = groupedBy(entries, (entry) => entry.build.id);
  const covers = await coversOfBuilds(em, ids);
  const used = await usedOfBuilds(em, builds.filter((build) => build.costsShown).map((build) => build.id));
  return builds.map((build) => {
    const days = byBuild.get(build.id) ?? [];
    return {
      slug: build.slug, title: build.title, kind: build.kind, lead: build.lead, owner: { handle: build.owner.handle, name: build.owner.name },
      stands: build.stands, standsNote: build.standsNote, madeIn: madeInWords(build), days: days.length, lastDay: days[0]?.dayTo ?? days[0]?.day ?? null,
      picture: covers.get(build.id) ?? null,
      ...(build.costsShown ? { used: { minor: used.get(build.id) ?? 0, currency: build.currency } } : {}),
    };
  });
}

export async function listBuilds(em: Em, kind: BuildKind | undefined, asked: number): Promise<BuildsView> {
  const where = kind ? { ...listedBuilds, kind } : listedBuilds;
  const count = await em.count(Build, where);
  const { page, pages, offset } = pageOf(asked, count, buildsAPage);
  const builds = await em.find(Build, where, { populate: ['owner'], orderBy: { id: 'desc' }, limit: buildsAPage, offset });
  return { builds: await buildCards(em, builds), page, pages, count, kinds: await countByKind(em) };
}
