import { Op } from 'sequelize';
import { mixAssay, type Assay } from '#shared/domain/metal/lot.ts';
import type { Services } from '../services/services.ts';
import { meltIncludes, type ListedMelt } from './load-melt.ts';
import { weighedInto } from './weighed-into.ts';

/** A melt with metal in its crucible by the ledger, and what that metal is. */
export interface FilledCrucible {
  readonly melt: ListedMelt;
  readonly balanceMg: number;
  readonly assay: Assay;
}

/** Every crucible that the ledger has metal in, the oldest melt first. */
export const listCrucibles = async (services: Services): Promise<readonly FilledCrucible[]> => {
  const { models } = services;
  const crucibles = await models.Crucible.findAll({ where: { balanceMg: { [Op.gt]: 0 } } });
  const melts = (await models.Melt.findAll({
    where: { id: crucibles.map(({ meltId }) => meltId) },
    include: meltIncludes(models),
    order: [['number', 'ASC']],
  })) as ListedMelt[];
  return Promise.all(
    melts.map(async (melt) => ({
      melt,
      balanceMg: crucibles.find(({ meltId }) => meltId === melt.id)?.balanceMg ?? 0,
      assay: mixAssay(await weighedInto(services, melt.id)),
    })),
  );
};
