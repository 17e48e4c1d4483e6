import type { Countersign } from '#shared/contracts/lot.ts';
import { AppError, fieldError } from '../errors.ts';
import type { User } from '../models/user.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { signInWithPassword } from './sign-in-with-password.ts';
import { signInWithPin } from './sign-in-with-pin.ts';

const verify = (services: Services, sign: Countersign): Promise<User> =>
  'pin' in sign ? signInWithPin(services, sign) : signInWithPassword(services, sign);

/**
 * The second person who signs, by the same rules as a sign-in (tries are counted and slowed down): someone else than the
 * first, an owner or a caster. It is done before the act's own transaction, so that a wrong try is counted whatever follows.
 */
export const verifyCountersign = async (
  services: Services,
  { person }: SignedIn,
  sign: Countersign,
): Promise<User> => {
  const user = await verify(services, sign).catch((error: unknown) => {
    // A wrong password here must not look as if the first person's own sign-in had ended.
    if (error instanceof AppError && error.id === 'wrong-sign-in')
      throw fieldError('countersign', error.message);
    throw error;
  });
  if (user.id === person.id) throw fieldError('countersign', 'Someone else has to sign, not you yourself.');
  if (!user.roles.some((role) => role === 'owner' || role === 'caster'))
    throw fieldError('countersign', 'An owner or a caster has to sign.');
  return user;
};
