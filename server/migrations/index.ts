import type { MigrationObject } from '@mikro-orm/core';
import { Migration20261201104435_first } from './migration-20261201104435-first.ts';

/** In order. A name is its file's, the same the command line records. */
export const migrationsList: MigrationObject[] = [{ name: 'migration-20261201104435-first', class: Migration20261201104435_first }];
