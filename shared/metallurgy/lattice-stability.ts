import type { StabilitySegment } from './model.ts';

/** Functions of temperature in the order that a compiled segment holds their coefficients. */
const TERMS = ['1', 'T', 'TlnT', 'T^2', 'T^3', 'T^-1', 'T^7', 'T^-9'] as const;
const WIDTH = TERMS.length;

/** G(liquid) − G(fcc) of one pure element, compiled; J/mol against kelvin. */
export class LatticeStability {
  private readonly upTo: Float64Array;
  private readonly coefficients: Float64Array;

  /**
   * Later segments are shifted by a constant to meet the one before at their common limit: published coefficients
   * miss by some thousandths of a joule, and a step in energy is a step in every fraction.
   */
  constructor(segments: readonly StabilitySegment[]) {
    this.upTo = Float64Array.from(segments, (s) => s.upToK);
    this.coefficients = new Float64Array(segments.length * WIDTH);
    segments.forEach((segment, k) => {
      for (const [coefficient, term] of segment.terms) {
        const column = TERMS.findIndex((t) => t === term);
        if (column < 0) throw new RangeError(`Unknown function of temperature: ${term}`);
        this.coefficients[k * WIDTH + column]! += coefficient;
      }
      if (k === 0) return;
      const limit = this.upTo[k - 1]!;
      this.coefficients[k * WIDTH]! += this.valueIn(k - 1, limit) - this.valueIn(k, limit);
    });
  }

  /** The difference itself at `t` kelvin, J/mol. */
  value(t: number): number {
    return this.valueIn(this.segmentAt(t), t);
  }

  /** Its slope with temperature at `t` kelvin, J/(mol K). */
  slope(t: number): number {
    const c = this.coefficients;
    const k = this.segmentAt(t) * WIDTH;
    const t3 = t * t * t;
    const logs = c[k + 2]! === 0 ? 0 : c[k + 2]! * (Math.log(t) + 1);
    const powers = 2 * c[k + 3]! * t + 3 * c[k + 4]! * t * t + 7 * c[k + 6]! * t3 * t3;
    return c[k + 1]! + logs + powers - c[k + 5]! / (t * t) - (9 * c[k + 7]!) / (t3 * t3 * t3 * t);
  }

  private segmentAt(t: number): number {
    let k = 0;
    while (k < this.upTo.length - 1 && t > this.upTo[k]!) k++;
    return k;
  }

  private valueIn(segment: number, t: number): number {
    const c = this.coefficients;
    const k = segment * WIDTH;
    const t3 = t * t * t;
    const logs = c[k + 2]! === 0 ? 0 : c[k + 2]! * t * Math.log(t);
    const powers = t * (c[k + 1]! + t * (c[k + 3]! + t * c[k + 4]!)) + c[k + 6]! * t3 * t3 * t;
    return c[k]! + logs + powers + c[k + 5]! / t + c[k + 7]! / (t3 * t3 * t3);
  }
}
