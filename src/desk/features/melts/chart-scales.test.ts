import { describe, expect, it } from 'vitest';
import { chartScales, type ChartInput } from './chart-scales.ts';

const frame = { left: 60, right: 700, top: 20, bottom: 400 };
const figures = { solidusC: 802, liquidusC: 899, pourC: { low: 973, target: 982, high: 992 } };
const opened = Date.parse('2026-12-01T08:00:00Z');
const at = (minutes: number): string => new Date(opened + minutes * 60_000).toISOString();

const input = (readings: readonly (readonly [number, number])[], pouredAt?: number): ChartInput => ({
  openedAt: at(0),
  figures,
  unit: 'C',
  state: {
    readings: readings.map(([minutes, temperatureC]) => ({ temperatureC, at: at(minutes) })),
    flaskOut: null,
    pour: pouredAt === undefined ? null : { at: at(pouredAt), meltC: 980, flaskC: 480, secondsOut: 30 },
    quenchedAt: null,
  },
});

describe('chartScales', () => {
  it('holds every reading, the melting range, the window and the pour', () => {
    const scales = chartScales(
      input(
        [
          [5, 640],
          [9, 1105],
        ],
        14,
      ),
      frame,
    );
    const heights = [640, 1105, figures.solidusC, figures.pourC.high].map(scales.y);
    expect(Math.min(...heights)).toBeGreaterThanOrEqual(frame.top);
    expect(Math.max(...heights)).toBeLessThanOrEqual(frame.bottom);
    expect(scales.x(0)).toBe(frame.left);
    expect(scales.x(14)).toBeLessThanOrEqual(frame.right);
    expect(scales.x(14)).toBeGreaterThan(650);
  });

  it('rises with the temperature and runs right with time', () => {
    const { x, y } = chartScales(input([[5, 840]]), frame);
    expect(y(900)).toBeLessThan(y(800));
    expect(x(6)).toBeGreaterThan(x(5));
  });

  it('counts minutes from the opening of the card', () => {
    expect(chartScales(input([]), frame).minutesOf(at(7.5))).toBe(7.5);
  });

  it('can be drawn before the first reading, with round ticks', () => {
    const { minuteTicks, degreeTicks } = chartScales(input([]), frame);
    expect(minuteTicks).toEqual([0, 1, 2, 3, 4, 5, 6, 7, 8]);
    expect(degreeTicks).toContain(900);
  });

  it('has round ticks in the studio’s own unit', () => {
    const { degreeTicks } = chartScales({ ...input([]), unit: 'F' }, frame);
    const fahrenheit = degreeTicks.map((celsius) => (celsius * 9) / 5 + 32);
    expect(fahrenheit.length).toBeGreaterThan(2);
    fahrenheit.forEach((degrees) => expect(degrees % 50).toBeCloseTo(0, 6));
  });
});
