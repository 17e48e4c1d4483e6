import type { CreationAttributes } from 'sequelize';
import type { User } from '#server/models/user.ts';
import { pepperedPin } from '#server/services/hashing.ts';
import type { Services } from '#server/services/services.ts';
import { cheapHash } from './cheap-hash.ts';
import { nextNumber } from './sequence.ts';

/** The password of every built user. */
export const PASSWORD = 'wax before the fire';
/** The PIN of every built user. */
export const PIN = '402817';

/** Builds a person who signs in by `PASSWORD` and `PIN`; a caster unless `roles` says otherwise. */
export const buildUser = (
  { models, secrets }: Services,
  overrides: Partial<CreationAttributes<User>> = {},
): Promise<User> => {
  const number = nextNumber();
  return models.User.create({
    name: `Person ${number}`,
    login: `person${number}`,
    roles: ['caster'],
    passwordHash: cheapHash(PASSWORD),
    pinHash: cheapHash(pepperedPin(PIN, secrets.pinPepper)),
    ...overrides,
  });
};
