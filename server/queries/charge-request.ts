import { Op } from 'sequelize';
import type { ChargeRequest } from '#shared/domain/metal/charge-request.ts';
import { toMilligrams } from '#shared/domain/metal/ledger.ts';
import type { LotOnHand } from '#shared/domain/metal/lot.ts';
import { AppError, fieldError } from '../errors.ts';
import type { Lot } from '../models/lot.ts';
import type { Services } from '../services/services.ts';
import { chargeAlloyOf } from './card-context.ts';
import { castingIncludes, type LoadedCasting } from './load-casting.ts';
import { loadStudio } from './load-studio.ts';

/** A lot as a charge is planned with it. */
export const lotOnHand = ({
  id,
  code,
  name,
  kind,
  compositionWt,
  toleranceWt,
  balanceMg,
  receivedAt,
}: Lot): LotOnHand => ({
  id,
  code,
  name,
  kind,
  compositionWt,
  toleranceWt,
  balanceMg,
  receivedAt: receivedAt.toISOString(),
});

/** Every lot that may be charged: on hand, not scrap, not in quarantine; the oldest first. */
export const lotsToCharge = async ({ models }: Services): Promise<readonly LotOnHand[]> => {
  const lots = await models.Lot.findAll({
    where: { balanceMg: { [Op.gt]: 0 }, quarantineReason: null, kind: { [Op.ne]: 'scrap' } },
    order: [
      ['receivedAt', 'ASC'],
      ['number', 'ASC'],
    ],
  });
  return lots.map(lotOnHand);
};

/** Castings by their ids, in the order asked for; refused at the field when one is not there. */
export const castingsToCharge = async (
  { models }: Services,
  ids: readonly string[],
): Promise<readonly [LoadedCasting, ...LoadedCasting[]]> => {
  const found = (await models.Casting.findAll({
    where: { id: [...ids] },
    include: castingIncludes(models),
  })) as LoadedCasting[];
  const [first, ...others] = ids.map((id) => {
    const casting = found.find((each) => each.id === id);
    if (!casting) throw fieldError('castingIds', 'One of these castings is not there any more.');
    return casting;
  });
  if (!first) throw fieldError('castingIds', 'Choose at least one casting.');
  return [first, ...others];
};

const refuseMixed = ([first, ...others]: readonly [LoadedCasting, ...LoadedCasting[]]): void => {
  if (others.every(({ alloyRevisionId }) => alloyRevisionId === first.alloyRevisionId)) return;
  throw new AppError('charge-refused', 'These castings are of different alloys: one melt cannot pour them.');
};

/** The request for a charge that is one melt of these castings, from these lots. */
export const requestOf = async (
  services: Services,
  castings: readonly [LoadedCasting, ...LoadedCasting[]],
  { lots, lossShare }: { readonly lots: readonly LotOnHand[]; readonly lossShare: number },
): Promise<ChargeRequest> => {
  refuseMixed(castings);
  const { compositionWt, ...alloy } = chargeAlloyOf(castings[0].alloyRevision);
  const { limits } = await loadStudio(services);
  const metalG = castings.reduce((sum, { plannedMetalG }) => sum + plannedMetalG, 0);
  return {
    ...alloy,
    targetWt: compositionWt,
    wantedMg: toMilligrams(metalG / (1 - lossShare)),
    returnsShare: limits.returnsShare,
    lots,
  };
};
