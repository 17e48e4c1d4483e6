import type { Health } from '#shared/contracts/health.ts';
import { pendingMigrations } from '../services/migrator.ts';
import type { Services } from '../services/services.ts';

/** Whether the database answers and its schema is current. */
export const readHealth = async ({ sequelize, logger }: Services): Promise<Health> => {
  try {
    const pending = await pendingMigrations(sequelize);
    return { ready: pending.length === 0, database: 'up', pendingMigrations: pending };
  } catch (error) {
    logger.warn('The database did not answer a health check.', { error: String(error) });
    return { ready: false, database: 'down', pendingMigrations: [] };
  }
};
