import { AppError } from '#contracts/errors.ts';
import type { DemoBuild, DemoEntry, DemoWriter } from '#fixtures/demo-build.ts';
import { documentOf, type Bench } from '#fixtures/entry-words.ts';
import { entryDocument } from '#src/blocks/pure.ts';
import { Build, Material, Person, Stage, type Picture } from '#server/entities/index.ts';
import { joinCrew, startRestoration } from '#server/features/builds/builds.service.ts';
import { replaceStages } from '#server/features/builds/stages.service.ts';
import { saveTyped } from '#server/features/entries/save-working.service.ts';
import { signOffDay } from '#server/features/entries/sign-off.service.ts';
import { startDay } from '#server/features/entries/start-entry.service.ts';
import { addPictureFromFile } from '#server/features/media/pictures.service.ts';
import { addToMaterials } from '#server/features/shelf/materials.service.ts';
import type { Caller, Em, Parts } from '#server/http/context.ts';
import type { PlateFile } from './demo-pictures.ts';

export type Writers = Readonly<Record<DemoWriter, Caller>>;
export interface LoadingDay {
  /** The plain date so many days before the day of loading. */
  day(daysAgo: number): string;
  /** The evening of that day. */
  evening(daysAgo: number): Date;
}

interface Loaded {
  readonly slug: string;
  readonly stages: ReadonlyMap<string, number>;
  readonly materials: ReadonlyMap<string, { id: number; name: string }>;
}
interface Shown { readonly key: string; readonly alt: string }

function found<V>(map: ReadonlyMap<string, V>, key: string, what: string): V {
  const value = map.get(key);
  if (value === undefined) throw new RangeError(`The demo has no ${what} called ${key}`);
  return value;
}

/** Loads one build of the demo by the services its people would use; its days come one by one, in the order of all builds. */
export class DemoBuildLoader {
  readonly #parts: Parts;
  readonly #demo: DemoBuild;
  readonly #writers: Writers;
  readonly #when: LoadingDay;
  readonly #pictures = new Map<string, Shown>();
  #loaded: Loaded | null = null;

  constructor(parts: Parts, demo: DemoBuild, writers: Writers, when: LoadingDay) {
    this.#parts = parts;
    this.#demo = demo;
    this.#writers = writers;
    this.#when = when;
  }

  get #build(): Loaded {
    if (!this.#loaded) throw new Error(`${this.#demo.title} has not been started`);
    return this.#loaded;
  }

  #em(): Em {
    return this.#parts.orm.em.fork();
  }

  async start(): Promise<void> {
    const { owner, crew, startedDaysAgo, before: _, after: __, stages, materials, entries: ___, serialNumber = '', standsNote = '', ...fields } = this.#demo;
    const em = this.#em();
    const startedOn = this.#when.day(startedDaysAgo);
    const build = await startRestoration(em, this.#writers[owner], { ...fields, serialNumber, standsNote, startedOn }, startedOn);
    for (const member of crew) await joinCrew(em, build, this.#writers[member].id);
    await replaceStages(em, this.#writers[owner], build.slug, stages.map(({ title, money, time, work, done = false }) => ({
      id: null, title, plannedMoney: money, plannedTime: time, plannedWork: work?.amount ?? '', workUnit: work?.unit ?? 'piece', workKind: work?.kind ?? '', done,
    })));
    const rows = await em.find(Stage, { build: build.id });
    this.#loaded = { slug: build.slug, stages: new Map(rows.map(({ id, title }) => [title, id])), materials: await this.#addMaterials(em, build.slug) };
  }

  async #addMaterials(em: Em, slug: string): Promise<Loaded['materials']> {
    const added = new Map<string, { id: number; name: string }>();
    for (const [key, { name, dimension, unit, packs = {}, hazards = [], ratio }] of Object.entries(this.#demo.materials)) {
      const material = await addToMaterials(em, this.#writers[this.#demo.owner], slug, {
        name, dimension, unit, packs: Object.entries(packs).map(([pack, amount]) => ({ name: pack, amount })), hazards: [...hazards],
      });
      // No service states a ratio yet.
      if (ratio) (await em.findOneOrFail(Material, material.id)).ratio = { ...ratio, about: true };
      added.set(key, { id: material.id, name: material.name });
    }
    await em.flush();
    return added;
  }

  /** Takes the pictures this build shows, the way uploads go; says each as it is done. */
  async takePictures(plates: ReadonlyMap<string, PlateFile>, done: () => void): Promise<void> {
    const { owner, before, after } = this.#demo;
    const em = this.#em();
    const build = await em.findOneOrFail(Build, { slug: this.#build.slug });
    const person = await em.findOneOrFail(Person, this.#writers[owner].id);
    const taken = new Map<string, Picture>();
    for (const file of this.#files()) {
      const { path, alt } = found(plates, file, 'picture');
      const picture = await addPictureFromFile(this.#parts, em, build, person, path);
      taken.set(file, picture);
      this.#pictures.set(file, { key: picture.key, alt });
      done();
    }
    if (before !== undefined) build.beforePicture = found(taken, before, 'picture');
    if (after !== undefined) build.afterPicture = found(taken, after, 'picture');
    await em.flush();
  }

  /** Files of the pictures its entries show, in their order. */
  #files(): string[] {
    const files: string[] = [];
    const noted = (file: string) => {
      files.push(file);
      return { key: file, alt: '' };
    };
    for (const entry of this.#demo.entries) documentOf(entry, { ...this.#bench(), picture: noted });
    return [...new Set(files)];
  }

  #bench(): Bench {
    const { stages, materials } = this.#build;
    return {
      day: (daysAgo) => this.#when.day(daysAgo),
      stage: (title) => found(stages, title, 'stage'),
      material: (key) => found(materials, key, 'material'),
      picture: (file) => found(this.#pictures, file, 'picture'),
    };
  }

  /** Writes up one day; what bars it is said with the day's title, since it is a fault of the fixture. */
  async writeUp(entry: DemoEntry): Promise<void> {
    try {
      await this.#signOff(entry);
    } catch (error) {
      if (!(error instanceof AppError)) throw error;
      throw new Error(`The demo's “${entry.title}” does not go in: ${error.message} ${JSON.stringify(error.fields ?? {})}`, { cause: error });
    }
  }

  /** As its writer does: begun, saved, and signed off that evening unless it is left as a draft. */
  async #signOff(entry: DemoEntry): Promise<void> {
    const { slug } = this.#build;
    const caller = this.#writers[entry.by];
    const em = this.#em();
    const evening = this.#when.evening(entry.daysAgoTo ?? entry.daysAgo);
    // Read as what comes over the wire is.
    const document = entryDocument.parse(documentOf(entry, this.#bench()));
    const number = await startDay(em, caller, slug, { day: document.day, stage: document.stage }, evening);
    const saved = await saveTyped(em.fork(), caller, slug, number, { version: 1, document }, evening);
    if (!entry.draft) await signOffDay(em.fork(), caller, slug, number, saved, evening);
  }
}
