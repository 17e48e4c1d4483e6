import { describe, expect, it } from 'vitest';
import { readTypedMass } from './typed-mass.ts';

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
