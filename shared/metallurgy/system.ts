import { LatticeStability } from './lattice-stability.ts';
import { FCC, GAS_CONSTANT, LIQUID, type Linear, type ModelParameters } from './model.ts';
import type { ElementSymbol } from './types.ts';

const MAX_ORDER = 4;

/** The Gibbs energies of both phases for one set of elements, held as flat arrays; set a temperature before asking. */
export class System {
  readonly elements: readonly ElementSymbol[];
  readonly n: number;
  readonly mass: Float64Array;
  /** Kelvin. */
  temperature = 0;
  /** R × T, J/mol. */
  rt = 0;
  /** Pure-element energies by phase, relative to fcc, J/mol, and their slopes. */
  readonly pure: readonly [Float64Array, Float64Array];
  readonly pureSlope: readonly [Float64Array, Float64Array];
  readonly pairCount: number;
  readonly pairI: Int32Array;
  readonly pairJ: Int32Array;
  /** Redlich-Kister values at the temperature, MAX_ORDER to a pair, and their slopes. */
  readonly pairs: readonly [Float64Array, Float64Array];
  readonly pairSlopes: readonly [Float64Array, Float64Array];
  readonly tripleCount: number;
  readonly tripleIndex: Int32Array;
  readonly triples: readonly [Float64Array, Float64Array];
  readonly tripleSlopes: readonly [Float64Array, Float64Array];
  private readonly pairBase: readonly [Float64Array, Float64Array];
  private readonly tripleBase: readonly [Float64Array, Float64Array];
  private readonly stability: readonly LatticeStability[];
  private readonly grad: Float64Array;
  private readonly hess: Float64Array;

  constructor(model: ModelParameters, elements: readonly ElementSymbol[]) {
    const n = elements.length;
    const inSystem = model.interactions.filter((i) => i.elements.every((e) => elements.includes(e)));
    const pairs = inSystem.filter((i) => i.elements.length === 2);
    const triples = inSystem.filter((i) => i.elements.length === 3);
    const index = (element: ElementSymbol | undefined) => elements.findIndex((e) => e === element);
    const both = (length: number): [Float64Array, Float64Array] => [
      new Float64Array(length),
      new Float64Array(length),
    ];
    this.stability = elements.map((e) => new LatticeStability(model.liquidOverFcc[e]));
    this.elements = elements;
    this.n = n;
    this.mass = Float64Array.from(elements, (e) => model.atomicMass[e]);
    this.pure = both(n);
    this.pureSlope = both(n);
    this.pairCount = pairs.length;
    this.pairI = Int32Array.from(pairs, (p) => index(p.elements[0]));
    this.pairJ = Int32Array.from(pairs, (p) => index(p.elements[1]));
    this.pairs = both(pairs.length * MAX_ORDER);
    this.pairBase = both(pairs.length * MAX_ORDER);
    this.pairSlopes = both(pairs.length * MAX_ORDER);
    this.tripleCount = triples.length;
    this.tripleIndex = Int32Array.from(triples.flatMap((t) => t.elements.map(index)));
    this.triples = both(triples.length);
    this.tripleBase = both(triples.length);
    this.tripleSlopes = both(triples.length);
    this.grad = new Float64Array(n);
    this.hess = new Float64Array(n * n);
    pairs.forEach((p, k) => {
      this.fill(LIQUID, k * MAX_ORDER, p.liquid, this.pairBase, this.pairSlopes);
      this.fill(FCC, k * MAX_ORDER, p.fcc, this.pairBase, this.pairSlopes);
    });
    triples.forEach((t, k) => {
      this.fill(LIQUID, k, t.liquid, this.tripleBase, this.tripleSlopes);
      this.fill(FCC, k, t.fcc, this.tripleBase, this.tripleSlopes);
    });
  }

  private fill(
    phase: 0 | 1,
    at: number,
    values: readonly Linear[],
    base: readonly [Float64Array, Float64Array],
    slopes: readonly [Float64Array, Float64Array],
  ): void {
    values.forEach(([a, b], v) => {
      base[phase][at + v] = a;
      slopes[phase][at + v] = b;
    });
  }

  /** The interaction values at 0 K. */
  excessAtZero(phase: 0 | 1): { readonly pairs: Float64Array; readonly triples: Float64Array } {
    return { pairs: this.pairBase[phase], triples: this.tripleBase[phase] };
  }

  /** Prepares every temperature-dependent value for `t` kelvin. */
  setTemperature(t: number): void {
    if (t === this.temperature) return;
    this.temperature = t;
    this.rt = GAS_CONSTANT * t;
    for (let i = 0; i < this.n; i++) {
      const stability = this.stability[i]!;
      this.pure[LIQUID][i] = stability.value(t);
      this.pureSlope[LIQUID][i] = stability.slope(t);
    }
    for (let phase = 0; phase < 2; phase++) {
      scale(this.pairs[phase]!, this.pairBase[phase]!, this.pairSlopes[phase]!, t);
      scale(this.triples[phase]!, this.tripleBase[phase]!, this.tripleSlopes[phase]!, t);
    }
  }

