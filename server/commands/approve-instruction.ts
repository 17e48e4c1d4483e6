import type { z } from 'zod';
import type { approveInstructionRequest } from '#shared/contracts/instruction.ts';
import type { FieldProblem } from '#shared/contracts/problem.ts';
import { judgeInstruction } from '#shared/domain/instruction/judge-instruction.ts';
import { AppError, fieldError } from '../errors.ts';
import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { SignedIn } from '../policies/actor.ts';
import { countApprovers } from '../queries/list-instructions.ts';
import type { Services } from '../services/services.ts';
import { lockDraft } from './lock-instructions.ts';

/** Refuses content that may not be worked by, each fault at the place of its step. */
const refuseFaults = ({ content }: WorkInstructionRevision): void => {
  const fields = judgeInstruction(content).map(({ stepKey, sentence }): FieldProblem => {
    const index = content.steps.findIndex(({ key }) => key === stepKey);
    return { path: index === -1 ? 'content.steps' : `content.steps.${index}`, message: sentence };
  });
  if (fields[0]) throw new AppError('invalid-request', fields[0].message, { fields });
};

/** A draft older than what cards are opened by would take back what was approved since. */
const refuseOvertaken = (draft: WorkInstructionRevision, all: readonly WorkInstructionRevision[]): void => {
  const newer = all.findLast(({ status, number }) => status === 'approved' && number > draft.number);
  if (newer)
    throw new AppError(
      'changed-meanwhile',
      `Revision ${newer.number} has been approved since this was drafted. Draft it again from there.`,
    );
};

/** The exception to be written beside the approval; refused where someone else could have looked. */
const exceptionOf = async (
  services: Services,
  { person }: SignedIn,
  { draftedBy }: WorkInstructionRevision,
  exception: string,
): Promise<string> => {
  if (draftedBy !== person.id) return '';
  if ((await countApprovers(services)) > 1)
    throw new AppError('not-allowed', 'Someone else has to approve what you drafted: an owner or a caster.');
  if (exception === '')
    throw fieldError('exception', 'Say why nobody else looks at it before it is worked by.');
  return exception;
};

/** Approves a draft as it was read: cards that are opened from now on are worked by it, running ones keep theirs. */
export const approveInstruction = (
  services: Services,
  actor: SignedIn,
  id: string,
  { version, exception }: z.output<typeof approveInstructionRequest>,
): Promise<WorkInstructionRevision> =>
  services.sequelize.transaction(async () => {
    const { draft, all } = await lockDraft(services, { id, version });
    refuseOvertaken(draft, all);
    refuseFaults(draft);
    return draft.update({
      status: 'approved',
      exception: await exceptionOf(services, actor, draft, exception),
      approvedBy: actor.person.id,
      approvedAt: services.now(),
    });
  });
