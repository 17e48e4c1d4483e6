import { literal, Op } from 'sequelize';
import { driftOfFigures, figuresOfComposition } from '#shared/domain/alloy/figures-of-composition.ts';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';
import { AppError } from '../errors.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { lockRevision } from './lock-revision.ts';

/** States in which nothing has been poured yet. */
const unpoured: CastingState[] = ['invested', 'dewaxed', 'burning-out', 'holding', 'held'];

/** Takes castings planned on a retired revision along to the new one; a card that has been opened keeps its own. */
const takePlannedAlong = async (
  { models }: Services,
  retired: readonly AlloyRevision[],
  revision: AlloyRevision,
): Promise<void> => {
  await models.Casting.update(
    { alloyRevisionId: revision.id },
    {
      where: {
        alloyRevisionId: retired.map(({ id }) => id),
        state: unpoured,
        [Op.or]: [
          { meltId: null },
          { meltId: { [Op.in]: literal('(select id from melts where over_at is not null)') } },
        ],
      },
    },
  );
};

/**
 * Approves a checked revision: freezes it with its figures, retires the one before, and takes along what was planned on
 * that and has not been opened.
 */
export const approveRevision = (
  services: Services,
  { person }: SignedIn,
  revision: AlloyRevision,
): Promise<AlloyRevision> => {
  const { sequelize, models, now } = services;
  return sequelize.transaction(async () => {
    // Two revisions of one alloy take turns, so that the later one supersedes the earlier.
    await models.Alloy.findByPk(revision.alloyId, { lock: true });
    await lockRevision(revision, 'checked');
    const drift = driftOfFigures(revision.compositionWt, revision.figures);
    if (drift.length > 0) {
      throw new AppError(
        'changed-meanwhile',
        `The figures have changed since they were checked. ${drift.join(' ')} Draft the revision again.`,
      );
    }
    const fresh = figuresOfComposition(revision.compositionWt, revision.measured);
    if (!fresh.ok) throw new AppError('alloy-not-approved', fresh.error);
    const retired = await models.AlloyRevision.findAll({
      where: { alloyId: revision.alloyId, status: 'approved' },
    });
    for (const before of retired) await before.update({ status: 'superseded' });
    await revision.update({ ...fresh.value, status: 'approved', approvedBy: person.id, approvedAt: now() });
    await takePlannedAlong(services, retired, revision);
    return revision;
  });
};
