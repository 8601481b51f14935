import type { MyBuilds } from '#contracts/builds.ts';
import { Build, CrewMember, Entry } from '#server/entities/index.ts';
import { coversOfBuilds } from '#server/features/publishing/covers.service.ts';
import type { Caller, Em } from '#server/http/context.ts';

/** Builds somebody may write in, newest work first, with what they left unfinished. */
export async function listMyBuilds(em: Em, caller: Caller): Promise<MyBuilds['builds']> {
  const crewOf = (await em.find(CrewMember, { person: caller.id })).map((row) => row.build.id);
  const builds = await em.find(Build, { $or: [{ owner: caller.id }, { id: { $in: crewOf } }] }, { orderBy: { id: 'desc' } });
  const ids = builds.map((build) => build.id);
  const entries = await em.find(Entry, { build: { $in: ids } }, { fields: ['id', 'build', 'number', 'title', 'working', 'day', 'workingAt', 'firstPublishedAt', 'createdAt'], orderBy: { day: 'desc', number: 'desc' } });
  const covers = await coversOfBuilds(em, ids);
  const latest = (id: number) => entries.find((entry) => entry.build.id === id)?.day ?? '';
  return builds.map((build) => ({
    slug: build.slug, title: build.title, kind: build.kind, visibility: build.visibility, mine: build.owner.id === caller.id, archived: build.archivedAt != null,
    picture: covers.get(build.id) ?? null, days: entries.filter((entry) => entry.build.id === build.id && entry.firstPublishedAt != null).length,
    drafts: entries.filter((entry) => entry.build.id === build.id && entry.workingAt != null).map((entry) => ({
      number: entry.number, title: entry.working?.title ?? entry.title, day: entry.working?.day ?? entry.day, savedAt: (entry.workingAt ?? entry.createdAt).toISOString(),
    })),
    latest: latest(build.id),
  })).toSorted((a, b) => b.latest.localeCompare(a.latest));
}