  /** Excess energy of one phase at x, J/mol, by the given coefficients (values, or slopes for the excess entropy's negative). */
  excess(x: Float64Array, at: number, pairs: Float64Array, triples: Float64Array): number {
    let sum = 0;
    for (let k = 0; k < this.pairCount; k++) {
      const xi = x[at + this.pairI[k]!]!;
      const xj = x[at + this.pairJ[k]!]!;
      const d = xi - xj;
      const c = k * MAX_ORDER;
      sum += xi * xj * (pairs[c]! + d * (pairs[c + 1]! + d * (pairs[c + 2]! + d * pairs[c + 3]!)));
    }
    for (let k = 0; k < this.tripleCount; k++) {
      const t = 3 * k;
      const index = this.tripleIndex;
      sum += triples[k]! * x[at + index[t]!]! * x[at + index[t + 1]!]! * x[at + index[t + 2]!]!;
    }
    return sum;
  }

  /** Molar Gibbs energy of `phase` at the composition `x[at…]`, J/mol. */
  energy(phase: number, x: Float64Array, at: number): number {
    let sum = this.excess(x, at, this.pairs[phase]!, this.triples[phase]!);
    const pure = this.pure[phase]!;
    for (let i = 0; i < this.n; i++) {
      const xi = x[at + i]!;
      sum += xi * (pure[i]! + this.rt * Math.log(xi));
    }
    return sum;
  }

  /** Chemical potentials into `mu[muAt…]`; returns the molar Gibbs energy. */
  potentials(phase: number, x: Float64Array, at: number, mu: Float64Array, muAt: number): number {
    return this.fillPotentials(
      x,
      at,
      mu,
      muAt,
      this.pure[phase]!,
      this.pairs[phase]!,
      this.triples[phase]!,
      this.rt,
    );
  }

  /** The slopes of the chemical potentials with temperature, minus the partial entropies, J/(mol K); returns minus the molar entropy. */
  potentialSlopes(phase: number, x: Float64Array, at: number, out: Float64Array, outAt: number): number {
    return this.fillPotentials(
      x,
      at,
      out,
      outAt,
      this.pureSlope[phase]!,
      this.pairSlopes[phase]!,
      this.tripleSlopes[phase]!,
      GAS_CONSTANT,
    );
  }

  private fillPotentials(
    x: Float64Array,
    at: number,
    mu: Float64Array,
    muAt: number,
    pure: Float64Array,
    pairs: Float64Array,
    triples: Float64Array,
    rt: number,
  ): number {
    const { n, grad } = this;
    const excess = this.excessGradient(x, at, pairs, triples);
    let along = 0;
    for (let i = 0; i < n; i++) along += x[at + i]! * grad[i]!;
    let energy = 0;
    for (let i = 0; i < n; i++) {
      const xi = x[at + i]!;
      const value = pure[i]! + rt * Math.log(xi) + excess + grad[i]! - along;
      mu[muAt + i] = value;
      energy += xi * value;
    }
    return energy;
  }

  private excessGradient(x: Float64Array, at: number, pairs: Float64Array, triples: Float64Array): number {
    const { grad, pairI, pairJ, tripleIndex, pairCount, tripleCount } = this;
    grad.fill(0);
    let excess = 0;
    for (let k = 0; k < pairCount; k++) {
      const i = pairI[k]!;
      const j = pairJ[k]!;
      const xi = x[at + i]!;
      const xj = x[at + j]!;
      const d = xi - xj;
      const c = k * MAX_ORDER;
      const l1 = pairs[c + 1]!;
      const l2 = pairs[c + 2]!;
      const l3 = pairs[c + 3]!;
      const p = pairs[c]! + d * (l1 + d * (l2 + d * l3));
      const dp = xi * xj * (l1 + d * (2 * l2 + 3 * d * l3));
      excess += xi * xj * p;
      grad[i]! += xj * p + dp;
      grad[j]! += xi * p - dp;
    }
    for (let k = 0; k < tripleCount; k++) {
      const i = tripleIndex[3 * k]!;
      const j = tripleIndex[3 * k + 1]!;
      const m = tripleIndex[3 * k + 2]!;
      const l = triples[k]!;
      const xi = x[at + i]!;
      const xj = x[at + j]!;
      const xm = x[at + m]!;
      excess += l * xi * xj * xm;
      grad[i]! += l * xj * xm;
      grad[j]! += l * xi * xm;
      grad[m]! += l * xi * xj;
    }
    return excess;
  }

