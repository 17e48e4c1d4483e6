import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readBalanceLine } from './read-balance-line.ts';

const read = (line: string, bareUnit?: 'g' | 'dwt' | 'ozt') => {
  const reading = readBalanceLine(line, bareUnit);
  return reading.ok ? reading.value : reading.error;
};

describe('readBalanceLine', () => {
  it.each([
    ['= 12.345 g', 12.345, 'g', true],
    ['~ 12.345 g', 12.345, 'g', false],
    ['  12.345 g', 12.345, 'g', true],
    ['12,345 g', 12.345, 'g', true],
    ['+   12.345g', 12.345, 'g', true],
    ['-0.02 g', -0.02, 'g', true],
    ['- 0.02 g', -0.02, 'g', true],
    ['ST,GS,+0012.34 g', 12.34, 'g', true],
    ['US,NT,+0012.34 g', 12.34, 'g', false],
    ['S S      12.34 g', 12.34, 'g', true],
    ['S D      12.34 g', 12.34, 'g', false],
    ['N     +  12.34 g', 12.34, 'g', true],
    ['     12.34 g ?', 12.34, 'g', false],
    ['0.0421 kg', 42.1, 'kg', true],
    // 1 ozt = 31.1034768 g, 1 dwt = 1/20 of it, rounded to the milligram.
    ['1.0000 ozt', 31.103, 'ozt', true],
    ['2.0 oz t', 62.207, 'ozt', true],
    ['1.00 dwt', 1.555, 'dwt', true],
    ['NET 10.00 G', 10, 'g', true],
  ] as const)('reads %j', (line, massG, unit, isStable) => {
    expect(read(line)).toEqual({ massG, unit, isStable });
  });

  it('takes a bare figure in the unit it is told, and refuses it without one', () => {
    expect(read('1', 'ozt')).toMatchObject({ massG: 31.103, unit: 'ozt' });
    expect(read('12.34 g', 'ozt')).toMatchObject({ massG: 12.34, unit: 'g' });
    expect(read('12.34')).toContain('names no unit');
  });

  it.each([
    ['T 5.00 g', /tare/],
    ['OL', /range/],
    ['ST,OL,+ 0.00 g', /range/],
    ['12.34 oz', /“oz” is not one we read/],
    ['12.34 ct', /“ct”/],
    ['12.34 gn', /“gn”/],
    ['1,234.5 g', /not a line/],
    ['1e9 g', /not a line|not one we read/],
    ['12.34 12.35 g', /not a line/],
    ['', /not a line/],
    ['F-0147-8', /not a line/],
    ['Battery low', /not a line/],
    ['12.34 g *', /not a line/],
  ])('refuses %j in one sentence', (line, sentence) => {
    expect(read(line)).toMatch(sentence);
  });

  it('never throws, whatever comes down the cable', () => {
    const garbage = fc.oneof(
      fc.string({ unit: 'binary', maxLength: 60 }),
      fc.stringMatching(/^[ =~?STUSD,+\-.0-9gkdwtoz]{0,30}$/),
    );
    fc.assert(
      fc.property(garbage, (line) => {
        const reading = readBalanceLine(line, 'g');
        if (reading.ok) expect(Number.isFinite(reading.value.massG)).toBe(true);
        else expect(reading.error).toMatch(/\.$/);
      }),
      { numRuns: 2000 },
    );
  });

  it('gives back what was written, with every mark and either separator', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -9_999_999, max: 9_999_999 }),
        fc.constantFrom('', '= ', '~ ', 'ST,GS,', 'US,NT,'),
        fc.constantFrom('.', ','),
        (mg, mark, separator) => {
          const figure = (Math.abs(mg) / 1000).toFixed(3).replace('.', separator);
          expect(read(`${mark}${mg < 0 ? '-' : '+'}${figure} g`)).toEqual({
            massG: mg / 1000,
            unit: 'g',
            isStable: !/[~U]/.test(mark),
          });
        },
      ),
    );
  });
});
