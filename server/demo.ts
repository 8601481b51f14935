import { DemoSeeder } from './seeders/demo-seeder.ts';
import { Person } from './entities/index.ts';
import type { Parts } from './http/context.ts';

/** Puts the demo into an empty database, and says who its people are. Runs only on loopback. */
export async function loadDemo(parts: Parts): Promise<void> {
  if ((await parts.orm.em.fork().count(Person)) > 0) return;
  const seeder = new DemoSeeder(parts);
  await seeder.run(parts.orm.em.fork());
  console.log(`The demo is in. Sign in as ${seeder.people.join(', ')}\nwith the password ${seeder.password}`);
}
