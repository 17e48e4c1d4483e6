import { describe, expect, it } from 'vitest';
import { computeCooling } from '#shared/domain/cooling-curve/compute-cooling.ts';
import { judgeCurve } from '#shared/domain/cooling-curve/judge-curve.ts';
import { computedCurve } from './computed-curve.ts';

const sterling = { Ag: 92.5, Cu: 7.5 };
const conditions = { startC: 960, untilC: 740, surroundingsC: 25, ratePerSecond: 0.8, everyS: 1 };
const logged = (composition: Readonly<Record<string, number>>) => {
  const points = computeCooling(composition, 'scheil', conditions) ?? [];
  const verdict = judgeCurve({
    points,
    compositionWt: sterling,
    toleranceWt: {},
    thermometerC: 2,
    unit: 'C',
  });
  return { points, verdict };
};

describe('the computed curve', () => {
  it('lies on a logged one of the same alloy', () => {
    const curve = logged(sterling);
    const computed = computedCurve(curve, sterling);
    expect(computed.length).toBeGreaterThan(50);
    for (const { seconds, temperatureC } of computed.filter((_, k) => k > 30 && k < 200)) {
      const nearest = curve.points.find((point) => point.seconds >= seconds);
      if (nearest) expect(Math.abs(nearest.temperatureC - temperatureC)).toBeLessThan(2.5);
    }
  });

  it('parts from one of another alloy where that begins to freeze', () => {
    const curve = logged({ Ag: 88, Cu: 12 });
    const computed = computedCurve(curve, sterling);
    const at = (seconds: number) => curve.points.find((point) => point.seconds >= seconds)?.temperatureC ?? 0;
    const furthest = Math.max(...computed.map(({ seconds, temperatureC }) => temperatureC - at(seconds)));
    expect(furthest).toBeGreaterThan(15);
  });

  it('is not drawn where nothing was found', () => {
    const points = [{ seconds: 0, temperatureC: 900 }];
    const verdict = judgeCurve({
      points,
      compositionWt: sterling,
      toleranceWt: {},
      thermometerC: 2,
      unit: 'C',
    });
    expect(computedCurve({ points, verdict }, sterling)).toEqual([]);
  });
});
