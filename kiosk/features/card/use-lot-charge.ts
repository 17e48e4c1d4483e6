import { useQuery } from '@tanstack/react-query';
import type { ChargeOutcome } from '#shared/contracts/charge.ts';
import type { Lot } from '#shared/contracts/lot.ts';
import { mayBeCharged } from '#shared/domain/metal/lot.ts';
import { adviseCharge, type ChargeAdvice, type LotAtHand } from '#shared/domain/pour-card/advise-charge.ts';
import { chargeLines, type ChargeLineState } from '#shared/domain/pour-card/charge-lines.ts';
import { judgeCharge } from '#shared/domain/pour-card/judge-charge.ts';
import { runningChargeQuery } from '#src/api/charges.ts';
import { lotsQuery } from '#src/api/lots.ts';
import type { RunningCard } from './use-running-card.ts';

/** How what is still to be weighed is known: as planned, corrected by the server, being asked, or not at all. */
export type RestKnown = 'as-planned' | 'corrected' | 'asking' | 'unknown';

/** A charge by lots as its screens see it. */
export interface LotCharge {
  readonly hasPlan: boolean;
  readonly lines: readonly ChargeLineState[];
  readonly next: ChargeLineState | null;
  readonly rest: RestKnown;
  /** What stands in the way of any remainder, by the server. */
  readonly short: Extract<ChargeOutcome, { readonly kind: 'short' }> | null;
  readonly advice: ChargeAdvice | null;
  /** The lots that could be charged, as the server last said. */
  readonly lots: readonly Lot[];
}

/** How often the server is asked again while it does not answer, or for lots that changed elsewhere, ms. */
const againMs = { unanswered: 5_000, lots: 30_000 } as const;

const atHandOf = ({ id, code, kind, compositionWt, toleranceWt, balanceG }: Lot): LotAtHand => ({
  id,
  code,
  kind,
  compositionWt,
  toleranceWt,
  onHandG: balanceG,
});

const isUsable = ({ kind, quarantineReason, balanceG }: Lot): boolean =>
  mayBeCharged(kind) && quarantineReason === null && balanceG > 0;

/** The lots with metal on hand, kept fresh while a charge is weighed in. */
export const useLots = (): readonly Lot[] | undefined =>
  useQuery({ ...lotsQuery('yes'), refetchInterval: againMs.lots }).data;

/** What remains of a charge that no longer goes by its plan, asked of the server once it has every weighing. */
const useRemainder = ({ card, state, waiting }: RunningCard, isOff: boolean) => {
  const crucible = (state.lots ?? []).map(({ id, massG }) => `${id} ${massG}`).join(' ');
  const { data, isFetching } = useQuery({
    ...runningChargeQuery(card.melt.id, crucible),
    enabled: isOff && waiting === 0,
    refetchInterval: ({ state: { status } }) => (status === 'error' ? againMs.unanswered : false),
  });
  const rest: RestKnown = !isOff ? 'as-planned' : data ? 'corrected' : isFetching ? 'asking' : 'unknown';
  return { rest, remainder: isOff ? (data?.remainder ?? null) : null };
};

const isGood = ({ card, state }: RunningCard, advice: ChargeAdvice | null): boolean =>
  advice === null && judgeCharge(state, card.context).kind === 'good';

/** In a charge that has come out well nothing is over any more. */
const asDone = (line: ChargeLineState): ChargeLineState =>
  line.state === 'over' ? { ...line, state: 'done' } : line;

/** Whether what was planned no longer leads to a good charge: a lot is over its line, or all are in and it is not good. */
const isOffPlan = (
  running: RunningCard,
  lines: readonly ChargeLineState[],
  advice: ChargeAdvice | null,
): boolean => {
  const { card, state } = running;
  if (!card.chargePlan || (state.lots ?? []).length === 0) return false;
  const isAllIn = lines.every((line) => line.state === 'done');
  return lines.some((line) => line.state === 'over') || (isAllIn && !isGood(running, advice));
};

/** Puts a charge by lots together: the plan's lines, what is in, what remains, and what stands in the way. */
export const useLotCharge = (running: RunningCard): LotCharge => {
  const { card, state } = running;
  const plan = card.chargePlan?.lines ?? [];
  const lots = (useLots() ?? []).filter(isUsable);
  const planned = new Map(plan.map(({ lotId, massG }) => [lotId, massG]));
  const advice = adviseCharge(state, card.context, planned, lots.map(atHandOf));
  const { chargeTolerance: tolerance } = card.context.limits;
  const progress = { plan, lots: state.lots ?? [], tolerance };
  const asPlanned = chargeLines({ ...progress, remainder: null });
  const { rest, remainder } = useRemainder(running, isOffPlan(running, asPlanned, advice));
  const corrected =
    remainder?.kind === 'planned' ? chargeLines({ ...progress, remainder: remainder.lines }) : asPlanned;
  const lines = isGood(running, advice) ? corrected.map(asDone) : corrected;
  return {
    hasPlan: plan.length > 0,
    lines,
    next: lines.find((line) => line.state === 'next') ?? null,
    rest,
    short: remainder?.kind === 'short' ? remainder : null,
    advice,
    lots,
  };
};
