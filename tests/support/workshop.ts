import { copyFile, mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { inject } from 'vitest';
import type { MaterialView } from '#contracts/materials.ts';
import type { EntryDocument, TopNode } from '#src/blocks/pure.ts';
import { blankBought, blankBoughtLine, type BoughtData, type BoughtLine } from '#src/blocks/bought/bought.ts';
import { blankCostLine, type CostLine } from '#src/blocks/cost/cost.ts';
import { blankTimeLine, type TimeLineData } from '#src/blocks/time/time.ts';
import { blankUsedLine, type UsedLine } from '#src/blocks/used/used.ts';
import { openDatabase, type Orm } from '#server/database.ts';
import { Build, Entry } from '#server/entities/index.ts';
import { createPerson } from '#server/features/accounts/people.ts';
import { joinCrew, startRestoration } from '#server/features/builds/builds.service.ts';
import { discardTyped } from '#server/features/entries/discard-working.service.ts';
import { signOffDay } from '#server/features/entries/sign-off.service.ts';
import { startDay } from '#server/features/entries/start-entry.service.ts';
import { saveTyped } from '#server/features/entries/save-working.service.ts';
import { takeBack } from '#server/features/entries/take-back.service.ts';
import { addToMaterials, type NewMaterial } from '#server/features/shelf/materials.service.ts';
import type { Caller, Em } from '#server/http/context.ts';

export interface BuildOptions {
  readonly title?: string;
  readonly currency?: string;
  readonly measures?: 'us' | 'imperial';
  readonly method?: 'fifo' | 'average';
  readonly visibility?: 'public' | 'unlisted' | 'private';
}

const now = new Date('2026-11-20T12:00:00Z');

/** A database of its own with people, builds and days written through the services, each in a request's own entity manager. */
export class Workshop {
  readonly orm: Orm;
  readonly #folder: string;

  private constructor(orm: Orm, folder: string) {
    this.orm = orm;
    this.#folder = folder;
  }

  static async open(): Promise<Workshop> {
    const folder = await mkdtemp(join(tmpdir(), 'workshop-'));
    const file = join(folder, 'workshop.sqlite');
    await copyFile(inject('templateDatabase'), file);
    return new Workshop(await openDatabase(file), folder);
  }

  async close(): Promise<void> {
    await this.orm.close(true);
    await rm(this.#folder, { recursive: true, force: true });
  }

  em(): Em {
    return this.orm.em.fork();
  }

  async person(handle: string): Promise<Caller> {
    const em = this.em();
    const person = createPerson(em, { handle, name: handle, email: `${handle}@people.example` });
    await em.flush();
    return { id: person.id, handle, name: handle, role: 'member', suspended: false };
  }

  async build(owner: Caller, options: BuildOptions = {}): Promise<string> {
    const { title = 'Lugger', currency = 'GBP', measures = 'imperial', ...rest } = options;
    return (await startRestoration(this.em(), owner, { kind: 'boat', title, currency, measures, ...rest }, '2026-01-01')).slug;
  }

  async joins(build: string, person: Caller): Promise<void> {
    const em = this.em();
    await joinCrew(em, await em.findOneOrFail(Build, { slug: build }), person.id);
  }

  material(owner: Caller, build: string, name: string, input: Partial<NewMaterial> = {}): Promise<MaterialView> {
    return addToMaterials(this.em(), owner, build, { name, dimension: 'count', unit: '', packs: [], ...input });
  }

  start(caller: Caller, build: string, day: string): Promise<number> {
    return startDay(this.em(), caller, build, { day, stage: null }, now);
  }

  async entry(build: string, number: number): Promise<Entry> {
    return this.em().findOneOrFail(Entry, { build: { slug: build }, number });
  }

  /** Saves the working copy over whatever version stands there. */
  async save(caller: Caller, build: string, number: number, document: EntryDocument) {
    const { version } = await this.entry(build, number);
    return saveTyped(this.em(), caller, build, number, { version, document }, now);
  }

  /** Signs off over whatever version stands there; a new entry is started where no number is given. */
  async signOff(caller: Caller, build: string, document: EntryDocument, number?: number): Promise<number> {
    const of = number ?? await this.start(caller, build, document.day);
    const { version } = await this.entry(build, of);
    await signOffDay(this.em(), caller, build, of, { version, document }, now);
    return of;
  }

  /** Throws the working copy away, whatever version stands there. */
  async discard(caller: Caller, build: string, number: number): Promise<void> {
    const { version } = await this.entry(build, number);
    await discardTyped(this.em(), caller, build, number, version);
  }

  async takeBack(caller: Caller, build: string, number: number): Promise<void> {
    const { version } = await this.entry(build, number);
    await takeBack(this.em(), caller, build, number, version, now);
  }
}

let ids = 0;
/** An id no other node or line has. */
export function freshId(): string {
  ids += 1;
  return `node${String(ids).padStart(6, '0')}`;
}

/** A write-up of a day: some words, and the blocks given. */
export function dayOf(day: string, blocks: readonly TopNode[], facts: Partial<EntryDocument> = {}): EntryDocument {
  const words: TopNode = { type: 'paragraph', attrs: { id: freshId() }, content: [{ type: 'text', text: 'A day in the shed.' }] };
  return { title: `Day of ${day}`, lead: '', day, dayTo: null, stage: null, work: null, content: [words, ...blocks], ...facts };
}

type MaterialName = Pick<MaterialView, 'id' | 'name'>;
export type UseInput = Partial<UsedLine> & { readonly of: MaterialName };
export function usedBlock(lines: readonly UseInput[], id = freshId(), day: string | null = null): TopNode {
  return { type: 'used', attrs: { id, version: 1, data: { day, lines: lines.map(({ of, ...line }) => ({ ...blankUsedLine(freshId()), material: of.id, name: of.name, ...line })) } } };
}

export type BuyInput = Partial<BoughtLine> & { readonly of?: MaterialName };
export function boughtBlock(lines: readonly BuyInput[], facts: Partial<BoughtData> = {}, id = freshId()): TopNode {
  const written = lines.map(({ of, ...line }) => ({ ...blankBoughtLine(freshId()), ...(of ? { material: of.id, name: of.name } : {}), ...line }));
  return { type: 'bought', attrs: { id, version: 1, data: { ...blankBought(), supplier: 'Chandler', ...facts, lines: written } } };
}

export function costBlock(lines: readonly Partial<CostLine>[], day: string | null = null): TopNode {
  return { type: 'cost', attrs: { id: freshId(), version: 1, data: { day, lines: lines.map((line) => ({ ...blankCostLine(freshId()), label: 'Hire', ...line })) } } };
}

export function timeBlock(lines: readonly Partial<TimeLineData>[], id = freshId(), day: string | null = null): TopNode {
  return { type: 'time', attrs: { id, version: 1, data: { day, lines: lines.map((line) => ({ ...blankTimeLine(freshId()), name: 'Wren', ...line })) } } };
}
