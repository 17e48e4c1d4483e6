import {
  formatTemperature,
  formatTemperatureDifference,
  type Celsius,
  type TemperatureUnit,
} from '#shared/lib/units.ts';
import { meltingRange, type Composition, type MeltingRange } from '#shared/metallurgy/index.ts';
import type { CurvePoint } from './curve-point.ts';
import {
  findArrests,
  type Arrests,
  type CurveFault,
  type CurveQuality,
  type FoundArrests,
} from './find-arrests.ts';
import { alongRay, mostTelling, solveForLiquidus } from './solve-composition.ts';

/** Why a curve does not tell whether it is this alloy. */
export type CannotTell = CurveFault | 'outside-model' | 'never-crossed';

/** What a curve is held against. */
export interface CurveQuestion {
  readonly points: readonly CurvePoint[];
  readonly compositionWt: Composition;
  /** How far each element may be off, ± wt%. */
  readonly toleranceWt: Readonly<Record<string, number>>;
  /** How far the thermometer may be off, ± °C, after its check; or by its class, where it was not checked. */
  readonly thermometerC: number;
  readonly unit: TemperatureUnit;
}

/** Where this alloy should freeze, by the engine, °C. */
export type ComputedRange = Pick<MeltingRange, 'liquidusC' | 'solidusC' | 'asCastSolidusC'>;

/** What a curve says of the metal in the crucible: exactly one of three answers, with all it rests on. */
export type CurveVerdict = {
  readonly sentence: string;
  readonly quality: CurveQuality;
} & (
  | {
      readonly kind: 'agrees';
      readonly observed: Arrests;
      readonly computed: ComputedRange;
      readonly allowedC: number;
    }
  | {
      readonly kind: 'differs';
      readonly observed: Arrests;
      readonly computed: ComputedRange;
      readonly allowedC: number;
      /** Observed less computed liquidus, °C. */
      readonly byC: number;
      readonly element: string;
      /** So much more of the element, wt%; null where no amount of it explains the liquidus. */
      readonly moreWt: number | null;
    }
  | {
      readonly kind: 'cannot-tell';
      readonly why: CannotTell;
      readonly observed: Arrests | null;
      readonly computed: ComputedRange | null;
    }
);

/** How well the engine's liquidus is known, ± °C: by the residuals in docs/metallurgy.md; for silver-copper by its published assessment. */
const engineC = ({ Au = 0, Zn = 0 }: Composition): number => {
  if (Zn > 0) return 10;
  return Au > 0 ? 6 : 3;
};

/** The curve must begin so far above the liquidus, and go so far below it, °C. */
const marginC = 5;

const elementWords: Readonly<Record<string, string>> = { Ag: 'silver', Au: 'gold', Cu: 'copper', Zn: 'zinc' };

/** What a tolerance in the composition makes of the liquidus, ± °C. */
const toleranceC = (
  { compositionWt, toleranceWt }: CurveQuestion,
  element: string,
  liquidusC: Celsius,
): number => {
  const wt = Math.max(0, ...Object.values(toleranceWt));
  const more = meltingRange(alongRay(compositionWt, element, wt));
  return more.withinModel ? Math.abs(more.liquidusC - liquidusC) : 0;
};

const faultWords = (fault: CurveFault, { points, everyS, noiseC }: CurveQuality): string => {
  switch (fault) {
    case 'too-few-points':
      return `${points} points are too few: log the whole fall, about once a second.`;
    case 'too-slow-sampling':
      return `a point every ${everyS.toFixed(1)} s is too slow for how fast it cooled: an arrest could slip through.`;
    case 'too-much-noise':
      return `the readings jump by about ${noiseC.toFixed(1)} °C: an arrest would be lost in that. Look at the thermocouple and its plug.`;
    case 'begins-too-late':
      return 'the curve shows too little of the liquid before it begins to freeze: begin to log earlier.';
    case 'no-arrest':
      return 'nothing in it slows down as freezing metal does.';
  }
};

