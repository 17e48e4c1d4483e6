import { join } from 'node:path';
import pg from 'pg';
import { createDatabase } from '#server/models/database.ts';
import { migrate } from '#server/services/migrator.ts';
import { findClusterHome } from '#server/services/postgres/cluster-home.ts';
import { ensurePostgres } from '#server/services/postgres/postgres-binaries.ts';
import { startPrivateCluster } from '#server/services/postgres/private-cluster.ts';
import type { Say } from '#server/services/say.ts';
import { makePassableFolder } from './scratch-folder.ts';
import { startSweeper } from './sweeper.ts';
import { onDatabase, TEMPLATE } from './template-database.ts';

/** A throw-away PostgreSQL with a migrated template in it. */
export interface TestCluster {
  readonly url: string;
  readonly stop: () => Promise<void>;
}

const makeTemplate = async (url: string): Promise<void> => {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  await client.query(`CREATE DATABASE ${TEMPLATE}`);
  await client.end();
  const sequelize = createDatabase(onDatabase(url, TEMPLATE), { poolMax: 2 });
  await migrate(sequelize);
  await sequelize.close();
};

/** Starts it in a temporary folder, as the product would but without waiting for the disk. */
export const startTestCluster = async (say: Say): Promise<TestCluster> => {
  const folder = makePassableFolder();
  const home = await findClusterHome(join(folder, 'data'), say);
  const sweep = startSweeper([folder, home.path]);
  try {
    const installed = await ensurePostgres(say);
    const quiet = (): void => {};
    const options = { home, installed, durable: false, mayCreateDatabases: true, say: quiet };
    const cluster = await startPrivateCluster(options);
    await makeTemplate(cluster.url);
    const stop = async (): Promise<void> => {
      await cluster.release();
      await sweep();
    };
    return { url: cluster.url, stop };
  } catch (error) {
    await sweep();
    throw error;
  }
};
