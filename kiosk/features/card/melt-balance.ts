import { markedMetal, type AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import { solidFractionAt } from '#shared/metallurgy/index.ts';
import type { MeltBalance } from '#src/ui/beam-geometry.ts';

/** The solid fraction (0 to 1) at a reading, with the tie line on which the beam balances. */
export interface MeltSolid {
  readonly solidMassFraction: number;
  /** Null when the metal is of one phase. */
  readonly balance: MeltBalance | null;
}

const elementNames: Readonly<Record<string, string>> = { Ag: 'silver', Au: 'gold', Cu: 'copper', Zn: 'zinc' };

/** The element, besides the marked metal, whose content differs most between solid and liquid: it shows the balance best. */
const balancingElement = (
  marked: string,
  solidWt: Readonly<Record<string, number>>,
  liquidWt: Readonly<Record<string, number>>,
): string | null => {
  const spread = (element: string): number => Math.abs((solidWt[element] ?? 0) - (liquidWt[element] ?? 0));
  const others = Object.keys(solidWt).filter((element) => element !== marked);
  return others.toSorted((a, b) => spread(b) - spread(a))[0] ?? null;
};

/** How much of an alloy (wt%) is solid at a reading by the lever rule; null where the model does not hold the alloy. */
export const meltSolidAt = (
  compositionWt: Readonly<Record<string, number>>,
  family: AlloyFamily,
  readingC: number,
): MeltSolid | null => {
  const found = solidFractionAt(compositionWt, readingC);
  if (!found.withinModel) return null;
  const { solidMassFraction, solidWt, liquidWt } = found;
  const element = solidWt && liquidWt ? balancingElement(markedMetal(family), solidWt, liquidWt) : null;
  if (!solidWt || !liquidWt || element === null) return { solidMassFraction, balance: null };
  const balance = {
    element: elementNames[element] ?? element,
    alloyWt: compositionWt[element] ?? 0,
    solidWt: solidWt[element] ?? 0,
    liquidWt: liquidWt[element] ?? 0,
    solidMassFraction,
  };
  return { solidMassFraction, balance };
};
