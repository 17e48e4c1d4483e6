import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { Services } from '../services/services.ts';
import { lockDraft, type DraftAsRead } from './lock-instructions.ts';

/** Drops a draft as it was read: it stays in the list, and nobody works by it. */
export const dropInstruction = (services: Services, read: DraftAsRead): Promise<WorkInstructionRevision> =>
  services.sequelize.transaction(async () => {
    const { draft } = await lockDraft(services, read);
    return draft.update({ status: 'dropped' });
  });
