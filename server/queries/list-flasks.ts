import { openCastingStates } from '#shared/domain/casting/casting-state.ts';
import type { Casting } from '../models/casting.ts';
import type { Flask } from '../models/flask.ts';
import type { Services } from '../services/services.ts';

/** A flask with its open casting, if it has one. */
export type ListedFlask = Flask & { readonly castings: Casting[] };

/** Every flask by its code. */
export const listFlasks = async ({ models }: Services): Promise<ListedFlask[]> => {
  const flasks = await models.Flask.findAll({
    include: [
      { model: models.Casting, as: 'castings', where: { state: [...openCastingStates] }, required: false },
    ],
    order: [['code', 'ASC']],
  });
  return flasks as ListedFlask[];
};
