import { UniqueConstraintError } from 'sequelize';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';
import { AppError } from '../errors.ts';
import type { Casting } from '../models/casting.ts';
import type { Services } from '../services/services.ts';

/** Writes a casting's new state with who and why; the caller holds the row's lock and has checked the transition. */
export const writeCastingState = async (
  { models }: Services,
  casting: Casting,
  to: CastingState,
  { userId, reason = '' }: { readonly userId: string; readonly reason?: string | undefined },
): Promise<void> => {
  await models.CastingMove.create({
    castingId: casting.id,
    fromState: casting.state,
    toState: to,
    reason,
    userId,
  });
  try {
    await casting.update({ state: to, stateReason: reason });
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    throw new AppError('wrong-state', `Its flask holds another casting by now, so it cannot become ${to}.`);
  }
};
