/** Where a set of marks applies. */
export const markPlaces = ['ISO 9202', 'United Kingdom', 'United States'] as const;
/** One such place. */
export type MarkPlace = (typeof markPlaces)[number];

/** One fineness a finished article may be marked with. */
export interface FinenessMark {
  readonly place: MarkPlace;
  readonly metal: 'Ag' | 'Au';
  readonly ppt: number;
  /** How far below the mark an assay may fall, parts per thousand; nought where the law allows none. */
  readonly negativeTolerancePpt: number;
  readonly source: string;
}

const marks = (
  place: MarkPlace,
  metal: 'Ag' | 'Au',
  finenesses: readonly number[],
  negativeTolerancePpt: number,
  source: string,
): readonly FinenessMark[] => finenesses.map((ppt) => ({ place, metal, ppt, negativeTolerancePpt, source }));

const iso = 'ISO 9202 (from memory); national law and the local assay office decide.';
const uk =
  'Hallmarking Act 1973: s. 4(1), on assay not less than the standard in all its parts; standards of Schedule 2 (from memory). The assay office decides.';
const usGold = '15 USC 295: 3 parts per thousand below the mark, 7 with solder. Local law decides.';
const usSilver =
  '15 USC 296 (from memory): 4 parts per thousand below the mark, 10 with solder. Local law decides.';

/** Fineness marks with the place they hold in and whose rule it is. */
export const finenessMarks: readonly FinenessMark[] = [
  ...marks('ISO 9202', 'Au', [375, 585, 750, 916, 990, 999], 0, iso),
  ...marks('ISO 9202', 'Ag', [800, 925, 999], 0, iso),
  ...marks('United Kingdom', 'Au', [375, 585, 750, 916, 990, 999], 0, uk),
  ...marks('United Kingdom', 'Ag', [800, 925, 958, 999], 0, uk),
  ...marks('United States', 'Au', [417, 583, 750, 917], 3, usGold),
  ...marks('United States', 'Ag', [900, 925], 4, usSilver),
];

/** The marks of a place for a metal, lowest first. */
export const marksOf = (place: MarkPlace, metal: 'Ag' | 'Au'): readonly FinenessMark[] =>
  finenessMarks.filter((mark) => mark.place === place && mark.metal === metal);
