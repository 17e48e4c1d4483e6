import { describe, expect, it } from 'vitest';
import { buildFlaskCode, numberOfCode, parseFlaskCode, splitCode } from './codes.ts';

const code = buildFlaskCode(147);

describe('flask codes', () => {
  it.each([code, code.toLowerCase(), code.replaceAll('-', ''), code.slice(2), ` ${code} `])(
    'reads %j',
    (text) => {
      expect(parseFlaskCode(text)).toEqual({ ok: true, value: code });
    },
  );

  it('says its number and its parts', () => {
    expect(numberOfCode(code)).toBe(147);
    expect(splitCode(code)).toEqual({ main: 'F-0147', check: code.slice(-1) });
  });

  it.each([
    ['', /Nothing was read/],
    ['147', /too short/],
    ['https://example.com/menu', /not one of our flask codes/],
    [code.replace(/\d$/, (digit) => String((Number(digit) + 1) % 10)), /One digit is wrong/],
    [code.replace('F', 'T'), /names a tree/],
    [code.replace('0147', '0174'), /One digit is wrong/],
  ])('refuses %j', (text, reason) => {
    const parsed = parseFlaskCode(text);
    expect(parsed.ok).toBe(false);
    expect(!parsed.ok && parsed.error).toMatch(reason);
  });
});
