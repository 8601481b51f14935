import { Seeder } from '@mikro-orm/seeder';
import { nanoid } from 'nanoid';
import { demoBuilds } from '#fixtures/demo-builds.ts';
import type { Person } from '#server/entities/index.ts';
import { createDemoPeople, demoAddress, demoPeople } from '#server/features/accounts/demo-people.ts';
import type { Caller, Em, Parts } from '#server/http/context.ts';
import { DemoBuildLoader, type LoadingDay } from './demo-build-loader.ts';
import { demoPlates } from './demo-pictures.ts';

const dayMs = 24 * 60 * 60 * 1000;

/** Days count back from the day of loading, so that the demo is always fresh. */
function loadingDay(now: Date): LoadingDay {
  const day = (daysAgo: number) => new Date(now.getTime() - daysAgo * dayMs).toISOString().slice(0, 10);
  // some evenings later than others, always the same for the same day
  const minute = (daysAgo: number) => 10 + ((daysAgo * 17) % 50);
  return { day, evening: (daysAgo) => new Date(`${day(daysAgo)}T19:${minute(daysAgo)}:00Z`) };
}

const callerOf = ({ id, handle, name, role }: Person): Caller => ({ id, handle, name, role: role ?? 'member', suspended: false });

/** Fills an empty database with people, builds, pictures and days of work, through the services that real ones go through. */
export class DemoSeeder extends Seeder {
  readonly people = demoPeople.map(({ key }) => demoAddress(key));
  readonly password: string;
  readonly #parts: Parts;

  constructor(parts: Parts) {
    super();
    this.#parts = parts;
    this.password = parts.config.demoPassword ?? nanoid(12);
  }

  async run(em: Em): Promise<void> {
    const startedAt = Date.now();
    const when = loadingDay(this.#parts.now());
    const people = await createDemoPeople(em, this.password, when.evening(200));
    await em.flush();
    const writers = { restorer: callerOf(people.restorer), crew: callerOf(people.crew) };
    const loaders = demoBuilds.map((demo) => ({ demo, loader: new DemoBuildLoader(this.#parts, demo, writers, when) }));
    for (const { loader } of loaders) await loader.start();
    await this.#takePictures(loaders.map(({ loader }) => loader));
    const days = loaders.flatMap(({ demo, loader }) => demo.entries.map((entry) => ({ entry, loader })));
    days.sort((a, b) => (b.entry.daysAgoTo ?? b.entry.daysAgo) - (a.entry.daysAgoTo ?? a.entry.daysAgo));
    for (const { entry, loader } of days) await loader.writeUp(entry);
    console.log(`Wrote up ${days.length} days in ${loaders.length} builds, ${Math.round((Date.now() - startedAt) / 1000)} s in all.`);
  }

  async #takePictures(loaders: readonly DemoBuildLoader[]): Promise<void> {
    const plates = await demoPlates();
    console.log(`Putting the demo in: ${plates.size} pictures are made first, which takes a little while.`);
    let count = 0;
    for (const loader of loaders) {
      await loader.takePictures(plates, () => {
        count += 1;
        if (count % 20 === 0) console.log(`${count} of ${plates.size} pictures made.`);
      });
    }
  }
}
