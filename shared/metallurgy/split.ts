import { factorise, solveFactorised } from './cholesky.ts';
import type { System } from './system.ts';

/** The most phases a split may hold at once. */
export const MAX_PHASES = 4;
const MAX_STEPS = 120;
/** Chemical potentials agree to this between phases, J/mol. */
const AGREEMENT = 1e-9;
/** A phase holding less of the whole than this, and shrinking, is removed. */
const VANISHING = 1e-11;
/** A step that leaves a phase less than this share of itself means to use it up. */
const REMNANT = 0.02;
/** Rounding in the whole energy, J. */
const NO_RISE = 1e-8;

/** Shares a fixed amount of each element between given phases at least Gibbs energy, by damped Newton steps on the amounts. */
export class Split {
  count = 0;
  readonly phase = new Int32Array(MAX_PHASES);
  /** Moles of each element in each phase, n to a phase; they add up to one mole of alloy. */
  readonly amounts: Float64Array;
  readonly total = new Float64Array(MAX_PHASES);
  readonly x: Float64Array;
  readonly mu: Float64Array;
  /** Index of the phase that holds most. */
  main = 0;
  energy = 0;
  private readonly system: System;
  private readonly curvature: Float64Array;
  private readonly matrix: Float64Array;
  private readonly step: Float64Array;
  private readonly gradient: Float64Array;
  private readonly full: Float64Array;
  private readonly saved: Float64Array;
  private readonly slopes: Float64Array;

  constructor(system: System) {
    const { n } = system;
    const dims = (MAX_PHASES - 1) * n;
    this.system = system;
    this.amounts = new Float64Array(MAX_PHASES * n);
    this.x = new Float64Array(MAX_PHASES * n);
    this.mu = new Float64Array(MAX_PHASES * n);
    this.curvature = new Float64Array(MAX_PHASES * n * n);
    this.matrix = new Float64Array(dims * dims);
    this.step = new Float64Array(dims);
    this.gradient = new Float64Array(dims);
    this.full = new Float64Array(MAX_PHASES * n);
    this.saved = new Float64Array(MAX_PHASES * n);
    this.slopes = new Float64Array(MAX_PHASES * n);
  }

  /** Starts from one phase holding everything. */
  startSingle(phase: number, overall: Float64Array): void {
    this.count = 1;
    this.phase[0] = phase;
    this.amounts.set(overall);
    this.main = 0;
    this.energy = this.evaluate();
  }

  /** Adds a phase of composition `x[at…]`, taking its matter from the others so that the energy falls; false when it cannot. */
  add(phase: number, x: Float64Array, at: number): boolean {
    const { n } = this.system;
    if (this.count === MAX_PHASES) return false;
    this.saved.set(this.amounts);
    const before = this.energy;
    const mains = this.roomFor(x, at);
    const added = this.count;
    this.phase[added] = phase;
    this.count++;
    for (let share = 0.5 * mains.room; share > 1e-14; share *= 0.25) {
      this.amounts.set(this.saved);
      for (let i = 0; i < n; i++) {
        this.amounts[added * n + i] = share * x[at + i]!;
        this.amounts[mains.donor * n + i]! -= share * x[at + i]!;
      }
      this.energy = this.evaluate();
      if (this.energy < before) return true;
    }
    this.count--;
    this.amounts.set(this.saved);
    this.energy = this.evaluate();
    return false;
  }

  private roomFor(x: Float64Array, at: number): { donor: number; room: number } {
    const { n } = this.system;
    let donor = 0;
    let room = 0;
    for (let p = 0; p < this.count; p++) {
      let most = Number.POSITIVE_INFINITY;
      for (let i = 0; i < n; i++) most = Math.min(most, this.amounts[p * n + i]! / x[at + i]!);
      if (most > room) {
        room = most;
        donor = p;
      }
    }
    return { donor, room };
  }

  /** Moves to the least energy these phases allow, dropping any that vanish; false when it could not settle. */
  settle(): boolean {
    for (let iteration = 0; iteration < MAX_STEPS; iteration++) {
      if (this.count === 1) return true;
      const disagreement = this.fillGradient();
      if (disagreement < AGREEMENT) return true;
      this.solveStep();
      if (this.vanish()) continue;
      if (!this.advance(disagreement)) return disagreement < 1e-7;
    }
    return false;
  }

  /** Compositions, potentials and amounts of every phase from the amounts; returns the whole energy, J. */
  evaluate(): number {
    const { system, amounts, total, x } = this;
    const { n } = system;
    let energy = 0;
    let main = 0;
    for (let p = 0; p < this.count; p++) {
      let sum = 0;
      for (let i = 0; i < n; i++) sum += amounts[p * n + i]!;
      for (let i = 0; i < n; i++) x[p * n + i] = amounts[p * n + i]! / sum;
      total[p] = sum;
      energy += sum * system.potentials(this.phase[p]!, x, p * n, this.mu, p * n);
      if (sum > total[main]!) main = p;
    }
    this.main = main;
    return energy;
  }

  /** How the chemical potentials move with temperature while the phases share the same matter, J/(mol K), into `out`. */
  potentialSlopes(out: Float64Array): void {
    const { system, main, slopes } = this;
    const { n } = system;
    for (let p = 0; p < this.count; p++) system.potentialSlopes(this.phase[p]!, this.x, p * n, slopes, p * n);
    for (let i = 0; i < n; i++) out[i] = slopes[main * n + i]!;
    if (this.count === 1) return;
    for (let p = 0, row = 0; p < this.count; p++) {
      if (p === main) continue;
      for (let i = 0; i < n; i++, row++) this.gradient[row] = slopes[p * n + i]! - slopes[main * n + i]!;
    }
    this.solveStep();
    for (let i = 0; i < n; i++) {
      let moved = 0;
      for (let j = 0; j < n; j++) moved += this.curvature[(main * n + i) * n + j]! * this.full[main * n + j]!;
      out[i]! += moved / this.total[main]!;
    }
  }

