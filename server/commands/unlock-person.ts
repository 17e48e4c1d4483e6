import type { User } from '../models/user.ts';
import type { Services } from '../services/services.ts';

/** Opens a person's terminal sign-in again after too many wrong PINs. */
export const unlockPerson = ({ sequelize }: Services, user: User): Promise<User> =>
  sequelize.transaction(() => user.update({ pinFailures: 0, pinWaitUntil: null, pinLockedAt: null }));
