import { liquidusK } from './boundaries.ts';
import { Coexistence } from './coexistence.ts';
import type { Job } from './engine.ts';
import { meanMass } from './equilibrium.ts';
import { coldLiquidRefusal, zincRefusal } from './limits.ts';
import { FCC, LIQUID } from './model.ts';
import type { Minimiser } from './minimiser.ts';
import type { System } from './system.ts';
import type { Refusal } from './types.ts';

/** A casting counts as frozen when this mass fraction of liquid is left. */
export const LAST_LIQUID = 1e-3;

/** The freeze starts in short steps, where lever and Scheil lie closest, and lengthens them. */
const FIRST_STEP = 1 / 32;
const LONGEST_STEP = 0.25;
const MAX_TURNS = 400;
const LOST = 'The freeze could not be followed further.';
const SHORTEST_STEP = 1e-4;
/** A solid moving further than this in one step, mole fraction, asks for a shorter one. */
const LARGEST_MOVE = 0.03;
const NEW_SOLID = -1e-6;
/** A new solid this little below the plane has only just appeared, J/mol. */
const LOCATED = -1e-5;

/** One node of a Scheil freeze; `s` is minus the logarithm of the mole fraction of liquid left. */
export interface ScheilNode {
  readonly s: number;
  readonly t: number;
  readonly tSlope: number;
  readonly liquid: Float64Array;
  /** d(liquid)/ds: liquid less the solid forming. */
  readonly liquidSlope: Float64Array;
  /** Mass fraction of liquid left. */
  readonly left: number;
}

/** A whole Scheil freeze. `end`: at the last node nothing more melts below (`frozen`), the rest freezes at one temperature (`isothermal`), or the liquid leaves the model. */
export interface ScheilFreeze {
  readonly nodes: readonly ScheilNode[];
  readonly end: 'frozen' | 'isothermal' | 'left-model';
  readonly note: string | null;
}

interface Place {
  t: number;
  tSlope: number;
  /** Share of the first solid where two form; outside [0, 1] one of them would dissolve. */
  share: number;
}

/** Integrates a Scheil-Gulliver freeze along s by fourth-order Runge-Kutta, with the liquidus solved at every stage. */
class ScheilWalk {
  private readonly system: System;
  private readonly minimiser: Minimiser;
  private readonly x: Float64Array;
  private readonly solids: Float64Array[] = [];
  private readonly solvers: readonly [Coexistence, Coexistence];
  private readonly slope: Float64Array;
  private readonly stages: readonly Float64Array[];
  private readonly trial: Float64Array;
  private readonly plane: Float64Array;
  private readonly place: Place = { t: 0, tSlope: 0, share: 1 };
  private liquid: Float64Array;
  private s = 0;
  private restarting = false;
  /** The new solid at whose first appearance the last step ended. */
  private arrived: Float64Array | null = null;
  /** A solid has just begun to dissolve: it is not looked for again until the liquid has moved on. */
  private dropped = false;
  /** How long the next step may be. */
  private step = FIRST_STEP;

  constructor(job: Job) {
    const { n } = job.system;
    this.system = job.system;
    this.minimiser = job.minimiser;
    this.x = job.x;
    this.solvers = [new Coexistence(job.system), new Coexistence(job.system)];
    this.slope = new Float64Array(n);
    this.stages = Array.from({ length: 4 }, () => new Float64Array(n));
    this.trial = new Float64Array(n);
    this.plane = new Float64Array(n);
    this.liquid = new Float64Array(job.x);
    this.place.t = liquidusK(job);
    const { search } = job.minimiser;
    const at = search.lowest() * n;
    this.solids.push(search.foundX.slice(at, at + n));
  }

  run(): ScheilFreeze {
    const nodes: ScheilNode[] = [];
    const finish = (end: ScheilFreeze['end'], note: string | null = null): ScheilFreeze => ({
      nodes,
      end,
      note,
    });
    for (let turn = 0; turn < MAX_TURNS; turn++) {
      if (!this.derive(this.liquid)) return finish('left-model', LOST);
      if (this.solids.length === 2 && this.dropDissolving()) continue;
      const refusal = this.refusal();
      if (refusal) return finish('left-model', refusal.reason);
      const left = this.leftAtNode();
      nodes.push(this.node(left));
      if (this.solids.length === this.system.n) return finish('isothermal');
      if (left <= LAST_LIQUID) return finish('frozen');
      // The node before a new solid keeps the slopes that lead up to it; the next one has those that lead away.
      if (this.admitNewSolid()) continue;
      if (!this.advance(left)) return finish('left-model', LOST);
    }
    return finish('left-model', LOST);
  }

