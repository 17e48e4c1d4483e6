import { FCC, LIQUID, ZERO_CELSIUS_K } from './model.ts';
import { orderingPoint } from './ordering.ts';
import { refuse } from './refusal.ts';
import type { System } from './system.ts';
import type { ElementSymbol, Refusal } from './types.ts';

/** Lowest temperature asked of the model, °C: below it metal does not reach equilibrium in any workshop. */
export const LOWEST_C = 200;
/** Highest temperature asked of the model, °C. */
export const HIGHEST_C = 1500;

/**
 * Most zinc before bcc beta or its like is stable, at%, in each phase against each other element.
 * Cu and Ag: the peritectics L + fcc = beta, Massalski, Binary Alloy Phase Diagrams (1990), from memory.
 * Au: beta' (AuZn) sets in on cooling at a eutectic near 683 °C; from memory, taken low.
 */
const MOST_ZINC: Readonly<Record<Exclude<ElementSymbol, 'Zn'>, readonly [number, number]>> = {
  Ag: [37.5, 32.1],
  Au: [30, 28],
  Cu: [36.8, 31.9],
};

/** The lowest temperature at which Ag-Cu-Zn metal holds liquid beside fcc alone, °C; filler-metal literature, about Ag56. */
const LOWEST_ZINC_LIQUID_C = 665;

const mostZinc = (system: System, phase: number, x: Float64Array, at: number): number => {
  let weight = 0;
  let sum = 0;
  system.elements.forEach((element, i) => {
    if (element === 'Zn') return;
    weight += x[at + i]!;
    sum += x[at + i]! * MOST_ZINC[element][phase as 0 | 1];
  });
  return weight > 0 ? sum / weight / 100 : 0;
};

/** Says why a phase of this composition cannot be trusted beside solid metal, or null when it can. */
export const zincRefusal = (system: System, phase: number, x: Float64Array, at: number): Refusal | null => {
  const zinc = system.elements.indexOf('Zn');
  if (zinc < 0 || x[at + zinc]! <= mostZinc(system, phase, x, at)) return null;
  const where = phase === LIQUID ? 'the liquid' : 'the solid';
  const share = (100 * x[at + zinc]!).toFixed(1);
  return refuse(
    'phase-outside-model',
    `At ${share} at% zinc in ${where} a beta phase would form, which the model does not hold.`,
  );
};

/** Says why zinc-bearing silver-copper liquid below the lowest published melting temperature cannot be trusted, or null. */
export const coldLiquidRefusal = (system: System): Refusal | null => {
  const cold = system.temperature - ZERO_CELSIUS_K < LOWEST_ZINC_LIQUID_C;
  if (!cold || !system.elements.includes('Zn')) return null;
  return refuse(
    'phase-outside-model',
    `Zinc-bearing liquid below ${LOWEST_ZINC_LIQUID_C} °C meets a beta phase, which the model does not hold.`,
  );
};

/** Refuses a whole composition whose zinc is beyond what fcc can hold at its solidus. */
export const wholeZincRefusal = (system: System, x: Float64Array): Refusal | null => {
  const zinc = system.elements.indexOf('Zn');
  if (zinc < 0 || x[zinc]! <= mostZinc(system, FCC, x, 0)) return null;
  return zincRefusal(system, FCC, x, 0);
};

/** Refuses a temperature outside the model, or one at which gold-copper would have ordered. */
export const temperatureRefusal = (system: System, x: Float64Array, temperatureC: number): Refusal | null => {
  if (!Number.isFinite(temperatureC)) return refuse('not-a-number', 'The temperature is not a number.');
  if (temperatureC < LOWEST_C || temperatureC > HIGHEST_C) {
    return refuse(
      'temperature',
      `${Number(temperatureC.toFixed(1))} °C is outside the model, which holds from ${LOWEST_C} to ${HIGHEST_C} °C.`,
    );
  }
  const orders = orderingPoint(system.elements, x);
  if (!orders || temperatureC >= orders.belowC) return null;
  return refuse(
    'phase-outside-model',
    `Below ${orders.belowC} °C ${orders.compound} orders, which the model does not hold.`,
  );
};

/** The lowest temperature at which the model may be asked about this composition, °C. */
export const floorC = (system: System, x: Float64Array): number =>
  Math.max(LOWEST_C, orderingPoint(system.elements, x)?.belowC ?? LOWEST_C);
