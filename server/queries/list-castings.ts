import { Op, type WhereOptions } from 'sequelize';
import { openCastingStates } from '#shared/domain/casting/casting-state.ts';
import { boundsOfLocalDay } from '../services/local-day.ts';
import type { Casting } from '../models/casting.ts';
import type { Services } from '../services/services.ts';
import { castingIncludes, type LoadedCasting } from './load-casting.ts';
import { loadStudio } from './load-studio.ts';

const plannedOn = async (services: Services, day: string): Promise<WhereOptions<Casting>> => {
  const { timeZone } = await loadStudio(services);
  const { from, to } = boundsOfLocalDay(day, timeZone);
  return { plannedPourAt: { [Op.gte]: from, [Op.lt]: to } };
};

/** Castings planned for a local day (`year-month-day`), or all whose flask is still in use, by the time of their pour. */
export const listCastings = async (
  services: Services,
  { on }: { readonly on?: string | undefined },
): Promise<LoadedCasting[]> => {
  const where: WhereOptions<Casting> =
    on === undefined ? { state: [...openCastingStates] } : await plannedOn(services, on);
  const castings = await services.models.Casting.findAll({
    where,
    include: castingIncludes(services.models),
    order: [['plannedPourAt', 'ASC']],
  });
  return castings as LoadedCasting[];
};
