import { ENGINE, type Engine, type Job } from './engine.ts';
import { stateOf } from './equilibrium.ts';
import { temperatureRefusal } from './limits.ts';
import { rangeOf } from './melting-range.ts';
import { refuse } from './refusal.ts';
import { ScheilCurve } from './scheil-curve.ts';
import { scheilFreeze } from './scheil-walk.ts';
import type {
  ByElement,
  Composition,
  EquilibriumState,
  FreezingPath,
  FreezingRule,
  Outcome,
  PathPoint,
  SolidFraction,
} from './types.ts';

const LEAST_STEP_C = 0.05;
const MOST_STEP_C = 200;
/** How far above a temperature at which the rest freezes at once the path is also read, °C. */
const JUST_ABOVE_C = 1e-6;
/** Less than this freezing at one temperature is not a step worth drawing. */
const SUDDEN = 1e-5;

const mixtureWt = (state: EquilibriumState): ByElement | null => {
  const solids = state.phases.filter((phase) => phase.name !== 'liquid');
  if (solids.length === 0) return null;
  const whole = solids.reduce((sum, phase) => sum + phase.massFraction, 0);
  const elements = Object.keys(state.chemicalPotentials);
  const mean = (e: string) => solids.reduce((sum, p) => sum + (p.massFraction / whole) * (p.wt[e] ?? 0), 0);
  return Object.fromEntries(elements.map((e) => [e, mean(e)]));
};

const leverFraction = (state: EquilibriumState): SolidFraction => ({
  solidMassFraction: Math.min(1, Math.max(0, state.solidMassFraction)),
  solidWt: mixtureWt(state),
  liquidWt: state.phases.find((phase) => phase.name === 'liquid')?.wt ?? null,
});

/** The liquidus, every whole multiple of `step` below it, a hair above the end, and the end. */
const readings = (liquidusC: number, endC: number, step: number): number[] => {
  const temperatures = [liquidusC];
  for (let k = Math.ceil(liquidusC / step) - 1; k * step > endC + JUST_ABOVE_C; k--)
    temperatures.push(k * step);
  if (liquidusC > endC + JUST_ABOVE_C) temperatures.push(endC + JUST_ABOVE_C);
  temperatures.push(endC);
  return temperatures;
};

/** Reads the first point in the liquid and the last in the solid, also where both are one temperature. */
const nudge = (t: number, liquidusC: number, solidusC: number, first: boolean): number => {
  if (first && t === liquidusC) return t + JUST_ABOVE_C;
  return t === solidusC ? t - JUST_ABOVE_C : t;
};

/** Drops the reading a hair above the end where nothing freezes at once there. */
const withoutRepeat = (points: readonly PathPoint[]): readonly PathPoint[] => {
  const hair = points.at(-2);
  const end = points.at(-1);
  if (points.length < 3 || !hair || !end) return points;
  return end.solidMassFraction - hair.solidMassFraction < SUDDEN ? points.toSpliced(-2, 1) : points;
};

const leverPath = (job: Job, step: number): Outcome<FreezingPath> => {
  const { liquidusC, solidusC } = rangeOf(job);
  const points: PathPoint[] = [];
  for (const temperatureC of readings(liquidusC, solidusC, step)) {
    const state = stateOf(job, nudge(temperatureC, liquidusC, solidusC, points.length === 0));
    if (!state.withinModel) {
      if (points.length === 0) return state;
      return { withinModel: true, rule: 'lever', points, endsC: null, note: state.reason };
    }
    points.push({ ...leverFraction(state), temperatureC });
  }
  return { withinModel: true, rule: 'lever', points: withoutRepeat(points), endsC: solidusC, note: job.note };
};

/**
 * Without diffusion metal may run ahead of the lever rule: by thousandths where the solidus is retrograde (copper-rich
 * silver-copper), and within a degree of a second solid where gold lifts the eutectic valley. Solid beyond what
 * equilibrium allows would melt again, so the fraction is held at the lever one.
 */
const heldAtLever = (
  job: Job,
  temperatureC: number,
  fraction: SolidFraction,
  endsC: number | null = null,
): SolidFraction => {
  if (endsC !== null && temperatureC <= endsC) return fraction;
  if (fraction.solidMassFraction === 0) return fraction;
  const lever = stateOf(job, temperatureC);
  if (!lever.withinModel || lever.solidMassFraction >= fraction.solidMassFraction) return fraction;
  return { ...fraction, solidMassFraction: lever.solidMassFraction };
};

const scheilPath = (job: Job, step: number): Outcome<FreezingPath> => {
  const freeze = scheilFreeze(job);
  if (freeze.nodes.length === 0)
    return refuse('phase-outside-model', freeze.note ?? 'The freeze could not be followed.');
  const curve = new ScheilCurve(job, freeze);
  const { liquidusC, solidusC } = rangeOf(job);
  const endsC = curve.endC === null ? null : Math.min(curve.endC, solidusC);
  const points: PathPoint[] = [];
  for (const temperatureC of readings(liquidusC, endsC ?? curve.lowestC, step)) {
    const first = points.length === 0;
    const fraction = curve.at(endsC === null ? temperatureC : nudge(temperatureC, liquidusC, endsC, first));
    if (fraction) points.push({ ...heldAtLever(job, temperatureC, fraction, endsC), temperatureC });
  }
  return {
    withinModel: true,
    rule: 'scheil',
    points: withoutRepeat(points),
    endsC,
    note: freeze.note ?? job.note,
  };
};

/** How an alloy freezes from its liquidus down, by the lever rule or by Scheil-Gulliver, read every `stepC` °C (5 unless told). */
export const freezingPath = (
  composition: Composition,
  options: { readonly rule: FreezingRule; readonly stepC?: number },
  engine: Engine = ENGINE,
): Outcome<FreezingPath> => {
  const step = options.stepC ?? 5;
  if (!(step >= LEAST_STEP_C && step <= MOST_STEP_C)) {
    return refuse('option', `The step must lie between ${LEAST_STEP_C} and ${MOST_STEP_C} °C.`);
  }
  const job = engine.prepare(composition);
  if (!job.withinModel) return job;
  return options.rule === 'lever' ? leverPath(job, step) : scheilPath(job, step);
};

/** How much is solid at one reading, by the lever rule unless told, with the solid and liquid there. */
export const solidFractionAt = (
  composition: Composition,
  temperatureC: number,
  rule: FreezingRule = 'lever',
  engine: Engine = ENGINE,
): Outcome<SolidFraction> => {
  const job = engine.prepare(composition);
  if (!job.withinModel) return job;
  if (rule === 'lever') {
    const state = stateOf(job, temperatureC);
    return state.withinModel ? { withinModel: true, ...leverFraction(state) } : state;
  }
  const refusal = temperatureRefusal(job.system, job.x, temperatureC);
  if (refusal) return refusal;
  const freeze = scheilFreeze(job);
  const fraction = freeze.nodes.length > 0 ? new ScheilCurve(job, freeze).at(temperatureC) : null;
  if (fraction) return { withinModel: true, ...heldAtLever(job, temperatureC, fraction) };
  return refuse('phase-outside-model', freeze.note ?? 'The freeze could not be followed so far.');
};
