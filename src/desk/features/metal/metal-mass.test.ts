import { describe, expect, it } from 'vitest';
import { readMass, writeExactGrams, writeExactMass, massRemark } from './metal-mass.ts';

describe('writeExactMass', () => {
  it('tells masses a milligram apart in every unit', () => {
    for (const unit of ['g', 'dwt', 'ozt'] as const) {
      expect(writeExactMass(100_000, unit)).not.toBe(writeExactMass(100_001, unit));
    }
  });

  it('writes what is taken away with a minus sign', () => {
    expect(writeExactMass(-50, 'g')).toBe('\u22120.050');
    expect(writeExactGrams(84.203, 'g')).toBe('84.203\u00a0g');
  });
});

describe('readMass', () => {
  it('reads decimal commas', () => {
    expect(readMass('84,203', 'g')).toEqual({ ok: true, value: 84.203 });
  });

  // 1 ozt = 31.1034768 g, international pound of 1959.
  it('takes troy ounces as grams to the milligram', () => {
    expect(readMass('1', 'ozt')).toEqual({ ok: true, value: 31.103 });
    expect(readMass('20', 'dwt')).toEqual({ ok: true, value: 31.103 });
  });

  it('gives back what it wrote', () => {
    for (const unit of ['g', 'dwt', 'ozt'] as const) {
      for (const milligrams of [1, 999, 31_103, 1_234_567]) {
        expect(readMass(writeExactMass(milligrams, unit), unit)).toEqual({
          ok: true,
          value: milligrams / 1000,
        });
      }
    }
  });

  it('refuses what is no number', () => {
    expect(readMass('1.234,5', 'g').ok).toBe(false);
    expect(readMass('', 'g').ok).toBe(false);
  });
});

describe('a mass with its unit after it', () => {
  it.each([
    ['1,5 ozt', 46.655],
    ['3dwt', 4.666],
    ['0.25 KG', 250],
    ['12 g', 12],
  ])('reads %s', (text, grams) => {
    expect(readMass(text, 'g')).toEqual({ ok: true, value: grams });
  });

  it('refuses a unit it does not know, and an avoirdupois ounce with it', () => {
    expect(readMass('3 oz', 'g').ok).toBe(false);
  });

  it('says what it comes to, or which unit may have been meant', () => {
    expect(massRemark('1 ozt', 'g')).toBe('That is 31.103\u00a0g.');
    expect(massRemark('12', 'g')).toBe('');
    expect(massRemark('3.858', 'g', 120)).toContain('In ozt it would be what the ledger says.');
    expect(massRemark('120', 'g', 120)).toBe('');
  });
});
