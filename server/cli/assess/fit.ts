import { levenbergMarquardt } from 'ml-levenberg-marquardt';
import { inverse, Matrix } from 'ml-matrix';
import type { ModelParameters } from '#shared/metallurgy/model.ts';
import { computePoints, withInteractions } from './compute.ts';
import type { AssessmentPoint, PublishedValue } from './points.ts';
import type { Stage } from './stages.ts';

const STEP = 0.02;
const ITERATIONS = 25;

/** One published value beside the computed one. */
export interface Residual extends PublishedValue {
  readonly id: string;
  readonly name: string;
  readonly computedC: number;
  readonly residualC: number;
}

/** A finished fit: parameter values with standard errors, and every residual of its points. */
export interface Fit {
  readonly stage: Stage;
  readonly values: readonly number[];
  readonly errors: readonly number[];
  readonly residuals: readonly Residual[];
  readonly model: ModelParameters;
}

type Evaluate = (values: readonly number[]) => readonly number[];

/** Every residual of some points under a model, computed less published. */
export const residualsOf = (
  model: ModelParameters,
  points: readonly AssessmentPoint[],
): readonly Residual[] => {
  const computed = computePoints(model, points);
  return points.flatMap((point, k) =>
    point.values.map((value) => {
      const computedC = computed[k]?.[value.quantity] ?? Number.NaN;
      return { ...value, id: point.id, name: point.name, computedC, residualC: computedC - value.valueC };
    }),
  );
};

/** Root mean square of the residuals with one use, °C, and their number; solvi are left out unless asked for. */
export const rootMeanSquare = (
  residuals: readonly Residual[],
  keep: (residual: Residual) => boolean,
): { readonly rmsC: number; readonly count: number } => {
  const kept = residuals.filter(keep);
  const sum = kept.reduce((total, { residualC }) => total + residualC ** 2, 0);
  return { rmsC: Math.sqrt(sum / Math.max(1, kept.length)), count: kept.length };
};

const remembered = (evaluate: Evaluate): Evaluate => {
  const known = new Map<string, readonly number[]>();
  return (values) => {
    const key = values.join();
    const found = known.get(key) ?? evaluate(values);
    known.set(key, found);
    return found;
  };
};

/** Standard errors from the curvature of the sum of squares at the answer. */
const standardErrors = (
  evaluate: Evaluate,
  values: readonly number[],
  chiSquare: number,
): readonly number[] => {
  const columns = values.map((_, k) => {
    const up = evaluate(values.map((v, j) => (j === k ? v + STEP : v)));
    const down = evaluate(values.map((v, j) => (j === k ? v - STEP : v)));
    return up.map((u, i) => (u - (down[i] ?? 0)) / (2 * STEP));
  });
  const jacobian = new Matrix(columns).transpose();
  const covariance = inverse(jacobian.transpose().mmul(jacobian));
  const freedom = Math.max(1, jacobian.rows - values.length);
  return values.map((_, k) => Math.sqrt((covariance.get(k, k) * chiSquare) / freedom));
};

/** Fits a stage to its points by Levenberg-Marquardt, each value weighted by its sigma. */
export const fitStage = (stage: Stage, base: ModelParameters, all: readonly AssessmentPoint[]): Fit => {
  const points = all.filter((point) => point.stage === stage.name);
  const modelFor = (values: readonly number[]) => withInteractions(base, stage.build(values));
  const used = residualsOf(base, points).filter(({ use }) => use === 'fit');
  const evaluate = remembered((values) =>
    residualsOf(modelFor(values), points)
      .filter(({ use }) => use === 'fit')
      .map(({ computedC, sigmaC }) => computedC / sigmaC),
  );
  // The data are scaled by their sigmas here: the package's own weights are left at one.
  const { parameterValues } = levenbergMarquardt(
    { x: used.map((_, i) => i), y: used.map(({ valueC, sigmaC }) => valueC / sigmaC) },
    (values: number[]) => {
      const at = [...values];
      return (i: number) => evaluate(at)[i] ?? Number.NaN;
    },
    {
      initialValues: stage.parameters.map(({ start }) => start),
      gradientDifference: STEP,
      centralDifference: true,
      damping: 1e-3,
      maxIterations: ITERATIONS,
      errorTolerance: 1e-9,
    },
  );
  const values = [...parameterValues];
  const model = modelFor(values);
  const residuals = residualsOf(model, points);
  const chiSquare = residuals
    .filter(({ use }) => use === 'fit')
    .reduce((sum, { residualC, sigmaC }) => sum + (residualC / sigmaC) ** 2, 0);
  return { stage, values, errors: standardErrors(evaluate, values, chiSquare), residuals, model };
};
