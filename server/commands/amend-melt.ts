import type { AmendMeltRequest } from '#shared/contracts/melt.ts';
import { fieldError } from '../errors.ts';
import type { Melt } from '../models/melt.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';

/** Adds a remark to a melt; the events themselves stay as they were written. */
export const amendMelt = (
  { sequelize, models }: Services,
  { person }: SignedIn,
  melt: Melt,
  { seq, note }: AmendMeltRequest,
): Promise<void> =>
  sequelize.transaction(async () => {
    if (seq !== null && (await models.MeltEvent.count({ where: { meltId: melt.id, seq } })) === 0) {
      throw fieldError('seq', 'The melt has no entry of that number.');
    }
    await models.MeltAmendment.create({ meltId: melt.id, seq, note, userId: person.id });
  });
