import { describe, expect, it } from 'vitest';
import { judgeCurve } from '../cooling-curve/judge-curve.ts';
import { playMelt } from './play-melt.ts';

const sterling = { Ag: 92.5, Cu: 7.5 };
const play = {
  composition: sterling,
  superheatC: 70,
  holdS: 60,
  heatingRate: 5,
  coolingRate: 1,
  noiseC: 0.5,
  seed: 1,
};
const range = { liquidusC: 896.3, endC: 779.1 };

describe('a played melt', () => {
  it('heats from the room, holds, and cools along its own curve', () => {
    const points = playMelt(play, range) ?? [];
    const temperatures = points.map(({ temperatureC }) => temperatureC);
    expect(Math.abs((temperatures[0] ?? 0) - 22)).toBeLessThan(3);
    expect(Math.abs(Math.max(...temperatures) - 966)).toBeLessThan(4);
    expect(temperatures.at(-1)).toBeLessThan(725);
    const verdict = judgeCurve({
      points,
      compositionWt: sterling,
      toleranceWt: {},
      thermometerC: 2,
      unit: 'C',
    });
    expect(verdict.kind).toBe('agrees');
  });

  it('is the same for the same number, and another for another', () => {
    expect(playMelt(play, range)).toEqual(playMelt(play, range));
    expect(playMelt({ ...play, seed: 2 }, range)).not.toEqual(playMelt(play, range));
  });

  it('is none of an alloy outside the model', () => {
    expect(playMelt({ ...play, composition: { Ag: 92.5, Cu: 6.5, Ge: 1 } }, range)).toBeNull();
  });
});
