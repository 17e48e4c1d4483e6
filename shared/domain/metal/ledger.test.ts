import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { balances, fromMilligrams, metalPlaces, onHandMg, storeOf, toMilligrams } from './ledger.ts';

const movement = fc.record({
  from: fc.constantFrom(...metalPlaces),
  to: fc.constantFrom(...metalPlaces),
  massMg: fc.integer({ min: 1, max: 5_000_000 }),
});

describe('the ledger', () => {
  it('conserves mass over any movements: what all places hold together stays nought', () => {
    fc.assert(
      fc.property(fc.array(movement, { maxLength: 200 }), (movements) => {
        const total = Object.values(balances(movements)).reduce((sum, mg) => sum + mg, 0);
        return total === 0;
      }),
    );
  });

  it('undoes a movement by its counter-movement', () => {
    fc.assert(
      fc.property(fc.array(movement, { minLength: 1 }), (movements) => {
        const countered = movements.flatMap(({ from, to, massMg }) => [
          { from, to, massMg },
          { from: to, to: from, massMg },
        ]);
        return Object.values(balances(countered)).every((mg) => mg === 0);
      }),
    );
  });

  it('counts as on hand what lies in the stores', () => {
    expect(
      onHandMg([
        { from: 'supplier', to: 'stock', massMg: 1000 },
        { from: 'stock', to: 'crucible', massMg: 300 },
        { from: 'crucible', to: 'returns', massMg: 50 },
      ]),
    ).toBe(750);
  });

  it('turns grams into whole milligrams and back', () => {
    expect([toMilligrams(12.3455), toMilligrams(0.1 + 0.2), fromMilligrams(12_345)]).toEqual([
      12_346, 300, 12.345,
    ]);
  });

  it('knows where each kind of lot lies', () => {
    expect([storeOf('fine'), storeOf('returns'), storeOf('scrap')]).toEqual(['stock', 'returns', 'scrap']);
  });
});
