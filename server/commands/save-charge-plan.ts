import type { z } from 'zod';
import type { savePlanRequest } from '#shared/contracts/charge.ts';
import { faultsOf, summarise } from '#shared/domain/metal/charge-plan.ts';
import type { ChargeLine } from '#shared/domain/metal/charge-request.ts';
import { toMilligrams } from '#shared/domain/metal/ledger.ts';
import type { LotOnHand } from '#shared/domain/metal/lot.ts';
import { AppError, fieldError } from '../errors.ts';
import type { ChargePlan } from '../models/charge-plan.ts';
import type { SignedIn } from '../policies/actor.ts';
import { castingsToCharge, lotsToCharge, requestOf } from '../queries/charge-request.ts';
import type { Services } from '../services/services.ts';

type SavePlan = z.output<typeof savePlanRequest>;

const linesOf = (lots: readonly LotOnHand[], { lines }: SavePlan): readonly ChargeLine[] =>
  lines.map(({ lotId, massG }, index) => {
    const lot = lots.find(({ id }) => id === lotId);
    if (!lot) throw fieldError(`lines.${index}.lotId`, 'This lot is used up, in quarantine or scrap by now.');
    return { lot, massMg: toMilligrams(massG) };
  });

const refuseTwice = ({ lines }: SavePlan): void => {
  if (new Set(lines.map(({ lotId }) => lotId)).size < lines.length)
    throw fieldError('lines', 'A lot stands in the plan twice: put its masses together.');
};

/** Keeps a charge plan for castings poured from one melt, after checking every limit again; the newest plan counts. */
export const saveChargePlan = (
  services: Services,
  { person }: SignedIn,
  request: SavePlan,
): Promise<ChargePlan> =>
  services.sequelize.transaction(async () => {
    refuseTwice(request);
    const castings = await castingsToCharge(services, request.castingIds);
    const lots = await lotsToCharge(services);
    const charge = await requestOf(services, castings, { lots, lossShare: request.lossShare });
    const lines = linesOf(lots, request);
    const plan = summarise(lines, charge.markedMetal);
    const faults = faultsOf(plan, charge);
    if (faults.length > 0) throw new AppError('charge-refused', faults.join(' '));
    return services.models.ChargePlan.create({
      castingIds: [...request.castingIds],
      alloyRevisionId: castings[0].alloyRevisionId,
      wantedMg: charge.wantedMg,
      lines: lines.map(({ lot: { id, code, name, kind }, massMg }) => ({
        lotId: id,
        code,
        name,
        kind,
        massMg,
      })),
      expectedPpt: plan.expectedPpt,
      worstPpt: plan.worstPpt,
      returnsShare: plan.returnsShare,
      userId: person.id,
      createdAt: services.now(),
    });
  });
