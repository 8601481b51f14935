import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { openDatabase } from '#server/database.ts';

declare module 'vitest' {
  export interface ProvidedContext {
    /** A migrated, empty database file, to be copied and never opened. */
    templateDatabase: string;
  }
}

/** Migrates one database file, which every test file starts from a copy of. */
export async function setup(project: TestProject): Promise<() => Promise<void>> {
  const folder = await mkdtemp(join(tmpdir(), 'template-database-'));
  const file = join(folder, 'template.sqlite');
  const orm = await openDatabase(file);
  // Closing writes the journal back, so that the one file is all of it.
  await orm.close(true);
  project.provide('templateDatabase', file);
  return () => rm(folder, { recursive: true, force: true });
}
