import { describe, expect, it } from 'vitest';
import { computeCooling } from './compute-cooling.ts';
import type { CurvePoint } from './curve-point.ts';
import { findArrests } from './find-arrests.ts';
import { judgeCurve, type CurveQuestion } from './judge-curve.ts';

const sterling = { Ag: 92.5, Cu: 7.5 };

const cooled = (composition: CurveQuestion['compositionWt'], everyS = 1): readonly CurvePoint[] => {
  const conditions = { startC: 960, untilC: 740, surroundingsC: 25, ratePerSecond: 1, everyS };
  const curve = computeCooling(composition, 'scheil', conditions);
  if (!curve) throw new Error('The engine does not hold this alloy.');
  return curve;
};

const judge = (points: readonly CurvePoint[], more: Partial<CurveQuestion> = {}) =>
  judgeCurve({
    points,
    compositionWt: sterling,
    toleranceWt: { Ag: 0.2 },
    thermometerC: 2,
    unit: 'C',
    ...more,
  });

const part = (keep: (point: CurvePoint) => boolean): readonly CurvePoint[] => cooled(sterling).filter(keep);

describe('a cooling curve', () => {
  it('agrees with the alloy it is of', () => {
    const verdict = judge(cooled(sterling));
    expect(verdict.kind).toBe('agrees');
    expect(verdict.sentence).toBe(
      'Agrees: it begins to freeze at 896 °C, and this alloy should at 896 °C, ± 4 °C.',
    );
  });

  it('differs by so much, which would mean so much copper', () => {
    const verdict = judge(cooled({ Ag: 90, Cu: 10 }));
    expect(verdict).toMatchObject({ kind: 'differs', element: 'Cu' });
    expect(verdict.kind === 'differs' && verdict.moreWt).toBeCloseTo(2.5, 1);
    expect(verdict.sentence).toMatch(/^Differs by 19 °C: .* That would mean about 2\.5 wt% more copper\.$/);
  });

  it('is written in the studio’s unit', () => {
    expect(judge(cooled(sterling), { unit: 'F' }).sentence).toMatch(/at 1645 °F/);
  });

  it('is judged more mildly by a thermometer that is less sure', () => {
    const curve = cooled({ Ag: 91.6, Cu: 8.4 });
    expect(judge(curve).kind).toBe('differs');
    expect(judge(curve, { thermometerC: 9 }).kind).toBe('agrees');
  });
});

describe('a curve from which nothing can be told', () => {
  it.each<[string, readonly CurvePoint[], RegExp]>([
    ['too-few-points', [], /0 points are too few/],
    ['too-few-points', cooled(sterling).slice(50, 70), /20 points are too few/],
    ['too-slow-sampling', part(({ seconds }) => seconds % 40 === 0), /every 40.0 s is too slow/],
    ['too-slow-sampling', cooled(sterling, 12), /every 12\.0 s is too slow/],
    ['never-crossed', part(({ temperatureC }) => temperatureC > 905), /does not cross 896 °C/],
    [
      'never-crossed',
      part(({ temperatureC }) => temperatureC < 870 && temperatureC > 800),
      /does not cross 896 °C/,
    ],
    [
      'too-much-noise',
      cooled(sterling).map(({ seconds, temperatureC }, k) => ({
        seconds,
        temperatureC: temperatureC + 14 * Math.sin(17 * k * k),
      })),
      /jump by about \d+\.\d °C/,
    ],
    [
      'no-arrest',
      Array.from({ length: 300 }, (_, k) => ({ seconds: k, temperatureC: 25 + 935 * Math.exp(-k / 935) })),
      /slows down/,
    ],
  ])('says %s, and why', (why, points, words) => {
    const verdict = judge(points);
    expect(verdict).toMatchObject({ kind: 'cannot-tell', why });
    expect(verdict.sentence).toMatch(/^Cannot tell, because /);
    expect(verdict.sentence).toMatch(words);
  });

  it('is that of an alloy outside the model, with the element named', () => {
    const verdict = judge(cooled(sterling), { compositionWt: { Ag: 92.5, Cu: 6.5, Ge: 1 } });
    expect(verdict).toMatchObject({ kind: 'cannot-tell', why: 'outside-model' });
    expect(verdict.sentence).toMatch(/holds Ge 1 wt%/);
    expect(verdict.observed?.liquidusC).toBeGreaterThan(890);
  });
});

describe('odd points', () => {
  it('in any order, twice, or no numbers at all, never make it throw', () => {
    const curve = cooled(sterling);
    const odd = [
      ...curve.toReversed(),
      ...curve.slice(0, 50),
      { seconds: Number.NaN, temperatureC: 900 },
      { seconds: 10.5, temperatureC: Number.POSITIVE_INFINITY },
    ];
    expect(judge(odd).kind).toBe('agrees');
    for (const points of [
      [{ seconds: 0, temperatureC: 900 }],
      Array.from({ length: 40 }, () => ({ seconds: 1, temperatureC: 900 })),
    ])
      expect(judge(points).kind).toBe('cannot-tell');
    const flat = Array.from({ length: 60 }, (_, seconds) => ({ seconds, temperatureC: 900 }));
    expect(judge(flat).kind).toBe('cannot-tell');
  });

  it('of a spike or a heating before the fall do not move the liquidus', () => {
    const curve = cooled(sterling);
    const heating = Array.from({ length: 120 }, (_, k) => ({
      seconds: k - 120,
      temperatureC: 700 + (260 * k) / 120,
    }));
    const spiked = [...heating, ...curve].map((point, k) =>
      k % 60 === 30 ? { ...point, temperatureC: point.temperatureC + 25 } : point,
    );
    const [plain, rough] = [findArrests(curve).found, findArrests(spiked).found];
    expect(Math.abs((rough?.liquidusC ?? 0) - (plain?.liquidusC ?? 0))).toBeLessThan(0.7);
  });
});
