import { existsSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { readConfig } from '#server/config.ts';
import { openDatabase } from '#server/database.ts';
import { clearInterruptedDemo } from '#server/demo.ts';
import { createDemoPeople } from '#server/features/accounts/demo-people.ts';
import { createPerson } from '#server/features/accounts/people.ts';

let folder: string;
beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), 'demo-'));
  mkdirSync(join(folder, 'pictures'));
  writeFileSync(join(folder, 'demo-loading'), '');
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

async function peopleIn(more: boolean): Promise<void> {
  const orm = await openDatabase(join(folder, 'tallywright.sqlite'));
  const em = orm.em.fork();
  await createDemoPeople(em, 'four brass cleats', new Date());
  if (more) createPerson(em, { handle: 'wren', name: 'Wren', email: 'wren@people.example', passwordHash: null, role: 'member', about: '', emailConfirmedAt: null });
  await em.flush();
  await orm.close(true);
}
const left = () => [existsSync(join(folder, 'tallywright.sqlite')), existsSync(join(folder, 'pictures')), existsSync(join(folder, 'demo-loading'))];

test('a demo that was interrupted starts over in an empty folder', async () => {
  await peopleIn(false);
  await clearInterruptedDemo(readConfig({ DATA_DIR: folder }));
  expect(left()).toEqual([false, false, false]);
});

test('a folder that has become somebody\u2019s is never cleared', async () => {
  await peopleIn(true);
  await clearInterruptedDemo(readConfig({ DATA_DIR: folder }));
  expect(left()).toEqual([true, true, false]);
});

test('a site that is open to the world clears nothing', async () => {
  await peopleIn(false);
  await clearInterruptedDemo(readConfig({ DATA_DIR: folder, PUBLIC_URL: 'http://log.example' }));
  expect(left()).toEqual([true, true, false]);
});
