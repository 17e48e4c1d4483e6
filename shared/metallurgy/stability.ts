import { factorise, solveFactorised } from './cholesky.ts';
import { createSearchGrid, REGIONS, type SearchGrid } from './search-grid.ts';
import type { System } from './system.ts';

/** No minimum lies further than this below the lowest grid point of its neighbourhood, J/mol (96, 560 and 1080 met in trials of two, three and four elements). */
const GRID_DEPTH: Readonly<Record<number, number>> = { 1: 100, 2: 300, 3: 1200, 4: 2000 };
/** Mole fraction at which an element absent from a grid point is first tried. */
const TRACE = 4e-3;
const MAX_STEPS = 60;
const MAX_FOUND = 8;
/** A step expected to lower the distance by less than this is not taken, J/mol. */
const SETTLED = 1e-11;
/** A minimum below the ceiling is known well enough to start from once a step would deepen it by this share. */
const GOOD_ENOUGH = 0.02;
/** A quadratic falls by half its decrement; three times that is beyond what these energies do. */
const OUT_OF_REACH = 1.5;
/** Only this near the plane, J/mol, is a minimum compared with the phases known to touch it. */
const NEAR = 200;
/** Compositions closer than this, summed over the elements, are one phase; so near they differ by less than 0.05 J/mol. */
const SAME = 1e-3;

/** Finds where a phase lies below (or least above) a tangent plane, over the whole of a system. */
export class StabilitySearch {
  /** Minima found by the last search: phase, distance in J/mol, composition (n to each). */
  readonly foundPhase = new Int32Array(MAX_FOUND);
  readonly foundDistance = new Float64Array(MAX_FOUND);
  readonly foundX: Float64Array;
  found = 0;
  private readonly known: Float64Array;
  private readonly knownPhase = new Int32Array(MAX_FOUND);
  private knownCount = 0;
  private readonly system: System;
  private readonly grid: SearchGrid;
  private readonly x: Float64Array;
  private readonly trial: Float64Array;
  private readonly mu: Float64Array;
  private readonly matrix: Float64Array;
  private readonly curvature: Float64Array;
  private readonly step: Float64Array;
  private readonly best: Float64Array;
  private readonly bestAt: Int32Array;
  private readonly offset: Float64Array;

  constructor(system: System) {
    const { n } = system;
    this.system = system;
    this.grid = createSearchGrid(system);
    this.foundX = new Float64Array(MAX_FOUND * n);
    this.known = new Float64Array(MAX_FOUND * n);
    this.x = new Float64Array(n);
    this.trial = new Float64Array(n);
    this.mu = new Float64Array(n);
    this.matrix = new Float64Array(n * n);
    this.curvature = new Float64Array(n * n);
    this.step = new Float64Array(n);
    this.best = new Float64Array(REGIONS);
    this.bestAt = new Int32Array(REGIONS);
    this.offset = new Float64Array(n);
  }

  /** Searches one phase against the plane `plane`; found minima below `ceiling` J/mol are appended. */
  search(phase: number, plane: Float64Array, ceiling: number): void {
    const { system } = this;
    this.scan(phase, plane);
    let within = ceiling;
    for (let region = 0; region < REGIONS; region++) within = Math.min(within, this.best[region]!);
    within += GRID_DEPTH[system.n] ?? 2000;
    for (let region = 0; region < REGIONS; region++) {
      if (!(this.best[region]! < within)) continue;
      this.startFrom(phase, plane, this.bestAt[region]! * system.n);
      const distance = this.descend(phase, plane, ceiling);
      if (distance < ceiling) this.keep(phase, distance);
    }
  }

  /** Sets `x` to a grid point, its absent elements put in at about the amount the plane would give them. */
  private startFrom(phase: number, plane: Float64Array, at: number): void {
    const { x, mu, grid, system } = this;
    const { n, rt } = system;
    for (let i = 0; i < n; i++) x[i] = Math.max(grid.x[at + i]!, TRACE);
    normalise(x);
    const energy = system.potentials(phase, x, 0, mu, 0);
    let distance = energy;
    for (let i = 0; i < n; i++) distance -= x[i]! * plane[i]!;
    for (let i = 0; i < n; i++) {
      if (grid.x[at + i]! > 0) continue;
      const pull = (distance - mu[i]! + plane[i]!) / rt;
      x[i]! *= Math.exp(Math.max(-14, Math.min(2.5, pull)));
    }
    normalise(x);
  }

  /** Names a phase that touches the plane, so that searches need not find it again. */
  addKnown(phase: number, x: Float64Array, at: number): void {
    const { n } = this.system;
    this.knownPhase[this.knownCount] = phase;
    for (let i = 0; i < n; i++) this.known[this.knownCount * n + i] = x[at + i]!;
    this.knownCount++;
  }

  /** Forgets what was found and what was known. */
  clear(): void {
    this.found = 0;
    this.knownCount = 0;
  }

  /** Index of the lowest minimum found, or −1. */
  lowest(): number {
    let at = -1;
    for (let k = 0; k < this.found; k++) {
      if (at < 0 || this.foundDistance[k]! < this.foundDistance[at]!) at = k;
    }
    return at;
  }

  /** Searches one phase and returns its least distance from the plane, J/mol; the place is the one `lowest` then names. */
  leastDistance(phase: number, plane: Float64Array): number {
    this.clear();
    this.search(phase, plane, Number.POSITIVE_INFINITY);
    return this.foundDistance[this.lowest()] ?? Number.NaN;
  }

