import { UniqueConstraintError } from 'sequelize';
import type { z } from 'zod';
import type { createAlloyRequest } from '#shared/contracts/alloy.ts';
import { AppError } from '../errors.ts';
import type { Alloy } from '../models/alloy.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { draftRevision } from './create-revision.ts';

/** Adds an alloy with its first draft revision. */
export const createAlloy = (
  services: Services,
  actor: SignedIn,
  { name, family, ...revision }: z.output<typeof createAlloyRequest>,
): Promise<Alloy> =>
  services.sequelize.transaction(async () => {
    const alloy = await insertAlloy(services, { name, family });
    await draftRevision(services, actor, alloy, 1, revision);
    return alloy;
  });

const insertAlloy = async ({ models }: Services, values: Pick<Alloy, 'name' | 'family'>): Promise<Alloy> => {
  try {
    return await models.Alloy.create(values);
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    const message = 'The studio already has an alloy of that name.';
    throw new AppError('already-exists', message, { fields: [{ path: 'name', message }] });
  }
};
