import { MODEL_ELEMENTS } from './model.ts';
import { refuse } from './refusal.ts';
import type { Composition, ElementSymbol, Outcome } from './types.ts';

/** How far a composition may miss 100 wt% before it is refused. */
export const SUM_TOLERANCE_WT = 0.05;

/** How much of elements outside the model, all together, is taken as trace and left out with a note, wt%. */
export const TRACE_LIMIT_WT = 0.02;

/** An element of the model below this is taken as absent, wt%. */
const ABSENT_WT = 1e-11;

const OTHER_ELEMENTS = new Set(
  (
    'H He Li Be B C N O F Ne Na Mg Al Si P S Cl Ar K Ca Sc Ti V Cr Mn Fe Co Ni Ga Ge As Se Br Kr Rb Sr Y Zr Nb Mo ' +
    'Tc Ru Rh Pd Cd In Sn Sb Te I Xe Cs Ba La Ce Pr Nd Pm Sm Eu Gd Tb Dy Ho Er Tm Yb Lu Hf Ta W Re Os Ir Pt Hg Tl ' +
    'Pb Bi Po At Rn Fr Ra Ac Th Pa U'
  ).split(' '),
);

/** A composition inside the model: elements present, mole fractions in their order, and a note of traces left out. */
export interface Charge {
  readonly elements: readonly ElementSymbol[];
  readonly x: Float64Array;
  readonly note: string | null;
}

/** An amount in wt% as people write it. */
export const writeWt = (value: number): string => String(Number(value.toFixed(3)));

const isModelElement = (symbol: string): symbol is ElementSymbol =>
  (MODEL_ELEMENTS as readonly string[]).includes(symbol);

const firstFault = (entries: readonly (readonly [string, number])[]): Outcome<object> | null => {
  for (const [symbol, wt] of entries) {
    if (!isModelElement(symbol) && !OTHER_ELEMENTS.has(symbol)) {
      return refuse('unknown-element', `${symbol || 'An empty name'} is not the symbol of an element.`);
    }
    if (typeof wt !== 'number' || !Number.isFinite(wt)) {
      return refuse('not-a-number', `The amount of ${symbol} is not a number.`);
    }
    if (wt < 0) return refuse('negative', `The amount of ${symbol} is below zero (${writeWt(wt)} wt%).`);
  }
  const sum = entries.reduce((total, [, wt]) => total + wt, 0);
  if (Math.abs(sum - 100) > SUM_TOLERANCE_WT) {
    return refuse('composition-sum', `The composition adds up to ${writeWt(sum)} wt%, not 100.`);
  }
  return null;
};

/** Reads a composition into mole fractions, or refuses it with the reason. */
export const readComposition = (
  composition: Composition,
  atomicMass: Readonly<Record<ElementSymbol, number>>,
): Outcome<Charge> => {
  const entries = Object.entries(composition);
  const fault = firstFault(entries);
  if (fault && !fault.withinModel) return fault;
  const others = entries.filter(([symbol, wt]) => !isModelElement(symbol) && wt > 0);
  const otherWt = others.reduce((total, [, wt]) => total + wt, 0);
  const named = others.map(([symbol, wt]) => `${symbol} ${writeWt(wt)} wt%`).join(', ');
  if (otherWt > TRACE_LIMIT_WT) {
    return refuse(
      'outside-model',
      `The model holds Ag, Au, Cu and Zn; this alloy also holds ${named}, more than the ${TRACE_LIMIT_WT} wt% taken as trace.`,
    );
  }
  const elements = MODEL_ELEMENTS.filter((e) => (composition[e] ?? 0) > ABSENT_WT);
  const moles = Float64Array.from(elements, (e) => (composition[e] ?? 0) / atomicMass[e]);
  const total = moles.reduce((a, b) => a + b, 0);
  const note = others.length > 0 ? `Left out as trace: ${named}.` : null;
  return { withinModel: true, elements, x: moles.map((m) => m / total), note };
};
