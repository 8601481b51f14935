import type { EntryPage, TallyView } from '#contracts/entry-view.ts';
import { estimateOf } from '#domain/ledger/estimate.ts';
import { exactFrom } from '#domain/quantity.ts';
import { oneOfWork } from '#domain/work-words.ts';
import { currentDocument, deriveEntry, projectEntry, type EntryDerivation, type EntryDocument, type ProjectionContext } from '#src/blocks/pure.ts';
import { AppError } from '#contracts/errors.ts';
import { CrewMember, Entry, EntryAddress, Stage, WorkKind, type Build } from '#server/entities/index.ts';
import { movedBuild, requireCrewBuild, requireVisibleBuild, seesCosts } from '#server/features/builds/build-access.service.ts';
import { workingFigures, type WorkingFigures } from '#server/features/entries/working-figures.service.ts';
import { pictureViews } from '#server/features/media/pictures.service.ts';
import { lineFigures, figuresOfEntries, unsettledBuilds, usedOfBuilds, type EntryFigures, type LineValue } from '#server/features/shelf/figures.service.ts';
import { lastPaidFor, paidKey } from '#server/features/shelf/last-paid.service.ts';
import { materialFacts } from '#server/features/shelf/materials.service.ts';
import type { Em, Viewer } from '#server/http/context.ts';
import { entryHref } from './entry-cards.service.ts';
import { takesOf, takesOfEntries, type Takes } from './takes.service.ts';
import { tapeOf } from './tape.service.ts';
import { workWords } from './work-words.ts';

type Materials = ProjectionContext['materials'];

/** What a reader's page is made of, gathered once: from the published document, or from a working copy for its preview. */
export interface EntrySource {
  readonly build: Build;
  readonly entry: Entry;
  readonly document: EntryDocument;
  readonly costsShown: boolean;
  readonly writes: boolean;
  /** The owner's materials, where they were read already. */
  readonly materials?: Materials;
  /** Figures of a working copy, which no stored row has. */
  readonly working?: WorkingFigures;
}

export const noFigures: EntryFigures = { used: 0, wasted: 0, costs: 0, bought: 0, minutes: 0, waiting: 0, unsettled: false };

async function namesAround(em: Em, build: Build): Promise<Map<string, string>> {
  const crew = await em.find(CrewMember, { build: build.id }, { populate: ['person'] });
  return new Map([[build.owner.handle, build.owner.name], ...crew.map(({ person }) => [person.handle, person.name] as const)]);
}

/** What the lines not bought yet would cost at the last price paid, by `block:line`. */
async function estimatesOf(em: Em, build: Build, derived: EntryDerivation, figures: ReadonlyMap<string, LineValue>): Promise<ReadonlyMap<string, number | null>> {
  const short = derived.uses.flatMap((use) => {
    const key = `${use.block}:${use.line}`;
    const amount = figures.get(key)?.short ?? '0/1';
    return amount === '0/1' ? [] : [{ key, amount, material: use.material, from: use.from }];
  });
  const paid = await lastPaidFor(em, build, short);
  return new Map(short.map(({ key, amount, material, from }) => [key, estimateOf(exactFrom(amount), paid.get(paidKey(material, from)) ?? null)]));
}

async function projectionContext(em: Em, source: EntrySource, materials: Materials, derived: EntryDerivation, plural: ReadonlyMap<string, string>): Promise<ProjectionContext> {
  const { build, entry, document, costsShown } = source;
  const figures = source.working?.lines ?? await lineFigures(em, entry.id);
  const estimates = costsShown ? await estimatesOf(em, build, derived, figures) : new Map<string, number | null>();
  return {
    measures: build.measures, currency: build.currency, day: document.day, dayTo: document.dayTo, stage: document.stage,
    materials, costsShown,
    figures: new Map([...figures].map(([key, line]) => [key, { value: costsShown ? line.value : null, short: line.short, estimate: estimates.get(key) ?? null }])),
    workWords: derived.work ? workWords(derived.work, plural) : null, names: await namesAround(em, build),
  };
}

async function pluralsOf(em: Em, derived: EntryDerivation): Promise<Map<string, string>> {
  if (!derived.work) return new Map();
  const kind = await em.findOne(WorkKind, { one: derived.work.kind });
  return new Map(kind ? [[kind.one, kind.many]] : []);
}

/** What the build used so far; with a working copy, in place of what is published of its entry. */
async function usedSoFar(em: Em, { build, entry, working }: EntrySource, sums: EntryFigures): Promise<number> {
  const stored = (await usedOfBuilds(em, [build.id])).get(build.id) ?? 0;
  if (!working) return stored;
  const published = (await figuresOfEntries(em, [entry.id])).get(entry.id) ?? noFigures;
  return stored - published.used - published.costs + sums.used + sums.costs;
}

async function oneTakes(em: Em, { entry, working }: EntrySource, derived: EntryDerivation): Promise<Takes | null> {
  const { work } = derived;
  if (!work) return null;
  if (working) return takesOf(derived, work.amount, working.lines);
  return (await takesOfEntries(em, [{ entry: entry.id, amount: work.amount }])).get(entry.id) ?? null;
}

