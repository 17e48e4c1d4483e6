import { factorise, solveFactorised } from './cholesky.ts';
import { FCC, LIQUID } from './model.ts';
import type { System } from './system.ts';

const MAX_STEPS = 40;
/** Steps converge quadratically: one this small leaves an error far below any that could be seen. */
const TOLERANCE_K = 1e-5;

/** Follows the solid and the temperature that go with a given liquid, from a near guess, by Newton steps. */
export class Coexistence {
  /** How the coexistence temperature moves with the liquid's composition, K per mole fraction; filled by `fillGradient`. */
  readonly gradient: Float64Array;
  private readonly system: System;
  /** The liquid's potentials as `fixed + T × slope`, and liquid less solid of the potentials and of their slopes. */
  private readonly liquidFixed: Float64Array;
  private readonly liquidSlope: Float64Array;
  private readonly potentialGap: Float64Array;
  private readonly slopeGap: Float64Array;
  private readonly liquidSlopes: Float64Array;
  private readonly solidSlopes: Float64Array;
  private readonly matrix: Float64Array;
  private readonly step: Float64Array;

  constructor(system: System) {
    const { n } = system;
    this.system = system;
    this.gradient = new Float64Array(n);
    this.liquidFixed = new Float64Array(n);
    this.liquidSlope = new Float64Array(n);
    this.potentialGap = new Float64Array(n);
    this.slopeGap = new Float64Array(n);
    this.liquidSlopes = new Float64Array(n);
    this.solidSlopes = new Float64Array(n);
    this.matrix = new Float64Array(n * n);
    this.step = new Float64Array(n);
  }

  /** Moves `solid` and returns the temperature, K, at which it and `liquid` coexist; NaN when no such place is near. */
  solve(liquid: Float64Array, solid: Float64Array, guessK: number): number {
    let t = guessK;
    this.system.potentialParts(LIQUID, liquid, 0, this.liquidFixed, this.liquidSlope);
    for (let iteration = 0; iteration < MAX_STEPS; iteration++) {
      const change = this.newton(solid, t);
      if (!Number.isFinite(change)) return Number.NaN;
      t += change;
      if (Math.abs(change) < TOLERANCE_K) return t;
    }
    return Number.NaN;
  }

  private newton(solid: Float64Array, t: number): number {
    const { system, potentialGap, slopeGap, matrix, step } = this;
    const { n } = system;
    system.setTemperature(t);
    system.potentialParts(FCC, solid, 0, potentialGap, slopeGap);
    const pure = system.pure;
    const pureSlope = system.pureSlope;
    let apart = 0;
    let slope = 0;
    for (let i = 0; i < n; i++) {
      const gapOfSlopes = pureSlope[LIQUID][i]! - pureSlope[FCC][i]! + this.liquidSlope[i]! - slopeGap[i]!;
      const fixed = this.liquidFixed[i]! - potentialGap[i]!;
      const gap = pure[LIQUID][i]! - pure[FCC][i]! + fixed + t * (this.liquidSlope[i]! - slopeGap[i]!);
      potentialGap[i] = gap;
      slopeGap[i] = gapOfSlopes;
      apart += solid[i]! * gap;
      slope -= solid[i]! * gapOfSlopes;
    }
    const change = Math.max(-40, Math.min(40, apart / slope));
    system.curvature(FCC, solid, 0, matrix, 0);
    for (let k = 0; k < n * n; k++) matrix[k]! += system.rt;
    for (let i = 0; i < n; i++) {
      step[i] = potentialGap[i]! + slopeGap[i]! * change;
    }
    if (!factorise(matrix, n)) return Number.NaN;
    solveFactorised(matrix, n, step);
    let reach = 1;
    for (let i = 0; i < n; i++) {
      const most = -0.9 * solid[i]!;
      if (step[i]! < most) reach = Math.min(reach, most / step[i]!);
    }
    let sum = 0;
    for (let i = 0; i < n; i++) sum += solid[i] = solid[i]! + reach * step[i]!;
    for (let i = 0; i < n; i++) solid[i]! /= sum;
    return reach === 1 ? change : Math.sign(change) * Math.max(Math.abs(change), 1e-6);
  }

  /** Fills `gradient` for a liquid and the solid `solve` found for it. Gibbs-Konovalov: ΔS dT = x(solid) · D(liquid) dx(liquid). */
  fillGradient(liquid: Float64Array, solid: Float64Array, t: number): void {
    const { system, gradient, matrix, liquidSlopes, solidSlopes } = this;
    const { n } = system;
    system.setTemperature(t);
    let entropy = system.potentialSlopes(FCC, solid, 0, solidSlopes, 0);
    system.potentialSlopes(LIQUID, liquid, 0, liquidSlopes, 0);
    for (let i = 0; i < n; i++) entropy -= solid[i]! * liquidSlopes[i]!;
    system.curvature(LIQUID, liquid, 0, matrix, 0);
    for (let j = 0; j < n; j++) {
      let sum = 0;
      for (let i = 0; i < n; i++) sum += solid[i]! * matrix[i * n + j]!;
      gradient[j] = sum / entropy;
    }
  }
}
