import { describe, expect, it } from 'vitest';
import { chooseCooling } from './choose-cooling.ts';
import { faultOfFit, fitFlaskCooling, fitRule, type FlaskOuting } from './fit-flask-cooling.ts';

/** A repeatable stream of normal numbers: mulberry32 and Box-Muller. */
const normals = (start: number): (() => number) => {
  let state = start >>> 0;
  const uniform = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return (((t ^ (t >>> 14)) >>> 0) + 0.5) / 4294967296;
  };
  return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
};

const seconds = [10, 30, 60, 90, 120, 180, 240];

interface Synthetic {
  readonly perSecond: number;
  readonly outings: number;
  readonly noiseC: number;
  readonly seed?: number;
  readonly at?: readonly number[];
}

const synthetic = ({ perSecond, outings, noiseC, seed = 7, at = seconds }: Synthetic): FlaskOuting[] => {
  const normal = normals(seed);
  return Array.from({ length: outings }, (_, k) => {
    const startC = 480 + 40 * k;
    return {
      id: `outing ${k + 1}`,
      roomC: 22,
      readings: at.map((secondsOut) => ({
        secondsOut,
        temperatureC: 22 + (startC - 22) * Math.exp(-perSecond * secondsOut) + noiseC * normal(),
      })),
    };
  });
};

const fitOf = (outings: readonly FlaskOuting[]) => {
  const fit = fitFlaskCooling(outings);
  if (!fit) throw new Error('There is no fit.');
  return fit;
};

describe('the fitted cooling constant', () => {
  it('is exact without noise, whatever each flask began at', () => {
    const fit = fitOf(synthetic({ perSecond: 0.00113, outings: 3, noiseC: 0 }));
    expect(fit.perSecond).toBeCloseTo(0.00113, 10);
    expect(fit.startsC['outing 2']).toBeCloseTo(520, 6);
    expect([fit.readings, fit.outings, fit.leftOut.length]).toEqual([21, 3, 0]);
  });

  it('lies within two standard errors of the truth nineteen times in twenty, and the error is told right', () => {
    const perSecond = 0.00113;
    const fits = Array.from({ length: 300 }, (_, seed) =>
      fitOf(synthetic({ perSecond, outings: 4, noiseC: 2, seed })),
    );
    const inside = fits.filter(
      (fit) => Math.abs(fit.perSecond - perSecond) < 2 * (fit.standardError ?? 0),
    ).length;
    expect(inside / fits.length).toBeGreaterThan(0.9);
    const mean = fits.reduce((total, fit) => total + fit.perSecond, 0) / fits.length;
    expect(Math.abs(mean / perSecond - 1)).toBeLessThan(0.005);
  });

  it('names a reading that is far off and is not moved by it', () => {
    const outings = synthetic({ perSecond: 0.00113, outings: 3, noiseC: 1 });
    const spoilt = outings.map((outing, k) =>
      k === 1
        ? {
            ...outing,
            readings: outing.readings.map((reading) =>
              reading.secondsOut === 120 ? { ...reading, temperatureC: reading.temperatureC - 60 } : reading,
            ),
          }
        : outing,
    );
    const [clean, fit] = [fitOf(outings), fitOf(spoilt)];
    expect(fit.leftOut).toMatchObject([
      { outingId: 'outing 2', secondsOut: 120, why: expect.stringMatching(/°C below/) as string },
    ]);
    expect(Math.abs(fit.perSecond / clean.perSecond - 1)).toBeLessThan(0.03);
  });

  it('takes the difference between flasks into its standard error', () => {
    const alike = fitOf(synthetic({ perSecond: 0.0011, outings: 4, noiseC: 0.5 }));
    const unlike = [0.0009, 0.0011, 0.0013, 0.0012].flatMap((perSecond, k) =>
      synthetic({ perSecond, outings: 1, noiseC: 0.5, seed: k }).map((outing) => ({
        ...outing,
        id: String(k),
      })),
    );
    expect(fitOf(unlike).standardError).toBeGreaterThan(5 * (alike.standardError ?? 0));
  });

  it('leaves out a lone reading and a cold one, with the reason', () => {
    const [outing] = synthetic({ perSecond: 0.00113, outings: 1, noiseC: 0 });
    const cold = { secondsOut: 9000, temperatureC: 30 };
    const fit = fitOf([
      { id: 'a', roomC: 22, readings: [...(outing?.readings ?? []), cold] },
      { id: 'lone', roomC: 22, readings: [{ secondsOut: 60, temperatureC: 400 }] },
    ]);
    expect(fit.leftOut.map(({ outingId, why }) => [outingId, why.slice(0, 8)])).toEqual([
      ['a', 'Within 4'],
      ['lone', 'The only'],
    ]);
  });

  it('is none where nothing tells a rate', () => {
    expect(fitFlaskCooling([])).toBeNull();
    const twice = { secondsOut: 60, temperatureC: 400 };
    expect(fitFlaskCooling([{ id: 'a', roomC: 22, readings: [twice, twice] }])).toBeNull();
  });
});

describe('the constant a card uses', () => {
  const table = [{ diameterMm: 89, perSecond: 0.00113 }];

  it('is the default until there are enough readings from enough flasks', () => {
    expect(chooseCooling(89, table, null)).toMatchObject({
      from: 'default',
      perSecond: 0.00113,
      readings: 0,
    });
    const few = fitOf(synthetic({ perSecond: 0.0015, outings: fitRule.leastOutings - 1, noiseC: 1 }));
    expect(few.readings).toBeGreaterThan(fitRule.leastReadings);
    const chosen = chooseCooling(89, table, few);
    expect(chosen).toMatchObject({ from: 'default', perSecond: 0.00113 });
    expect(chosen.words).toMatch(/no reading stands behind it.*there are 14 from 2/);
    const short = fitOf(synthetic({ perSecond: 0.0015, outings: 3, noiseC: 1, at: [10, 60, 120] }));
    expect(faultOfFit(short)).toMatch(/there are 9 from 3/);
  });

  it('is the fitted one from then on, and says how many readings stand behind it', () => {
    const chosen = chooseCooling(89, table, fitOf(synthetic({ perSecond: 0.0015, outings: 3, noiseC: 1 })));
    expect(chosen.from).toBe('fitted');
    expect(Math.abs(chosen.perSecond - 0.0015)).toBeLessThan(0.0001);
    expect(chosen.words).toMatch(
      /^Fitted to 21 readings of 3 flasks of this size: 0\.0\d+ ± 0\.00\d+ per minute/,
    );
  });

  it('stays the default where the readings scatter too much, or warm up', () => {
    const wild = fitOf(synthetic({ perSecond: 0.0011, outings: 3, noiseC: 60, at: [10, 20, 30, 40, 50] }));
    expect(faultOfFit(wild)).toMatch(/scatter too much|no cooling/);
    const warming = fitOf(synthetic({ perSecond: -0.001, outings: 3, noiseC: 0.1 }));
    expect(faultOfFit(warming)).toMatch(/no cooling/);
  });
});
