import { FCC, LIQUID } from './model.ts';
import { Split } from './split.ts';
import { StabilitySearch } from './stability.ts';
import type { System } from './system.ts';

/** A phase this far below the plane, J/mol, is one that must be added. */
const UNSTABLE = -1e-7;
/** Within 0.0001 K of an invariant a missing phase is nearer the plane than rounding lets its matter be moved, J/mol. */
const INDISTINGUISHABLE = -1e-3;
const MAX_ROUNDS = 24;

/** Which phases a minimisation may use. */
export type Allowed = 'both' | 'solid' | 'liquid';

/** Finds the state of least Gibbs energy of a system: a split of known phases, tested against every other until none is missing. */
export class Minimiser {
  readonly system: System;
  readonly split: Split;
  readonly search: StabilitySearch;
  private readonly plane: Float64Array;

  constructor(system: System) {
    this.system = system;
    this.split = new Split(system);
    this.search = new StabilitySearch(system);
    this.plane = new Float64Array(system.n);
  }

  /** Minimises for mole fractions `overall` at the system's temperature; the answer stands in `split`. False when it could not. */
  minimise(overall: Float64Array, allowed: Allowed = 'both'): boolean {
    this.startWithBest(overall, allowed);
    if (this.system.n === 1) return true;
    for (let round = 0; round < MAX_ROUNDS; round++) {
      const missing = this.mostUnstable(allowed);
      if (missing < 0) return true;
      const { search, split, system } = this;
      if (!split.add(search.foundPhase[missing]!, search.foundX, missing * system.n)) {
        return search.foundDistance[missing]! > INDISTINGUISHABLE;
      }
      if (!split.settle()) return false;
    }
    return false;
  }

  private startWithBest(overall: Float64Array, allowed: Allowed): void {
    const { split } = this;
    if (allowed !== 'solid') split.startSingle(LIQUID, overall);
    if (allowed === 'liquid') return;
    const liquid = split.energy;
    split.startSingle(FCC, overall);
    if (allowed === 'both' && liquid < split.energy) split.startSingle(LIQUID, overall);
  }

  private mostUnstable(allowed: Allowed): number {
    const { search, split, system, plane } = this;
    for (let i = 0; i < system.n; i++) plane[i] = split.mu[split.main * system.n + i]!;
    search.clear();
    for (let p = 0; p < split.count; p++) search.addKnown(split.phase[p]!, split.x, p * system.n);
    if (allowed !== 'solid') search.search(LIQUID, plane, UNSTABLE);
    if (allowed !== 'liquid') search.search(FCC, plane, UNSTABLE);
    return search.lowest();
  }
}
