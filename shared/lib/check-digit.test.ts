import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkDigit, hasValidCheckDigit } from './check-digit.ts';

describe('check digit, ISO 7064 MOD 11,10', () => {
  it('gives the published example: 0794 takes 5 (ISO 7064:2003, from memory)', () => {
    expect(checkDigit('0794')).toBe('5');
  });

  it('notices every single wrong digit', () => {
    const digits = fc.stringMatching(/^\d{2,8}$/);
    fc.assert(
      fc.property(digits, fc.nat(), fc.integer({ min: 1, max: 9 }), (body, place, shift) => {
        const code = body + checkDigit(body);
        const at = place % code.length;
        const wrong = (Number(code[at]) + shift) % 10;
        expect(hasValidCheckDigit(code.slice(0, at) + wrong + code.slice(at + 1))).toBe(false);
      }),
    );
  });

  it('refuses what is not digits', () => {
    expect(() => checkDigit('12a')).toThrow(RangeError);
    expect(hasValidCheckDigit('')).toBe(false);
  });
});
