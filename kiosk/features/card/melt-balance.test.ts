import { describe, expect, it } from 'vitest';
import { meltSolidAt } from './melt-balance.ts';

describe('meltSolidAt', () => {
  it('balances the lever of sterling on its copper', () => {
    const solid = meltSolidAt({ Ag: 92.5, Cu: 7.5 }, 'silver', 850);
    const balance = solid?.balance;
    expect(balance?.element).toBe('copper');
    if (!balance) return expect.unreachable('Sterling is mushy at 850 °C.');
    const { solidMassFraction: share, solidWt, liquidWt, alloyWt } = balance;
    expect(share * (alloyWt - solidWt)).toBeCloseTo((1 - share) * (liquidWt - alloyWt), 6);
  });

  it('has no balance where the metal is of one phase, and no answer outside the model', () => {
    expect(meltSolidAt({ Ag: 92.5, Cu: 7.5 }, 'silver', 980)).toEqual({
      solidMassFraction: 0,
      balance: null,
    });
    expect(meltSolidAt({ Au: 75, Ni: 10, Cu: 15 }, 'white-gold', 900)).toBeNull();
  });
});
