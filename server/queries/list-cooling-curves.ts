import type { CoolingCurve } from '../models/cooling-curve.ts';
import type { Instrument } from '../models/instrument.ts';
import type { User } from '../models/user.ts';
import type { Services } from '../services/services.ts';

/** A cooling curve with who handed it in and what logged it. */
export type LoadedCurve = CoolingCurve & { readonly user: User; readonly instrument: Instrument | null };

/** The cooling curves of a melt, oldest first. */
export const listCoolingCurves = async ({ models }: Services, meltId: string): Promise<LoadedCurve[]> => {
  const curves = await models.CoolingCurve.findAll({
    where: { meltId },
    include: [
      { model: models.User, as: 'user' },
      { model: models.Instrument, as: 'instrument' },
    ],
    order: [['id', 'ASC']],
  });
  return curves as LoadedCurve[];
};
