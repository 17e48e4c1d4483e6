import type { AlloyRevision } from '../models/alloy-revision.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { lockRevision } from './lock-revision.ts';

/** Marks a draft as checked by a person who has looked at its figures. */
export const checkRevision = (
  { sequelize, now }: Services,
  { person }: SignedIn,
  revision: AlloyRevision,
): Promise<AlloyRevision> =>
  sequelize.transaction(async () => {
    await lockRevision(revision, 'draft');
    return revision.update({ status: 'checked', checkedBy: person.id, checkedAt: now() });
  });
