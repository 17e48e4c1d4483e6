import { AppError } from '../errors.ts';
import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { Services } from '../services/services.ts';

/** The newest approved work instruction. */
export const loadInstruction = async ({ models }: Services): Promise<WorkInstructionRevision> => {
  const instruction = await models.WorkInstructionRevision.findOne({
    where: { status: 'approved' },
    order: [['number', 'DESC']],
  });
  if (!instruction) throw new AppError('not-ready', 'The studio has no work instruction yet.');
  return instruction;
};
