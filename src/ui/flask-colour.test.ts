import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { contrast } from './contrast.ts';
import { flaskColours, flaskInk } from './flask-colour.ts';

describe('flaskColours', () => {
  it('keeps the figures on a flask at 7:1 or better at any temperature', () => {
    fc.assert(
      fc.property(fc.double({ min: -50, max: 1500, noNaN: true }), (celsius) => {
        expect(contrast(flaskColours(celsius).body, flaskInk)).toBeGreaterThanOrEqual(7);
      }),
    );
  });

  it('does not change beyond the ends of its scale', () => {
    expect(flaskColours(-40)).toEqual(flaskColours(20));
    expect(flaskColours(1400)).toEqual(flaskColours(1000));
  });

  it('tells a cold flask from a hot one', () => {
    expect(contrast(flaskColours(20).edge, flaskColours(800).edge)).toBeGreaterThan(1.5);
  });
});
