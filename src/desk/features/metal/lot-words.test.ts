import { describe, expect, it } from 'vitest';
import { ageWords, finenessOf, finenessWords, totalsSentence } from './lot-words.ts';

const grams = (value: number): string => `${value.toFixed(2)} g`;

describe('finenessOf', () => {
  it('goes by the gold, and by the silver where there is none', () => {
    const gold = finenessOf({ compositionWt: { Au: 75, Ag: 12.5, Cu: 12.5 }, toleranceWt: { Au: 0.2 } });
    expect(gold).toMatchObject({ metal: 'Au', expected: 750 });
    expect(gold?.worst).toBeCloseTo(748, 9);
    expect(finenessOf({ compositionWt: { Ag: 92.5, Cu: 7.5 }, toleranceWt: {} })?.metal).toBe('Ag');
    expect(finenessOf({ compositionWt: { Cu: 100 }, toleranceWt: {} })).toBeNull();
  });

  it('is never written rounded up', () => {
    const words = finenessWords({ metal: 'Au', expected: 749.96, worst: 749.91 });
    expect(words).toBe('749.9 gold, at least 749.9');
  });

  it('says the lower bound only where there is one', () => {
    expect(finenessWords({ metal: 'Ag', expected: 925, worst: 925 })).toBe('925.0 silver');
  });
});

describe('totalsSentence', () => {
  it('adds up every metal of the lots, whatever alloy it is in', () => {
    const lots: Parameters<typeof totalsSentence>[0] = [
      { contentsMg: { Au: 75_000, Ag: 12_500, Cu: 12_500 }, quarantineReason: null },
      { contentsMg: { Ag: 92_500, Cu: 7_500 }, quarantineReason: 'paper missing' },
    ];
    expect(totalsSentence(lots, grams)).toBe(
      '75.00 g of gold, 105.00 g of silver and 20.00 g of other metals in 2 lots, 1 of them in quarantine.',
    );
  });

  it('leaves out a metal there is none of', () => {
    const lots = [{ contentsMg: { Ag: 1000 }, quarantineReason: null }];
    expect(totalsSentence(lots, grams)).toBe('1.00 g of silver in 1 lot.');
    expect(totalsSentence([], grams)).toBe('No metal is on hand.');
  });
});

describe('ageWords', () => {
  const now = Date.parse('2026-12-01T12:00:00Z');
  it.each([
    ['2026-12-01T08:00:00Z', 'today'],
    ['2026-11-30T08:00:00Z', '1 day'],
    ['2026-11-19T08:00:00Z', '12 days'],
    ['2026-08-20T08:00:00Z', '3 months'],
    ['2024-10-01T08:00:00Z', '2 years'],
  ])('%s is %s', (iso, words) => expect(ageWords(iso, now)).toBe(words));
});
