import { Sequelize } from 'sequelize';
import { bindTransactions } from './transactions.ts';

bindTransactions();

/** Opens a pool on the PostgreSQL database at `url`; `poolMax` connections at most. */
export const createDatabase = (
  url: string,
  { poolMax = 10 }: { readonly poolMax?: number } = {},
): Sequelize =>
  new Sequelize(url, {
    dialect: 'postgres',
    logging: false,
    define: { underscored: true },
    pool: { max: poolMax, acquire: 20_000, idle: 10_000 },
  });
