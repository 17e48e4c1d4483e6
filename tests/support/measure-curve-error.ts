import { findArrests } from '#shared/domain/cooling-curve/find-arrests.ts';
import { judgeCurve } from '#shared/domain/cooling-curve/judge-curve.ts';
import { alongRay } from '#shared/domain/cooling-curve/solve-composition.ts';
import { meltingRange, type Composition, type MeltingRange } from '#shared/metallurgy/index.ts';
import { randomStream } from '#tests/checks/support/random.ts';
import { playCooling, plainMelt, type PlayedMelt } from './play-cooling.ts';

/** One alloy of each way of freezing: plateau, wide range with and without eutectic, narrow range. */
const alloys: readonly Composition[] = [
  { Ag: 92.5, Cu: 7.5 },
  { Ag: 100 },
  { Ag: 80, Cu: 20 },
  { Ag: 95.8, Cu: 4.2 },
  { Au: 75, Ag: 12.5, Cu: 12.5 },
  { Au: 58.5, Ag: 20, Cu: 21.5 },
  { Au: 58.5, Ag: 20, Cu: 18, Zn: 3.5 },
  { Au: 75, Ag: 4.5, Cu: 20.5 },
  { Au: 91.7, Ag: 4.3, Cu: 4 },
];

const rangeOf = (composition: Composition): MeltingRange => {
  const range = meltingRange(composition);
  if (!range.withinModel) throw new Error(range.reason);
  return range;
};

/** A melt cooled and logged in some way a studio might: rate, logger, noise, undercooling, sheath and spikes at random. */
export const randomMelt = (composition: Composition, random: () => number): PlayedMelt => {
  const { liquidusC, solidusC, asCastSolidusC } = rangeOf(composition);
  return {
    ...plainMelt,
    composition,
    rule: random() < 0.5 ? 'lever' : 'scheil',
    startC: liquidusC + 40 + 50 * random(),
    untilC: (asCastSolidusC ?? solidusC) - 30,
    surroundingsC: random() < 0.3 ? 300 : 25,
    ratePerSecond: 0.4 + 1.6 * random(),
    undercoolingC: 8 * random(),
    recalescenceS: 1 + 2 * random(),
    lagS: 2 * random(),
    everyS: [0.5, 1, 1, 2][Math.floor(4 * random())] ?? 1,
    noiseC: 0.2 + 0.8 * random(),
    spikes: 0.003,
    heldS: 20 * random(),
  };
};

/** How far the liquidus found lies from the true one, over many played melts. */
export interface CurveError {
  readonly curves: number;
  /** Curves from which nothing could be told. */
  readonly untold: number;
  readonly biasC: number;
  readonly rmsC: number;
  /** Nineteen of twenty lie within this. */
  readonly within95C: number;
  readonly largestC: number;
}

/** Measures the error of the liquidus over `curves` played melts of nine alloys, repeatable by its seed. */
export const measureCurveError = (curves: number, seed: number): CurveError => {
  const random = randomStream(seed);
  const errors: number[] = [];
  for (let k = 0; k < curves; k++) {
    const composition = alloys[k % alloys.length] ?? {};
    const { found } = findArrests(playCooling(randomMelt(composition, random), random));
    if (found) errors.push(found.liquidusC - rangeOf(composition).liquidusC);
  }
  const sizes = errors.map(Math.abs).sort((a, b) => a - b);
  const mean = (values: readonly number[]): number =>
    values.reduce((total, value) => total + value, 0) / values.length;
  return {
    curves,
    untold: curves - errors.length,
    biasC: mean(errors),
    rmsC: Math.sqrt(mean(errors.map((error) => error ** 2))),
    within95C: sizes[Math.floor(0.95 * sizes.length)] ?? Number.NaN,
    largestC: sizes.at(-1) ?? Number.NaN,
  };
};

/** What the judge makes of sterling that is sterling, and of sterling with copper added or left out. */
export interface VerdictError {
  readonly curves: number;
  readonly untold: number;
  /** Right alloys called wrong. */
  readonly falseAlarms: number;
  /** Alloys off by at least 1.5 wt% copper called right. */
  readonly missed: number;
  /** Root mean square error of the copper told, wt%. */
  readonly copperRmsWt: number;
}

const sterling: Composition = { Ag: 92.5, Cu: 7.5 };

/** Judges `curves` played melts of sterling with up to 4 wt% copper too much or too little, every other one as it should be. */
export const measureVerdicts = (curves: number, seed: number): VerdictError => {
  const random = randomStream(seed);
  let [untold, falseAlarms, missed] = [0, 0, 0];
  const off: number[] = [];
  for (let k = 0; k < curves; k++) {
    const size = 1.5 + 2.5 * random();
    const by = k % 2 === 0 ? 0 : random() < 0.5 ? size : -size;
    const melt = randomMelt(alongRay(sterling, 'Cu', by), random);
    const verdict = judgeCurve({
      points: playCooling({ ...melt, startC: Math.max(melt.startC, 940) }, random),
      compositionWt: sterling,
      toleranceWt: { Ag: 0.2 },
      thermometerC: 2,
      unit: 'C',
    });
    if (verdict.kind === 'cannot-tell') untold += 1;
    else if (by === 0 && verdict.kind === 'differs') falseAlarms += 1;
    else if (by !== 0 && verdict.kind === 'agrees') missed += 1;
    else if (verdict.kind === 'differs' && verdict.moreWt !== null) off.push(verdict.moreWt - by);
  }
  const squares = off.reduce((total, error) => total + error ** 2, 0);
  return { curves, untold, falseAlarms, missed, copperRmsWt: Math.sqrt(squares / off.length) };
};
