import { describe, expect, it } from 'vitest';
import {
  binarySection,
  equilibrium,
  leverRule,
  meltingRange,
  solidFractionAt,
  tieLine,
} from '#shared/metallurgy/index.ts';
import type { MeltingRange, Outcome } from '#shared/metallurgy/index.ts';

const known = <T>(outcome: Outcome<T>): T => {
  if (!outcome.withinModel) throw new Error(outcome.reason);
  return outcome;
};

const range = (wt: Record<string, number>): MeltingRange => known(meltingRange(wt));

describe('pure metals', () => {
  // Published: International Temperature Scale of 1990, defining fixed points (Ag 961.78, Au 1064.18, Cu 1084.62, Zn 419.527 °C).
  it.each([
    ['Ag', 961.78],
    ['Au', 1064.18],
    ['Cu', 1084.62],
  ])('%s melts at its ITS-90 point', (element, celsius) => {
    const { liquidusC, solidusC, asCastSolidusC } = range({ [element]: 100 });
    for (const t of [liquidusC, solidusC, asCastSolidusC]) expect(t).toBeCloseTo(celsius, 2);
  });

  it('zinc is refused: its solid is not fcc', () => {
    expect(meltingRange({ Zn: 100 })).toMatchObject({ withinModel: false, code: 'phase-outside-model' });
  });
});

describe('the Ag-Cu eutectic', () => {
  // Published: NIST phase diagrams of solder systems, Ag-Cu page (Hayes 1986, adapted by Kattner 1999):
  // 779.1 °C; liquid 71.59, (Ag) 91.73, (Cu) 7.47 wt% Ag.
  const section = known(binarySection({ kind: 'binary', elements: ['Ag', 'Cu'] }));
  const [eutectic] = section.invariants;

  it('lies where the source computes it', () => {
    expect(eutectic?.name).toBe('eutectic');
    expect(eutectic?.temperatureC).toBeCloseTo(779.1, 1);
    expect(100 - (eutectic?.liquidX ?? 0)).toBeCloseTo(71.59, 1);
    expect(100 - (eutectic?.fromX ?? 0)).toBeCloseTo(91.73, 1);
    expect(100 - (eutectic?.toX ?? 0)).toBeCloseTo(7.47, 1);
  });

  it('has no degree of freedom: three phases meet at one temperature only (condensed phase rule)', () => {
    const t = eutectic?.temperatureC ?? 0;
    const above = known(equilibrium({ Ag: 60, Cu: 40 }, t + 0.001));
    const below = known(equilibrium({ Ag: 60, Cu: 40 }, t - 0.001));
    const names = new Set(
      [...above.phases, ...below.phases].map((phase) => phase.name.replace(/^.*fcc$/, 'fcc')),
    );
    expect(names).toEqual(new Set(['liquid', 'fcc']));
    expect(above.degreesOfFreedom).toBe(1);
    expect(below.degreesOfFreedom).toBe(1);
    // Each side of the line shares two phases of the three: F = 2 + 1 − 3 = 0 on it.
    expect(above.phases.length + below.phases.length - 1).toBe(3);
  });

  it('leaves one, two and three degrees of freedom to fewer phases', () => {
    expect(known(equilibrium({ Ag: 92.5, Cu: 7.5 }, 1000)).degreesOfFreedom).toBe(2);
    expect(known(equilibrium({ Ag: 92.5, Cu: 7.5 }, 850)).degreesOfFreedom).toBe(1);
    expect(known(equilibrium({ Au: 75, Ag: 12.5, Cu: 12.5 }, 1000)).degreesOfFreedom).toBe(3);
  });
});

