import type { QueryInterface } from 'sequelize';

/** One direction of a migration. */
export type Migration = (parameters: { readonly context: QueryInterface }) => Promise<void>;
