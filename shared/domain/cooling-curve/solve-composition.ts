import type { Celsius } from '#shared/lib/units.ts';
import { meltingRange, type Composition } from '#shared/metallurgy/index.ts';

/** How far along the ray an answer is looked for, wt%, and in what steps. */
const furthestWt = 15;
const stepWt = 0.5;

/** A composition with `by` wt% more of one element, taken from the others in proportion. */
export const alongRay = (composition: Composition, element: string, by: number): Composition => {
  const wt = composition[element] ?? 0;
  const rest = 100 - wt;
  return {
    ...Object.fromEntries(
      Object.entries(composition).map(([each, amount]) => [each, amount * (1 - by / rest)]),
    ),
    [element]: wt + by,
  };
};

const liquidusAt = (composition: Composition, element: string, by: number): Celsius | null => {
  const wt = (composition[element] ?? 0) + by;
  if (wt < 0 || wt > 100) return null;
  const range = meltingRange(alongRay(composition, element, by));
  return range.withinModel ? range.liquidusC : null;
};

/** Which element moves the liquidus most, °C for each wt%; copper where the alloy holds none that could be off. */
export const mostTelling = (composition: Composition): string => {
  const here = liquidusAt(composition, 'Cu', 0) ?? Number.NaN;
  const others = Object.entries(composition)
    .filter(([element, wt]) => wt > 0 && wt < 50 && element !== 'Ag')
    .map(([element]) => element);
  const candidates = others.length > 0 ? others : ['Cu'];
  const move = (element: string): number => Math.abs((liquidusAt(composition, element, 0.1) ?? here) - here);
  return candidates.reduce((best, each) => (move(each) > move(best) ? each : best));
};

const bisect = (
  liquidus: (by: number) => Celsius | null,
  wantedC: Celsius,
  { from, to }: { readonly from: number; readonly to: number },
): number | null => {
  const above = (by: number): boolean => (liquidus(by) ?? Number.NaN) > wantedC;
  const side = above(from);
  let [near, far] = [from, to];
  for (let k = 0; k < 24; k++) {
    const middle = (near + far) / 2;
    if (above(middle) === side) near = middle;
    else far = middle;
  }
  return (near + far) / 2;
};

const search = (
  liquidus: (by: number) => Celsius | null,
  wantedC: Celsius,
  direction: 1 | -1,
): number | null => {
  const start = liquidus(0);
  if (start === null) return null;
  const side = start > wantedC;
  for (let k = 1; k * stepWt <= furthestWt; k++) {
    const value = liquidus(direction * k * stepWt);
    if (value === null) return null;
    if (value > wantedC !== side)
      return bisect(liquidus, wantedC, { from: direction * (k - 1) * stepWt, to: direction * k * stepWt });
  }
  return null;
};

/**
 * How much more of an element (less, below zero), wt%, would give the liquidus that was observed, the rest keeping its
 * proportions; the nearest answer within 15 wt%, null where there is none.
 */
export const solveForLiquidus = (
  composition: Composition,
  element: string,
  observedC: Celsius,
): number | null => {
  const liquidus = (by: number): Celsius | null => liquidusAt(composition, element, by);
  const answers = [search(liquidus, observedC, 1), search(liquidus, observedC, -1)].filter(
    (answer) => answer !== null,
  );
  return answers.length === 0
    ? null
    : answers.reduce((best, each) => (Math.abs(each) < Math.abs(best) ? each : best));
};
