import type { SectionAxis } from './binary-section.ts';
import type { Engine } from './engine.ts';
import { equilibrium } from './equilibrium.ts';
import { rangeOf } from './melting-range.ts';
import type { SectionBoundary, SectionInvariant, SectionPoint, SectionRequest } from './types.ts';

const HAIR_C = 1e-5;

const eutectic = (
  axis: SectionAxis,
  solidus: readonly SectionPoint[],
  engine: Engine,
): SectionInvariant[] => {
  for (const { x, temperatureC } of solidus) {
    const below = equilibrium(axis.compositionAt(x), temperatureC - HAIR_C, engine);
    const above = equilibrium(axis.compositionAt(x), temperatureC + HAIR_C, engine);
    if (!below.withinModel || !above.withinModel || below.phases.length !== 2) continue;
    const liquid = above.phases.find((phase) => phase.name === 'liquid');
    if (!liquid || below.phases.some((phase) => phase.name === 'liquid')) continue;
    const ends = below.phases.map((phase) => phase.wt[axis.xElement] ?? 0).sort((a, b) => a - b);
    const liquidX = liquid.wt[axis.xElement] ?? 0;
    return [{ name: 'eutectic', temperatureC, fromX: ends[0] ?? 0, liquidX, toX: ends[1] ?? 0 }];
  }
  return [];
};

const congruentMinimum = (
  axis: SectionAxis,
  liquidus: readonly SectionPoint[],
  engine: Engine,
): SectionInvariant[] => {
  const at = liquidus.reduce(
    (best, point, k) => (point.temperatureC < (liquidus[best]?.temperatureC ?? 0) ? k : best),
    0,
  );
  const before = liquidus[at - 1];
  const after = liquidus[at + 1];
  if (!before || !after || after.x >= axis.xMax - 1 || before.x <= axis.xMin + 1) return [];
  const liquidusAt = (x: number): number => {
    const job = engine.prepare(axis.compositionAt(x));
    return job.withinModel ? rangeOf(job).liquidusC : Number.POSITIVE_INFINITY;
  };
  let low = before.x;
  let high = after.x;
  const golden = (Math.sqrt(5) - 1) / 2;
  while (high - low > 1e-4) {
    const a = high - golden * (high - low);
    const b = low + golden * (high - low);
    if (liquidusAt(a) < liquidusAt(b)) high = b;
    else low = a;
  }
  const x = (low + high) / 2;
  return [{ name: 'congruent minimum', temperatureC: liquidusAt(x), fromX: x, liquidX: x, toX: x }];
};

/** The eutectic line, or the minimum at which liquid and solid are alike, of a binary section. */
export const sectionInvariants = (
  request: SectionRequest,
  axis: SectionAxis,
  melting: readonly SectionBoundary[],
  engine: Engine,
): SectionInvariant[] => {
  if (request.kind !== 'binary') return [];
  const flat = eutectic(axis, melting[1]?.points ?? [], engine);
  return flat.length > 0 ? flat : congruentMinimum(axis, melting[0]?.points ?? [], engine);
};
