import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseDecimal } from './decimal.ts';
import {
  formatClock,
  formatMass,
  formatPercent,
  formatTemperature,
  fromCelsius,
  fromGrams,
  toCelsius,
  toGrams,
} from './units.ts';

describe('units', () => {
  it('knows the troy ounce exactly (31.1034768 g, international definition)', () => {
    expect(toGrams(1, 'ozt')).toBe(31.1034768);
    expect(toGrams(20, 'dwt')).toBeCloseTo(31.1034768, 12);
  });

  it('knows the freezing and boiling points of water on both scales', () => {
    expect(fromCelsius(0, 'F')).toBe(32);
    expect(toCelsius(212, 'F')).toBe(100);
  });

  it('comes back from every conversion', () => {
    fc.assert(
      fc.property(fc.double({ min: -50, max: 2000, noNaN: true }), (value) => {
        expect(toCelsius(fromCelsius(value, 'F'), 'F')).toBeCloseTo(value, 9);
        expect(toGrams(fromGrams(value, 'dwt'), 'dwt')).toBeCloseTo(value, 9);
      }),
    );
  });

  it('writes what people read', () => {
    expect(formatTemperature(892.4, 'C')).toBe('892 °C');
    expect(formatTemperature(892, 'F')).toBe('1638 °F');
    expect(formatMass(84.2, 'g')).toBe('84.20 g');
    expect(formatClock(41)).toBe('0:41');
    expect(formatClock(3725)).toBe('1:02:05');
  });

  it('never calls a trace of solid none', () => {
    expect(formatPercent(0.001)).toBe('1 %');
    expect(formatPercent(0.999)).toBe('99 %');
    expect(formatPercent(0)).toBe('0 %');
    expect(formatPercent(1)).toBe('100 %');
  });
});

describe('typed numbers', () => {
  it.each([
    ['12,5', 12.5],
    ['12.5', 12.5],
    [' 980 ', 980],
    ['-1', -1],
  ])('reads %j', (text, value) => expect(parseDecimal(text)).toEqual({ ok: true, value }));

  it.each(['', 'abc', '1,234.5', '1e9', '12.', '--3', '٣'])('refuses %j', (text) =>
    expect(parseDecimal(text).ok).toBe(false),
  );
});
