import { describe, expect, it } from 'vitest';
import { readTypedMass, readWeighedLine } from './typed-mass.ts';

describe('readTypedMass', () => {
  it('reads a comma, and the studio’s unit', () => {
    expect(readTypedMass('12,5', 'g')).toEqual({ ok: true, value: 12.5 });
    expect(readTypedMass('1', 'ozt')).toEqual({ ok: true, value: 31.1034768 });
  });

  it.each(['', 'abc', '1e9', '-1', '0', '1000000000', '1.2.3'])('refuses %j with a sentence', (text) => {
    const read = readTypedMass(text, 'g');
    expect(read.ok).toBe(false);
    expect(read.ok ? '' : read.error).toMatch(/[.!]$/);
  });

  it('lets nought through where nothing is a mass', () => {
    expect(readTypedMass('0', 'g', true)).toEqual({ ok: true, value: 0 });
  });
});

describe('readWeighedLine', () => {
  it('takes what a balance types, in its own unit, and a bare figure in the studio’s', () => {
    expect(readWeighedLine('  12.345 g', 'ozt')).toEqual({ ok: true, value: 12.345 });
    expect(readWeighedLine('1', 'ozt')).toEqual({ ok: true, value: 31.103 });
  });

  it.each([
    ['~ 12.345 g', 'still moving'],
    ['-0.02 g', 'above zero'],
    ['L-0001-2', 'not a line of a balance'],
    ['12 ct', 'ct'],
  ])('refuses %j', (line, sentence) => {
    const read = readWeighedLine(line, 'g');
    expect(read.ok ? '' : read.error).toContain(sentence);
  });
});
