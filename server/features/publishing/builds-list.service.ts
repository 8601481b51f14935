import type { BuildCard, BuildsView } from '#contracts/builds.ts';
import { buildKinds, type BuildKind } from '#contracts/words.ts';
import { Build } from '#server/entities/index.ts';
import { unsettledBuilds, usedOfBuilds } from '#server/features/shelf/figures.service.ts';
import type { Em } from '#server/http/context.ts';
import { daysOfBuilds } from './build-days.service.ts';
import { madeInWords } from './build-page.service.ts';
import { coversOfBuilds } from './covers.service.ts';
import { pageOf } from './paging.ts';

const buildsAPage = 12;
/** What lists show: public and not put away. */
export const listedBuilds = { visibility: 'public' as const, archivedAt: null };

/** How many listed builds there are of each kind, in the order of the list. */
export async function countByKind(em: Em): Promise<{ kind: BuildKind; count: number }[]> {
  const rows = await em.execute<{ kind: BuildKind; count: number }[]>(
    `select kind, count(*) as count from build where visibility = 'public' and archived_at is null group by kind`,
  );
  const counts = new Map(rows.map(({ kind, count }) => [kind, count]));
  return buildKinds.map((kind) => ({ kind, count: counts.get(kind) ?? 0 })).filter(({ count }) => count > 0);
}

/** Cards of builds; what was used in them only where costs are shown to everyone. */
export async function buildCards(em: Em, builds: readonly Build[]): Promise<BuildCard[]> {
  const ids = builds.map((build) => build.id);
  const days = await daysOfBuilds(em, ids);
  const covers = await coversOfBuilds(em, ids);
  const shown = builds.filter((build) => build.costsShown).map((build) => build.id);
  const used = await usedOfBuilds(em, shown);
  const unsettled = await unsettledBuilds(em, shown);
  return builds.map((build) => {
    const written = days.get(build.id);
    return {
      slug: build.slug, title: build.title, kind: build.kind, lead: build.lead, owner: { handle: build.owner.handle, name: build.owner.name },
      stands: build.stands, standsNote: build.standsNote, madeIn: madeInWords(build), days: written?.days ?? 0, lastDay: written?.lastDay ?? null,
      picture: covers.get(build.id) ?? null,
      ...(build.costsShown ? { used: { minor: used.get(build.id) ?? 0, currency: build.currency, unsettled: unsettled.has(build.id) } } : {}),
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
