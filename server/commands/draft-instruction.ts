import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { lockInstructions } from './lock-instructions.ts';

/** Drafts a new revision that begins as another one stands; two drafts at once take turns. */
export const draftInstruction = (
  services: Services,
  { person }: SignedIn,
  { content }: WorkInstructionRevision,
): Promise<WorkInstructionRevision> =>
  services.sequelize.transaction(async () => {
    await lockInstructions(services);
    const { WorkInstructionRevision } = services.models;
    const last = await WorkInstructionRevision.max<number, WorkInstructionRevision>('number');
    return WorkInstructionRevision.create({
      number: last + 1,
      content,
      status: 'draft',
      draftedBy: person.id,
      createdAt: services.now(),
      approvedBy: null,
      approvedAt: null,
    });
  });