  /** Follows one minimum from a start of its own; the composition is left in `x`. Returns the distance, J/mol. */
  refine(phase: number, plane: Float64Array, x: Float64Array): number {
    this.x.set(x.subarray(0, this.system.n));
    const distance = this.descend(phase, plane, Number.POSITIVE_INFINITY);
    x.set(this.x);
    return distance;
  }

  private scan(phase: number, plane: Float64Array): void {
    const { grid, best, bestAt, offset } = this;
    const { n, temperature } = this.system;
    const pure = this.system.pure[phase]!;
    const fixed = grid.fixed[phase]!;
    const slope = grid.slope[phase]!;
    best.fill(Number.POSITIVE_INFINITY);
    for (let i = 0; i < n; i++) offset[i] = pure[i]! - plane[i]!;
    for (let k = 0, at = 0; k < grid.count; k++, at += n) {
      let h = fixed[k]! + temperature * slope[k]!;
      for (let i = 0; i < n; i++) h += grid.x[at + i]! * offset[i]!;
      const region = grid.region[k]!;
      if (h < best[region]!) {
        best[region] = h;
        bestAt[region] = k;
      }
    }
  }

  private keep(phase: number, distance: number): void {
    const { n } = this.system;
    for (let k = 0; k < this.found; k++) {
      if (this.foundPhase[k] !== phase) continue;
      let apart = 0;
      for (let i = 0; i < n; i++) apart += Math.abs(this.foundX[k * n + i]! - this.x[i]!);
      if (apart < 1e-6) return;
    }
    if (this.found === MAX_FOUND) return;
    this.foundPhase[this.found] = phase;
    this.foundDistance[this.found] = distance;
    this.foundX.set(this.x, this.found * n);
    this.found++;
  }

  /** Newton descent on the distance from the plane, from `this.x`; gives up once no value below `ceiling` is in reach. */
  private descend(phase: number, plane: Float64Array, ceiling: number): number {
    const { x, mu, trial, step } = this;
    const { n } = this.system;
    let distance = this.distanceAt(phase, plane, x);
    for (let iteration = 0; iteration < MAX_STEPS; iteration++) {
      this.solveStep(plane, distance);
      let decrement = 0;
      let reach = 1;
      for (let i = 0; i < n; i++) {
        decrement -= step[i]! * (mu[i]! - plane[i]!);
        const most = -0.95 * x[i]!;
        if (step[i]! < most) reach = Math.min(reach, most / step[i]!);
      }
      if (decrement < SETTLED) return distance;
      if (distance < ceiling && decrement < GOOD_ENOUGH * -distance) return distance;
      if (reach === 1 && distance - OUT_OF_REACH * decrement > ceiling + 1) return distance;
      if (reach === 1 && distance < NEAR && ceiling < NEAR && this.leadsToKnown(phase)) return ceiling;
      let next = distance;
      let moved = false;
      for (let halving = 0; halving < 30 && !moved; halving++) {
        for (let i = 0; i < n; i++) trial[i] = x[i]! + reach * step[i]!;
        next = this.distanceAt(phase, plane, trial);
        moved = next <= distance + 1e-10;
        if (!moved) reach /= 2;
      }
      if (!moved) return distance;
      x.set(trial);
      distance = next;
    }
    return distance;
  }

  /** Whether the next step ends at a phase that touches the plane already. */
  private leadsToKnown(phase: number): boolean {
    const { x, step, known, knownPhase } = this;
    const { n } = this.system;
    for (let k = 0; k < this.knownCount; k++) {
      if (knownPhase[k] !== phase) continue;
      let apart = 0;
      for (let i = 0; i < n; i++) apart += Math.abs(x[i]! + step[i]! - known[k * n + i]!);
      if (apart < SAME) return true;
    }
    return false;
  }

  /** The distance from the plane at x, leaving potentials and curvature there for the next step. */
  private distanceAt(phase: number, plane: Float64Array, x: Float64Array): number {
    let distance = this.system.derivatives(phase, x, this.mu, this.curvature);
    for (let i = 0; i < this.system.n; i++) distance -= x[i]! * plane[i]!;
    return distance;
  }

  private solveStep(plane: Float64Array, distance: number): void {
    const { matrix, curvature, step, mu, x } = this;
    const { n, rt } = this.system;
    for (let shift = 0; ; shift = shift === 0 ? 0.5 : shift * 3) {
      for (let k = 0; k < n * n; k++) matrix[k] = curvature[k]! + rt * (1 - shift);
      for (let i = 0; i < n; i++) {
        matrix[i * n + i]! += (shift * rt) / x[i]!;
        step[i] = distance - (mu[i]! - plane[i]!);
      }
      if (factorise(matrix, n) || shift > 1e6) break;
    }
    solveFactorised(matrix, n, step);
    // Rounding lets a step leave the plane of fractions that add up to one.
    let drift = 0;
    for (let i = 0; i < n; i++) drift += x[i]! + step[i]!;
    for (let i = 0; i < n; i++) step[i]! -= x[i]! * (drift - 1);
  }
}

const normalise = (x: Float64Array): void => {
  let sum = 0;
  for (let i = 0; i < x.length; i++) sum += x[i]!;
  for (let i = 0; i < x.length; i++) x[i]! /= sum;
};
