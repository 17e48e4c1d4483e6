import { fn, col, where } from 'sequelize';
import { AppError } from '../errors.ts';
import type { User } from '../models/user.ts';
import { hashSecret, verifySecret } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';
import { tooSoon, waitAfter } from './sign-in-guard.ts';

const wrong = (): AppError =>
  new AppError('wrong-sign-in', 'Name and password do not belong together. Try again.');

/** A hash to check against when nobody has that name, so that both answers take as long. */
let nobodysHash: Promise<string> | null = null;

/** Signs a person in at the desk by name and password; an unknown name answers as a wrong password does. */
export const signInWithPassword = async (
  { sequelize, models, now }: Services,
  { login, password }: { readonly login: string; readonly password: string },
): Promise<User> => {
  const outcome = await sequelize.transaction(async (): Promise<User | AppError> => {
    const user = await models.User.findOne({
      where: where(fn('lower', col('login')), fn('lower', login)),
      lock: true,
    });
    if (!user?.active) {
      nobodysHash ??= hashSecret('nobody');
      await verifySecret(password, await nobodysHash);
      return wrong();
    }
    const early = tooSoon(user.passwordWaitUntil, now());
    if (early) return early;
    if (await verifySecret(password, user.passwordHash))
      return user.update({ passwordFailures: 0, passwordWaitUntil: null });
    const passwordFailures = user.passwordFailures + 1;
    await user.update({ passwordFailures, passwordWaitUntil: waitAfter(passwordFailures, now()) });
    return wrong();
  });
  if (outcome instanceof AppError) throw outcome;
  return outcome;
};
