import type { ChargeProposal } from '#shared/contracts/charge.ts';
import type { Lot } from '#shared/contracts/lot.ts';
import { faultsOf, summarise, type ChargePlan } from '#shared/domain/metal/charge-plan.ts';
import type { ChargeLine } from '#shared/domain/metal/charge-request.ts';
import { toMilligrams } from '#shared/domain/metal/ledger.ts';
import { mayBeCharged, type LotOnHand } from '#shared/domain/metal/lot.ts';
import type { MassUnit } from '#shared/lib/units.ts';
import { readMass } from './metal-mass.ts';

/** One line of a plan as it is changed by hand. */
export interface HandLine {
  readonly lotId: string;
  /** In the studio's unit, as it is typed. */
  readonly mass: string;
}

/** What a plan changed by hand comes to; null while a mass cannot be read. */
export interface HandPlan {
  readonly plan: ChargePlan | null;
  readonly faults: readonly string[];
}

/** Lots that may stand in a plan. */
export const lotsToPlan = (lots: readonly Lot[]): readonly Lot[] =>
  lots.filter(({ kind, quarantineReason }) => mayBeCharged(kind) && quarantineReason === null);

const onHand = (lot: Lot): LotOnHand => ({
  id: lot.id,
  code: lot.code,
  name: lot.name,
  kind: lot.kind,
  compositionWt: lot.compositionWt,
  toleranceWt: lot.toleranceWt,
  balanceMg: toMilligrams(lot.balanceG),
  receivedAt: lot.receivedAt,
});

/** Judges a plan changed by hand as the server will: every limit, exactly. */
export const judgeHandPlan = (
  lines: readonly HandLine[],
  lots: readonly Lot[],
  proposal: Omit<ChargeProposal, 'outcome'>,
  unit: MassUnit,
): HandPlan => {
  const read: ChargeLine[] = [];
  for (const { lotId, mass } of lines) {
    const lot = lots.find(({ id }) => id === lotId);
    const grams = readMass(mass, unit);
    if (!lot) return { plan: null, faults: ['A lot of the plan is used up or in quarantine by now.'] };
    if (!grams.ok || grams.value <= 0) return { plan: null, faults: [`Type what to weigh of ${lot.code}.`] };
    read.push({ lot: onHand(lot), massMg: toMilligrams(grams.value) });
  }
  if (read.length === 0) return { plan: null, faults: ['A charge has at least one lot.'] };
  const { wantedG, markedMetal, markPpt, targetWt, toleranceWt, returnsLimit } = proposal;
  const plan = summarise(read, markedMetal);
  const request = {
    wantedMg: toMilligrams(wantedG),
    targetWt,
    toleranceWt,
    markedMetal,
    markPpt,
    returnsShare: returnsLimit,
    lots: read.map(({ lot }) => lot),
  };
  return { plan, faults: faultsOf(plan, request) };
};
