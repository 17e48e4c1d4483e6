import { toMilligrams } from '#shared/domain/metal/ledger.ts';
import { AppError } from '../errors.ts';
import type { Melt } from '../models/melt.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { closeOut } from './close-out.ts';
import { lockRow } from './lock-row.ts';

/** Empties the crucible of a melt whose card has ended with metal in it: an abandoned melt that was let freeze, say. */
export const closeOutMelt = (
  services: Services,
  { person }: SignedIn,
  melt: Melt,
  outcome: { readonly buttonG: number; readonly lossG: number; readonly note: string },
): Promise<void> =>
  services.sequelize.transaction(async () => {
    await lockRow(melt);
    if (melt.overAt === null)
      throw new AppError('wrong-state', `The card of ${melt.code} is open: close it at its terminal.`);
    const crucible = await services.models.Crucible.findByPk(melt.id);
    if (!crucible || crucible.balanceMg === 0)
      throw new AppError(
        'wrong-state',
        `By the ledger there is no metal left in the crucible of ${melt.code}.`,
      );
    await closeOut(services, { person, terminal: null, via: 'desk' }, melt, {
      buttonMg: toMilligrams(outcome.buttonG),
      lossMg: toMilligrams(outcome.lossG),
      reason: outcome.note,
      occurredAt: services.now(),
    });
  });
