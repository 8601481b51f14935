import { wrap } from '@mikro-orm/core';
import { isCurrency } from '#domain/currency.ts';
import { AppError } from '#contracts/errors.ts';
import type { BuildSettings, changeBuild, startBuild } from '#contracts/builds.ts';
import type { ParsedOf } from '#contracts/endpoint.ts';
import { Build, BuildAddress, Cost, CrewMember, Movement, Person, Receipt, Shelf, Stage } from '#server/entities/index.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { requireCrewBuild, requireOwnBuild } from './build-access.service.ts';
import { freeBuildSlug, moveBuild } from './build-address.service.ts';

type StartInput = ParsedOf<typeof startBuild>['body'];
type ChangeInput = ParsedOf<typeof changeBuild>['body'];

function requireCurrency(code: string | undefined): void {
  if (code !== undefined && !isCurrency(code)) {
    throw new AppError('bad-input', 'Some of this needs mending.', { currency: 'Pick a currency from the ISO 4217 list.' });
  }
}

/** Starts a build, with its shelf. Any member becomes a restorer by this. */
export async function startRestoration(em: Em, caller: Pick<Caller, 'id'>, input: StartInput, today: string): Promise<Build> {
  requireCurrency(input.currency);
  return em.transactional(async (inner) => {
    const { method, ...fields } = input;
    const visibility = fields.visibility ?? 'public';
    const slug = await freeBuildSlug(inner, fields.title, visibility);
    const build = inner.create(Build, { ...fields, visibility, slug, owner: inner.getReference(Person, caller.id), startedOn: fields.startedOn ?? today });
    inner.persist([build, inner.create(BuildAddress, { slug, build }), inner.create(Shelf, { build, currency: build.currency, method: method ?? 'fifo' })]);
    return build;
  });
}

/** Whether money stands anywhere in the build's currency: spent, on the shelf, drawn from the shed, or planned. */
async function moneyWritten(em: Em, build: Build): Promise<boolean> {
  const counts = [
    await em.count(Cost, { build: build.id }), await em.count(Receipt, { build: build.id }), await em.count(Movement, { $or: [{ build: build.id }, { shelf: { build: build.id } }] }),
    await em.count(Stage, { build: build.id, plannedMoney: { $ne: null } }),
  ];
  return counts.some((count) => count > 0);
}

export async function readSettings(em: Em, caller: Caller, slug: string): Promise<BuildSettings> {
  await requireCrewBuild(em, caller, slug);
  const build = await requireOwnBuild(em, caller, slug);
  const shelf = await em.findOneOrFail(Shelf, { build: build.id });
  const { kind, title, lead, maker, model, year, yearAbout, frameNumber, engineNumber, hullNumber, serialNumber, registration, numbersShown, stands, standsNote, startedOn, currency, measures, visibility, costsShown, version } = build;
  return {
    kind, title, lead, maker, model, year: year ?? null, yearAbout, frameNumber, engineNumber, hullNumber, serialNumber, registration, numbersShown,
    stands, standsNote, startedOn, currency, measures, method: shelf.method, visibility, costsShown, version,
    slug: build.slug, archived: build.archivedAt != null, currencyFixed: await moneyWritten(em, build),
  };
}

/** Changes what is given and leaves the rest. A new title, or a change to or from unlisted, gives a new address; the old one redirects. */
export async function changeSettings(em: Em, caller: Caller, slug: string, input: ChangeInput): Promise<Build> {
  requireCurrency(input.currency);
  return em.transactional(async (inner) => {
    const build = await requireOwnBuild(inner, caller, slug);
    const { version, method, ...changes } = input;
    if (build.version !== version) {
      throw new AppError('newer-exists', 'Somebody changed these settings since you opened them. Look at them as they are now, then say whose to keep.', undefined, { version: build.version });
    }
    if (changes.currency !== undefined && changes.currency !== build.currency && (await moneyWritten(inner, build))) {
      throw new AppError('bad-input', 'Some of this needs mending.', { currency: `Money is already written down in ${build.currency}, so the currency stays.` });
    }
    const shelf = await inner.findOneOrFail(Shelf, { build: build.id });
    if (method !== undefined && method !== shelf.method && (await inner.count(Movement, { shelf: shelf.id })) > 0) {
      throw new AppError('bad-input', 'Some of this needs mending.', { method: 'This shelf already holds priced materials, so the method stays for now.' });
    }
    const moves = (changes.title !== undefined && changes.title !== build.title) || (changes.visibility !== undefined && (changes.visibility === 'unlisted') !== (build.visibility === 'unlisted'));
    if (moves) await moveBuild(inner, build, changes.title ?? build.title, changes.visibility ?? build.visibility);
    wrap(build).assign(changes);
    shelf.currency = build.currency;
    if (method !== undefined) shelf.method = method;
    return build;
  });
}

export async function setArchived(em: Em, caller: Caller, slug: string, archived: boolean, now: Date): Promise<void> {
  const build = await requireOwnBuild(em, caller, slug);
  build.archivedAt = archived ? build.archivedAt ?? now : null;
  await em.flush();
}

/** Lets somebody work on a build. Inviting by mail comes before this. */
export async function joinCrew(em: Em, build: Build, personId: number): Promise<void> {
  em.persist(em.create(CrewMember, { build, person: em.getReference(Person, personId) }));
  await em.flush();
}
