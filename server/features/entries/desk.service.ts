import type { DeskView } from '#contracts/entries.ts';
import { exactFigure } from '#domain/figures.ts';
import { exactFrom } from '#domain/quantity.ts';
import { CrewMember, Stage, type Build, type Entry } from '#server/entities/index.ts';
import { figuresOfStages, usedOfBuilds } from '#server/features/shelf/figures.service.ts';
import { materialsOf } from '#server/features/shelf/materials.service.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { deskShelves, materialHistories, shelfRows } from './desk-shelves.ts';
import { requireOpenEntry } from './entry-access.ts';
import { keptDocuments, standingDocument } from './stored-document.ts';

const mostWorkKinds = 300;

async function stagesOf(em: Em, build: Build, entry: Entry): Promise<DeskView['stages']> {
  const stages = await em.find(Stage, { build: build.id }, { orderBy: { position: 'asc', id: 'asc' }, populate: ['workKind'] });
  const figures = await figuresOfStages(em, build, { without: entry.id });
  return stages.map((stage) => {
    const { used = 0, wasted = 0, usedForEach = 0, workDone = null } = figures.get(stage.id) ?? {};
    return {
      id: stage.id, title: stage.title, done: stage.done, planned: stage.plannedMoney ?? null,
      plannedWork: stage.plannedWork ? exactFigure(exactFrom(stage.plannedWork)) : null, workUnit: stage.workUnit ?? null, workKind: stage.workKind?.one ?? null,
      used, wasted, usedForEach, workDone: workDone ?? '0/1',
    };
  });
}

/** Kinds of work to suggest: this build's and the caller's own first, then those the public may read of. What only private builds name is nobody else's. */
async function workKindsFor(em: Em, caller: Caller, build: Build): Promise<DeskView['workKinds']> {
  return em.execute<DeskView['workKinds']>(
    `select k.one as one, k.many as many from work_kind k join (
       select e.work_kind_id as kind, (b.owner_id = ? or b.id = ?) as own from entry e join build b on b.id = e.build_id
         where e.work_kind_id is not null and (b.owner_id = ? or b.id = ? or (b.visibility = 'public' and e.published is not null))
       union all select s.work_kind_id as kind, 1 as own from stage s join build b on b.id = s.build_id where s.work_kind_id is not null and (b.owner_id = ? or b.id = ?)
     ) at on at.kind = k.id group by k.id order by max(at.own) desc, count(*) desc, k.one limit ${mostWorkKinds}`,
    [caller.id, build.id, caller.id, build.id, caller.id, build.id],
  );
}

async function peopleOf(em: Em, build: Build): Promise<DeskView['people']> {
  const crew = await em.find(CrewMember, { build: build.id }, { populate: ['person'], orderBy: { id: 'asc' } });
  return [build.owner, ...crew.map(({ person }) => person)].map(({ handle, name }) => ({ handle, name }));
}

function entryView(build: Build, entry: Entry): DeskView['entry'] {
  return {
    number: entry.number, guid: entry.guid, version: entry.version, sequence: entry.sequence, document: standingDocument(entry), hasWorking: entry.working != null,
    savedAt: entry.workingAt?.toISOString() ?? null, published: entry.published != null, href: entry.published && entry.slug ? `/builds/${build.slug}/${entry.slug}` : null,
  };
}

/** All the desk needs to show a cost while somebody types: with drafts, and nothing of it stored. One transaction, so that a sign-off meanwhile is in all of it or in none. */
export function readDeskOf(em: Em, caller: Caller, slug: string, number: number): Promise<DeskView> {
  return em.transactional((inner) => deskOf(inner, caller, slug, number));
}

async function deskOf(em: Em, caller: Caller, slug: string, number: number): Promise<DeskView> {
  const { build, entry } = await requireOpenEntry(em, caller, slug, number);
  const shelves = await deskShelves(em, caller, build, entry);
  const { title, currency, measures, costsShown, visibility } = build;
  return {
    build: { slug: build.slug, title, currency, measures, method: shelves.shelf.method, costsShown, visibility },
    shedMethod: shelves.shed?.method ?? 'fifo',
    entry: entryView(build, entry),
    stages: await stagesOf(em, build, entry), workKinds: await workKindsFor(em, caller, build), people: await peopleOf(em, build),
    materials: await materialsOf(em, build.owner.id, shelves.seen),
    shelf: shelfRows(shelves), history: materialHistories(shelves, keptDocuments(entry)),
    buildUsed: (await usedOfBuilds(em, [build.id])).get(build.id) ?? 0,
  };
}
