import { MikroORM } from '@mikro-orm/sqlite';
import { databaseConfig } from '../mikro-orm.config.ts';

export type Orm = MikroORM;

/** Opens the database in the data folder and brings it up to the schema of today. */
export async function openDatabase(file: string): Promise<Orm> {
  const orm = await MikroORM.init(databaseConfig(file));
  await orm.getMigrator().up();
  return orm;
}
