import { ENGINE, type Engine } from './engine.ts';
import { meltingRange } from './melting-range.ts';
import { refuse } from './refusal.ts';
import type { Band, Composition, MeltingRange, Outcome, RangeBand, Sensitivity } from './types.ts';

const NUDGE_WT = 0.01;

type Amounts = Record<string, number>;

const signChoices = (count: number): number[][] =>
  count === 0
    ? [[]]
    : signChoices(count - 1).flatMap((rest) => [
        [...rest, -1],
        [...rest, 1],
      ]);

/** The corners of what a composition may be: each element at a limit of its tolerance but one, which makes up 100. */
const corners = (composition: Composition, tolerance: Readonly<Amounts>): Amounts[] => {
  const elements = Object.keys(tolerance);
  const found = new Map<string, Amounts>();
  for (const balance of elements) {
    const others = elements.filter((e) => e !== balance);
    for (const signs of signChoices(others.length)) {
      const moves = others.map((e, k) => (signs[k] ?? 0) * (tolerance[e] ?? 0));
      const made = -moves.reduce((a, b) => a + b, 0);
      if (Math.abs(made) > (tolerance[balance] ?? 0) + 1e-12) continue;
      const corner: Amounts = { ...composition };
      others.forEach((e, k) => (corner[e] = (corner[e] ?? 0) + (moves[k] ?? 0)));
      corner[balance] = (corner[balance] ?? 0) + made;
      if (Object.values(corner).some((wt) => wt < 0)) continue;
      found.set(elements.map((e) => corner[e]?.toFixed(9)).join(), corner);
    }
  }
  return [...found.values()];
};

/** An element without a tolerance of its own may take up whatever the others leave. */
const fullTolerance = (composition: Composition, toleranceWt: Readonly<Amounts>): Amounts => {
  const sum = Object.values(toleranceWt).reduce((a, b) => a + b, 0);
  return Object.fromEntries(Object.keys(composition).map((e) => [e, toleranceWt[e] ?? sum]));
};

const halfway = (a: Composition, b: Composition): Amounts =>
  Object.fromEntries(Object.keys(a).map((e) => [e, ((a[e] ?? 0) + (b[e] ?? 0)) / 2]));

const bandOf = (values: readonly number[]): Band => ({ low: Math.min(...values), high: Math.max(...values) });

const nudged = (composition: Composition, element: string, by: number): Amounts => {
  const wt = composition[element] ?? 0;
  const rest = 100 - wt;
  return Object.fromEntries(
    Object.entries(composition).map(([e, amount]) => [
      e,
      e === element ? amount + by : amount * (1 - by / rest),
    ]),
  );
};

const sensitivityTo = (composition: Composition, element: string, engine: Engine): Sensitivity | null => {
  const wt = composition[element] ?? 0;
  if (wt >= 100 - NUDGE_WT) return null;
  const down = Math.min(NUDGE_WT, wt / 2);
  const above = meltingRange(nudged(composition, element, NUDGE_WT), engine);
  const below = meltingRange(nudged(composition, element, -down), engine);
  if (!above.withinModel || !below.withinModel) return null;
  const span = NUDGE_WT + down;
  return {
    element,
    liquidusCPerWt: (above.liquidusC - below.liquidusC) / span,
    solidusCPerWt: (above.solidusC - below.solidusC) / span,
  };
};

const toleranceFault = (composition: Composition, toleranceWt: Readonly<Amounts>): string | null => {
  for (const [element, wt] of Object.entries(toleranceWt)) {
    if (!(element in composition))
      return `A tolerance is given for ${element}, which the alloy does not hold.`;
    if (!Number.isFinite(wt) || wt < 0) return `The tolerance of ${element} must be a number not below zero.`;
  }
  return null;
};

/**
 * How far liquidus, solidus and as-cast limit may lie when each element is anywhere within ± its tolerance (wt%);
 * computed at the corners of the tolerance and halfway to them.
 */
export const rangeBand = (
  composition: Composition,
  toleranceWt: Readonly<Record<string, number>>,
  engine: Engine = ENGINE,
): Outcome<RangeBand> => {
  const centre = meltingRange(composition, engine);
  if (!centre.withinModel) return centre;
  const fault = toleranceFault(composition, toleranceWt);
  if (fault) return refuse('option', fault);
  const limits = corners(composition, fullTolerance(composition, toleranceWt));
  const ranges: MeltingRange[] = [centre];
  for (const place of [...limits, ...limits.map((corner) => halfway(composition, corner))]) {
    const range = meltingRange(place, engine);
    if (!range.withinModel) return range;
    ranges.push(range);
  }
  const asCast = ranges.map((r) => r.asCastSolidusC).filter((t) => t !== null);
  const elements = Object.keys(composition).filter((e) => (composition[e] ?? 0) > 0);
  return {
    withinModel: true,
    liquidusC: bandOf(ranges.map((r) => r.liquidusC)),
    solidusC: bandOf(ranges.map((r) => r.solidusC)),
    asCastSolidusC: asCast.length === ranges.length ? bandOf(asCast) : null,
    sensitivities: elements.map((e) => sensitivityTo(composition, e, engine)).filter((s) => s !== null),
    compositions: ranges.length,
  };
};
