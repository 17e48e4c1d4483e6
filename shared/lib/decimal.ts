import { ok, refuse, type Result } from './result.ts';

const plain = /^[+-]?\d+(?:[.,]\d+)?$/;

/**
 * Reads a number as people type it: `12.5`, `12,5` and ` 12,5 ` are all 12.5.
 * Anything doubtful (two separators, letters, an exponent) is refused with a sentence instead of being guessed.
 */
export const parseDecimal = (text: string): Result<number> => {
  const cleaned = text.trim();
  if (cleaned === '') return refuse('Type a number.');
  if (!plain.test(cleaned)) return refuse('That is not a number. Use digits and one decimal point or comma.');
  return ok(Number(cleaned.replace(',', '.')));
};
