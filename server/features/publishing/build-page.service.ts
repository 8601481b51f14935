import type { BuildPage, FiguresView, PlanRow } from '#contracts/builds.ts';
import { finishAt } from '#domain/forecast.ts';
import { exactFrom } from '#domain/quantity.ts';
import { CrewMember, Entry, Stage, type Build } from '#server/entities/index.ts';
import { movedBuild, requireVisibleBuild, seesCosts } from '#server/features/builds/build-access.service.ts';
import { pictureView } from '#server/features/media/pictures.service.ts';
import { buildFigures, figuresOfStages, minutesOfBuild, type StageFigures } from '#server/features/shelf/figures.service.ts';
import type { Em, Viewer } from '#server/http/context.ts';
import { entryCards } from './entry-cards.service.ts';
import { pageOf } from './paging.ts';
import { tapeOf } from './tape.service.ts';

const entriesAPage = 20;

/** "Built 1968", "built about 1961, Larkspur Mk II". */
export function madeInWords(build: Pick<Build, 'year' | 'yearAbout'>): string {
  return build.year == null ? '' : `Built ${build.yearAbout ? 'about ' : ''}${build.year}`;
}

/** What is said of its identity; the numbers only where the restorer shows them, or to those who work on it. */
function identityOf(build: Build, writes: boolean): BuildPage['identity'] {
  const numbers = build.numbersShown || writes ? [
    { label: 'Frame number', value: build.frameNumber }, { label: 'Engine number', value: build.engineNumber },
    { label: 'Hull number', value: build.hullNumber }, { label: 'Serial number', value: build.serialNumber }, { label: 'Registration', value: build.registration },
  ] : [];
  return [{ label: 'Maker', value: build.maker }, { label: 'Model', value: build.model }, ...numbers].filter((row) => row.value !== '');
}

function planRow(stage: Stage, figures: StageFigures | undefined): PlanRow {
  const { used = 0, wasted = 0, usedForEach = 0, unsettled = false, minutes = 0, workDone = null } = figures ?? {};
  return {
    stage: stage.title, done: stage.done, planned: stage.plannedMoney ?? null, used, wasted, unsettled, minutes, plannedMinutes: stage.plannedMinutes ?? null,
    finishAt: finishAt({
      planned: stage.plannedMoney ?? null, used, wasted, usedForEach, done: stage.done, percent: null,
      workPlanned: stage.plannedWork ? exactFrom(stage.plannedWork) : null, workDone: workDone ? exactFrom(workDone) : null,
    }),
  };
}

/** Work outside any stage keeps the table's foot equal to the build's figures. */
function looseRow(stages: ReadonlyMap<number | null, StageFigures>): PlanRow[] {
  const loose = stages.get(null);
  if (!loose || (loose.used + loose.wasted + loose.minutes === 0 && !loose.unsettled)) return [];
  return [{ stage: 'Outside any stage', done: false, planned: null, used: loose.used, wasted: loose.wasted, unsettled: loose.unsettled, finishAt: null, minutes: loose.minutes, plannedMinutes: null }];
}

async function listedEntries(em: Em, build: Build, page: number) {
  const where = { build: build.id, published: { $ne: null } };
  const count = await em.count(Entry, where);
  const paging = pageOf(page, count, entriesAPage);
  const entries = await em.find(Entry, where, {
    populate: ['build', 'author', 'stage'], orderBy: { day: 'desc', sequence: 'desc' }, limit: entriesAPage, offset: paging.offset,
  });
  return { entries, count, paging };
}

/** A build as this viewer may see it: lead, tape, the four figures, entries, plan and tally. */
export async function readBuildPage(em: Em, viewer: Viewer, slug: string, page: number): Promise<BuildPage | { movedTo: string }> {
  const moved = await movedBuild(em, viewer, slug);
  if (moved) return { movedTo: `/builds/${moved}` };
  const { build, writes, owns } = await requireVisibleBuild(em, viewer, slug);
  await em.populate(build, ['beforePicture', 'afterPicture']);
  const shows = seesCosts(build, writes);
  const { entries, count, paging } = await listedEntries(em, build, page);
  const crew = await em.find(CrewMember, { build: build.id }, { populate: ['person'], orderBy: { id: 'asc' } });
  const stages = await em.find(Stage, { build: build.id }, { orderBy: { position: 'asc', id: 'asc' } });
  const byStage = await figuresOfStages(em, build);
  const figures: FiguresView | undefined = shows ? await buildFigures(em, build) : undefined;
  return {
    slug: build.slug, title: build.title, kind: build.kind, lead: build.lead, owner: { handle: build.owner.handle, name: build.owner.name },
    crew: crew.map(({ person }) => ({ handle: person.handle, name: person.name })),
    madeIn: madeInWords(build), identity: identityOf(build, writes), startedOn: build.startedOn, stands: build.stands, standsNote: build.standsNote,
    archived: build.archivedAt != null, visibility: build.visibility, currency: build.currency, days: count, minutes: await minutesOfBuild(em, build),
    before: build.beforePicture ? pictureView(build.beforePicture, { alt: `${build.title}, before`, caption: 'Before' }) : null,
    after: build.afterPicture ? pictureView(build.afterPicture, { alt: `${build.title}, as it stands`, caption: 'As it stands' }) : null,
    tape: await tapeOf(em, build, shows),
    ...(figures ? { figures, plan: [...stages.map((stage) => planRow(stage, byStage.get(stage.id))), ...looseRow(byStage)] } : {}),
    stages: stages.map((stage) => ({ stage: stage.title, done: stage.done, minutes: byStage.get(stage.id)?.minutes ?? 0, days: byStage.get(stage.id)?.days ?? 0 })),
    entries: await entryCards(em, entries, () => shows), page: paging.page, pages: paging.pages,
    may: { write: writes && viewer?.suspended === false, settle: owns && viewer?.suspended === false },
  };
}
