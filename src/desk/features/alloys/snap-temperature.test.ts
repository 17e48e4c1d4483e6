import { describe, expect, it } from 'vitest';
import { snapTemperature, temperatureAfterKey, writeDegrees } from './snap-temperature.ts';

const span = { lowC: 600, highC: 1100 };
const after = (key: string, shiftKey = false) => temperatureAfterKey(850, { key, shiftKey }, span, 'C');

describe('temperatureAfterKey', () => {
  it.each([
    ['ArrowUp', false, 851],
    ['ArrowDown', false, 849],
    ['ArrowUp', true, 860],
    ['ArrowLeft', true, 840],
    ['PageDown', false, 840],
    ['Home', false, 600],
    ['End', false, 1100],
  ])('%s (shift %s) leads from 850 to %d °C', (key, shiftKey, expected) => {
    expect(after(key, shiftKey)).toBe(expected);
  });

  it('leaves other keys to the page', () => {
    expect(after('Tab')).toBeNull();
  });

  it('stops at the edge of the picture', () => {
    expect(temperatureAfterKey(1099.6, { key: 'ArrowUp', shiftKey: true }, span, 'C')).toBe(1100);
  });

  it('steps by whole degrees of a studio that reads Fahrenheit', () => {
    // 850 °C is 1562 °F; one degree more is 1563 °F.
    expect(temperatureAfterKey(850, { key: 'ArrowUp', shiftKey: false }, span, 'F')).toBeCloseTo(
      (1563 - 32) / 1.8,
      3,
    );
  });
});

describe('writeDegrees', () => {
  it('keeps a typed tenth and writes no idle one', () => {
    expect(writeDegrees(850.5, 'C')).toBe('850.5');
    expect(writeDegrees(850, 'C')).toBe('850');
    expect(writeDegrees(850, 'F')).toBe('1562');
  });
});

describe('snapTemperature', () => {
  it('rounds to the degree and keeps inside the span', () => {
    expect(snapTemperature(850.4, span, 'C')).toBe(850);
    expect(snapTemperature(20, span, 'C')).toBe(600);
  });
});
