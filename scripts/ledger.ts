/** Checks the ledger of a whole database from nothing. Usage: node --import tsx scripts/ledger.ts verify (DATA_DIR says where). Exits 1 when any figure differs. */
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { readConfig } from '#server/config.ts';
import { openDatabase } from '#server/database.ts';
import { verifyLedger } from '#server/features/entries/ledger-check.service.ts';

async function verify(file: string): Promise<number> {
  const orm = await openDatabase(file);
  try {
    const { shelves, entries, movements, differences } = await verifyLedger(orm.em.fork());
    for (const difference of differences) console.error(difference);
    console.log(`${shelves} shelves, ${entries} entries, ${movements} movements replayed: ${differences.length === 0 ? 'every figure is as stored' : `${differences.length} differences`}`);
    return differences.length === 0 ? 0 : 1;
  } finally {
    await orm.close(true);
  }
}

const file = join(readConfig(process.env).dataDir, 'tallywright.sqlite');
const [command] = process.argv.slice(2);
if (command !== 'verify') {
  console.error('Say what to do: verify');
  process.exitCode = 2;
} else if (!existsSync(file)) {
  console.error(`There is no database at ${file}.`);
  process.exitCode = 2;
} else {
  process.exitCode = await verify(file);
}
