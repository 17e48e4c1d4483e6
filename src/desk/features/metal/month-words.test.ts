import { describe, expect, it } from 'vitest';
import { reconcile } from '#shared/domain/metal/reconcile.ts';
import {
  crucibleLines,
  isMonth,
  lossRateWords,
  lotLines,
  missingMg,
  monthAfter,
  monthWords,
} from './month-words.ts';

describe('months', () => {
  it('go over the end of a year', () => {
    expect(monthAfter('2026-12', 1)).toBe('2027-01');
    expect(monthAfter('2026-01', -1)).toBe('2025-12');
    expect(monthAfter('2026-06', 0)).toBe('2026-06');
    expect(monthWords('2026-12')).toBe('December 2026');
  });

  it('are told from what is none', () => {
    expect(isMonth('2026-12')).toBe(true);
    expect(isMonth('2026-13')).toBe(false);
    expect(isMonth('26-12')).toBe(false);
  });
});

describe('missingMg', () => {
  const flow = { element: 'Au', isBefore: false } as const;
  const [gold] = reconcile(
    [
      { ...flow, isBefore: true, from: 'supplier', to: 'stock', kind: 'received', mg: 50_000 },
      { ...flow, from: 'supplier', to: 'stock', kind: 'received', mg: 10_000 },
      { ...flow, from: 'stock', to: 'crucible', kind: 'weighed-in', mg: 40_000 },
      { ...flow, from: 'crucible', to: 'castings', kind: 'cast', mg: 30_000 },
      { ...flow, from: 'crucible', to: 'returns', kind: 'returned', mg: 9_950 },
      { ...flow, from: 'crucible', to: 'loss', kind: 'lost', mg: 50 },
      { ...flow, from: 'stock', to: 'refiner', kind: 'dispatched', mg: 1_000 },
      { ...flow, from: 'stock', to: 'adjustment', kind: 'counted', mg: 3 },
    ],
    [{ element: 'Au', isBefore: false, mg: -7 }],
  );

  it('is nought where every line adds up', () => {
    if (!gold) throw new Error('The month has no gold.');
    expect(missingMg(lotLines, gold)).toBe(0);
    expect(missingMg(crucibleLines, gold)).toBe(0);
  });

  it('says by how much a line is off', () => {
    if (!gold) throw new Error('The month has no gold.');
    expect(missingMg(lotLines, { ...gold, received: gold.received + 1 })).toBe(1);
    expect(missingMg(crucibleLines, { ...gold, lost: gold.lost + 1 })).toBe(-1);
  });
});

describe('lossRateWords', () => {
  it('is what was lost of what went in', () => {
    expect(lossRateWords({ name: 'sterling', melts: 1, metalInMg: 40_000, lostMg: 50 })).toBe('0.13\u00a0%');
    expect(lossRateWords({ name: 'sterling', melts: 0, metalInMg: 0, lostMg: 0 })).toBe('no metal');
  });
});
