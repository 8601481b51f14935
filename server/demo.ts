import { existsSync } from 'node:fs';
import { rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { Config } from './config.ts';
import { openDatabase } from './database.ts';
import { Person } from './entities/index.ts';
import { demoAddress, demoPeople } from './features/accounts/demo-people.ts';
import type { Parts } from './http/context.ts';
import { DemoSeeder } from './seeders/demo-seeder.ts';

const markerOf = (config: Config) => join(config.dataDir, 'demo-loading');

async function holdsMoreThanTheDemo(file: string): Promise<boolean> {
  if (!existsSync(file)) return false;
  const orm = await openDatabase(file);
  try {
    return (await orm.em.fork().count(Person, { email: { $nin: demoPeople.map(({ key }) => demoAddress(key)) } })) > 0;
  } finally {
    await orm.close(true);
  }
}

/**
 * Clears a data folder whose demo was interrupted half-way, so that it starts over.
 * A folder that has become somebody's in the meantime is left as it is.
 */
export async function clearInterruptedDemo(config: Config): Promise<void> {
  if (!existsSync(markerOf(config))) return;
  const database = join(config.dataDir, 'tallywright.sqlite');
  if (config.local && !(await holdsMoreThanTheDemo(database))) {
    console.log('The demo was interrupted while it went in; it starts over.');
    const leftovers = [database, `${database}-wal`, `${database}-shm`, join(config.dataDir, 'pictures'), join(config.dataDir, 'quarantine')];
    for (const path of leftovers) await rm(path, { recursive: true, force: true });
  }
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
