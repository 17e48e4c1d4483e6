import type { z } from 'zod';
import type { changePotRequest, planChargeRequest } from '#shared/contracts/charge.ts';
import type { ChargeRequest } from '#shared/domain/metal/charge-request.ts';
import { faultOfAssay } from '#shared/domain/metal/judge-lot.ts';
import { toMilligrams } from '#shared/domain/metal/ledger.ts';
import type { LotOnHand } from '#shared/domain/metal/lot.ts';
import { potRequest } from '#shared/domain/metal/pot-request.ts';
import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { fieldError } from '../errors.ts';
import type { Alloy } from '../models/alloy.ts';
import type { Services } from '../services/services.ts';
import { castingsToCharge, lotsToCharge, requestOf } from './charge-request.ts';
import type { LoadedCasting } from './load-casting.ts';
import { planCharge, type ChargeOutcome } from './plan-charge.ts';

/** A charge planned for some castings. */
export interface Proposal {
  readonly castings: readonly [LoadedCasting, ...LoadedCasting[]];
  readonly request: ChargeRequest;
  readonly outcome: ChargeOutcome;
}

/** What is left of the lots when a plan has taken its own. */
const without = (lots: readonly LotOnHand[], outcome: ChargeOutcome): readonly LotOnHand[] => {
  if (outcome.kind === 'short') return lots;
  const taken = new Map(outcome.plan.lines.map(({ lot, massMg }) => [lot.id, massMg]));
  return lots.map((lot) => ({ ...lot, balanceMg: lot.balanceMg - (taken.get(lot.id) ?? 0) }));
};

/** Plans one melt for all the castings, or one for each in their order, each from what the ones before have left. */
export const proposeCharges = async (
  services: Services,
  { castingIds, together, lossShare }: z.output<typeof planChargeRequest>,
): Promise<readonly Proposal[]> => {
  const castings = await castingsToCharge(services, castingIds);
  const melts = together ? [castings] : castings.map((casting) => [casting] as const);
  let lots = await lotsToCharge(services);
  const proposals: Proposal[] = [];
  for (const melt of melts) {
    const request = await requestOf(services, [...melt], { lots, lossShare });
    const outcome = await planCharge(request);
    lots = without(lots, outcome);
    proposals.push({ castings: [...melt], request, outcome });
  }
  return proposals;
};

/** What to add to a pot so that it becomes an alloy: from the lots on hand, with metal to buy where they do not do. */
export const proposePotChange = async (
  services: Services,
  { massG, alloyRevisionId, ...assay }: z.output<typeof changePotRequest>,
): Promise<ChargeOutcome> => {
  const fault = faultOfAssay('grain', assay);
  if (fault) throw fieldError(fault.field, fault.message);
  const revision = await services.models.AlloyRevision.findByPk(alloyRevisionId, {
    include: [{ model: services.models.Alloy, as: 'alloy' }],
  });
  if (!revision) throw fieldError('alloyRevisionId', 'There is no such alloy revision.');
  const { family } = revision.alloy as Alloy;
  return planCharge(
    potRequest({
      pot: { ...assay, massMg: toMilligrams(massG) },
      targetWt: revision.compositionWt,
      toleranceWt: revision.toleranceWt,
      markedMetal: markedMetal(family),
      markPpt: revision.fineness,
      lots: await lotsToCharge(services),
    }),
  );
};