/** The day's tally of a source: money where it is shown, hours, work, and what one took. */
export async function tallyOf(em: Em, source: EntrySource, derived: EntryDerivation, sums: EntryFigures, plural: ReadonlyMap<string, string>): Promise<TallyView> {
  const { build, costsShown } = source;
  const takes = await oneTakes(em, source, derived);
  const buildUsed = await usedSoFar(em, source, sums);
  const people = new Set(derived.times.filter((time) => time.kind !== 'waiting').map((time) => time.handle ?? time.name)).size;
  return {
    currency: build.currency,
    ...(costsShown ? { money: {
      day: sums.used + sums.wasted + sums.costs, used: sums.used, wasted: sums.wasted, costs: sums.costs, bought: sums.bought,
      buildUsed, buildUnsettled: sums.unsettled || (await unsettledBuilds(em, [build.id])).has(build.id),
      one: takes?.money ?? null, oneUnsettled: takes?.unsettled ?? false, unsettled: sums.unsettled,
    } } : {}),
    minutes: sums.minutes, waiting: sums.waiting, people,
    work: derived.work ? { words: workWords(derived.work, plural), one: `One ${oneOfWork(derived.work)}` } : null,
    oneMinutes: takes && takes.minutes > 0 ? takes.minutes : null,
  };
}

type Neighbours = Pick<EntryPage, 'before' | 'after' | 'first'>;
async function neighboursOf(em: Em, build: Build, entry: Entry): Promise<Neighbours> {
  const entries = await em.find(Entry, { build: build.id, published: { $ne: null } }, { fields: ['id', 'number', 'slug', 'title', 'day'], orderBy: { day: 'asc', sequence: 'asc' } });
  const at = entries.findIndex((other) => other.id === entry.id);
  const link = (index: number) => {
    const other = entries[index];
    return other && index >= 0 ? { href: entryHref(build, other), title: other.title, day: other.day } : null;
  };
  if (at < 0) return { before: null, after: null, first: link(0) };
  return { before: at > 0 ? link(at - 1) : null, after: link(at + 1), first: at > 0 ? link(0) : null };
}

/** A source projected: the rows readers get, and what was learnt on the way. */
export async function projectedEntry(em: Em, source: EntrySource) {
  const { build } = source;
  const document = currentDocument(source.document);
  const materials = source.materials ?? (await materialFacts(em, build.owner.id));
  const derived = deriveEntry(document, { measures: build.measures, currency: build.currency, materials });
  const plural = await pluralsOf(em, derived);
  const pictures = await pictureViews(em, build.id, derived.pictures.map((picture) => picture.key));
  const context = await projectionContext(em, source, materials, derived, plural);
  return { derived, plural, pictures, names: context.names, rows: projectEntry(document, context, pictures).rows };
}

function withNames(derived: EntryDerivation, names: ReadonlyMap<string, string>, author: { handle: string; name: string }): string[] {
  const others = derived.times.filter((time) => time.kind !== 'waiting' && time.handle !== author.handle);
  return [...new Set(others.map((time) => (time.handle && names.get(time.handle)) || time.name))].filter((name) => name !== '' && name !== author.name);
}

/** A reader's page of a source: the projection and what stands around it, never the stored document. */
export async function entryPageOf(em: Em, source: EntrySource, preview: boolean): Promise<EntryPage> {
  const { build, entry, document, costsShown, writes } = source;
  const { derived, plural, pictures, names, rows } = await projectedEntry(em, source);
  const sums = source.working?.sums ?? (await figuresOfEntries(em, [entry.id])).get(entry.id) ?? noFigures;
  const stage = document.stage === null ? null : await em.findOne(Stage, { id: document.stage, build: build.id });
  const cover = derived.pictures.find((picture) => picture.cover) ?? derived.pictures[0];
  const coverView = cover ? pictures.get(cover.key) : undefined;
  return {
    build: { slug: build.slug, title: build.title, currency: build.currency, visibility: build.visibility },
    owner: { handle: build.owner.handle, name: build.owner.name }, author: { handle: entry.author.handle, name: entry.author.name },
    withNames: withNames(derived, names, entry.author),
    number: entry.number, slug: entry.slug ?? '', title: document.title, lead: document.lead, day: document.day, dayTo: document.dayTo, stage: stage?.title ?? null,
    publishedAt: entry.firstPublishedAt?.toISOString() ?? null, editedAt: entry.editedAt?.toISOString() ?? null,
    rows, tally: await tallyOf(em, source, derived, sums, plural), tape: await tapeOf(em, build, costsShown),
    ...(await neighboursOf(em, build, entry)),
    cover: coverView && cover ? { ...coverView, alt: cover.alt } : null,
    may: { write: writes }, preview,
  };
}

/** A published entry by its slug, as this viewer may see it; an old slug answers with the address of today. */
export async function readEntryBySlug(em: Em, viewer: Viewer, buildSlug: string, slug: string): Promise<EntryPage | { movedTo: string }> {
  const moved = await movedBuild(em, viewer, buildSlug);
  if (moved) return { movedTo: `/builds/${moved}/${slug}` };
  const { build, writes } = await requireVisibleBuild(em, viewer, buildSlug);
  const address = await em.findOne(EntryAddress, { build: build.id, slug }, { populate: ['entry.author'] });
  const entry = address?.entry;
  if (!entry?.published) throw new AppError('not-found', 'There is nothing at this address.');
  if (entry.slug !== slug) return { movedTo: entryHref(build, entry) };
  return entryPageOf(em, { build, entry, document: entry.published, costsShown: seesCosts(build, writes), writes: writes && viewer?.suspended === false }, false);
}

/** What readers will see of the working copy; for those who may write it. */
export async function previewWorking(em: Em, viewer: Viewer, buildSlug: string, number: number): Promise<EntryPage> {
  const build = await requireCrewBuild(em, viewer, buildSlug);
  const entry = await em.findOne(Entry, { build: build.id, number }, { populate: ['author'] });
  const document = entry?.working ?? entry?.published;
  if (!entry || !document) throw new AppError('not-found', 'There is nothing at this address.');
  return entryPageOf(em, { build, entry, document, costsShown: build.costsShown, writes: true, working: await workingFigures(em, build, entry, document) }, true);
}
