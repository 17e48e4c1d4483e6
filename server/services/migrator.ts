import { readdirSync } from 'node:fs';
import { basename, join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { type QueryInterface, QueryTypes, type Sequelize } from 'sequelize';
import { type RunnableMigration, SequelizeStorage, Umzug } from 'umzug';
import type { Migration } from './migration.ts';
import { StartProblem } from './start-problem.ts';

interface MigrationFile {
  readonly up: Migration;
  readonly down: Migration;
}

const FOLDER = fileURLToPath(new URL('../migrations', import.meta.url));

/** Umzug's record of what was done. */
const TABLE = 'schema_migrations';

/** Any fixed number: whoever migrates this database holds the lock of this key meanwhile. */
const LOCK_KEY = 43_800_001;

const migrationNames = (): string[] =>
  readdirSync(FOLDER)
    .filter((file) => /^\d.*(?<!\.test)\.ts$/.test(file))
    .map((file) => basename(file, '.ts'))
    .sort();

const loadMigration = async (name: string): Promise<MigrationFile> => {
  const address = pathToFileURL(join(FOLDER, `${name}.ts`)).href;
  return (await import(/* @vite-ignore */ address)) as MigrationFile;
};

const toMigration = (name: string): RunnableMigration<QueryInterface> => ({
  name,
  up: async ({ context }) => (await loadMigration(name)).up({ context }),
  down: async ({ context }) => (await loadMigration(name)).down({ context }),
});

/** Umzug over the files of `server/migrations`, each loaded only when it is run. */
export const createMigrator = (sequelize: Sequelize): Umzug<QueryInterface> =>
  new Umzug({
    migrations: migrationNames().map(toMigration),
    context: sequelize.getQueryInterface(),
    storage: new SequelizeStorage({ sequelize, modelName: TABLE, tableName: TABLE }),
    logger: undefined,
  });

const doneMigrations = async (sequelize: Sequelize): Promise<string[]> => {
  // Asked first, for a query that fails would spoil the transaction it may be part of.
  const [table] = await sequelize.query<{ there: boolean }>(
    `SELECT to_regclass('${TABLE}') IS NOT NULL AS there`,
    { type: QueryTypes.SELECT },
  );
  if (!table?.there) return [];
  const rows = await sequelize.query<{ name: string }>(`SELECT name FROM ${TABLE} ORDER BY name`, {
    type: QueryTypes.SELECT,
  });
  return rows.map((row) => row.name);
};

/** The migrations this database still lacks, in order; it only reads. Rejects when the database does not answer. */
export const pendingMigrations = async (sequelize: Sequelize): Promise<string[]> => {
  const done = new Set(await doneMigrations(sequelize));
  return migrationNames().filter((name) => !done.has(name));
};

const refuseNewerDatabase = async (sequelize: Sequelize): Promise<void> => {
  const known = new Set(migrationNames());
  const unknown = (await doneMigrations(sequelize)).filter((name) => !known.has(name));
  if (unknown.length === 0) return;
  throw new StartProblem(
    `The database was used by a newer version of Ladlemark (it has ${unknown.join(', ')}). Start that version, or restore a backup made before it.`,
  );
};

/**
 * Brings the database up to date and gives the names of what was done. Two starters take turns: the lock is a
 * transaction's, so it ends with the connection; the pool must hold at least two.
 */
export const migrate = (sequelize: Sequelize): Promise<string[]> =>
  sequelize.transaction(async (transaction) => {
    await sequelize.query('SELECT pg_advisory_xact_lock(:key)', {
      replacements: { key: LOCK_KEY },
      transaction,
      type: QueryTypes.SELECT,
    });
    await refuseNewerDatabase(sequelize);
    const done = await createMigrator(sequelize).up();
    return done.map((migration) => migration.name);
  });
