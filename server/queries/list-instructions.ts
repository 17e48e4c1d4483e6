import { Op } from 'sequelize';
import { notFound } from '../errors.ts';
import type { Models } from '../models/index.ts';
import type { User } from '../models/user.ts';
import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { Services } from '../services/services.ts';

/** A revision of the work instruction with who drafted and approved it. */
export type LoadedInstruction = WorkInstructionRevision & {
  readonly drafter: User | null;
  readonly approver: User | null;
};

/** What a revision is seen against. */
export interface InstructionGround {
  /** The number of the revision that cards are opened by; null before the first. */
  readonly inForce: number | null;
  /** How many people could approve one: owners and casters who work here. */
  readonly approvers: number;
}

const people = ({ User }: Models) => [
  { model: User, as: 'drafter' },
  { model: User, as: 'approver' },
];

/** Every revision, newest first. */
export const listInstructions = async ({ models }: Services): Promise<LoadedInstruction[]> => {
  const revisions = await models.WorkInstructionRevision.findAll({
    include: people(models),
    order: [['number', 'DESC']],
  });
  return revisions as LoadedInstruction[];
};

/** One revision. */
export const loadInstructionRevision = async (
  { models }: Services,
  id: string,
): Promise<LoadedInstruction> => {
  const revision = await models.WorkInstructionRevision.findByPk(id, { include: people(models) });
  if (!revision) throw notFound('work instruction');
  return revision as LoadedInstruction;
};

/** How many people who work here could approve a revision. */
export const countApprovers = ({ models }: Services): Promise<number> =>
  models.User.count({ where: { active: true, roles: { [Op.overlap]: ['owner', 'caster'] } } });

/** What every revision is seen against. */
export const loadInstructionGround = async (services: Services): Promise<InstructionGround> => {
  const { WorkInstructionRevision } = services.models;
  const inForce = await WorkInstructionRevision.max<number | null, WorkInstructionRevision>('number', {
    where: { status: 'approved' },
  });
  return { inForce, approvers: await countApprovers(services) };
};