  /**
   * The chemical potentials of one phase as straight lines in temperature but for the pure elements:
   * μ = pure(T) + fixed + T × slope, J/mol and J/(mol K). Good for every temperature at one composition.
   */
  potentialParts(phase: number, x: Float64Array, at: number, fixed: Float64Array, slope: Float64Array): void {
    const { n, grad } = this;
    let excess = this.excessGradient(x, at, this.pairBase[phase]!, this.tripleBase[phase]!);
    for (let i = 0; i < n; i++) excess -= x[at + i]! * grad[i]!;
    for (let i = 0; i < n; i++) fixed[i] = excess + grad[i]!;
    excess = this.excessGradient(x, at, this.pairSlopes[phase]!, this.tripleSlopes[phase]!);
    for (let i = 0; i < n; i++) excess -= x[at + i]! * grad[i]!;
    for (let i = 0; i < n; i++) slope[i] = excess + grad[i]! + GAS_CONSTANT * Math.log(x[at + i]!);
  }

  /**
   * Second derivatives of the energy of N moles with respect to amounts, times N, J/mol:
   * (e_i − x)ᵀ H (e_j − x). Singular along x, as the energy is homogeneous in the amounts.
   */
  curvature(phase: number, x: Float64Array, at: number, out: Float64Array, outAt: number): void {
    this.fillHessian(phase, x, at);
    this.projectHessian(x, at, out, outAt);
  }

  /** Chemical potentials and curvature together, as `potentials` and `curvature` would give them; returns the molar energy. */
  derivatives(phase: number, x: Float64Array, mu: Float64Array, curvature: Float64Array): number {
    const { n, grad } = this;
    const excess = this.fillHessian(phase, x, 0);
    const pure = this.pure[phase]!;
    let along = 0;
    for (let i = 0; i < n; i++) along += x[i]! * grad[i]!;
    let energy = 0;
    for (let i = 0; i < n; i++) {
      const value = pure[i]! + this.rt * Math.log(x[i]!) + excess + grad[i]! - along;
      mu[i] = value;
      energy += x[i]! * value;
    }
    this.projectHessian(x, 0, curvature, 0);
    return energy;
  }

  private projectHessian(x: Float64Array, at: number, out: Float64Array, outAt: number): void {
    const { n, grad, hess } = this;
    let whole = 0;
    for (let i = 0; i < n; i++) {
      let row = 0;
      for (let j = 0; j < n; j++) row += hess[i * n + j]! * x[at + j]!;
      grad[i] = row;
      whole += row * x[at + i]!;
    }
    for (let i = 0; i < n; i++) {
      const shift = whole - grad[i]!;
      for (let j = 0; j < n; j++) out[outAt + i * n + j] = hess[i * n + j]! - grad[j]! + shift;
    }
  }

  /** Fills `hess` and `grad` for the excess energy (the ideal part too in `hess`); returns the excess energy. */
  private fillHessian(phase: number, x: Float64Array, at: number): number {
    const { n, grad, hess, pairI, pairJ, tripleIndex, pairCount, tripleCount, rt } = this;
    const pairs = this.pairs[phase]!;
    const triples = this.triples[phase]!;
    let excess = 0;
    hess.fill(0);
    grad.fill(0);
    for (let i = 0; i < n; i++) hess[i * n + i] = rt / x[at + i]!;
    for (let k = 0; k < pairCount; k++) {
      const i = pairI[k]!;
      const j = pairJ[k]!;
      const xi = x[at + i]!;
      const xj = x[at + j]!;
      const d = xi - xj;
      const c = k * MAX_ORDER;
      const l1 = pairs[c + 1]!;
      const l2 = pairs[c + 2]!;
      const l3 = pairs[c + 3]!;
      const xx = xi * xj;
      const p = pairs[c]! + d * (l1 + d * (l2 + d * l3));
      const dp = l1 + d * (2 * l2 + 3 * d * l3);
      const ddp = xx * (2 * l2 + 6 * d * l3);
      const cross = p + d * dp - ddp;
      excess += xx * p;
      grad[i]! += xj * p + xx * dp;
      grad[j]! += xi * p - xx * dp;
      hess[i * n + i]! += 2 * xj * dp + ddp;
      hess[j * n + j]! += ddp - 2 * xi * dp;
      hess[i * n + j]! += cross;
      hess[j * n + i]! += cross;
    }
    for (let k = 0; k < tripleCount; k++) {
      const i = tripleIndex[3 * k]!;
      const j = tripleIndex[3 * k + 1]!;
      const m = tripleIndex[3 * k + 2]!;
      const l = triples[k]!;
      const li = l * x[at + i]!;
      const lj = l * x[at + j]!;
      const lm = l * x[at + m]!;
      excess += li * x[at + j]! * x[at + m]!;
      grad[i]! += lj * x[at + m]!;
      grad[j]! += li * x[at + m]!;
      grad[m]! += li * x[at + j]!;
      addCross(hess, n, i, j, lm);
      addCross(hess, n, i, m, lj);
      addCross(hess, n, j, m, li);
    }
    return excess;
  }
}

const addCross = (hess: Float64Array, n: number, i: number, j: number, value: number): void => {
  hess[i * n + j]! += value;
  hess[j * n + i]! += value;
};

const scale = (out: Float64Array, base: Float64Array, slope: Float64Array, t: number): void => {
  for (let k = 0; k < out.length; k++) out[k] = base[k]! + t * slope[k]!;
};
