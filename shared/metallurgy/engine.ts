import { readComposition } from './composition.ts';
import { wholeZincRefusal } from './limits.ts';
import { Minimiser } from './minimiser.ts';
import { COMMITTED, type ModelParameters } from './model.ts';
import { System } from './system.ts';
import type { Composition, ElementSymbol, Outcome } from './types.ts';

/** A composition made ready to compute: its minimiser, mole fractions, and a note of traces left out. */
export interface Job {
  readonly minimiser: Minimiser;
  readonly system: System;
  readonly x: Float64Array;
  readonly note: string | null;
}

/** The solvers of one parameter set, one for each set of elements, made when first asked for. */
export class Engine {
  readonly model: ModelParameters;
  private readonly minimisers = new Map<string, Minimiser>();

  constructor(model: ModelParameters) {
    this.model = model;
  }

  /** The minimiser for exactly these elements, in the model's order. */
  minimiserFor(elements: readonly ElementSymbol[]): Minimiser {
    const key = elements.join('');
    const known = this.minimisers.get(key);
    if (known) return known;
    const made = new Minimiser(new System(this.model, elements));
    this.minimisers.set(key, made);
    return made;
  }

  /** Reads a composition and makes it ready, or refuses it. */
  prepare(composition: Composition): Outcome<Job> {
    const charge = readComposition(composition, this.model.atomicMass);
    if (!charge.withinModel) return charge;
    const minimiser = this.minimiserFor(charge.elements);
    const refusal = wholeZincRefusal(minimiser.system, charge.x);
    if (refusal) return refusal;
    return { withinModel: true, minimiser, system: minimiser.system, x: charge.x, note: charge.note };
  }
}

/** The engine on the committed parameters. */
export const ENGINE = new Engine(COMMITTED);
