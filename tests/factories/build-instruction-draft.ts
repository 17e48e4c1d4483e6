import type { CreationAttributes } from 'sequelize';
import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import type { WorkInstructionRevision } from '#server/models/work-instruction-revision.ts';
import type { Services } from '#server/services/services.ts';
import { buildUser } from './build-user.ts';

/** Builds a draft of the work instruction after the last revision, by an owner of its own unless told otherwise. */
export const buildInstructionDraft = async (
  services: Services,
  overrides: Partial<CreationAttributes<WorkInstructionRevision>> = {},
): Promise<WorkInstructionRevision> => {
  const { WorkInstructionRevision } = services.models;
  const last = await WorkInstructionRevision.max<number, WorkInstructionRevision>('number');
  return WorkInstructionRevision.create({
    number: last + 1,
    content: defaultInstruction,
    status: 'draft',
    approvedBy: null,
    approvedAt: null,
    ...overrides,
    draftedBy: overrides.draftedBy ?? (await buildUser(services, { roles: ['owner'] })).id,
  });
};
