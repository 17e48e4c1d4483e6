import { UniqueConstraintError } from 'sequelize';
import { AppError } from '../errors.ts';

/** Runs a write of a user; a sign-in name that is taken becomes an error at its field. */
export const refuseTakenLogin = async <Value>(write: () => Promise<Value>): Promise<Value> => {
  try {
    return await write();
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    const message = 'Someone already signs in by that name.';
    throw new AppError('already-exists', message, { fields: [{ path: 'login', message }] });
  }
};
