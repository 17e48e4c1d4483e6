import { Transaction } from 'sequelize';
import { AppError, notFound } from '../errors.ts';
import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { Services } from '../services/services.ts';

/** Locks every revision of the work instruction, so that those who draft and approve take turns; cards open meanwhile. */
export const lockInstructions = ({ models }: Services): Promise<WorkInstructionRevision[]> =>
  models.WorkInstructionRevision.findAll({
    order: [['number', 'ASC']],
    lock: Transaction.LOCK.NO_KEY_UPDATE,
  });

/** What is asked of a draft that is to be changed: the version that was read. */
export interface DraftAsRead {
  readonly id: string;
  readonly version: number;
}

/** Locks a draft for a change; refused when it has been approved, dropped or changed since it was read. */
export const lockDraft = async (
  services: Services,
  { id, version }: DraftAsRead,
): Promise<{ readonly draft: WorkInstructionRevision; readonly all: readonly WorkInstructionRevision[] }> => {
  const all = await lockInstructions(services);
  const draft = all.find((revision) => revision.id === id);
  if (!draft) throw notFound('work instruction');
  if (draft.status !== 'draft')
    throw new AppError('changed-meanwhile', `This revision is ${draft.status} by now. Load the page again.`);
  if (draft.version !== version)
    throw new AppError('changed-meanwhile', 'This draft was changed meanwhile. Load it again.');
  return { draft, all };
};
