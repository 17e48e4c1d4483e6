import { readComposition } from './composition.ts';
import { COMMITTED } from './model.ts';
import type { Composition, ElementSymbol, Outcome } from './types.ts';

/** A gold-copper compound that orders on slow cooling, and below what temperature, °C. */
export interface OrderingPoint {
  readonly compound: 'AuCu' | 'AuCu3';
  readonly belowC: number;
}

/** Whether and where an alloy orders, and whether its flask must be quenched before that. */
export interface Ordering {
  readonly ordersBelowC: number | null;
  readonly compound: OrderingPoint['compound'] | null;
  readonly needsEarlyQuench: boolean;
  readonly rule: string;
  readonly source: string;
}

const SOURCE =
  'Ordering temperatures: Okamoto, Chakrabarti, Laughlin, Massalski, Bull. Alloy Phase Diagrams 8 (1987) 454. ' +
  'Which alloys need the early quench: common practice, no source.';

/** Copper's share of gold and copper together, as atoms, between which each compound orders. */
const AUCU_SHARE = [0.3, 0.65] as const;
const AUCU3_SHARE_TO = 0.85;
/** Silver hinders ordering: above this share of silver among atoms none is reckoned with. */
const SILVER_STOPS = 0.35;
/** Below this share of silver in silver and copper, by mass, a gold alloy counts as red or rose. */
const RED_SILVER_SHARE = 0.25;

/** The compound that metal of these mole fractions orders to, or null. */
export const orderingPoint = (elements: readonly ElementSymbol[], x: Float64Array): OrderingPoint | null => {
  const of = (element: ElementSymbol) => x[elements.indexOf(element)] ?? 0;
  const gold = of('Au');
  const copper = of('Cu');
  if (gold < 0.05 || of('Ag') > SILVER_STOPS) return null;
  const share = copper / (gold + copper);
  if (share < AUCU_SHARE[0] || share > AUCU3_SHARE_TO) return null;
  return share <= AUCU_SHARE[1] ? { compound: 'AuCu', belowC: 410 } : { compound: 'AuCu3', belowC: 390 };
};

/** Whether slow cooling would order this alloy, and whether it must be quenched early (rule and source beside it). */
export const ordering = (composition: Composition): Outcome<Ordering> => {
  const charge = readComposition(composition, COMMITTED.atomicMass);
  if (!charge.withinModel) return charge;
  const point = orderingPoint(charge.elements, charge.x);
  const copper = composition['Cu'] ?? 0;
  const silver = composition['Ag'] ?? 0;
  const red = point !== null && silver / (silver + copper) < RED_SILVER_SHARE;
  const rule = !point
    ? 'Not a gold-copper alloy that orders: no early quench on that account.'
    : red
      ? `Red or rose gold: quench before the metal falls to ${point.belowC} °C, or ${point.compound} forms and it turns hard and brittle.`
      : `Silver slows the ordering of ${point.compound} below ${point.belowC} °C: slow cooling hardens this alloy rather than breaking it.`;
  return {
    withinModel: true,
    ordersBelowC: point?.belowC ?? null,
    compound: point?.compound ?? null,
    needsEarlyQuench: red,
    rule,
    source: SOURCE,
  };
};
