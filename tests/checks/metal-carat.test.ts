import { describe, expect, it } from 'vitest';
import { additionFor, finenessOfCarat } from '#shared/domain/metal/carat.ts';
import { finenessMarks, marksOf } from '#shared/domain/metal/fineness-marks.ts';
import { formatFineness, mixParts, type LotOnHand } from '#shared/domain/metal/lot.ts';
import { potRequest } from '#shared/domain/metal/pot-request.ts';
import { metalForWax } from '#shared/domain/pour-card/card-figures.ts';
import { defaultProcessTables } from '#shared/domain/studio/process-tables.ts';
import { fromGrams, toGrams } from '#shared/lib/units.ts';
import { planCharge } from '#server/queries/plan-charge.ts';

const raise = (mass: number, from: number, to: number): number =>
  additionFor({ mass, fromPpt: finenessOfCarat(from), targetPpt: finenessOfCarat(to), additionPpt: 1000 });
const lower = (mass: number, from: number, to: number): number =>
  additionFor({ mass, fromPpt: finenessOfCarat(from), targetPpt: finenessOfCarat(to), additionPpt: 0 });

describe('raising and lowering the carat, as published', () => {
  it('20 g of 10 ct to 14 ct takes 8 g of fine gold (Borahan, Orchid forum thread 27089)', () => {
    expect(raise(20, 10, 14)).toBeCloseTo(8, 9);
  });

  it('25 dwt of 10 ct to 14 ct takes 0.400 times as much, 10 dwt (Krohn’s factor table)', () => {
    expect(raise(25, 10, 14)).toBeCloseTo(10, 9);
  });

  it('9 dwt of 18 ct to 10 ct takes 0.800 times as much, 7.2 dwt (Orchid forum thread 27089)', () => {
    expect(lower(9, 18, 10)).toBeCloseTo(7.2, 9);
  });

  it('6 oz of fine gold to 16 ct takes 3 oz of alloy (A Manual of Mechanical Dentistry and Metallurgy, p. 206)', () => {
    expect(lower(6, 24, 16)).toBeCloseTo(3, 9);
  });

  it('14 ct as 14/24 is 583.3 and fails a 585 mark (ISO 9202 marks, from memory)', () => {
    const marks = marksOf('ISO 9202', 'Au').map(({ ppt }) => ppt);
    expect(marks).toContain(585);
    expect(finenessOfCarat(14)).toBeLessThan(585);
    expect(formatFineness(finenessOfCarat(14))).toBe('583.3');
  });

  it('is refused where the addition goes the other way', () => {
    expect(() => raise(20, 14, 10)).toThrow(RangeError);
    expect(() => additionFor({ mass: 1, fromPpt: 585, targetPpt: 750, additionPpt: 750 })).toThrow(
      RangeError,
    );
  });

  it('agrees with the planner, which balances copper too: 20 g of 10 ct with 8 g of fine gold', async () => {
    const ct = (carat: number) => ({
      Au: finenessOfCarat(carat) / 10,
      Cu: 100 - finenessOfCarat(carat) / 10,
    });
    const gold: LotOnHand = {
      id: 'gold',
      code: 'L-0001',
      name: 'fine gold',
      kind: 'fine',
      compositionWt: { Au: 100 },
      toleranceWt: { Au: 0 },
      balanceMg: 50_000,
      receivedAt: '2026-11-01T00:00:00.000Z',
    };
    const outcome = await planCharge(
      potRequest({
        pot: { massMg: 20_000, compositionWt: ct(10), toleranceWt: {} },
        targetWt: ct(14),
        toleranceWt: { Au: 0.2, Cu: 0.2 },
        markedMetal: 'Au',
        markPpt: finenessOfCarat(14),
        lots: [gold],
      }),
    );
    expect(outcome.kind === 'planned' && outcome.plan.lines.map(({ massMg }) => massMg)).toEqual([8000]);
  });
});

