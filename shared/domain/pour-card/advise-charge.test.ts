import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LotKind } from '../metal/lot.ts';
import { adviseCharge, type LotAtHand } from './advise-charge.ts';
import { buildCardContext } from './build-card-context.fixture.ts';
import { chargeKindOf } from './card-event.ts';
import type { ChargedLot } from './card-state.ts';
import { judgeCharge } from './judge-charge.ts';
import { judgeMetal } from './judge-metal.ts';

const context = buildCardContext({
  plannedMetalG: 100,
  alloy: {
    compositionWt: { Au: 75, Ag: 12.5, Cu: 12.5 },
    toleranceWt: { Au: 0.3, Ag: 0.3, Cu: 0.3 },
    markedMetal: 'Au',
    markPpt: 750,
  },
});

const lot = (id: string, gold: number, massG: number, kind: LotKind = 'grain'): ChargedLot => ({
  id,
  code: `L-000${id}`,
  kind,
  compositionWt: { Au: gold, Ag: 100 - gold },
  toleranceWt: { Au: 0.05 },
  massG,
});
const atHand = (id: string, gold: number, onHandG = 50, kind: LotKind = 'fine'): LotAtHand => ({
  ...lot(id, gold, 0, kind),
  onHandG,
});
const stateOf = (...lots: readonly ChargedLot[]) => {
  const of = (which: 'grain' | 'returns'): number =>
    lots.reduce((sum, { kind, massG }) => sum + (chargeKindOf(kind) === which ? massG : 0), 0);
  return { lots, charge: { grain: of('grain'), returns: of('returns') } };
};
const none = new Map<string, number>();
const advise = (lots: readonly ChargedLot[], hand: readonly LotAtHand[] = [], planned = none) =>
  adviseCharge(stateOf(...lots), context, planned, hand);

describe('adviseCharge', () => {
  it('has nothing to say while a charge is growing, or when it is good', () => {
    expect(advise([lot('1', 70, 40)])).toBeNull();
    expect(advise([lot('1', 75.1, 100)])).toBeNull();
    expect(advise([lot('1', 75.1, 40, 'returns')])).toBeNull();
  });

  it('takes what is too much out of the lot that is most over its line', () => {
    const planned = new Map([
      ['1', 60],
      ['2', 40],
    ]);
    expect(advise([lot('1', 75.1, 60.2), lot('2', 75.1, 44)], [], planned)).toEqual({
      fault: 'too-much',
      out: { lotId: '2', code: 'L-0002', massG: 4.2 },
      add: null,
    });
  });

  it('says how much of the returns comes out, or how much fine metal would thin them', () => {
    const tooMany = [lot('1', 75.1, 50.5, 'returns'), lot('2', 75.1, 49.5)];
    expect(advise(tooMany, [atHand('3', 99.99)])).toEqual({
      fault: 'too-many-returns',
      out: { lotId: '1', code: 'L-0001', massG: 1 },
      add: { lotId: '3', code: 'L-0003', massG: 1 },
    });
    // More than half of the heaviest charge the card allows, before anything else is in.
    expect(advise([lot('1', 75.1, 60, 'returns')])?.fault).toBe('too-many-returns');
  });

  it('finds the poorest lot to take out, and the least of a finer one to add', () => {
    // At worst 749 and 750.5: 100 g lack 50 × 1 − 50 × 0.5 = 25 mg; 25/1 g out, or 25/249.4 g of fine gold in.
    const charge = [lot('1', 74.95, 50), lot('2', 75.1, 50)];
    expect(advise(charge, [atHand('3', 99.99), atHand('4', 80)])).toEqual({
      fault: 'below-mark',
      out: { lotId: '1', code: 'L-0001', massG: 25 },
      add: { lotId: '3', code: 'L-0003', massG: 0.11 },
    });
    expect(advise(charge, [atHand('3', 99.99, 0.05)])?.add).toBeNull();
  });

  it('tells metal of no lot before anything else', () => {
    const state = { ...stateOf(lot('1', 75.1, 60)), charge: { grain: 100, returns: 0 } };
    expect(adviseCharge(state, context, none, [])?.fault).toBe('no-lot');
  });

  it('is always enough: what is advised puts that fault right', () => {
    const gold = fc.double({ min: 70, max: 80, noNaN: true });
    fc.assert(
      fc.property(gold, gold, fc.integer({ min: 1, max: 99 }), (one, other, share) => {
        const [first, second] = [lot('1', one, share), lot('2', other, 100 - share)];
        const advice = advise([first, second], [atHand('3', 99.99)]);
        const add = advice?.add;
        if (advice?.fault !== 'below-mark' || !add) return;
        const after = stateOf(first, second, { ...atHand('3', 99.99), massG: add.massG });
        expect(judgeMetal(after, context)?.worstPpt).toBeGreaterThanOrEqual(750 - 1e-6);
        expect(judgeCharge(after, context).kind).toBe('good');
      }),
    );
  });
});
