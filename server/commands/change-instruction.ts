import type { z } from 'zod';
import type { changeInstructionRequest } from '#shared/contracts/instruction.ts';
import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { lockDraft } from './lock-instructions.ts';

/** Changes a draft as it was read; whoever changed it last is its drafter, so that someone else has to approve it. */
export const changeInstruction = (
  services: Services,
  { person }: SignedIn,
  id: string,
  { version, content, note }: z.output<typeof changeInstructionRequest>,
): Promise<WorkInstructionRevision> =>
  services.sequelize.transaction(async () => {
    const { draft } = await lockDraft(services, { id, version });
    return draft.update({ content, note, version: version + 1, draftedBy: person.id });
  });