  private node(left: number): ScheilNode {
    return {
      s: this.s,
      t: this.place.t,
      tSlope: this.place.tSlope,
      liquid: this.liquid.slice(),
      liquidSlope: this.slope.slice(),
      left,
    };
  }

  private leftAtNode(): number {
    return (Math.exp(-this.s) * meanMass(this.system, this.liquid, 0)) / meanMass(this.system, this.x, 0);
  }

  /** Fills `slope` and `place` for a liquid; false when no coexistence is near. */
  private derive(liquid: Float64Array, withSlope = true): boolean {
    const { place, slope, solids, solvers } = this;
    const { n } = this.system;
    if (this.restarting) this.restart(liquid);
    const first = solids[0]!;
    const t = this.restarting ? place.t : solvers[0].solve(liquid, first, place.t);
    if (!Number.isFinite(t)) return false;
    place.t = t;
    place.share = 1;
    for (let i = 0; i < n; i++) slope[i] = liquid[i]! - first[i]!;
    const second = solids[1];
    if (second || withSlope) solvers[0].fillGradient(liquid, first, t);
    if (second) {
      if (!Number.isFinite(solvers[1].solve(liquid, second, t))) return false;
      solvers[1].fillGradient(liquid, second, t);
      place.share = this.shareOfFirst(liquid, first, second);
      for (let i = 0; i < n; i++) slope[i]! -= (1 - place.share) * (second[i]! - first[i]!);
    }
    if (!withSlope) return true;
    place.tSlope = 0;
    for (let i = 0; i < n; i++) place.tSlope += solvers[0].gradient[i]! * slope[i]!;
    return true;
  }

  /** Finds the one solid that goes with a liquid from nothing: for places where two solids become one and Newton steps fail. */
  private restart(liquid: Float64Array): void {
    const { minimiser, system } = this;
    this.place.t = liquidusK({ minimiser, system, x: liquid, note: null });
    const at = minimiser.search.lowest() * system.n;
    const solid = minimiser.search.foundX.slice(at, at + system.n);
    this.solids.splice(0, this.solids.length, solid);
  }

  /** The mixture of two solids that keeps the liquid in equilibrium with both. */
  private shareOfFirst(liquid: Float64Array, first: Float64Array, second: Float64Array): number {
    let along = 0;
    let across = 0;
    for (let i = 0; i < this.system.n; i++) {
      const g = this.solvers[0].gradient[i]! - this.solvers[1].gradient[i]!;
      along += g * (liquid[i]! - second[i]!);
      across += g * (first[i]! - second[i]!);
    }
    return along / across;
  }

  private dropDissolving(): boolean {
    const { share } = this.place;
    if (share >= 0 && share <= 1) return false;
    if (share < 0) this.solids.shift();
    else this.solids.pop();
    this.dropped = true;
    return true;
  }

  private refusal(): Refusal | null {
    const solids = this.solids.map((solid) => zincRefusal(this.system, FCC, solid, 0));
    return (
      zincRefusal(this.system, LIQUID, this.liquid, 0) ??
      coldLiquidRefusal(this.system) ??
      solids.find((refusal) => refusal !== null) ??
      null
    );
  }

  /** Takes in a solid of another kind that the liquid has come to; says whether there was one. */
  private admitNewSolid(): boolean {
    const looks = this.solids.length === 1 && !this.dropped;
    const found = this.arrived ?? (looks ? this.newSolid() : null);
    this.arrived = null;
    if (found) this.solids.push(found);
    return found !== null;
  }

  private newSolid(): Float64Array | null {
    const { system, minimiser, plane } = this;
    const { n } = system;
    const { search } = minimiser;
    system.setTemperature(this.place.t);
    system.potentials(LIQUID, this.liquid, 0, plane, 0);
    search.clear();
    search.addKnown(FCC, this.solids[0]!, 0);
    search.search(FCC, plane, NEW_SOLID);
    const at = search.lowest() * n;
    return at < 0 ? null : search.foundX.slice(at, at + n);
  }

