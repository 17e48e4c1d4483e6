import { ENGINE, type Engine, type Job } from './engine.ts';
import { coldLiquidRefusal, temperatureRefusal, zincRefusal } from './limits.ts';
import { FCC, LIQUID, ZERO_CELSIUS_K } from './model.ts';
import { refuse } from './refusal.ts';
import type { System } from './system.ts';
import type {
  ByElement,
  Composition,
  EquilibriumState,
  Outcome,
  Phase,
  PhaseName,
  Refusal,
} from './types.ts';

const byElement = (system: System, value: (i: number) => number): ByElement =>
  Object.fromEntries(system.elements.map((element, i) => [element, value(i)]));

/** Mean atomic mass at `x[at…]`, g/mol. */
export const meanMass = (system: System, x: Float64Array, at: number): number => {
  let sum = 0;
  for (let i = 0; i < system.n; i++) sum += x[at + i]! * system.mass[i]!;
  return sum;
};

/** Mole fractions at `x[at…]` as wt% by element. */
export const toWt = (system: System, x: Float64Array, at: number): ByElement => {
  const mean = meanMass(system, x, at);
  return byElement(system, (i) => (100 * x[at + i]! * system.mass[i]!) / mean);
};

const fccName = (job: Job, p: number): PhaseName => {
  const { split } = job.minimiser;
  const { n, elements } = job.system;
  const others = Array.from({ length: split.count }, (_, q) => q).filter(
    (q) => q !== p && split.phase[q] === FCC,
  );
  if (others.length === 0) return 'fcc';
  const silver = elements.indexOf('Ag');
  const mine = split.x[p * n + silver] ?? 0;
  return others.every((q) => mine >= (split.x[q * n + silver] ?? 0)) ? 'silver-rich fcc' : 'copper-rich fcc';
};

const phaseAt = (job: Job, p: number, wholeMass: number): Phase => {
  const { split } = job.minimiser;
  const { system } = job;
  const at = p * system.n;
  return {
    name: split.phase[p] === LIQUID ? 'liquid' : fccName(job, p),
    moleFraction: split.total[p]!,
    massFraction: (split.total[p]! * meanMass(system, split.x, at)) / wholeMass,
    wt: toWt(system, split.x, at),
    at: byElement(system, (i) => 100 * split.x[at + i]!),
  };
};

const refusalOfPhases = (job: Job): Refusal | null => {
  const { split } = job.minimiser;
  const { system } = job;
  const phases = Array.from({ length: split.count }, (_, p) => p);
  const solid = phases.some((p) => split.phase[p] === FCC);
  const liquid = phases.some((p) => split.phase[p] === LIQUID);
  if (!solid) return null;
  if (liquid) {
    const cold = coldLiquidRefusal(system);
    if (cold) return cold;
  }
  for (const p of phases) {
    const refusal = zincRefusal(system, split.phase[p]!, split.x, p * system.n);
    if (refusal) return refusal;
  }
  return null;
};

/** Reads the answer that stands in the job's minimiser. */
export const readState = (job: Job): EquilibriumState => {
  const { split } = job.minimiser;
  const { system } = job;
  const wholeMass = meanMass(system, job.x, 0);
  const phases = Array.from({ length: split.count }, (_, p) => phaseAt(job, p, wholeMass));
  phases.sort(
    (a, b) => Number(b.name === 'liquid') - Number(a.name === 'liquid') || b.massFraction - a.massFraction,
  );
  const liquidMassFraction =
    phases[0]?.name !== 'liquid' ? 0 : phases.length === 1 ? 1 : phases[0].massFraction;
  return {
    temperatureC: system.temperature - ZERO_CELSIUS_K,
    phases,
    liquidMassFraction,
    solidMassFraction: 1 - liquidMassFraction,
    degreesOfFreedom: system.n + 1 - split.count,
    chemicalPotentials: byElement(system, (i) => split.mu[split.main * system.n + i]!),
  };
};

/** The state of least energy of a prepared job, or the reason there is none. */
export const stateOf = (job: Job, temperatureC: number): Outcome<EquilibriumState> => {
  const refusal = temperatureRefusal(job.system, job.x, temperatureC);
  if (refusal) return refusal;
  job.system.setTemperature(temperatureC + ZERO_CELSIUS_K);
  if (!job.minimiser.minimise(job.x)) {
    return refuse('outside-model', `No settled state was found at ${temperatureC} °C.`);
  }
  return refusalOfPhases(job) ?? { withinModel: true, ...readState(job), temperatureC };
};

/** Which phases are stable at `temperatureC`, how much of each, and of what composition. */
export const equilibrium = (
  composition: Composition,
  temperatureC: number,
  engine: Engine = ENGINE,
): Outcome<EquilibriumState> => {
  const job = engine.prepare(composition);
  return job.withinModel ? stateOf(job, temperatureC) : job;
};
