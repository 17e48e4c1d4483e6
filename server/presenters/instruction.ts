import type {
  ApprovalRule,
  Instruction,
  InstructionList,
  InstructionSummary,
} from '#shared/contracts/instruction.ts';
import { judgeInstruction } from '#shared/domain/instruction/judge-instruction.ts';
import type { Actor } from '../policies/actor.ts';
import { instructionDraftPolicy, instructionPolicy } from '../policies/instruction.ts';
import { can } from '../policies/policy.ts';
import type { InstructionGround, LoadedInstruction } from '../queries/list-instructions.ts';

const presentSummary = (
  revision: LoadedInstruction,
  { inForce }: Pick<InstructionGround, 'inForce'>,
): InstructionSummary => ({
  id: revision.id,
  number: revision.number,
  status: revision.status,
  isInForce: revision.number === inForce,
  title: revision.content.title,
  note: revision.note,
  exception: revision.exception,
  draftedBy: revision.drafter?.name ?? null,
  draftedAt: revision.createdAt.toISOString(),
  approvedBy: revision.approver?.name ?? null,
  approvedAt: revision.approvedAt?.toISOString() ?? null,
});

const mayDraft = (actor: Actor): boolean => can(instructionPolicy.draft, actor, undefined);

const approvalRule = (revision: LoadedInstruction, actor: Actor, approvers: number): ApprovalRule => {
  if (revision.draftedBy !== actor.person?.id) return 'second-person';
  return approvers > 1 ? 'own-draft' : 'exception';
};

/** Every revision as a line of the list. */
export const presentInstructionList = (
  revisions: readonly LoadedInstruction[],
  ground: InstructionGround,
  actor: Actor,
): InstructionList => ({
  revisions: revisions.map((revision) => presentSummary(revision, ground)),
  abilities: { draft: mayDraft(actor) },
});

/** One revision with its content, what is wrong with it, and what the person who asks may do with it. */
export const presentInstruction = (
  revision: LoadedInstruction,
  ground: InstructionGround,
  actor: Actor,
): Instruction => {
  const approval = approvalRule(revision, actor, ground.approvers);
  return {
    ...presentSummary(revision, ground),
    version: revision.version,
    content: revision.content,
    faults: judgeInstruction(revision.content),
    approval,
    abilities: {
      draft: mayDraft(actor),
      change: can(instructionDraftPolicy.change, actor, revision),
      drop: can(instructionDraftPolicy.drop, actor, revision),
      approve: approval !== 'own-draft' && can(instructionDraftPolicy.approve, actor, revision),
    },
  };
};
