import { driftOfFigures, figuresOfComposition } from '#shared/domain/alloy/figures-of-composition.ts';
import { AppError } from '../errors.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { lockRevision } from './lock-revision.ts';

/** Approves a checked revision: freezes it with its figures and retires the one before. */
export const approveRevision = (
  { sequelize, models, now }: Services,
  { person }: SignedIn,
  revision: AlloyRevision,
): Promise<AlloyRevision> =>
  sequelize.transaction(async () => {
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
    await models.AlloyRevision.update(
      { status: 'superseded' },
      { where: { alloyId: revision.alloyId, status: 'approved' } },
    );
    return revision.update({ ...fresh.value, status: 'approved', approvedBy: person.id, approvedAt: now() });
  });
