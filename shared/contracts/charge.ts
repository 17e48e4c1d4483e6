import { z } from 'zod';
import type { LotKind, Parts } from '#shared/domain/metal/lot.ts';
import { massG, massOrNoneG, words, type Abilities } from './common.ts';
import { lotCompositionWt, lotToleranceWt } from './lot.ts';

const castingIds = z
  .array(z.uuid(), { error: 'Choose the castings.' })
  .min(1, 'Choose at least one casting.')
  .max(60, 'That is more than a day of castings.')
  .refine((ids) => new Set(ids).size === ids.length, 'Each casting counts once.');

const lossShare = z.number().min(0, 'Not below 0.').max(0.05, 'At most 5 %.').default(0);

/** Plans charges from the lots on hand: one melt for all the castings, or one for each with the lots shared out in turn. */
export const planChargeRequest = z.object({
  castingIds,
  together: z.boolean().default(true),
  /** Metal expected to be lost in melting, as a share of the charge. */
  lossShare,
});
/** Plans charges. */
export type PlanChargeRequest = z.input<typeof planChargeRequest>;

/** Keeps a charge plan, computed or made by hand, for castings poured from one melt. */
export const savePlanRequest = z.object({
  castingIds,
  lossShare,
  lines: z
    .array(z.object({ lotId: z.uuid(), massG }))
    .min(1, 'A charge has at least one lot.')
    .max(40),
});
/** Keeps a charge plan. */
export type SavePlanRequest = z.input<typeof savePlanRequest>;

/** What to add to a pot already melted so that it becomes an alloy. */
export const changePotRequest = z.object({
  massG,
  compositionWt: lotCompositionWt,
  toleranceWt: lotToleranceWt,
  alloyRevisionId: z.uuid(),
});
/** What to add to a pot. */
export type ChangePotRequest = z.input<typeof changePotRequest>;

/** The plan of which casting. */
export const findPlanQuery = z.object({ castingId: z.uuid() });

/** One line of a charge plan: how much of which lot. */
export interface ChargeLine {
  readonly lotId: string;
  readonly code: string;
  readonly name: string;
  readonly kind: LotKind;
  readonly massG: number;
}

/** What a plan came to: lines that hold every limit, or what stands in the way and what would do. */
export type ChargeOutcome =
  | {
      readonly kind: 'planned';
      readonly lines: readonly ChargeLine[];
      /** The whole charge, crucible included. */
      readonly totalG: number;
      readonly partsWt: Parts;
      readonly expectedPpt: number;
      readonly worstPpt: number;
      readonly returnsShare: number;
      /** How far the plan can be from the best there is, as a share of its cost. */
      readonly gap: number;
    }
  | {
      readonly kind: 'short';
      readonly obstacles: readonly string[];
      /** Metal that would do, if it were bought. */
      readonly wouldDo: readonly { readonly name: string; readonly massG: number }[];
    };

/** A charge planned for some castings. */
export interface ChargeProposal {
  readonly castingIds: readonly string[];
  readonly alloyName: string;
  readonly revision: number;
  readonly wantedG: number;
  readonly markedMetal: 'Ag' | 'Au';
  readonly markPpt: number;
  /** What the charge must come to, so that a plan changed by hand can be judged at once. */
  readonly targetWt: Parts;
  readonly toleranceWt: Parts;
  /** The largest share of returns. */
  readonly returnsLimit: number;
  readonly outcome: ChargeOutcome;
}

/** A charge plan that was kept. */
export interface SavedChargePlan {
  readonly id: string;
  readonly castingIds: readonly string[];
  readonly wantedG: number;
  readonly lines: readonly ChargeLine[];
  readonly expectedPpt: number;
  readonly worstPpt: number;
  readonly returnsShare: number;
  readonly person: string;
  readonly at: string;
  readonly abilities: Abilities<'replace'>;
}

/** Where the charge of a running card stands, and what is still to be weighed in. */
export interface RunningCharge {
  readonly weighed: readonly ChargeLine[];
  readonly totalG: number;
  readonly wantedG: number;
  readonly expectedPpt: number;
  readonly worstPpt: number;
  readonly markPpt: number;
  /** What remains, corrected for what was really weighed. */
  readonly remainder: ChargeOutcome;
}

/** Metal that the ledger has in the crucible of a melt. */
export interface FilledCrucible {
  readonly melt: { readonly id: string; readonly code: string };
  readonly alloy: { readonly name: string; readonly revisionId: string };
  readonly massG: number;
  readonly compositionWt: Parts;
  readonly toleranceWt: Parts;
  /** Who opened the melt. */
  readonly person: string;
  /** When its card ended; null while it is open at a terminal. */
  readonly endedAt: string | null;
}

/** Empties the crucible of a melt whose card has ended with metal in it; what is neither button nor loss is in castings. */
export const closeOutRequest = z.object({
  buttonG: massOrNoneG,
  lossG: massOrNoneG,
  note: words(500, 'Say what became of the melt.'),
});
/** Empties a crucible. */
export type CloseOutRequest = z.input<typeof closeOutRequest>;
