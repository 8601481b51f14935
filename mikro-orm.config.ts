import { SeedManager } from '@mikro-orm/seeder';
import { Migrator } from '@mikro-orm/migrations';
import { defineConfig, SqliteKnexDialect } from '@mikro-orm/sqlite';
import * as sqlite3Module from 'sqlite3';
import { entities } from '#server/entities/index.ts';
import { migrationsList } from '#server/migrations/index.ts';

// Pragmas belong to a connection, so they run as the pool makes it.
interface RawConnection { exec(sql: string, done: (error: Error | null) => void): void }
const pragmas = `
  PRAGMA journal_mode = WAL;
  PRAGMA synchronous = NORMAL;
  PRAGMA foreign_keys = ON;
  PRAGMA busy_timeout = 5000;
  PRAGMA temp_store = MEMORY;
  PRAGMA cache_size = -16000;
`;

// The driver is chosen here and nowhere else. `sqlite3` is an alias of a package that carries its binaries; it is an
// ES module, so knex's own require() would get a namespace without the OPEN_* constants: it is handed the default export.
const sqlite3 = (sqlite3Module as unknown as { default: unknown }).default;
class SqliteDialect extends SqliteKnexDialect {
  _driver() {
    return sqlite3;
  }
}

export function databaseConfig(dbName: string) {
  return defineConfig({
    dbName,
    entities,
    extensions: [Migrator, SeedManager],
    discovery: { disableDynamicFileAccess: true },
    metadataCache: { enabled: false },
    forceUtcTimezone: true,
    driverOptions: { client: SqliteDialect },
    // One connection: with more, a deferred transaction cannot upgrade a stale snapshot and fails at once.
    pool: {
      min: 1, max: 1,
      afterCreate: (connection: RawConnection, done: (error: Error | null, connection: RawConnection) => void) =>
        connection.exec(pragmas, (error) => done(error, connection)),
    },
    migrations: {
      path: 'server/migrations',
      migrationsList,
      // a snapshot would be rewritten from the live schema at every start, in the source tree
      snapshot: false,
      emit: 'ts',
      silent: true,
      fileName: (timestamp, name) => `migration-${timestamp}${name ? `-${name}` : ''}`,
    },
    seeder: { path: 'server/seeders', defaultSeeder: 'DemoSeeder' },
  });
}

export default databaseConfig(process.env['TALLYWRIGHT_DATABASE'] ?? 'data/tallywright.sqlite');