const neverCrossed = ({ highestC, lowestC }: CurveQuality, { liquidusC }: ComputedRange): boolean =>
  highestC < liquidusC + marginC || lowestC > liquidusC - marginC;

const cannotTell = (
  why: CannotTell,
  because: string,
  { quality, observed, computed }: Pick<CurveVerdict, 'quality' | 'observed' | 'computed'>,
): CurveVerdict => ({
  kind: 'cannot-tell',
  why,
  sentence: `Cannot tell, because ${because}`,
  quality,
  observed,
  computed,
});

const explainNothing = (
  arrests: FoundArrests & { readonly found: null },
  computed: ComputedRange,
  unit: TemperatureUnit,
): CurveVerdict => {
  const { quality, fault } = arrests;
  const context = { quality, observed: null, computed };
  const isShort = fault === 'no-arrest' || fault === 'begins-too-late';
  if (isShort && neverCrossed(quality, computed)) {
    const write = (celsius: Celsius): string => formatTemperature(celsius, unit);
    return cannotTell(
      'never-crossed',
      `the curve runs from ${write(quality.highestC)} to ${write(quality.lowestC)} and does not cross ${write(computed.liquidusC)}, where this alloy begins to freeze.`,
      context,
    );
  }
  return cannotTell(fault, faultWords(fault, quality), context);
};

const amountWords = (element: string, moreWt: number | null): string => {
  const name = elementWords[element] ?? element;
  if (moreWt === null) return `No amount of ${name} alone explains that: it may be another alloy.`;
  return `That would mean about ${Math.abs(moreWt).toFixed(1)} wt% ${moreWt > 0 ? 'more' : 'less'} ${name}.`;
};

const compare = (
  question: CurveQuestion,
  observed: Arrests,
  quality: CurveQuality,
  computed: ComputedRange,
): CurveVerdict => {
  const { compositionWt, unit, thermometerC } = question;
  const element = mostTelling(compositionWt);
  const byC = observed.liquidusC - computed.liquidusC;
  const allowedC = Math.hypot(
    engineC(compositionWt),
    thermometerC,
    2 * observed.liquidusErrorC,
    toleranceC(question, element, computed.liquidusC),
  );
  const write = (celsius: Celsius): string => formatTemperature(celsius, unit);
  const difference = (celsius: Celsius): string => formatTemperatureDifference(celsius, unit);
  const seen = `it begins to freeze at ${write(observed.liquidusC)}, and this alloy should at ${write(computed.liquidusC)}`;
  const context = { quality, observed, computed, allowedC };
  if (Math.abs(byC) <= allowedC)
    return { kind: 'agrees', sentence: `Agrees: ${seen}, ± ${difference(allowedC)}.`, ...context };
  const moreWt = solveForLiquidus(compositionWt, element, observed.liquidusC);
  return {
    kind: 'differs',
    sentence: `Differs by ${difference(Math.abs(byC))}: ${seen}, ± ${difference(allowedC)}. ${amountWords(element, moreWt)}`,
    ...context,
    byC,
    element,
    moreWt,
  };
};

/**
 * Whether the metal in the crucible freezes where this alloy should. The liquidus decides, for it is the surest to see;
 * what is allowed joins, as independent errors, the engine's, the thermometer's, the curve's own and the alloy's tolerance.
 */
export const judgeCurve = (question: CurveQuestion): CurveVerdict => {
  const arrests = findArrests(question.points);
  const range = meltingRange(question.compositionWt);
  if (!range.withinModel)
    return cannotTell('outside-model', `where this alloy freezes is not computed. ${range.reason}`, {
      quality: arrests.quality,
      observed: arrests.found,
      computed: null,
    });
  const { liquidusC, solidusC, asCastSolidusC } = range;
  const computed = { liquidusC, solidusC, asCastSolidusC };
  return arrests.found
    ? compare(question, arrests.found, arrests.quality, computed)
    : explainNothing(arrests, computed, question.unit);
};
