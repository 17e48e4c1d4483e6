import type { Lot } from '#shared/contracts/lot.ts';
import { lotKinds, type LotKind } from '#shared/domain/metal/lot.ts';

/** Metals by which lots are looked for. */
export const filterMetals = ['Au', 'Ag', 'other'] as const;
/** One of them; `other` is metal with neither gold nor silver in it. */
export type FilterMetal = (typeof filterMetals)[number];

/** Which lots are looked at. */
export interface LotFilters {
  /** Lots with metal on hand, or lots that are used up. */
  readonly onHand: 'yes' | 'no';
  readonly kind: LotKind | null;
  readonly metal: FilterMetal | null;
}

const oneOf = <Choice extends string>(choices: readonly Choice[], text: string | null): Choice | null =>
  choices.find((choice) => choice === text) ?? null;

/** The filters that stand in an address; what it does not know is left out. */
export const filtersOf = (search: URLSearchParams): LotFilters => ({
  onHand: search.get('lots') === 'used-up' ? 'no' : 'yes',
  kind: oneOf(lotKinds, search.get('kind')),
  metal: oneOf(filterMetals, search.get('metal')),
});

const holds = ({ compositionWt }: Pick<Lot, 'compositionWt'>, metal: 'Au' | 'Ag'): boolean =>
  (compositionWt[metal] ?? 0) > 0;

const isOfMetal = (lot: Pick<Lot, 'compositionWt'>, metal: FilterMetal): boolean =>
  metal === 'other' ? !holds(lot, 'Au') && !holds(lot, 'Ag') : holds(lot, metal);

/** The lots of a kind that hold a metal. */
export const chooseLots = <Each extends Pick<Lot, 'kind' | 'compositionWt'>>(
  lots: readonly Each[],
  { kind, metal }: Pick<LotFilters, 'kind' | 'metal'>,
): readonly Each[] =>
  lots.filter((lot) => (kind === null || lot.kind === kind) && (metal === null || isOfMetal(lot, metal)));
