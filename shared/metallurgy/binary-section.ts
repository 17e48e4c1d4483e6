import { ENGINE, type Engine } from './engine.ts';
import { equilibrium } from './equilibrium.ts';
import { MODEL_ELEMENTS } from './model.ts';
import { rangeOf } from './melting-range.ts';
import { refuse } from './refusal.ts';
import { sectionFields } from './section-fields.ts';
import { sectionInvariants } from './section-invariants.ts';
import { solvusCurve } from './section-solvus.ts';
import type {
  Composition,
  ElementSymbol,
  Outcome,
  Section,
  SectionBoundary,
  SectionPoint,
  SectionRequest,
  TieLine,
} from './types.ts';

const STEPS = 100;
/** A pure end is drawn from its melting point; next to it the curve is read this far in, wt%. */
const EDGE_WT = 0.05;

/** What a section holds along its axis. */
export interface SectionAxis {
  readonly xElement: ElementSymbol;
  readonly xMin: number;
  readonly xMax: number;
  readonly compositionAt: (x: number) => Composition;
}

/** The axis of a requested section: x is wt% of its second element (copper, in a carat section). */
export const sectionAxis = (request: SectionRequest): Outcome<SectionAxis> => {
  if (request.kind === 'carat') {
    const { goldWt } = request;
    if (!(goldWt > 0 && goldWt < 100))
      return refuse('option', 'The gold of a carat section must lie between 0 and 100 wt%.');
    const compositionAt = (x: number) => ({ Au: goldWt, Ag: 100 - goldWt - x, Cu: x });
    return { withinModel: true, xElement: 'Cu', xMin: 0, xMax: 100 - goldWt, compositionAt };
  }
  const [first, second] = request.elements;
  const known = (e: string) => (MODEL_ELEMENTS as readonly string[]).includes(e);
  if (!known(first) || !known(second) || first === second) {
    return refuse('unknown-element', 'A binary section wants two different elements of Ag, Au, Cu and Zn.');
  }
  const compositionAt = (x: number) => ({ [first]: 100 - x, [second]: x });
  return { withinModel: true, xElement: second, xMin: 0, xMax: 100, compositionAt };
};

const places = ({ xMin, xMax }: SectionAxis): number[] => {
  const inner = Array.from({ length: STEPS - 1 }, (_, k) => xMin + ((k + 1) * (xMax - xMin)) / STEPS);
  return [xMin, xMin + EDGE_WT, ...inner, xMax - EDGE_WT, xMax];
};

const liquidusAndSolidus = (axis: SectionAxis, engine: Engine): SectionBoundary[] => {
  const liquidus: SectionPoint[] = [];
  const solidus: SectionPoint[] = [];
  for (const x of places(axis)) {
    const job = engine.prepare(axis.compositionAt(x));
    if (!job.withinModel) continue;
    const { liquidusC, solidusC } = rangeOf(job);
    liquidus.push({ x, temperatureC: liquidusC });
    if (equilibrium(axis.compositionAt(x), solidusC, engine).withinModel)
      solidus.push({ x, temperatureC: solidusC });
  }
  return [
    { name: 'liquidus', points: liquidus },
    { name: 'solidus', points: solidus },
  ];
};

/** The boundaries, fields and invariants of a section, for drawing; where the model ends, so do the lines. */
export const binarySection = (request: SectionRequest, engine: Engine = ENGINE): Outcome<Section> => {
  const axis = sectionAxis(request);
  if (!axis.withinModel) return axis;
  const melting = liquidusAndSolidus(axis, engine);
  const solidus = melting[1]?.points ?? [];
  return {
    withinModel: true,
    request,
    xElement: axis.xElement,
    xMin: axis.xMin,
    xMax: axis.xMax,
    boundaries: [...melting, ...solvusCurve(request, axis, solidus, engine)],
    fields: sectionFields(axis, melting, engine),
    invariants: sectionInvariants(request, axis, melting, engine),
  };
};

/** The phases at a place of a section, with where each lies along its axis. */
export const tieLine = (
  section: Section,
  x: number,
  temperatureC: number,
  engine: Engine = ENGINE,
): Outcome<TieLine> => {
  const axis = sectionAxis(section.request);
  if (!axis.withinModel) return axis;
  if (!(x >= axis.xMin && x <= axis.xMax)) {
    return refuse('option', `The place must lie between ${axis.xMin} and ${axis.xMax} wt% ${axis.xElement}.`);
  }
  const state = equilibrium(axis.compositionAt(x), temperatureC, engine);
  if (!state.withinModel) return state;
  const { withinModel: _, ...plain } = state;
  const gold = section.request.kind === 'carat' ? section.request.goldWt : null;
  const inPlane =
    gold === null || state.phases.every((phase) => Math.abs((phase.wt['Au'] ?? 0) - gold) < 1e-6);
  const ends = state.phases.map((phase) => ({
    name: phase.name,
    x: phase.wt[axis.xElement] ?? 0,
    massFraction: phase.massFraction,
  }));
  return { withinModel: true, state: plain, inPlane, ends };
};