describe('balancing every element', () => {
  it('gold may be right while silver and copper are wrong: Au 39 Ag 33 Cu 28 (Orchid forum thread 11552)', async () => {
    // Raised to 58.5 by fine gold alone, silver and copper stay at 33 : 28, and 14 ct yellow of 20.5 : 21 is missed.
    const mass = additionFor({ mass: 100, fromPpt: 390, targetPpt: 585, additionPpt: 1000 });
    const parts = mixParts([
      { assay: { compositionWt: { Au: 39, Ag: 33, Cu: 28 }, toleranceWt: {} }, massMg: 100_000 },
      { assay: { compositionWt: { Au: 100 }, toleranceWt: {} }, massMg: Math.round(mass * 1000) },
    ]);
    expect(parts.Au).toBeCloseTo(58.5, 3);
    expect(parts.Ag).toBeCloseTo(22.45, 2);
    expect(parts.Cu).toBeCloseTo(19.05, 2);
    const outcome = await planCharge(
      potRequest({
        pot: { massMg: 100_000, compositionWt: { Au: 39, Ag: 33, Cu: 28 }, toleranceWt: { Au: 0 } },
        targetWt: { Au: 58.5, Ag: 20.5, Cu: 21 },
        toleranceWt: { Au: 0.1, Ag: 0.3, Cu: 0.3 },
        markedMetal: 'Au',
        markPpt: 585,
        lots: [],
      }),
    );
    if (outcome.kind !== 'short') throw new Error('Something was planned from nothing.');
    expect(outcome.wouldDo.map(({ name }) => name).sort()).toEqual(['fine copper', 'fine gold']);
  });
});

describe('units and wax', () => {
  it('1 oz t is 31.1035 g and 1 dwt 1.55518 g (A.U. Enterprises), exactly 31.1034768 g (international pound, 1959)', () => {
    expect(toGrams(1, 'ozt')).toBe(31.1034768);
    expect(toGrams(1, 'ozt')).toBeCloseTo(31.1035, 4);
    expect(toGrams(1, 'dwt')).toBeCloseTo(1.55518, 4);
    expect(fromGrams(toGrams(20, 'dwt'), 'ozt')).toBeCloseTo(1, 12);
  });

  it('5 g of wax in 14 ct with a button of 10 %: 5.5 × 13.5 = 74.25 g (Romanoff)', () => {
    const tables = { ...defaultProcessTables, waxDensityGPerCm3: 1, buttonShare: 0.1 };
    expect(metalForWax(5, 13.5, tables)).toBeCloseTo(74.25, 9);
  });

  // Density of the metal over wax of 1.00 g/cm³; the trade's tables differ by ± 5 % from each other.
  it.each([
    ['sterling, 10.36 (A.U. Enterprises)', 10.36, 10.36],
    ['14 ct yellow, 13.08 (A.U. Enterprises)', 13.08, 13.08],
    ['18 ct yellow, 15.60 (A.U. Enterprises) by the density 15.58 (Orchid forum thread 27807)', 15.58, 15.6],
  ])('the factor of %s', (_name, density, factor) => {
    const tables = { ...defaultProcessTables, waxDensityGPerCm3: 1, buttonShare: 0 };
    expect(Math.abs(metalForWax(1, density, tables) / factor - 1)).toBeLessThan(0.005);
  });
});

describe('fineness marks', () => {
  it('allow nothing below the mark in the United Kingdom (Hallmarking Act 1973, s. 4(1))', () => {
    expect(
      finenessMarks
        .filter(({ place }) => place === 'United Kingdom')
        .map(({ negativeTolerancePpt }) => negativeTolerancePpt),
    ).toEqual(Array.from({ length: 10 }, () => 0));
  });

  it('allow gold 3 parts per thousand in the United States (15 USC 295) and silver 4 (15 USC 296, from memory)', () => {
    expect(
      new Set(marksOf('United States', 'Au').map(({ negativeTolerancePpt }) => negativeTolerancePpt)),
    ).toEqual(new Set([3]));
    expect(
      new Set(marksOf('United States', 'Ag').map(({ negativeTolerancePpt }) => negativeTolerancePpt)),
    ).toEqual(new Set([4]));
  });

  it('are never rounded up to', () => {
    expect([formatFineness(749.96), formatFineness(750), formatFineness(924.999)]).toEqual([
      '749.9',
      '750.0',
      '924.9',
    ]);
  });
});
