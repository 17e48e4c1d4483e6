import type { Migration } from '../services/migration.ts';

export const up: Migration = async ({ context }) => {
  await context.sequelize.query('alter table users add column email text');
};

export const down: Migration = async ({ context }) => {
  await context.sequelize.query('alter table users drop column email');
};
