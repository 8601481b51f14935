import type { MyBuilds } from '#contracts/builds.ts';
import { Build, CrewMember, Entry } from '#server/entities/index.ts';
import { daysOfBuilds } from '#server/features/publishing/build-days.service.ts';
import { coversOfBuilds } from '#server/features/publishing/covers.service.ts';
import type { Caller, Em } from '#server/http/context.ts';

type Draft = MyBuilds['builds'][number]['drafts'][number];

function draftOf({ number, title, day, working, workingAt }: Pick<Entry, 'number' | 'title' | 'day' | 'working' | 'workingAt'>): Draft[] {
  return workingAt ? [{ number, title: working?.title ?? title, day: working?.day ?? day, savedAt: workingAt.toISOString() }] : [];
}

/** Builds somebody may write in, newest work first, with what they left unfinished. */
export async function listMyBuilds(em: Em, caller: Caller): Promise<MyBuilds['builds']> {
  const crewOf = (await em.find(CrewMember, { person: caller.id })).map((row) => row.build.id);
  const builds = await em.find(Build, { $or: [{ owner: caller.id }, { id: { $in: crewOf } }] }, { orderBy: { id: 'desc' } });
  const ids = builds.map((build) => build.id);
  const left = await em.find(Entry, { build: { $in: ids }, workingAt: { $ne: null } }, { fields: ['id', 'build', 'number', 'title', 'working', 'day', 'workingAt'], orderBy: { day: 'desc', number: 'desc' } });
  const drafts = new Map(ids.map((id) => [id, left.filter((entry) => entry.build.id === id)]));
  const days = await daysOfBuilds(em, ids);
  const covers = await coversOfBuilds(em, ids);
  return builds.map((build) => {
    const written = days.get(build.id);
    const own = drafts.get(build.id) ?? [];
    return {
      slug: build.slug, title: build.title, kind: build.kind, visibility: build.visibility, mine: build.owner.id === caller.id, archived: build.archivedAt != null,
      picture: covers.get(build.id) ?? null, days: written?.days ?? 0, drafts: own.flatMap(draftOf),
      latest: [written?.lastDay ?? '', own[0]?.day ?? ''].toSorted().at(-1) ?? '',
    };
  }).toSorted((a, b) => b.latest.localeCompare(a.latest));
}
