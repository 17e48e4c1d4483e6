import type { Model } from 'sequelize';

/** Reads a record afresh and locks its row until the transaction ends; what was loaded beside it is dropped. */
export const lockRow = async (record: Model): Promise<void> => {
  // PostgreSQL refuses to lock a row through the outer joins a record may have been loaded with.
  await record.reload({ lock: true, include: [] });
};
