import type { LossRate, Reconciliation } from '#shared/contracts/reconciliation.ts';
import { metalName } from '#shared/domain/metal/metal-name.ts';
import type { MonthOfMetal } from '#shared/domain/metal/reconcile.ts';

/** Milligrams as grams with all three decimals. */
export const gramsOf = (mg: number): string => (mg / 1000).toFixed(3);

/** A metal's name in words; what certificates leave unnamed is `unnamed`. */
export const nameOfElement = (element: string): string => {
  if (element === 'all') return 'all metal';
  return element === 'other' ? 'unnamed' : metalName(element);
};

/** The lines of a month's balance, in the order in which they add up. */
export const balanceLines: readonly (readonly [
  label: string,
  key: Exclude<keyof MonthOfMetal, 'element'>,
])[] = [
  ['On hand at the beginning', 'opening'],
  ['+ received', 'received'],
  ['- issued to melts', 'issued'],
  ['+ returned from melts', 'returned'],
  ['- sent to the refiner', 'dispatched'],
  ['+ found by counting', 'counted'],
  ['+ changed by assays', 'reassayed'],
  ['= on hand at the end', 'closing'],
  ['In crucibles at the beginning', 'crucibleOpening'],
  ['+ issued to melts', 'issued'],
  ['- cast', 'cast'],
  ['- returned from melts', 'returned'],
  ['- lost', 'lost'],
  ['= in crucibles at the end', 'crucibleClosing'],
];

/** The loss as a share of the metal in, in per cent. */
export const lossPercent = ({ lostMg, metalInMg }: LossRate): string =>
  metalInMg === 0 ? '' : ((lostMg / metalInMg) * 100).toFixed(3);

/** A month's balance as the rows of a table: one row for each line, one column for each metal, in g. */
export const monthRows = ({ metals, total }: Reconciliation): readonly (readonly string[])[] => {
  const columns = [...metals, total];
  return [
    ['g', ...columns.map(({ element }) => nameOfElement(element))],
    ...balanceLines.map(([label, key]) => [label, ...columns.map((month) => gramsOf(month[key]))]),
  ];
};

/** Loss rates as the rows of a table. */
export const lossRows = (group: string, rates: readonly LossRate[]): readonly (readonly string[])[] => [
  [`Loss by ${group}`, 'melts', 'metal in, g', 'lost, g', 'lost, %'],
  ...rates.map((rate) => [
    rate.name,
    String(rate.melts),
    gramsOf(rate.metalInMg),
    gramsOf(rate.lostMg),
    lossPercent(rate),
  ]),
];

/** The counts of a month as the rows of a table. */
export const countRows = ({ counts }: Reconciliation): readonly (readonly string[])[] => [
  ['Counted', 'lot', 'ledger, g', 'counted, g', 'difference, g', 'explanation', 'by'],
  ...counts.map(({ code, name, expectedMg, countedMg, explanation, person, at }) => [
    at.slice(0, 10),
    `${code} ${name}`,
    gramsOf(expectedMg),
    gramsOf(countedMg),
    gramsOf(countedMg - expectedMg),
    explanation,
    person,
  ]),
];
