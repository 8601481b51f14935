import { existsSync } from 'node:fs';
import { rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { Config } from './config.ts';
import { Person } from './entities/index.ts';
import type { Parts } from './http/context.ts';
import { DemoSeeder } from './seeders/demo-seeder.ts';

const markerOf = (config: Config) => join(config.dataDir, 'demo-loading');

/** Clears a data folder whose demo was interrupted half-way: it was empty before, so nothing of anybody's is lost but what was typed meanwhile. */
export async function clearInterruptedDemo(config: Config): Promise<void> {
  if (!existsSync(markerOf(config))) return;
  console.log('The demo was interrupted while it went in; it starts over.');
  const leftovers = ['tallywright.sqlite', 'tallywright.sqlite-wal', 'tallywright.sqlite-shm', 'pictures', 'quarantine'];
  for (const name of leftovers) await rm(join(config.dataDir, name), { recursive: true, force: true });
  await rm(markerOf(config));
}

/** Puts the demo into an empty database, and says who its people are. Runs only on loopback. */
export async function loadDemo(parts: Parts): Promise<void> {
  if ((await parts.orm.em.fork().count(Person)) > 0) return;
  await writeFile(markerOf(parts.config), '');
  const seeder = new DemoSeeder(parts);
  await seeder.run(parts.orm.em.fork());
  await rm(markerOf(parts.config));
  console.log(`The demo is in. Sign in as ${seeder.people.join(', ')}\nwith the password ${seeder.password}`);
}
