import { describe, expect, it } from 'vitest';
import { balanceAt } from './balance-at.ts';

const sterling = { Ag: 92.5, Cu: 7.5 };

describe('balanceAt', () => {
  it('balances sterling on silver or copper by the lever rule', () => {
    const balance = balanceAt(sterling, 850);
    expect(balance).not.toBeNull();
    const { alloyWt, solidWt, liquidWt, solidMassFraction } = balance ?? {
      alloyWt: 0,
      solidWt: 0,
      liquidWt: 0,
      solidMassFraction: 0,
    };
    const mixed = solidWt * solidMassFraction + liquidWt * (1 - solidMassFraction);
    expect(mixed).toBeCloseTo(alloyWt, 3);
    expect(solidMassFraction).toBeGreaterThan(0);
    expect(solidMassFraction).toBeLessThan(1);
  });

  it('has no balance where the metal is of one phase', () => {
    expect(balanceAt(sterling, 1000)).toBeNull();
    expect(balanceAt(sterling, 600)).toBeNull();
  });

  it('has no balance for an alloy the model does not hold', () => {
    expect(balanceAt({ Au: 75, Pd: 25 }, 1300)).toBeNull();
  });
});
