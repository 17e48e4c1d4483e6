import type { z } from 'zod';
import type { createPersonRequest } from '#shared/contracts/person.ts';
import type { User } from '../models/user.ts';
import { hashSecret, pepperedPin } from '../services/hashing.ts';
import type { Services } from '../services/services.ts';
import { refuseTakenLogin } from './refuse-taken-login.ts';

/** Adds a person to the studio. */
export const createPerson = async (
  services: Services,
  request: z.output<typeof createPersonRequest>,
): Promise<User> => {
  const { models, secrets, sequelize } = services;
  const { name, login, email, roles, password, pin } = request;
  const [passwordHash, pinHash] = await Promise.all([
    hashSecret(password),
    pin === null ? null : hashSecret(pepperedPin(pin, secrets.pinPepper)),
  ]);
  return sequelize.transaction(() =>
    refuseTakenLogin(() => models.User.create({ name, login, email, roles, passwordHash, pinHash })),
  );
};
