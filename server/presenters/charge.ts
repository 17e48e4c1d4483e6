import type {
  ChargeLine as ChargeLineContract,
  ChargeOutcome as ChargeOutcomeContract,
  ChargeProposal,
  FilledCrucible as FilledCrucibleContract,
  RunningCharge as RunningChargeContract,
  SavedChargePlan,
} from '#shared/contracts/charge.ts';
import type { ChargeLine } from '#shared/domain/metal/charge-request.ts';
import { fromMilligrams } from '#shared/domain/metal/ledger.ts';
import type { Actor } from '../policies/actor.ts';
import { chargePolicy } from '../policies/charge.ts';
import { can } from '../policies/policy.ts';
import type { FilledCrucible } from '../queries/list-crucibles.ts';
import type { LoadedChargePlan } from '../queries/load-charge-plan.ts';
import type { RunningCharge } from '../queries/load-running-charge.ts';
import type { ChargeOutcome } from '../queries/plan-charge.ts';
import type { Proposal } from '../queries/propose-charges.ts';

const presentLine = ({ lot, massMg }: ChargeLine): ChargeLineContract => ({
  lotId: lot.id,
  code: lot.code,
  name: lot.name,
  kind: lot.kind,
  massG: fromMilligrams(massMg),
});

/** What a plan came to. */
export const presentOutcome = (outcome: ChargeOutcome): ChargeOutcomeContract => {
  if (outcome.kind === 'short') {
    const { obstacles, wouldDo } = outcome;
    return {
      kind: 'short',
      obstacles,
      wouldDo: wouldDo.map(({ name, massMg }) => ({ name, massG: fromMilligrams(massMg) })),
    };
  }
  const { plan, gap } = outcome;
  return {
    kind: 'planned',
    lines: plan.lines.map(presentLine),
    totalG: fromMilligrams(plan.totalMg),
    partsWt: plan.partsWt,
    expectedPpt: plan.expectedPpt,
    worstPpt: plan.worstPpt,
    returnsShare: plan.returnsShare,
    gap,
  };
};

/** A charge planned for some castings. */
export const presentProposal = ({ castings, request, outcome }: Proposal): ChargeProposal => ({
  castingIds: castings.map(({ id }) => id),
  alloyName: castings[0].alloyRevision.alloy.name,
  revision: castings[0].alloyRevision.number,
  wantedG: fromMilligrams(request.wantedMg),
  markedMetal: request.markedMetal,
  markPpt: request.markPpt,
  targetWt: request.targetWt,
  toleranceWt: request.toleranceWt,
  returnsLimit: request.returnsShare,
  outcome: presentOutcome(outcome),
});

/** Metal in a crucible. */
export const presentCrucible = ({ melt, balanceMg, assay }: FilledCrucible): FilledCrucibleContract => ({
  melt: { id: melt.id, code: melt.code },
  alloy: { name: melt.alloyRevision.alloy.name, revisionId: melt.alloyRevisionId },
  massG: fromMilligrams(balanceMg),
  compositionWt: assay.compositionWt,
  toleranceWt: assay.toleranceWt,
  person: melt.opener.name,
  endedAt: melt.overAt?.toISOString() ?? null,
});

/** A charge plan that was kept. */
export const presentChargePlan = (plan: LoadedChargePlan, actor: Actor): SavedChargePlan => ({
  id: plan.id,
  castingIds: plan.castingIds,
  wantedG: fromMilligrams(plan.wantedMg),
  lines: plan.lines.map(({ massMg, lotId, code, name, kind }) => ({
    lotId,
    code,
    name,
    kind,
    massG: fromMilligrams(massMg),
  })),
  expectedPpt: plan.expectedPpt,
  worstPpt: plan.worstPpt,
  returnsShare: plan.returnsShare,
  person: plan.user.name,
  at: plan.createdAt.toISOString(),
  abilities: { replace: can(chargePolicy.save, actor, undefined) },
});

/** Where the charge of a running card stands. */
export const presentRunningCharge = ({
  weighed,
  context,
  remainder,
}: RunningCharge): RunningChargeContract => ({
  weighed: weighed.lines.map(presentLine),
  totalG: fromMilligrams(weighed.totalMg),
  wantedG: context.plannedMetalG,
  expectedPpt: weighed.expectedPpt,
  worstPpt: weighed.worstPpt,
  markPpt: context.alloy?.markPpt ?? 0,
  remainder: presentOutcome(remainder),
});
