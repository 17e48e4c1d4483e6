import { Op } from 'sequelize';
import type { ChargePlan } from '../models/charge-plan.ts';
import type { User } from '../models/user.ts';
import type { Services } from '../services/services.ts';

/** A kept charge plan with who made it. */
export type LoadedChargePlan = ChargePlan & { readonly user: User };

/** The newest plan for a casting, or null. */
export const loadChargePlan = async (
  { models }: Services,
  castingId: string,
): Promise<LoadedChargePlan | null> => {
  const plan = await models.ChargePlan.findOne({
    where: { castingIds: { [Op.contains]: [castingId] } },
    include: [{ model: models.User, as: 'user' }],
    order: [['id', 'DESC']],
  });
  return plan as LoadedChargePlan | null;
};
