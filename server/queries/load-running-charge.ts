import { summarise, type ChargePlan } from '#shared/domain/metal/charge-plan.ts';
import {
  leastWeighingMg,
  massOfLines,
  type ChargeLine,
  type ChargeRequest,
} from '#shared/domain/metal/charge-request.ts';
import { toMilligrams } from '#shared/domain/metal/ledger.ts';
import type { LotOnHand } from '#shared/domain/metal/lot.ts';
import { chargedG, type CardContext } from '#shared/domain/pour-card/card-state.ts';
import { AppError } from '../errors.ts';
import type { Melt } from '../models/melt.ts';
import type { Services } from '../services/services.ts';
import { lotOnHand, lotsToCharge } from './charge-request.ts';
import { loadChargePlan } from './load-charge-plan.ts';
import { planCharge, type ChargeOutcome } from './plan-charge.ts';

/** Where the charge of a running card stands, and what is still to be weighed in. */
export interface RunningCharge {
  readonly weighed: ChargePlan;
  readonly context: CardContext;
  readonly remainder: ChargeOutcome;
}

const weighedLines = async ({ models }: Services, { state }: Melt): Promise<readonly ChargeLine[]> => {
  const charged = state.lots ?? [];
  const lots = await models.Lot.findAll({ where: { id: charged.map(({ id }) => id) } });
  return charged.flatMap(({ id, massG }): ChargeLine[] => {
    const lot = lots.find((each) => each.id === id);
    return lot ? [{ lot: lotOnHand(lot), massMg: toMilligrams(massG) }] : [];
  });
};

/** The planned lots that are not all in yet, then all of the plan, then every lot: nobody fetches others while these do. */
const planRemainder = async (
  services: Services,
  castingId: string,
  request: Omit<ChargeRequest, 'lots'>,
): Promise<ChargeOutcome> => {
  const lots = await lotsToCharge(services);
  const lines = (await loadChargePlan(services, castingId))?.lines ?? [];
  const weighedMg = (lotId: string): number =>
    massOfLines(request.weighed?.filter(({ lot }) => lot.id === lotId) ?? []);
  const open = lines.filter(({ lotId, massMg }) => massMg - weighedMg(lotId) >= leastWeighingMg);
  for (const tier of [open, lines].filter(({ length }) => length > 0)) {
    const isInTier = ({ id }: LotOnHand): boolean => tier.some(({ lotId }) => lotId === id);
    const planned = await planCharge({ ...request, lots: lots.filter(isInTier) });
    if (planned.kind === 'planned') return planned;
  }
  return planCharge({ ...request, lots });
};

/** What a card's charge has come to by lot, and the remainder corrected for what was really weighed. */
export const loadRunningCharge = async (services: Services, melt: Melt): Promise<RunningCharge> => {
  const { context, state } = melt;
  if (!context.alloy) throw new AppError('wrong-state', 'This card was opened before lots were kept.');
  const weighed = await weighedLines(services, melt);
  const { compositionWt, ...alloy } = context.alloy;
  const charged = summarise(weighed, alloy.markedMetal);
  const { chargeTolerance, returnsShare } = context.limits;
  const wantedMg = toMilligrams(context.plannedMetalG);
  const unlottedMg = toMilligrams(chargedG(state)) - charged.totalMg;
  if (unlottedMg > 0)
    throw new AppError(
      'wrong-state',
      'Some metal in the crucible is of no lot: no remainder can be computed.',
    );
  const roomMg = Math.floor(wantedMg * chargeTolerance);
  const request = {
    ...alloy,
    targetWt: compositionWt,
    wantedMg,
    overMg: roomMg,
    underMg: roomMg,
    weighed,
    returnsShare,
  };
  return { weighed: charged, context, remainder: await planRemainder(services, melt.castingId, request) };
};
