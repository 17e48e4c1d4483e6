import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { MetalPlace, MovementKind } from './ledger.ts';
import { reconcile, totalOfMonth, type Flow } from './reconcile.ts';

const flow = (
  kind: MovementKind,
  from: MetalPlace,
  to: MetalPlace,
  mg: number,
  isBefore = false,
  element = 'Ag',
): Flow => ({
  element,
  isBefore,
  from,
  to,
  kind,
  mg,
});

const ways: readonly (readonly [MovementKind, MetalPlace, MetalPlace])[] = [
  ['received', 'supplier', 'stock'],
  ['received', 'stock', 'supplier'],
  ['weighed-in', 'stock', 'crucible'],
  ['weighed-in', 'returns', 'crucible'],
  ['taken-out', 'crucible', 'stock'],
  ['weighed-in', 'crucible', 'stock'],
  ['weighed-in', 'crucible', 'castings'],
  ['weighed-in', 'castings', 'crucible'],
  ['cast', 'crucible', 'castings'],
  ['returned', 'crucible', 'returns'],
  ['returned', 'returns', 'crucible'],
  ['lost', 'crucible', 'loss'],
  ['lost', 'loss', 'crucible'],
  ['dispatched', 'scrap', 'refiner'],
  ['dispatched', 'refiner', 'scrap'],
  ['counted', 'stock', 'adjustment'],
  ['counted', 'adjustment', 'returns'],
];

const anyFlow = fc
  .tuple(
    fc.constantFrom(...ways),
    fc.integer({ min: 1, max: 1_000_000 }),
    fc.boolean(),
    fc.constantFrom('Au', 'Ag', 'Cu'),
  )
  .map(([[kind, from, to], mg, isBefore, element]) => flow(kind, from, to, mg, isBefore, element));

describe('a month of metal', () => {
  it('adds up line by line, to the milligram, whatever moved', () => {
    const reassay = fc.record({
      element: fc.constantFrom('Au', 'Ag'),
      isBefore: fc.boolean(),
      mg: fc.integer({ min: -99, max: 99 }),
    });
    fc.assert(
      fc.property(fc.array(anyFlow), fc.array(reassay), (flows, reassays) => {
        const months = reconcile(flows, reassays);
        return [...months, totalOfMonth(months)].every(
          (m) =>
            m.opening + m.received - m.issued + m.returned - m.dispatched + m.counted + m.reassayed ===
              m.closing && m.crucibleOpening + m.issued - m.cast - m.returned - m.lost === m.crucibleClosing,
        );
      }),
    );
  });

  it('tells what was issued from what came back as a button', () => {
    const [silver] = reconcile(
      [
        flow('received', 'supplier', 'stock', 1000, true),
        flow('weighed-in', 'stock', 'crucible', 400),
        flow('taken-out', 'crucible', 'stock', 50),
        flow('returned', 'crucible', 'returns', 60),
        flow('lost', 'crucible', 'loss', 2),
        flow('cast', 'crucible', 'castings', 288),
        flow('counted', 'stock', 'adjustment', 5),
      ],
      [{ element: 'Ag', isBefore: false, mg: -3 }],
    );
    expect(silver).toEqual({
      element: 'Ag',
      opening: 1000,
      received: 0,
      issued: 350,
      returned: 60,
      dispatched: 0,
      counted: -5,
      reassayed: -3,
      closing: 702,
      crucibleOpening: 0,
      cast: 288,
      lost: 2,
      crucibleClosing: 0,
    });
  });

  it('names precious metals first and the unnamed last', () => {
    const flows = ['other', 'Cu', 'Ag', 'Zn', 'Au'].map((element) =>
      flow('received', 'supplier', 'stock', 1, false, element),
    );
    expect(reconcile(flows, []).map(({ element }) => element)).toEqual(['Au', 'Ag', 'Cu', 'Zn', 'other']);
  });
});
