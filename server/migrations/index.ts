import type { MigrationObject } from '@mikro-orm/core';
import { Migration20261201103533_first } from './migration-20261201103533-first.ts';

/** In order. A name is its file's, the same the command line records. */
export const migrationsList: MigrationObject[] = [{ name: 'migration-20261201103533-first', class: Migration20261201103533_first }];
