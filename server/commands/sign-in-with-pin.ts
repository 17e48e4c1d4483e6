import { furnaceRoles } from '#shared/domain/people/role.ts';
import { AppError } from '../errors.ts';
import type { User } from '../models/user.ts';
import { pepperedPin, verifySecret } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';
import { tooSoon, waitAfter } from './sign-in-guard.ts';
import { tellOwners } from './tell-owners.ts';

/** Wrong PINs in a row after which only the owner opens the sign-in again. */
const lockAfter = 10;

const locked = (): AppError =>
  new AppError(
    'sign-in-locked',
    'This sign-in is locked after too many wrong PINs. The owner can open it at the desk.',
  );

const countFailure = async (user: User, now: Date): Promise<AppError> => {
  const pinFailures = user.pinFailures + 1;
  const isLocked = pinFailures >= lockAfter;
  await user.update({
    pinFailures,
    pinWaitUntil: waitAfter(pinFailures, now),
    pinLockedAt: isLocked ? now : null,
  });
  if (isLocked) return locked();
  return new AppError('wrong-sign-in', 'That PIN is not right. Try again.');
};

const tellOfLock = ({ name }: User): { readonly subject: string; readonly text: string } => ({
  subject: `Terminal sign-in of ${name} is locked`,
  text: `${lockAfter} wrong PINs in a row were typed for ${name}. If that was not ${name}, ask who stood at the terminal. You can open the sign-in again at the desk, under People.`,
});

/**
 * Signs a person in at a terminal. The row is locked while the PIN is checked, so that tries at several terminals
 * cannot slip past the count; the failure is committed before it is reported.
 */
export const signInWithPin = async (
  services: Services,
  { personId, pin }: { readonly personId: string; readonly pin: string },
): Promise<User> => {
  const { sequelize, models, secrets, now } = services;
  let lockedNow: User | null = null;
  const outcome = await sequelize.transaction(async (): Promise<User | AppError> => {
    const user = await models.User.findByPk(personId, { lock: true });
    if (!user?.active || user.pinHash === null || !user.roles.some((role) => furnaceRoles.includes(role))) {
      return new AppError('wrong-sign-in', 'This person cannot sign in at a terminal.');
    }
    if (user.pinLockedAt) return locked();
    const early = tooSoon(user.pinWaitUntil, now());
    if (early) return early;
    if (!(await verifySecret(pepperedPin(pin, secrets.pinPepper), user.pinHash))) {
      const failure = await countFailure(user, now());
      if (user.pinLockedAt) lockedNow = user;
      return failure;
    }
    return user.update({ pinFailures: 0, pinWaitUntil: null });
  });
  if (lockedNow) await tellOwners(services, tellOfLock(lockedNow));
  if (outcome instanceof AppError) throw outcome;
  return outcome;
};
