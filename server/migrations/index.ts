import type { MigrationObject } from '@mikro-orm/core';

/** In order. A name is its file's, the same the command line records. */
export const migrationsList: MigrationObject[] = [];
