import pg from 'pg';
import { Sequelize } from 'sequelize';
import { bindTransactions } from './transactions.ts';

bindTransactions();

/**
 * A connection that may break as soon as it stands: Sequelize listens for that a moment too late, and a break that
 * nobody listens for would end the process.
 */
class HeardClient extends pg.Client {
  constructor(config?: pg.ClientConfig) {
    super(config);
    this.on('error', () => {});
  }
}

/** Opens a pool on the PostgreSQL database at `url`; `poolMax` connections at most. */
export const createDatabase = (
  url: string,
  { poolMax = 10 }: { readonly poolMax?: number } = {},
): Sequelize =>
  new Sequelize(url, {
    dialect: 'postgres',
    dialectModule: { ...pg, Client: HeardClient },
    logging: false,
    define: { underscored: true },
    pool: { max: poolMax, acquire: 20_000, idle: 10_000 },
  });
