import { Op } from 'sequelize';
import type { z } from 'zod';
import type { updatePersonRequest } from '#shared/contracts/person.ts';
import { AppError, notFound } from '../errors.ts';
import type { User } from '../models/user.ts';
import { hashSecret, pepperedPin } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';
import { refuseTakenLogin } from './refuse-taken-login.ts';

type UpdatePerson = z.output<typeof updatePersonRequest>;

/** Refuses to take the last owner away, which would lock everyone out of the studio. */
const refuseLastOwner = async ({ models }: Services, user: User, change: UpdatePerson): Promise<void> => {
  const staysOwner = (change.roles ?? user.roles).includes('owner') && (change.active ?? user.active);
  if (staysOwner || !user.roles.includes('owner')) return;
  // All owners are locked in one order, so that two owners cannot remove each other at the same moment.
  const owners = await models.User.findAll({
    where: { active: true, roles: { [Op.contains]: ['owner'] } },
    order: ['id'],
    lock: true,
  });
  if (owners.some(({ id }) => id !== user.id)) return;
  throw new AppError('changed-meanwhile', 'The studio needs an owner. Make someone else an owner first.');
};

/** Changes a person; what the request leaves out stays. */
export const updatePerson = async (services: Services, id: string, request: UpdatePerson): Promise<User> => {
  const { models, secrets, sequelize } = services;
  const { password, pin, ...plain } = request;
  const passwordHash = password === undefined ? undefined : await hashSecret(password);
  const pinHash = pin ? await hashSecret(pepperedPin(pin, secrets.pinPepper)) : pin;
  return sequelize.transaction(async () => {
    await refuseLastOwner(services, (await models.User.findByPk(id)) ?? refuseMissing(), request);
    const user = (await models.User.findByPk(id, { lock: true })) ?? refuseMissing();
    return refuseTakenLogin(() =>
      user.update({
        ...plain,
        ...(passwordHash === undefined ? {} : { passwordHash, passwordFailures: 0, passwordWaitUntil: null }),
        ...(pinHash === undefined ? {} : { pinHash, pinFailures: 0, pinWaitUntil: null, pinLockedAt: null }),
      }),
    );
  });
};

const refuseMissing = (): never => {
  throw notFound('person');
};