describe('silver alloys against handbook ranges', () => {
  // Memory: ASM Handbook vol. 2 gives sterling 802-893 °C. The NIST parameters give 803-896.
  it('sterling melts from 802 to 893 °C', () => {
    const sterling = range({ Ag: 92.5, Cu: 7.5 });
    expect(Math.abs(sterling.solidusC - 802)).toBeLessThan(3);
    expect(Math.abs(sterling.liquidusC - 893)).toBeLessThan(5);
  });

  it('sterling as cast remelts at the eutectic, not at its solidus', () => {
    expect(range({ Ag: 92.5, Cu: 7.5 }).asCastSolidusC).toBeCloseTo(779.1, 1);
  });

  // Memory of handbooks: 7.5 wt% Cu dissolves fully above about 745-760 °C.
  it('sterling is of one solid above a solvus near 750 °C', () => {
    const solvus = range({ Ag: 92.5, Cu: 7.5 }).solvusC ?? 0;
    expect(solvus).toBeGreaterThan(740);
    expect(solvus).toBeLessThan(765);
  });

  // Computed from the NIST parameters by their source's own tool, equilibrium, rounded to 1 °C.
  it.each([
    [95.8, 879, 924],
    [95, 862, 917],
    [93.5, 829, 904],
    [90, 779, 877],
    [87.5, 779, 860],
    [80, 779, 815],
    [75, 779, 792],
    [50, 779, 866],
  ])('silver %d agrees with the same parameters computed elsewhere', (silver, solidusC, liquidusC) => {
    const computed = range({ Ag: silver, Cu: 100 - silver });
    expect(Math.abs(computed.solidusC - solidusC)).toBeLessThan(1);
    expect(Math.abs(computed.liquidusC - liquidusC)).toBeLessThan(1);
  });

  // Published: ASTM B628 / AWS A5.8 BAg-8 (Ag72 Cu28) 779-779 °C; data sheets round to 780.
  it('Ag72 Cu28 melts all but at once', () => {
    const { solidusC, liquidusC } = range({ Ag: 72, Cu: 28 });
    expect(solidusC).toBeCloseTo(779.1, 1);
    expect(liquidusC - solidusC).toBeLessThan(3);
  });
});

describe('the lever rule', { timeout: 30_000 }, () => {
  // Published: Callister, Materials Science and Engineering, worked example for Cu-Ni: 35 wt% Ni at 1250 °C,
  // liquid 31.5 and solid 42.5 wt% Ni; mass fractions 0.68 liquid and 0.32 solid.
  it('gives the fractions of the textbook example', () => {
    const { solid, liquid } = leverRule({ overall: 35, solid: 42.5, liquid: 31.5 });
    expect(liquid).toBeCloseTo(0.68, 2);
    expect(solid).toBeCloseTo(0.32, 2);
  });

  it('agrees with the fractions of the equilibrium and of its tie line', () => {
    const section = known(binarySection({ kind: 'binary', elements: ['Ag', 'Cu'] }));
    const line = known(tieLine(section, 7.5, 850));
    const end = (name: string) => line.ends.find((e) => e.name === name);
    const fractions = leverRule({ overall: 7.5, solid: end('fcc')?.x ?? 0, liquid: end('liquid')?.x ?? 0 });
    expect(line.inPlane).toBe(true);
    expect(end('fcc')?.massFraction).toBeCloseTo(fractions.solid, 10);
    expect(known(solidFractionAt({ Ag: 92.5, Cu: 7.5 }, 850)).solidMassFraction).toBeCloseTo(
      fractions.solid,
      10,
    );
  });

  it('refuses a composition off its line', () => {
    expect(() => leverRule({ overall: 50, solid: 42.5, liquid: 31.5 })).toThrow(RangeError);
  });
});

describe('the Scheil freeze of sterling', { timeout: 30_000 }, () => {
  // Independent route: integrate df/f = dC/(C_L − C_S) on the tie lines of the equilibrium, by the trapezium rule.
  it('leaves the eutectic fraction that direct integration gives', () => {
    const eutecticC = 779.128;
    let logLeft = 0;
    const tie = (celsius: number, copper: number): readonly [number, number] => {
      const state = known(equilibrium({ Ag: 100 - copper, Cu: copper }, celsius));
      const of = (name: string) => state.phases.find((phase) => phase.name === name)?.wt['Cu'] ?? 0;
      return [of('liquid'), of('fcc')];
    };
    const { liquidusC } = range({ Ag: 92.5, Cu: 7.5 });
    const steps = 400;
    let [lastLiquid, lastSolid] = [7.5, tie(liquidusC - 0.001, 7.5)[1]];
    for (let k = 1; k <= steps; k++) {
      const celsius = liquidusC + ((eutecticC - liquidusC) * k) / steps;
      const [liquid, solid] = tie(celsius, 0.5 * (lastLiquid + lastSolid) + 0.3);
      logLeft -= 0.5 * (liquid - lastLiquid) * (1 / (lastLiquid - lastSolid) + 1 / (liquid - solid));
      [lastLiquid, lastSolid] = [liquid, solid];
    }
    const scheil = known(solidFractionAt({ Ag: 92.5, Cu: 7.5 }, eutecticC, 'scheil'));
    expect(1 - scheil.solidMassFraction).toBeCloseTo(Math.exp(logLeft), 4);
  });
});
