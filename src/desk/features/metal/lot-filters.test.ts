import { describe, expect, it } from 'vitest';
import { chooseLots, filtersOf } from './lot-filters.ts';

const lots = [
  { name: 'yellow', kind: 'returns', compositionWt: { Au: 75, Ag: 12.5, Cu: 12.5 } },
  { name: 'sterling', kind: 'grain', compositionWt: { Ag: 92.5, Cu: 7.5 } },
  { name: 'copper', kind: 'fine', compositionWt: { Cu: 99.99 } },
] as const;

const names = (filters: Parameters<typeof chooseLots>[1]) => chooseLots(lots, filters).map((lot) => lot.name);

describe('filtersOf', () => {
  it('reads an address, and passes over what it does not know', () => {
    expect(filtersOf(new URLSearchParams('kind=returns&metal=Au&lots=used-up'))).toEqual({
      onHand: 'no',
      kind: 'returns',
      metal: 'Au',
    });
    expect(filtersOf(new URLSearchParams('kind=gravel&metal=Pb'))).toEqual({
      onHand: 'yes',
      kind: null,
      metal: null,
    });
  });
});

describe('chooseLots', () => {
  it('goes by kind and by what a lot holds', () => {
    expect(names({ kind: null, metal: null })).toEqual(['yellow', 'sterling', 'copper']);
    expect(names({ kind: null, metal: 'Ag' })).toEqual(['yellow', 'sterling']);
    expect(names({ kind: null, metal: 'other' })).toEqual(['copper']);
    expect(names({ kind: 'returns', metal: 'Au' })).toEqual(['yellow']);
    expect(names({ kind: 'grain', metal: 'Au' })).toEqual([]);
  });
});
