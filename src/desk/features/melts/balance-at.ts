import { solidFractionAt } from '#shared/metallurgy/index.ts';
import type { MeltBalance } from '#src/ui/beam-geometry.ts';

const names: Readonly<Record<string, string>> = { Ag: 'silver', Au: 'gold', Cu: 'copper', Zn: 'zinc' };

/**
 * The lever rule of an alloy (wt%) at a temperature in °C, told by the element whose content differs most between solid
 * and liquid; null where there is one phase only, or where the phase model does not hold the alloy.
 */
export const balanceAt = (
  compositionWt: Readonly<Record<string, number>>,
  temperatureC: number,
): MeltBalance | null => {
  const state = solidFractionAt(compositionWt, temperatureC, 'lever');
  if (!state.withinModel || !state.solidWt || !state.liquidWt) return null;
  const { solidWt, liquidWt, solidMassFraction } = state;
  const apart = (symbol: string): number => Math.abs((solidWt[symbol] ?? 0) - (liquidWt[symbol] ?? 0));
  const [symbol] = Object.keys(compositionWt).toSorted((a, b) => apart(b) - apart(a));
  if (symbol === undefined) return null;
  return {
    element: names[symbol] ?? symbol,
    alloyWt: compositionWt[symbol] ?? 0,
    solidWt: solidWt[symbol] ?? 0,
    liquidWt: liquidWt[symbol] ?? 0,
    solidMassFraction,
  };
};