  private advance(left: number): boolean {
    const start = this.liquid.slice();
    const startT = this.place.t;
    const startSlope = this.place.tSlope;
    const startSolids = this.solids.map((solid) => solid.slice());
    this.stages[0]!.set(this.slope);
    const go = (h: number): boolean => {
      this.place.t = startT;
      this.place.tSlope = startSlope;
      this.solids.splice(0, this.solids.length, ...startSolids.map((solid) => solid.slice()));
      return this.rungeKutta(start, h);
    };
    let h = Math.min(this.stableStep(), this.step, Math.log(left / LAST_LIQUID) + 1e-9);
    let moved = 0;
    while (h > SHORTEST_STEP) {
      const went = go(h);
      moved = went ? this.solidsMoved(startSolids) : 2 * LARGEST_MOVE;
      if (moved <= LARGEST_MOVE) break;
      h *= Math.max(0.25, (0.8 * LARGEST_MOVE) / moved);
    }
    if (h <= SHORTEST_STEP) {
      this.restarting = true;
      const went = go(h);
      this.restarting = false;
      if (!went) return false;
    }
    const found = this.solids.length === 1 && !this.dropped ? this.newSolid() : null;
    this.dropped = false;
    if (found) h = this.locate(found, h, go);
    const growth = Math.min(2, (0.8 * LARGEST_MOVE) / moved);
    this.step = Math.max(found ? FIRST_STEP : h * growth, 2 * SHORTEST_STEP);
    this.s += h;
    return true;
  }

  private solidsMoved(from: readonly Float64Array[]): number {
    let most = 0;
    this.solids.forEach((solid, k) => {
      for (let i = 0; i < this.system.n; i++) most = Math.max(most, Math.abs(solid[i]! - from[k]![i]!));
    });
    return most;
  }

  /** Shortens a step so that it ends where the new solid first appears; returns the step. */
  private locate(found: Float64Array, step: number, go: (h: number) => boolean): number {
    const other = found.slice();
    let low = 0;
    let high = step;
    let above = 0;
    let below = this.distanceOf(other);
    for (let k = 0; k < 60 && high - low > 1e-10 && below < LOCATED; k++) {
      const at = above > 0 ? low + ((high - low) * above) / (above - below) : (low + high) / 2;
      go(at);
      other.set(found);
      const distance = this.distanceOf(other);
      if (distance < 0) {
        high = at;
        below = distance;
        found.set(other);
        above /= 2;
      } else {
        low = at;
        above = this.isKnown(other) ? 0 : distance;
        if (k > 0) below /= 2;
      }
    }
    go(high);
    this.arrived = found;
    return high;
  }

  /** How far a solid, followed to its nearest minimum, lies from the plane of the liquid, J/mol. */
  private distanceOf(solid: Float64Array): number {
    this.system.setTemperature(this.place.t);
    this.system.potentials(LIQUID, this.liquid, 0, this.plane, 0);
    return this.minimiser.search.refine(FCC, this.plane, solid);
  }

  /** Whether a minimum is but the solid already forming. */
  private isKnown(solid: Float64Array): boolean {
    let apart = 0;
    for (let i = 0; i < this.system.n; i++) apart += Math.abs(solid[i]! - this.solids[0]![i]!);
    return apart < 1e-4;
  }

  /** An element that the solid takes up fast wants a shorter step. */
  private stableStep(): number {
    let step = LONGEST_STEP;
    for (let i = 0; i < this.system.n; i++) {
      const rate = -this.slope[i]! / this.liquid[i]!;
      if (rate * step > 0.25) step = 0.25 / rate;
    }
    return step;
  }

  private rungeKutta(start: Float64Array, h: number): boolean {
    const { stages, trial } = this;
    const { n } = this.system;
    const startT = this.place.t;
    const startSlope = this.place.tSlope;
    for (let k = 1; k < 4; k++) {
      const reach = k === 3 ? h : h / 2;
      for (let i = 0; i < n; i++) trial[i] = start[i]! + reach * stages[k - 1]![i]!;
      this.place.t = startT + reach * startSlope;
      if (!this.derive(trial, false)) return false;
      stages[k]!.set(this.slope);
    }
    let sum = 0;
    const next = new Float64Array(n);
    for (let i = 0; i < n; i++) {
      const [a, b, c, d] = stages;
      sum += next[i] = start[i]! + (h / 6) * (a![i]! + 2 * b![i]! + 2 * c![i]! + d![i]!);
    }
    for (let i = 0; i < n; i++) next[i]! /= sum;
    this.liquid = next;
    return this.derive(next);
  }
}

/** Freezes a job's alloy by the Scheil-Gulliver rule, from its liquidus to the last liquid. */
export const scheilFreeze = (job: Job): ScheilFreeze => new ScheilWalk(job).run();
