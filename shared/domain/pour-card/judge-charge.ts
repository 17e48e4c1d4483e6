import type { Grams } from '#shared/lib/units.ts';
import type { CardContext, CardState } from './card-state.ts';
import { chargedG } from './card-state.ts';

/** How a charge compares with what the card plans. */
export interface ChargeVerdict {
  readonly totalG: Grams;
  readonly lowG: Grams;
  readonly highG: Grams;
  readonly returnsShare: number;
  readonly kind: 'short' | 'good' | 'over' | 'too-many-returns';
}

/** Judges the metal weighed so far, in g, against the planned mass and the studio's share of returns. */
export const judgeCharge = (
  state: Pick<CardState, 'charge'>,
  { plannedMetalG, limits }: Pick<CardContext, 'plannedMetalG' | 'limits'>,
): ChargeVerdict => {
  const totalG = chargedG(state);
  const lowG = plannedMetalG * (1 - limits.chargeTolerance);
  const highG = plannedMetalG * (1 + limits.chargeTolerance);
  const returnsShare = totalG > 0 ? state.charge.returns / totalG : 0;
  const planned = { totalG, lowG, highG, returnsShare };
  if (totalG > highG) return { ...planned, kind: 'over' };
  if (totalG < lowG) return { ...planned, kind: 'short' };
  return { ...planned, kind: returnsShare > limits.returnsShare + 1e-9 ? 'too-many-returns' : 'good' };
};
