import { describe, expect, it } from 'vitest';
import { equilibrium, freezingPath, meltingRange, rangeBand, solidFractionAt } from './index.ts';

const STERLING = { Ag: 92.5, Cu: 7.5 };

describe('a composition is refused with its reason', () => {
  it.each([
    [{ Ag: 92.5, Cu: 7 }, 'composition-sum', /adds up to 99.5 wt%/],
    [{}, 'composition-sum', /adds up to 0 wt%/],
    [{ Ag: 105, Cu: -5 }, 'negative', /Cu is below zero/],
    [{ Ag: 92.5, Xx: 7.5 }, 'unknown-element', /Xx is not the symbol/],
    [{ Ag: 92.5, Cu: Number.NaN }, 'not-a-number', /Cu is not a number/],
    [{ Ag: 92.5, Cu: Number.POSITIVE_INFINITY }, 'not-a-number', /not a number/],
    [{ Au: 75, Pd: 20, Ag: 5 }, 'outside-model', /Pd 20 wt%/],
    [{ Cu: 55, Zn: 45 }, 'phase-outside-model', /beta/],
  ] as [Record<string, number>, string, RegExp][])('%o', (composition, code, reason) => {
    const answer = meltingRange(composition);
    expect(answer).toMatchObject({ withinModel: false, code });
    expect(answer.withinModel ? '' : answer.reason).toMatch(reason);
  });

  it('but a trace is only noted', () => {
    const range = meltingRange({ Ag: 92.49, Cu: 7.5, Ir: 0.01 });
    expect(range).toMatchObject({ withinModel: true, note: 'Left out as trace: Ir 0.01 wt%.' });
  });

  it('and an amount of nothing is no element', () => {
    expect(meltingRange({ ...STERLING, Zn: 0, Pd: 0 })).toEqual(meltingRange(STERLING));
  });
});

describe('a temperature is refused with its reason', () => {
  it.each([
    [STERLING, 20, 'temperature'],
    [STERLING, 1600, 'temperature'],
    [STERLING, Number.NaN, 'not-a-number'],
    [{ Au: 75, Cu: 25 }, 400, 'phase-outside-model'],
  ] as [Record<string, number>, number, string][])('%o at %d °C', (composition, celsius, code) => {
    expect(equilibrium(composition, celsius)).toMatchObject({ withinModel: false, code });
    expect(solidFractionAt(composition, celsius, 'scheil')).toMatchObject({ withinModel: false, code });
  });
});

describe('an option is refused with its reason', () => {
  it.each([0, -5, Number.NaN, 1e6])('a step of %d °C', (stepC) => {
    expect(freezingPath(STERLING, { rule: 'lever', stepC })).toMatchObject({
      withinModel: false,
      code: 'option',
    });
  });

  it('a tolerance for an element that is not there, or below zero', () => {
    expect(rangeBand(STERLING, { Au: 1 })).toMatchObject({ withinModel: false, code: 'option' });
    expect(rangeBand(STERLING, { Ag: -1 })).toMatchObject({ withinModel: false, code: 'option' });
  });
});
