import type { SectionAxis } from './binary-section.ts';
import { solvusK } from './boundaries.ts';
import type { Engine } from './engine.ts';
import { equilibrium } from './equilibrium.ts';
import { LOWEST_C, floorC } from './limits.ts';
import { ZERO_CELSIUS_K } from './model.ts';
import type { SectionBoundary, SectionPoint, SectionRequest } from './types.ts';

const STEP_C = 10;

/** In a binary the two ends of the solid tie line at each temperature are the solvus. */
const binarySolvus = (axis: SectionAxis, top: SectionPoint, engine: Engine): SectionBoundary[] => {
  const rich: SectionPoint[] = [];
  const poor: SectionPoint[] = [];
  let x = top.x;
  for (let t = top.temperatureC - 1e-6; t >= LOWEST_C; t = Math.ceil(t / STEP_C - 1) * STEP_C) {
    const state = equilibrium(axis.compositionAt(x), t, engine);
    if (!state.withinModel || state.phases.length !== 2) break;
    const ends = state.phases.map((p) => p.wt[axis.xElement] ?? 0).sort((a, b) => a - b);
    poor.push({ x: ends[0] ?? 0, temperatureC: t });
    rich.push({ x: ends[1] ?? 0, temperatureC: t });
    x = ((ends[0] ?? 0) + (ends[1] ?? 0)) / 2;
  }
  if (poor.length < 2) return [];
  return [
    { name: 'solvus', points: poor.reverse() },
    { name: 'solvus', points: rich },
  ];
};

/** In a carat section the tie lines leave the plane: the solvus is found alloy by alloy. */
const caratSolvus = (
  axis: SectionAxis,
  solidus: readonly SectionPoint[],
  engine: Engine,
): SectionBoundary[] => {
  const points: SectionPoint[] = [];
  const lines: SectionPoint[][] = [points];
  for (const { x, temperatureC } of solidus) {
    const job = engine.prepare(axis.compositionAt(x));
    if (!job.withinModel) continue;
    const solvus = solvusK(job, temperatureC + ZERO_CELSIUS_K);
    const shown = solvus !== null && solvus - ZERO_CELSIUS_K > floorC(job.system, job.x);
    if (shown) lines.at(-1)?.push({ x, temperatureC: solvus - ZERO_CELSIUS_K });
    else if (lines.at(-1)?.length) lines.push([]);
  }
  return lines.filter((line) => line.length > 1).map((line) => ({ name: 'solvus', points: line }));
};

/** The lines below which one solid becomes two, if the section has any. */
export const solvusCurve = (
  request: SectionRequest,
  axis: SectionAxis,
  solidus: readonly SectionPoint[],
  engine: Engine,
): SectionBoundary[] => {
  if (request.kind === 'carat') return caratSolvus(axis, solidus, engine);
  const split = solidus.find(({ x, temperatureC }) => {
    const below = equilibrium(axis.compositionAt(x), temperatureC - 0.01, engine);
    return below.withinModel && below.phases.length === 2;
  });
  return split ? binarySolvus(axis, split, engine) : [];
};
