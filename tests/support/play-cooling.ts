import { heatOfAlloy } from '#shared/domain/cooling-curve/heat-of-alloy.ts';
import type { CurvePoint } from '#shared/domain/cooling-curve/curve-point.ts';
import type { Composition, FreezingRule } from '#shared/metallurgy/index.ts';

/** How a melt cools in its crucible, and how it is logged. */
export interface PlayedMelt {
  readonly composition: Composition;
  readonly rule: FreezingRule;
  readonly startC: number;
  readonly untilC: number;
  readonly surroundingsC: number;
  /** °C per second in the liquid at its liquidus. */
  readonly ratePerSecond: number;
  /** How far the liquid falls below its liquidus before it freezes, °C; as far again at a eutectic plateau. */
  readonly undercoolingC: number;
  /** Time constant with which an undercooled melt warms up again, s. */
  readonly recalescenceS: number;
  /** Time constant of the thermocouple in its sheath, s. */
  readonly lagS: number;
  readonly everyS: number;
  readonly noiseC: number;
  /** The share of points that are spikes of a loose plug. */
  readonly spikes: number;
  /** Seconds held at the start before the heat is taken away, and over which it fades. */
  readonly heldS: number;
}

/** A melt without anything odd: sterling, frozen as cast, logged each second. */
export const plainMelt: PlayedMelt = {
  composition: { Ag: 92.5, Cu: 7.5 },
  rule: 'scheil',
  startC: 960,
  untilC: 720,
  surroundingsC: 25,
  ratePerSecond: 1,
  undercoolingC: 0,
  recalescenceS: 2,
  lagS: 0,
  everyS: 1,
  noiseC: 0,
  spikes: 0,
  heldS: 0,
};

const stepS = 0.05;

/** Normal numbers from a stream of even ones, by Box and Muller. */
export const normalFrom =
  (random: () => number): (() => number) =>
  () =>
    Math.sqrt(-2 * Math.log(random() + 1e-12)) * Math.cos(2 * Math.PI * random());

/**
 * The metal's own temperature, step by step. Heat leaves by Newton's law; what of it is latent follows the engine's
 * path. Until a phase has begun to form the metal goes on along the line it was on (that of the liquid, then that of the
 * first solid), and when it has, it warms back to equilibrium exponentially.
 */
const metalOf = (melt: PlayedMelt): ((secondsOn: number) => number) => {
  const alloy = heatOfAlloy(melt.composition, melt.rule);
  if (!alloy) throw new Error('The engine does not hold this alloy.');
  const { surroundingsC, ratePerSecond, undercoolingC, recalescenceS } = melt;
  let heat = alloy.heatAt(melt.startC);
  let [begunAgo, missing] = [-1, 0];
  let passed = 0;
  return () => {
    passed += stepS;
    const balanced = alloy.temperatureOf(heat);
    // Undercooled liquid holds no latent heat given up: its temperature is its heat.
    if (begunAgo < 0 && heat < alloy.liquidusC - undercoolingC) {
      begunAgo = 0;
      missing = balanced - heat;
    }
    if (begunAgo >= 0) begunAgo += stepS;
    const shown =
      begunAgo < 0
        ? Math.max(heat, alloy.liquidusC - undercoolingC)
        : balanced - missing * Math.exp(-begunAgo / recalescenceS);
    const faded = melt.heldS === 0 ? 1 : Math.min(1, Math.max(0, (passed - melt.heldS) / melt.heldS));
    heat -= (stepS * faded * ratePerSecond * (shown - surroundingsC)) / (alloy.liquidusC - surroundingsC);
    return shown;
  };
};

/** A cooling curve as a logger would write it: `random` gives even numbers in [0, 1). */
export const playCooling = (melt: PlayedMelt, random: () => number): readonly CurvePoint[] => {
  const normal = normalFrom(random);
  const metal = metalOf(melt);
  const points: CurvePoint[] = [];
  let sensor = melt.startC;
  const perPoint = Math.round(melt.everyS / stepS);
  for (let step = 0; step < 3600 / stepS; step++) {
    const shown = metal(step);
    sensor += melt.lagS === 0 ? shown - sensor : ((shown - sensor) * stepS) / (melt.lagS + stepS);
    if (step % perPoint !== 0) continue;
    const spike = random() < melt.spikes ? 60 * (random() - 0.5) : 0;
    points.push({ seconds: step * stepS, temperatureC: sensor + melt.noiseC * normal() + spike });
    if (sensor < melt.untilC) break;
  }
  return points;
};
