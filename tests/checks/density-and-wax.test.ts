import { describe, expect, it } from 'vitest';
import { density, metalFromWax } from '#shared/metallurgy/index.ts';

const of = (wt: Record<string, number>): number => {
  const answer = density(wt);
  if (!answer.withinModel) throw new Error(answer.reason);
  return answer.gPerCm3;
};

describe('density by additive volumes', () => {
  // Published densities, g/cm³: ITS-90 era handbook values for the pure metals; carat golds from World Gold Council /
  // Gold Technology alloy data (memory); sterling 10.36 and coin 10.31 from maker's sheets; 18 ct green 16.0 (memory).
  it.each([
    [{ Ag: 100 }, 10.49],
    [{ Au: 100 }, 19.32],
    [{ Cu: 100 }, 8.96],
    [{ Ag: 92.5, Cu: 7.5 }, 10.36],
    [{ Ag: 90, Cu: 10 }, 10.31],
    [{ Ag: 80, Cu: 20 }, 10.14],
    [{ Ag: 72, Cu: 28 }, 10.0],
    [{ Au: 91.67, Ag: 5.5, Cu: 2.83 }, 17.9],
    [{ Au: 91.67, Ag: 3.2, Cu: 5.13 }, 17.8],
    [{ Au: 75, Ag: 25 }, 16.0],
    [{ Au: 75, Ag: 16, Cu: 9 }, 15.5],
    [{ Au: 75, Ag: 12.5, Cu: 12.5 }, 15.45],
    [{ Au: 75, Ag: 4.5, Cu: 20.5 }, 15.15],
    [{ Au: 75, Cu: 25 }, 14.9],
    [{ Au: 58.5, Ag: 30, Cu: 11.5 }, 14.0],
    [{ Au: 58.5, Ag: 20.5, Cu: 21 }, 13.6],
    [{ Au: 58.5, Ag: 9, Cu: 32.5 }, 13.3],
    [{ Au: 37.5, Ag: 10, Cu: 45, Zn: 7.5 }, 11.2],
  ] as [Record<string, number>, number][])(
    '%o stands at %d g/cm³ within its stated error',
    (wt, published) => {
      const answer = density(wt);
      if (!answer.withinModel) throw new Error(answer.reason);
      expect(Math.abs(answer.gPerCm3 - published)).toBeLessThanOrEqual(answer.errorGPerCm3);
    },
  );

  // Published: worked example of the additive method, 14 ct US yellow Au58.3 Ag10.4 Cu31.3 gives 13.33 g/cm³.
  it('follows the published worked example', () => {
    expect(of({ Au: 58.3, Ag: 10.4, Cu: 31.3 })).toBeCloseTo(13.33, 1);
  });
});

describe('metal for wax', () => {
  // Published casting tables, grams of metal per gram of wax (wax taken as 1.00 g/cm³): sterling 10.36; 14 ct yellow 13.08
  // to 13.5; 10 ct yellow 11.6; International Gem Society 9 ct 11.2, 18 ct 15.7, 22 ct 17.8.
  it.each([
    [{ Ag: 92.5, Cu: 7.5 }, 10.36, 10.8],
    [{ Au: 58.5, Ag: 20.5, Cu: 21 }, 13.08, 14.1],
    [{ Au: 75, Ag: 12.5, Cu: 12.5 }, 15.4, 15.8],
    [{ Au: 91.67, Ag: 5.5, Cu: 2.83 }, 17.7, 18.0],
  ] as [Record<string, number>, number, number][])('%o takes the published factor', (wt, low, high) => {
    const factor = metalFromWax({ waxMassG: 1, waxDensity: 1, metalDensity: of(wt) });
    expect(factor).toBeGreaterThanOrEqual(low - 0.02);
    expect(factor).toBeLessThanOrEqual(high);
  });

  // Published: a button allowance of 10 % before conversion: 5 g of wax, 14 ct at 13.5, is 5.5 × 13.5 = 74.25 g.
  it('follows the published worked example', () => {
    expect(metalFromWax({ waxMassG: 5.5, waxDensity: 1, metalDensity: 13.5 })).toBeCloseTo(74.25, 10);
  });

  it('minds the density of the wax', () => {
    expect(metalFromWax({ waxMassG: 10, waxDensity: 0.96, metalDensity: 10.36 })).toBeCloseTo(107.92, 2);
    expect(() => metalFromWax({ waxMassG: -1, waxDensity: 1, metalDensity: 10 })).toThrow(RangeError);
  });
});
