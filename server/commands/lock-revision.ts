import type { RevisionStatus } from '#shared/contracts/alloy.ts';
import { AppError } from '../errors.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import { lockRow } from './lock-row.ts';

/** Locks a revision for a change; refused when it has moved on meanwhile. */
export const lockRevision = async (revision: AlloyRevision, expected: RevisionStatus): Promise<void> => {
  await lockRow(revision);
  if (revision.status === expected) return;
  throw new AppError('changed-meanwhile', `This revision is ${revision.status} by now. Load the page again.`);
};
