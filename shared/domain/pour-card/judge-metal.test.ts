import { describe, expect, it } from 'vitest';
import { applyEvent, foldCard } from './apply-event.ts';
import { buildCardContext } from './build-card-context.fixture.ts';
import type { CardEvent, ChargeLot, TimedCardEvent } from './card-event.ts';
import { freshCard, type CardState } from './card-state.ts';
import { judgeMetal } from './judge-metal.ts';

const context = buildCardContext({
  alloy: {
    compositionWt: { Au: 75, Ag: 12.5, Cu: 12.5 },
    toleranceWt: { Au: 0.1, Ag: 0.3, Cu: 0.3 },
    markedMetal: 'Au',
    markPpt: 750,
  },
});

const lot = (id: string, gold: number, tolerance = 0.05): ChargeLot => ({
  id,
  code: `L-000${id}`,
  kind: 'grain',
  compositionWt: { Au: gold, Ag: 12.5, Cu: 87.5 - gold },
  toleranceWt: { Au: tolerance },
});
const good = lot('1', 75.06);
const poor = lot('2', 75.04);

const timed = (event: CardEvent): TimedCardEvent => ({ event, occurredAt: '2026-12-01T10:00:00.000Z' });
const weigh = (
  of: ChargeLot,
  massG: number,
  type: 'charge-weighed' | 'charge-taken-out' = 'charge-weighed',
) => timed({ type, kind: 'grain', massG, lot: of });
const begun = [timed({ type: 'card-opened' }), timed({ type: 'guard-confirmed', prompts: [] })];
const charged = (...events: readonly TimedCardEvent[]): CardState => foldCard([...begun, ...events], context);
const refusal = (state: CardState, event: TimedCardEvent): string => {
  const applied = applyEvent(state, event, context);
  return applied.ok ? '' : applied.error;
};

describe('a charge by lots', () => {
  it('is known by lot, in the order they first came in, and forgets a lot taken out again', () => {
    const state = charged(
      weigh(good, 30),
      weigh(poor, 20),
      weigh(good, 10.5),
      weigh(poor, 20, 'charge-taken-out'),
    );
    expect(state.lots).toEqual([{ ...good, massG: 40.5 }]);
    expect(state.charge.grain).toBe(40.5);
    expect(refusal(state, weigh(poor, 0.01, 'charge-taken-out'))).toContain('Only 0.00 g of lot L-0002');
  });

  it('shows its fineness as it builds: 40 g at 750.6 and 20 g at 750.4', () => {
    const verdict = judgeMetal(charged(weigh(good, 40), weigh(poor, 20)), context);
    expect(verdict?.expectedPpt).toBeCloseTo((40 * 750.6 + 20 * 750.4) / 60, 9);
    expect(verdict?.worstPpt).toBeCloseTo((40 * 750.1 + 20 * 749.9) / 60, 9);
    expect(verdict?.unlottedG).toBe(0);
    expect(judgeMetal(freshCard, context)).toBeNull();
  });

  it('closes at the mark exactly, and not a trace below it', () => {
    const close = timed({ type: 'charge-closed' });
    expect(refusal(charged(weigh(lot('3', 75.05), 84.2)), close)).toBe('');
    expect(refusal(charged(weigh(poor, 84.2)), close)).toContain(
      '749.9 parts per thousand of gold; the mark wants 750',
    );
  });

  it('folds as before on a card that knows no alloy to judge by', () => {
    const { alloy: _alloy, ...old } = context;
    const state = foldCard([...begun, weigh(poor, 84.2), timed({ type: 'charge-closed' })], old);
    expect(state.step).toBe('melt');
  });
});
