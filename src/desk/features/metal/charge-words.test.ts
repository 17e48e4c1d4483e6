import { describe, expect, it } from 'vitest';
import { gapWords, shareWords, wouldDoSentence } from './charge-words.ts';

const mass = (grams: number): string => `${grams.toFixed(2)} g`;

describe('gapWords', () => {
  it('never says a plan nearer to the best than it is', () => {
    expect(gapWords(0)).toBe('the best there is');
    expect(gapWords(0.00001)).toBe('within 0.01\u00a0% of the best there is');
    expect(gapWords(0.0123)).toBe('within 1.23\u00a0% of the best there is');
  });
});

describe('shareWords', () => {
  it('never says a share lower than it is', () => {
    expect(shareWords(0.5)).toBe('50.0\u00a0%');
    expect(shareWords(0.50001)).toBe('50.1\u00a0%');
    expect(shareWords(0)).toBe('0.0\u00a0%');
  });
});

describe('wouldDoSentence', () => {
  it('names what to add', () => {
    expect(wouldDoSentence({ wouldDo: [{ name: 'fine gold', massG: 12.4 }] }, mass)).toBe(
      '12.40 g of fine gold would do.',
    );
    const two = [
      { name: 'fine silver', massG: 9.25 },
      { name: 'copper', massG: 0.75 },
    ];
    expect(wouldDoSentence({ wouldDo: two }, mass)).toBe(
      '9.25 g of fine silver and 0.75 g of copper would do.',
    );
    expect(wouldDoSentence({ wouldDo: [] }, mass)).toBe('');
  });
});
