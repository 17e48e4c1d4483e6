import { liquidusK, solidusK, solvusK } from '#shared/metallurgy/boundaries.ts';
import { Engine, type Job } from '#shared/metallurgy/engine.ts';
import { LOWEST_C } from '#shared/metallurgy/limits.ts';
import {
  MODEL_ELEMENTS,
  ZERO_CELSIUS_K,
  type Interaction,
  type ModelParameters,
} from '#shared/metallurgy/model.ts';
import type { AssessmentPoint, Quantity } from './points.ts';

/** Liquidus, solidus and (where asked for) solvus of a point, °C. */
export type Computed = Readonly<Record<Quantity, number>>;

/** The model with some interactions replaced. */
export const withInteractions = (base: ModelParameters, made: readonly Interaction[]): ModelParameters => {
  const names = new Set(made.map((i) => i.elements.join('-')));
  return {
    ...base,
    interactions: [...base.interactions.filter((i) => !names.has(i.elements.join('-'))), ...made],
  };
};

// Fillers and tie-line ends lie past the limit that the public functions refuse, so the job is made here.
const jobOf = (engine: Engine, point: AssessmentPoint): Job => {
  const elements = MODEL_ELEMENTS.filter((e) => (point.wt[e] ?? 0) > 0);
  const moles = elements.map((e) => (point.wt[e] ?? 0) / engine.model.atomicMass[e]);
  const total = moles.reduce((a, b) => a + b, 0);
  const minimiser = engine.minimiserFor(elements);
  return { minimiser, system: minimiser.system, x: Float64Array.from(moles, (m) => m / total), note: null };
};

/** Computes every point with one set of parameters. */
export const computePoints = (
  model: ModelParameters,
  points: readonly AssessmentPoint[],
): readonly Computed[] => {
  const engine = new Engine(model);
  return points.map((point) => {
    const job = jobOf(engine, point);
    const liquidus = liquidusK(job);
    const solidus = Math.min(liquidus, solidusK(job, liquidus));
    const wantsSolvus = point.values.some((value) => value.quantity === 'solvus');
    const solvus = (wantsSolvus ? solvusK(job, solidus) : null) ?? LOWEST_C + ZERO_CELSIUS_K;
    return {
      liquidus: liquidus - ZERO_CELSIUS_K,
      solidus: solidus - ZERO_CELSIUS_K,
      solvus: solvus - ZERO_CELSIUS_K,
    };
  });
};
