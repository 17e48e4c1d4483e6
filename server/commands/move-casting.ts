import type { z } from 'zod';
import type { moveCastingRequest } from '#shared/contracts/casting.ts';
import { castingStatesByHand, describeCastingState } from '#shared/domain/casting/casting-state.ts';
import { AppError } from '../errors.ts';
import type { Casting } from '../models/casting.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { lockRow } from './lock-row.ts';
import { writeCastingState } from './write-casting-state.ts';

/** Moves a casting along its life by hand; what the pour card records itself is refused here. */
export const moveCasting = (
  services: Services,
  { person }: SignedIn,
  casting: Casting,
  { to, reason }: z.output<typeof moveCastingRequest>,
): Promise<void> =>
  services.sequelize.transaction(async () => {
    await lockRow(casting);
    if (!castingStatesByHand(casting.state).includes(to)) {
      throw new AppError(
        'wrong-state',
        `The casting is ${describeCastingState(casting.state)}; it cannot become ${to} from there by hand.`,
      );
    }
    await refuseWhileCardRuns(services, casting);
    await writeCastingState(services, casting, to, { userId: person.id, reason });
  });

const refuseWhileCardRuns = async ({ models }: Services, { meltId }: Casting): Promise<void> => {
  const melt = meltId === null ? null : await models.Melt.findByPk(meltId);
  if (!melt || melt.overAt) return;
  throw new AppError(
    'wrong-state',
    'Its pour card is open at a terminal. Close or end the card there first.',
  );
};
