import type { Grams } from '#shared/lib/units.ts';
import { lowestPart, type Assay } from '../metal/lot.ts';
import type { ChargeLot } from './card-event.ts';
import { chargeKindOf } from './card-event.ts';
import type { CardContext, CardState, ChargedLot } from './card-state.ts';
import { judgeCharge, type ChargeVerdict } from './judge-charge.ts';
import { judgeMetal } from './judge-metal.ts';

/** A lot that could be added, with what is on hand of it. */
export interface LotAtHand extends ChargeLot {
  readonly onHandG: Grams;
}

/** So much of one lot. */
export interface Portion {
  readonly lotId: string;
  readonly code: string;
  readonly massG: Grams;
}

/** Why a charge cannot be closed as it is, and what would put it right: take metal out, or add some. */
export interface ChargeAdvice {
  readonly fault: 'no-lot' | 'too-much' | 'too-many-returns' | 'below-mark';
  readonly out: Portion | null;
  readonly add: Portion | null;
}

type Judged = Pick<CardState, 'charge' | 'lots'>;
type Alloy = NonNullable<CardContext['alloy']>;

/** Up to the next step of the balance, so that what is advised is enough. */
const roundUp = (grams: number): Grams => Math.ceil(grams * 100 - 1e-6) / 100;

const portion = (lot: { readonly id: string; readonly code: string }, grams: number): Portion => ({
  lotId: lot.id,
  code: lot.code,
  massG: roundUp(grams),
});

const worstPpt = (assay: Assay, { markedMetal }: Alloy): number => lowestPart(assay, markedMetal) * 10;

/** The lot with the most of it in beyond what was planned; the plan's masses by lot. */
const mostOver = (lots: readonly ChargedLot[], planned: ReadonlyMap<string, Grams>): ChargedLot | null => {
  const overOf = ({ id, massG }: ChargedLot): number => massG - (planned.get(id) ?? 0);
  return lots.reduce<ChargedLot | null>(
    (best, lot) => (best && overOf(best) >= overOf(lot) ? best : lot),
    null,
  );
};

const forTooMuch = (
  { lots = [] }: Judged,
  { totalG, highG }: ChargeVerdict,
  plannedMetalG: Grams,
  planned: ReadonlyMap<string, Grams>,
): ChargeAdvice | null => {
  if (totalG <= highG) return null;
  const lot = mostOver(lots, planned);
  const overG = totalG - plannedMetalG;
  return { fault: 'too-much', out: lot && portion(lot, Math.min(overG, lot.massG)), add: null };
};

const forReturns = (
  { charge, lots = [] }: Judged,
  { totalG, lowG, highG }: ChargeVerdict,
  limit: number,
  atHand: readonly LotAtHand[],
): ChargeAdvice | null => {
  // Returns often go in first: they are too many only once nothing that may still come could thin them out.
  const couldBeG = totalG < lowG ? highG : totalG;
  if (charge.returns <= limit * couldBeG + 1e-9) return null;
  const returns = lots.filter(({ kind }) => chargeKindOf(kind) === 'returns');
  const largest = returns.reduce<ChargedLot | null>(
    (best, lot) => (best && best.massG >= lot.massG ? best : lot),
    null,
  );
  const outG = limit < 1 ? (charge.returns - limit * couldBeG) / (totalG < lowG ? 1 : 1 - limit) : 0;
  const addG = charge.returns / limit - totalG;
  const fresh = atHand.find(({ kind, onHandG }) => chargeKindOf(kind) === 'grain' && onHandG >= addG);
  const fits = fresh && totalG + roundUp(addG) <= highG;
  return {
    fault: 'too-many-returns',
    out: largest && portion(largest, Math.min(outG, largest.massG)),
    add: fits ? portion(fresh, addG) : null,
  };
};

const forMark = (
  { lots = [] }: Judged,
  { totalG, lowG, highG }: ChargeVerdict,
  alloy: Alloy,
  atHand: readonly LotAtHand[],
): ChargeAdvice | null => {
  const lackPpt = lots.reduce((sum, lot) => sum + (alloy.markPpt - worstPpt(lot, alloy)) * lot.massG, 0);
  if (totalG < lowG || lackPpt <= 1e-6) return null;
  const poorest = lots.reduce<ChargedLot | null>(
    (best, lot) => (best && worstPpt(best, alloy) <= worstPpt(lot, alloy) ? best : lot),
    null,
  );
  const outG = poorest ? lackPpt / (alloy.markPpt - worstPpt(poorest, alloy)) : 0;
  const finer = atHand
    .filter((lot) => worstPpt(lot, alloy) > alloy.markPpt)
    .map((lot) => ({ lot, massG: lackPpt / (worstPpt(lot, alloy) - alloy.markPpt) }))
    .filter(({ lot, massG }) => massG <= lot.onHandG && totalG + roundUp(massG) <= highG)
    .toSorted((a, b) => a.massG - b.massG)
    .at(0);
  return {
    fault: 'below-mark',
    out: poorest && portion(poorest, Math.min(outG, poorest.massG)),
    add: finer ? portion(finer.lot, finer.massG) : null,
  };
};

/**
 * What stands in the way of closing a charge by lots that no more of the plan would cure, and how much of which lot to take
 * out or to add; null when nothing does. `planned` holds the plan's masses by lot, `atHand` the lots that could be added.
 */
export const adviseCharge = (
  state: Judged,
  context: Pick<CardContext, 'alloy' | 'limits' | 'plannedMetalG'>,
  planned: ReadonlyMap<string, Grams>,
  atHand: readonly LotAtHand[],
): ChargeAdvice | null => {
  const { alloy, limits, plannedMetalG } = context;
  if (!alloy) return null;
  const metal = judgeMetal(state, context);
  if (metal && metal.unlottedG > 0) {
    return { fault: 'no-lot', out: null, add: null };
  }
  const verdict = judgeCharge(state, context);
  return (
    forTooMuch(state, verdict, plannedMetalG, planned) ??
    forReturns(state, verdict, limits.returnsShare, atHand) ??
    forMark(state, verdict, alloy, atHand)
  );
};
