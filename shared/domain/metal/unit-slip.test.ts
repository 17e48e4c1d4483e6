import { describe, expect, it } from 'vitest';
import { unitSlip } from './unit-slip.ts';

describe('unitSlip', () => {
  it.each([
    [3.858, 120, 'g', 'ozt'],
    [77.16, 120, 'g', 'dwt'],
    [0.12, 120, 'g', 'kg'],
    [3732.417, 120, 'ozt', 'g'],
  ] as const)('%d g for %d g, typed as %s, was meant in %s', (typedG, expectedG, unit, meant) => {
    expect(unitSlip(typedG, expectedG, unit)).toBe(meant);
  });

  it('asks nothing about a figure that is right, or wrong in another way', () => {
    expect(unitSlip(119.9, 120, 'g')).toBeNull();
    expect(unitSlip(100, 120, 'g')).toBeNull();
    expect(unitSlip(10, 0, 'g')).toBeNull();
  });
});
