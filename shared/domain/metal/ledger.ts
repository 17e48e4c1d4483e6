import type { LotKind } from './lot.ts';

/** Where metal can be. The first three are stores in the studio; the rest are where it goes. */
export const metalPlaces = [
  'stock',
  'returns',
  'scrap',
  'supplier',
  'crucible',
  'castings',
  'refiner',
  'loss',
  'adjustment',
] as const;
/** One place of the ledger. */
export type MetalPlace = (typeof metalPlaces)[number];

/** The places in which a lot lies and can be weighed out. */
export const stores = ['stock', 'returns', 'scrap'] as const satisfies readonly MetalPlace[];
/** A place in which a lot lies. */
export type Store = (typeof stores)[number];

/** Whether metal in this place is a lot on hand. */
export const isStore = (place: MetalPlace): place is Store =>
  (stores as readonly MetalPlace[]).includes(place);

/** One movement of metal: out of one place, into another, in whole milligrams above nought. */
export interface Movement {
  readonly from: MetalPlace;
  readonly to: MetalPlace;
  readonly massMg: number;
}

/** The mass in every place after these movements, mg; the sum over all places is nought. */
export const balances = (movements: readonly Movement[]): Readonly<Record<MetalPlace, number>> => {
  const sums = Object.fromEntries(metalPlaces.map((place) => [place, 0])) as Record<MetalPlace, number>;
  for (const { from, to, massMg } of movements) {
    sums[from] -= massMg;
    sums[to] += massMg;
  }
  return sums;
};

/** What of a lot is on hand after its movements, mg. */
export const onHandMg = (movements: readonly Movement[]): number => {
  const sums = balances(movements);
  return stores.reduce((sum, store) => sum + sums[store], 0);
};

/** Grams as whole milligrams, the ledger's only unit of mass. */
export const toMilligrams = (grams: number): number => Math.round(grams * 1000);

/** Whole milligrams as grams. */
export const fromMilligrams = (milligrams: number): number => milligrams / 1000;

/** What a movement records. */
export const movementKinds = [
  'received',
  'weighed-in',
  'taken-out',
  'cast',
  'returned',
  'lost',
  'dispatched',
  'counted',
  'corrected',
] as const;
/** One kind of movement. */
export type MovementKind = (typeof movementKinds)[number];

/** The store in which lots of a kind lie. */
export const storeOf = (kind: LotKind): Store =>
  kind === 'returns' ? 'returns' : kind === 'scrap' ? 'scrap' : 'stock';
