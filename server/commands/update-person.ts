import { Op } from 'sequelize';
import type { z } from 'zod';
import type { updatePersonRequest } from '#shared/contracts/person.ts';
import { AppError, notFound } from '../errors.ts';
import type { User } from '../models/user.ts';
import { hashSecret, pepperedPin } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';
import { endOtherSessions } from './end-other-sessions.ts';
import { refuseTakenLogin } from './refuse-taken-login.ts';

type UpdatePerson = z.output<typeof updatePersonRequest>;

/**
 * Locks a person's row with those of all owners, in one order, so that two owners can neither remove each other at the
 * same moment nor wait for each other for ever.
 */
const lockWithOwners = async (
  { models }: Services,
  id: string,
): Promise<{ readonly user: User; readonly owners: readonly User[] }> => {
  const isOwner = { active: true, roles: { [Op.contains]: ['owner'] } };
  const locked = await models.User.findAll({
    where: { [Op.or]: [{ id }, isOwner] },
    order: ['id'],
    lock: true,
  });
  const user = locked.find((candidate) => candidate.id === id);
  if (!user) throw notFound('person');
  return { user, owners: locked.filter(({ active, roles }) => active && roles.includes('owner')) };
};

/** Refuses to take the last owner away, which would lock everyone out of the studio. */
const refuseLastOwner = (user: User, owners: readonly User[], change: UpdatePerson): void => {
  const staysOwner = (change.roles ?? user.roles).includes('owner') && (change.active ?? user.active);
  if (staysOwner || owners.length > 1 || owners[0]?.id !== user.id) return;
  throw new AppError('changed-meanwhile', 'The studio needs an owner. Make someone else an owner first.');
};

/**
 * Changes a person; what the request leaves out stays. A new password or PIN ends the person's sessions, but for the
 * one that asks for it.
 */
export const updatePerson = async (
  services: Services,
  id: string,
  request: UpdatePerson,
  askingSessionId: string,
): Promise<User> => {
  const { secrets, sequelize } = services;
  const { password, pin, ...plain } = request;
  const passwordHash = password === undefined ? undefined : await hashSecret(password);
  const pinHash = pin ? await hashSecret(pepperedPin(pin, secrets.pinPepper)) : pin;
  return sequelize.transaction(async () => {
    const { user, owners } = await lockWithOwners(services, id);
    refuseLastOwner(user, owners, request);
    if (password !== undefined || pin !== undefined) await endOtherSessions(services, id, askingSessionId);
    return refuseTakenLogin(() =>
      user.update({
        ...plain,
        ...(passwordHash === undefined ? {} : { passwordHash, passwordFailures: 0, passwordWaitUntil: null }),
        ...(pinHash === undefined ? {} : { pinHash, pinFailures: 0, pinWaitUntil: null, pinLockedAt: null }),
      }),
    );
  });
};
