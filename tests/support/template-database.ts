import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { createDatabase } from '#server/models/database.ts';
import { initModels, type Models } from '#server/models/index.ts';
import type { Sequelize } from 'sequelize';

/** The name of the migrated, empty database that every test's own is a copy of. */
export const TEMPLATE = 'template_studio';

/** A database of one test file's own, migrated and empty. */
export interface TestDatabase {
  readonly url: string;
  readonly sequelize: Sequelize;
  readonly models: Models;
  readonly drop: () => Promise<void>;
}

/** The same server's address with another database in it. */
export const onDatabase = (url: string, database: string): string =>
  Object.assign(new URL(url), { pathname: `/${database}` }).href;

const runOn = async (url: string, statement: string): Promise<void> => {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  await client.query(statement).finally(() => client.end());
};

/** Copies the template of the test server at `url`; `template: false` gives a database with nothing in it. */
export const cloneTemplate = async (url: string, { template = true } = {}): Promise<TestDatabase> => {
  const name = `t_${randomBytes(8).toString('hex')}`;
  await runOn(url, `CREATE DATABASE ${name}${template ? ` TEMPLATE ${TEMPLATE}` : ''}`);
  const own = onDatabase(url, name);
  const sequelize = createDatabase(own);
  const drop = async (): Promise<void> => {
    await sequelize.close();
    await runOn(url, `DROP DATABASE ${name} WITH (FORCE)`);
  };
  return { url: own, sequelize, models: initModels(sequelize), drop };
};
