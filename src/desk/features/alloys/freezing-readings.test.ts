import { describe, expect, it } from 'vitest';
import { solidFractionAt } from '#shared/metallurgy/index.ts';
import { runStudy } from './alloy-study.ts';
import { freezingRows, lastAtOnce, solidShareAt } from './freezing-readings.ts';

const sterling = { Ag: 92.5, Cu: 7.5 };
const study = runStudy('freezing', { compositionWt: sterling });
if (!study.withinModel) throw new Error(study.reason);
const { lever, scheil } = study;

describe('solidShareAt', () => {
  it.each([880, 850.5, 820])('reads the curve at %d °C as the engine computes it', (celsius) => {
    const answer = solidFractionAt(sterling, celsius);
    expect(solidShareAt(lever.points, celsius)).toBeCloseTo(
      answer.withinModel ? answer.solidMassFraction : NaN,
      3,
    );
  });

  it('is nothing above the liquidus and the whole below the end', () => {
    expect(solidShareAt(lever.points, 1000)).toBe(0);
    expect(solidShareAt(lever.points, 700)).toBe(1);
  });
});

describe('lastAtOnce', () => {
  it('finds the eutectic pockets of as-cast sterling and none in the slow freeze', () => {
    const before = scheil.points.at(-2)?.solidMassFraction ?? NaN;
    expect(lastAtOnce(scheil.points)).toBeCloseTo(1 - before, 9);
    expect(lastAtOnce(scheil.points)).toBeGreaterThan(0.05);
    expect(lastAtOnce(lever.points)).toBe(0);
  });
});

describe('freezingRows', () => {
  it('falls from the liquidus to the end of the as-cast freeze, slow never behind as-cast', () => {
    const rows = freezingRows(lever.points, scheil.points);
    expect(rows[0]?.temperatureC).toBeCloseTo(896, 0);
    expect(rows.at(-1)).toMatchObject({ lever: 1, scheil: 1 });
    expect(rows.length).toBeLessThanOrEqual(17);
    rows.forEach((row, index) => {
      expect(row.scheil).toBeLessThanOrEqual(row.lever + 1e-9);
      expect(row.temperatureC).toBeLessThan(rows[index - 1]?.temperatureC ?? Infinity);
    });
  });
});
