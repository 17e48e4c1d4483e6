import type { Weighed } from '#shared/domain/metal/lot.ts';
import type { Lot } from '../models/lot.ts';
import type { Services } from '../services/services.ts';

/** What of each lot went into a melt, net, with the assays as they are known today. */
export const weighedInto = async ({ models }: Services, meltId: string): Promise<readonly Weighed[]> => {
  const movements = await models.MetalMovement.findAll({
    where: { meltId },
    include: [{ model: models.Lot, as: 'lot', required: true }],
    order: [['id', 'ASC']],
  });
  const byLot = new Map<string, { assay: Lot; massMg: number }>();
  for (const { lot, toPlace, massMg } of movements) {
    // The melt's own button came out of it.
    if (!lot || lot.meltId === meltId) continue;
    const sum = byLot.get(lot.id) ?? { assay: lot, massMg: 0 };
    sum.massMg += toPlace === 'crucible' ? massMg : -massMg;
    byLot.set(lot.id, sum);
  }
  return [...byLot.values()].filter(({ massMg }) => massMg > 0);
};
