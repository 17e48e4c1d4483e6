import { meanMass, toWt } from './equilibrium.ts';
import type { Job } from './engine.ts';
import { ZERO_CELSIUS_K } from './model.ts';
import type { ScheilFreeze, ScheilNode } from './scheil-walk.ts';
import type { ByElement, SolidFraction } from './types.ts';

const hermite = (
  from: number,
  to: number,
  fromSlope: number,
  toSlope: number,
  h: number,
  u: number,
): number => {
  const v = 1 - u;
  return (
    (1 + 2 * u) * v * v * from +
    u * v * v * h * fromSlope +
    u * u * (3 - 2 * u) * to -
    u * u * v * h * toSlope
  );
};

const hermiteSlope = (
  from: number,
  to: number,
  fromSlope: number,
  toSlope: number,
  h: number,
  u: number,
): number =>
  (6 * u * (1 - u) * (to - from)) / h + (1 - u) * (1 - 3 * u) * fromSlope + u * (3 * u - 2) * toSlope;

/** Reads a Scheil freeze at any temperature, between its nodes by cubic Hermite curves. */
export class ScheilCurve {
  private readonly job: Job;
  private readonly freeze: ScheilFreeze;
  private readonly liquid: Float64Array;
  private readonly solid: Float64Array;

  constructor(job: Job, freeze: ScheilFreeze) {
    this.job = job;
    this.freeze = freeze;
    this.liquid = new Float64Array(job.system.n);
    this.solid = new Float64Array(job.system.n);
  }

  /** The temperature at which the last liquid freezes, °C; null when the liquid leaves the model before that. */
  get endC(): number | null {
    const last = this.freeze.nodes.at(-1);
    return last && this.freeze.end !== 'left-model' ? last.t - ZERO_CELSIUS_K : null;
  }

  /** The lowest temperature the curve reaches, °C. */
  get lowestC(): number {
    return (this.freeze.nodes.at(-1)?.t ?? Number.NaN) - ZERO_CELSIUS_K;
  }

  /** The state at a temperature; null below where the liquid left the model. */
  at(temperatureC: number): SolidFraction | null {
    const { nodes } = this.freeze;
    const t = temperatureC + ZERO_CELSIUS_K;
    const first = nodes[0]!;
    const last = nodes.at(-1)!;
    if (t >= first.t) return { solidMassFraction: 0, solidWt: null, liquidWt: this.wt(first.liquid) };
    if (t < last.t) {
      const solid = { solidMassFraction: 1, solidWt: this.formingAt(last), liquidWt: null };
      return this.freeze.end === 'left-model' ? null : solid;
    }
    let k = 1;
    while (k < nodes.length - 1 && nodes[k]!.t > t) k++;
    return this.between(nodes[k - 1]!, nodes[k]!, t);
  }

  private formingAt(node: ScheilNode): ByElement {
    for (let i = 0; i < this.solid.length; i++) this.solid[i] = node.liquid[i]! - node.liquidSlope[i]!;
    return this.wt(this.solid);
  }

  private between(a: ScheilNode, b: ScheilNode, t: number): SolidFraction {
    const h = b.s - a.s;
    const u = placeOf(a, b, h, t);
    const { liquid, solid } = this;
    for (let i = 0; i < liquid.length; i++) {
      const from = a.liquid[i]!;
      const to = b.liquid[i]!;
      liquid[i] = hermite(from, to, a.liquidSlope[i]!, b.liquidSlope[i]!, h, u);
      solid[i] = Math.max(0, liquid[i]! - hermiteSlope(from, to, a.liquidSlope[i]!, b.liquidSlope[i]!, h, u));
    }
    const { system, x } = this.job;
    const left = (Math.exp(-(a.s + u * h)) * meanMass(system, liquid, 0)) / meanMass(system, x, 0);
    return {
      solidMassFraction: Math.min(1, Math.max(0, 1 - left)),
      solidWt: this.wt(solid),
      liquidWt: this.wt(liquid),
    };
  }

  private wt(x: Float64Array): ByElement {
    return toWt(this.job.system, x, 0);
  }
}

/** Where between two nodes, in [0, 1], the temperature stands at `t`, by bisection on the Hermite curve. */
const placeOf = (a: ScheilNode, b: ScheilNode, h: number, t: number): number => {
  let low = 0;
  let high = 1;
  for (let k = 0; k < 52; k++) {
    const middle = (low + high) / 2;
    if (hermite(a.t, b.t, a.tSlope, b.tSlope, h, middle) > t) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
};
