import { Op } from 'sequelize';
import type { Services } from '../services/services.ts';
import { meltIncludes, type ListedMelt } from './load-melt.ts';

/** A page of the melt book, newest first, and the number the next page begins before. */
export const listMelts = async (
  { models }: Services,
  { before, limit }: { readonly before?: number | undefined; readonly limit: number },
): Promise<{ readonly melts: ListedMelt[]; readonly next: number | null }> => {
  const found = (await models.Melt.findAll({
    where: before === undefined ? {} : { number: { [Op.lt]: before } },
    include: meltIncludes(models),
    order: [['number', 'DESC']],
    limit: limit + 1,
  })) as ListedMelt[];
  const melts = found.slice(0, limit);
  return { melts, next: found.length > limit ? (melts.at(-1)?.number ?? null) : null };
};
