import type { Environment } from '#server/environment.ts';
import { checkDatabase } from './postgres/check-database.ts';
import { findClusterHome } from './postgres/cluster-home.ts';
import { ensurePostgres } from './postgres/postgres-binaries.ts';
import { startPrivateCluster } from './postgres/private-cluster.ts';
import type { Say } from './say.ts';

/** A database that answers, and how to give it up. */
export interface ReadyDatabase {
  readonly url: string;
  readonly release: () => Promise<void>;
}

/** Brings up the private cluster in DATA_DIR, or tries the database of DATABASE_URL, which is left as it is. */
export const prepareDatabase = async (environment: Environment, say: Say): Promise<ReadyDatabase> => {
  if (environment.databaseUrl) {
    await checkDatabase(environment.databaseUrl);
    return { url: environment.databaseUrl, release: () => Promise.resolve() };
  }
  const installed = await ensurePostgres(say);
  const home = await findClusterHome(environment.dataDir, say);
  return startPrivateCluster({ home, installed, durable: true, mayCreateDatabases: false, say });
};
