import { liquidusK, solidusK } from '#shared/metallurgy/boundaries.ts';
import { Engine, type Job } from '#shared/metallurgy/engine.ts';
import { wholeZincRefusal } from '#shared/metallurgy/limits.ts';
import { MODEL_ELEMENTS, ZERO_CELSIUS_K, type ModelParameters } from '#shared/metallurgy/model.ts';
import type { ElementSymbol } from '#shared/metallurgy/types.ts';

const STEPS = 16;
const PURE_C: Readonly<Record<ElementSymbol, number>> = { Ag: 961.78, Au: 1064.18, Cu: 1084.62, Zn: 419.53 };

/** One check that nothing absurd happens away from the points. */
export interface SanityCheck {
  readonly what: string;
  readonly passed: boolean;
  readonly found: string;
}

const simplex = (n: number, steps: number): number[][] =>
  n === 1
    ? [[steps]]
    : Array.from({ length: steps + 1 }, (_, k) =>
        simplex(n - 1, steps - k).map((rest) => [k, ...rest]),
      ).flat();

const jobsOver = (engine: Engine, steps: number, keep: (x: readonly number[]) => boolean): Job[] =>
  simplex(MODEL_ELEMENTS.length, steps)
    .map((point) => point.map((k) => k / steps))
    .filter(keep)
    .map((point) => {
      const elements = MODEL_ELEMENTS.filter((_, i) => (point[i] ?? 0) > 0);
      const minimiser = engine.minimiserFor(elements);
      return {
        minimiser,
        system: minimiser.system,
        x: Float64Array.from(point.filter((v) => v > 0)),
        note: null,
      };
    })
    .filter((job) => !wholeZincRefusal(job.system, job.x));

const phasesAt = ({ minimiser, system, x }: Job, celsius: number, allowed: 'solid' | 'liquid'): number => {
  system.setTemperature(celsius + ZERO_CELSIUS_K);
  minimiser.minimise(x, allowed);
  return minimiser.split.count;
};

const worst = (jobs: readonly Job[], measure: (job: Job) => number): number =>
  jobs.reduce((most, job) => Math.max(most, measure(job)), Number.NEGATIVE_INFINITY);

const goldWt = ({ system, x }: Job): number => {
  const mass = system.elements.map((_, i) => (x[i] ?? 0) * (system.mass[i] ?? 0));
  const gold = mass[system.elements.indexOf('Au')] ?? 0;
  return (100 * gold) / mass.reduce((a, b) => a + b, 0);
};

/** Looks over the whole of the model for liquidus maxima, gaps where none exist, and liquids that unmix. */
export const sanityChecks = (model: ModelParameters): readonly SanityCheck[] => {
  const engine = new Engine(model);
  const all = jobsOver(engine, STEPS, (x) => x.filter((v) => v > 0).length > 1);
  const above = worst(all, (job) => {
    const hottest = Math.max(...job.system.elements.map((e) => PURE_C[e]));
    return liquidusK(job) - ZERO_CELSIUS_K - hottest;
  });
  const inverted = worst(all, (job) => {
    const liquidus = liquidusK(job);
    return solidusK(job, liquidus) - liquidus;
  });
  const liquids = worst(all, (job) => phasesAt(job, 650, 'liquid'));
  const gold = all.filter((job) => goldWt(job) >= 75);
  const goldSolids = worst(gold, (job) => phasesAt(job, 600, 'solid'));
  const noGap = all.filter(
    ({ system }) => !(system.elements.includes('Ag') && system.elements.includes('Cu')),
  );
  const plainSolids = worst(noGap, (job) => phasesAt(job, 250, 'solid'));
  return [
    {
      what: 'No liquidus stands above the melting point of its hottest element',
      passed: above < 0,
      found: `highest is ${above.toFixed(1)} °C from it`,
    },
    {
      what: 'No solidus stands above its liquidus',
      passed: inverted < 1e-6,
      found: `largest solidus less liquidus ${inverted.toExponential(1)} °C`,
    },
    { what: 'The liquid never unmixes at 650 °C', passed: liquids === 1, found: `at most ${liquids} liquid` },
    {
      what: 'Solid of 75 wt% gold or more is of one kind at 600 °C, where 18 ct is solution-treated',
      passed: goldSolids === 1,
      found: `at most ${goldSolids} solid phase in ${gold.length} alloys`,
    },
    {
      what: 'Solids without silver and copper together never unmix, down to 250 °C',
      passed: plainSolids === 1,
      found: `at most ${plainSolids} solid phase in ${noGap.length} alloys`,
    },
  ];
};