  private fillGradient(): number {
    const { n } = this.system;
    let worst = 0;
    for (let p = 0, row = 0; p < this.count; p++) {
      if (p === this.main) continue;
      for (let i = 0; i < n; i++, row++) {
        const difference = this.mu[p * n + i]! - this.mu[this.main * n + i]!;
        this.gradient[row] = difference;
        worst = Math.max(worst, Math.abs(difference));
      }
    }
    return worst;
  }

  private solveStep(): void {
    const { system, matrix, step, gradient, curvature, main, full } = this;
    const { n } = system;
    const dims = (this.count - 1) * n;
    for (let p = 0; p < this.count; p++)
      system.curvature(this.phase[p]!, this.x, p * n, curvature, p * n * n);
    for (let shift = 0; ; shift = shift === 0 ? 1e-11 : shift * 100) {
      this.fillMatrix(dims, shift);
      if (factorise(matrix, dims) || shift > 1e8) break;
    }
    for (let k = 0; k < dims; k++) step[k] = -gradient[k]!;
    solveFactorised(matrix, dims, step);
    full.fill(0);
    for (let p = 0, row = 0; p < this.count; p++) {
      if (p === main) continue;
      for (let i = 0; i < n; i++, row++) {
        full[p * n + i] = step[row]!;
        full[main * n + i]! -= step[row]!;
      }
    }
  }

  private fillMatrix(dims: number, shift: number): void {
    const { matrix, curvature, main, total, amounts } = this;
    const { n, rt } = this.system;
    const size = n * n;
    for (let p = 0, rowBlock = 0; p < this.count; p++) {
      if (p === main) continue;
      for (let q = 0, columnBlock = 0; q <= p; q++) {
        if (q === main) continue;
        for (let i = 0; i < n; i++) {
          const row = (rowBlock + i) * dims + columnBlock;
          for (let j = 0; j < n; j++) {
            let value = curvature[main * size + i * n + j]! / total[main]!;
            if (p === q) value += curvature[p * size + i * n + j]! / total[p]!;
            matrix[row + j] = value;
          }
          if (p === q) matrix[row + i]! += (shift * rt) / amounts[p * n + i]!;
        }
        columnBlock += n;
      }
      rowBlock += n;
    }
  }

  /** Removes a phase that the step would use up, following the step just so far; says whether one went. */
  private vanish(): boolean {
    const { n } = this.system;
    for (let p = 0; p < this.count; p++) {
      let change = 0;
      for (let i = 0; i < n; i++) change += this.full[p * n + i]!;
      const usedUp = change < 0 && this.total[p]! + change < REMNANT * this.total[p]!;
      const gone = change < 0 && this.total[p]! < VANISHING;
      if ((usedUp || gone) && this.removeAlong(p, Math.min(1, -this.total[p]! / change))) return true;
    }
    return false;
  }

  /** Takes the step as far as `reach`, where phase `p` runs out, and forgets the phase; undone if the energy would rise. */
  private removeAlong(p: number, reach: number): boolean {
    const { amounts, full, saved } = this;
    const { n } = this.system;
    const length = this.count * n;
    saved.set(amounts);
    const before = this.energy;
    let receiver = -1;
    for (let q = 0; q < this.count; q++) {
      if (q !== p && (receiver < 0 || this.total[q]! > this.total[receiver]!)) receiver = q;
    }
    for (let k = 0; k < length; k++) amounts[k] = saved[k]! + reach * full[k]!;
    for (let i = 0; i < n; i++) amounts[receiver * n + i]! += amounts[p * n + i]!;
    const last = this.count - 1;
    const phase = this.phase[p]!;
    let positive = true;
    for (let k = 0; k < length; k++) positive &&= amounts[k]! > 0 || (k >= p * n && k < p * n + n);
    if (positive) {
      for (let i = 0; i < n; i++) amounts[p * n + i] = amounts[last * n + i]!;
      this.phase[p] = this.phase[last]!;
      this.count--;
      this.energy = this.evaluate();
      if (this.energy <= before + NO_RISE) return true;
      this.count++;
      this.phase[p] = phase;
    }
    amounts.set(saved);
    this.energy = this.evaluate();
    return false;
  }

  private advance(disagreement: number): boolean {
    const { amounts, full, saved } = this;
    const length = this.count * this.system.n;
    let reach = 1;
    for (let k = 0; k < length; k++) {
      const most = -0.98 * amounts[k]!;
      if (full[k]! < most) reach = Math.min(reach, most / full[k]!);
    }
    let slope = 0;
    for (let k = 0; k < length; k++) slope += full[k]! * this.mu[k]!;
    saved.set(amounts);
    const before = this.energy;
    for (let halving = 0; halving < 40; halving++) {
      for (let k = 0; k < length; k++) amounts[k] = saved[k]! + reach * full[k]!;
      this.energy = this.evaluate();
      const fall = before - this.energy;
      if (fall >= -1e-4 * slope * reach || (slope > -1e-6 && this.fillGradient() < disagreement)) return true;
      reach /= 2;
    }
    amounts.set(saved);
    this.energy = this.evaluate();
    return false;
  }
}
