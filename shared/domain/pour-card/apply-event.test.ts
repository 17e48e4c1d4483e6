import { describe, expect, it } from 'vitest';
import { applyEvent, foldCard } from './apply-event.ts';
import { buildCardContext } from './build-card-context.fixture.ts';
import type { CardEvent, TimedCardEvent } from './card-event.ts';
import { freshCard, type CardState } from './card-state.ts';

const context = buildCardContext();
const start = Date.parse('2026-12-01T10:00:00Z');

const timed = (event: CardEvent, seconds: number): TimedCardEvent => ({
  event,
  occurredAt: new Date(start + seconds * 1000).toISOString(),
});

const good: readonly TimedCardEvent[] = [
  timed({ type: 'card-opened' }, 0),
  timed({ type: 'guard-confirmed', prompts: ['face'] }, 10),
  timed({ type: 'charge-weighed', kind: 'returns', massG: 30 }, 20),
  timed({ type: 'charge-weighed', kind: 'grain', massG: 54.2 }, 30),
  timed({ type: 'charge-closed' }, 40),
  timed({ type: 'reading-taken', temperatureC: context.figures.pourC.target, confirmed: false }, 100),
  timed({ type: 'melt-ready' }, 110),
  timed({ type: 'flask-out', furnaceC: null }, 120),
  timed({ type: 'poured' }, 150),
  timed({ type: 'quenched' }, 150 + context.figures.quench.earliestS + 1),
  timed({ type: 'closed', buttonMassG: 9.1, lossMassG: 0.1, look: 'full', note: '' }, 2000),
];

const after = (count: number): CardState => foldCard(good.slice(0, count), context);
const refusalOf = (state: CardState, event: CardEvent, seconds = 60): string => {
  const applied = applyEvent(state, timed(event, seconds), context);
  return applied.ok ? '' : applied.error;
};

describe('a pour card', () => {
  it('goes from guard to done, one event after the other, with no departure', () => {
    const card = foldCard(good, context);
    expect(card.step).toBe('done');
    expect(card.departures).toEqual([]);
    expect(card.closing?.castMassG).toBe(75);
    expect(card.pour?.secondsOut).toBe(30);
  });

  it('expects the mould to have cooled by Newton’s law at the pour', () => {
    const { flaskHoldC, roomC, coolingPerSecond } = context.figures;
    expect(after(9).pour?.flaskC).toBeCloseTo(
      roomC + (flaskHoldC - roomC) * Math.exp(-coolingPerSecond * 30),
      9,
    );
  });

  it('refuses an event that belongs to another step', () => {
    expect(refusalOf(after(2), { type: 'poured' })).toMatch(/stands at “Charge”/);
  });

  it('does not close a short charge, an over-full one, or one with too many returns', () => {
    expect(refusalOf(after(3), { type: 'charge-closed' })).toMatch(/weigh more in/);
    const over = foldCard(
      [...good.slice(0, 4), timed({ type: 'charge-weighed', kind: 'grain', massG: 5 }, 35)],
      context,
    );
    expect(refusalOf(over, { type: 'charge-closed' })).toMatch(/take some out/);
    const returns = foldCard(
      [...good.slice(0, 2), timed({ type: 'charge-weighed', kind: 'returns', massG: 84.2 }, 20)],
      context,
    );
    expect(refusalOf(returns, { type: 'charge-closed' })).toMatch(/100 % of the charge is returns/);
  });

  it('takes metal out again, but never more than is in', () => {
    expect(refusalOf(after(3), { type: 'charge-taken-out', kind: 'grain', massG: 1 })).toMatch(
      /Only 0\.00 g of grain/,
    );
  });

  it('opens the flask only within the pour window', () => {
    const { low, high } = context.figures.pourC;
    expect(refusalOf(after(5), { type: 'melt-ready' })).toMatch(/Take a reading/);
    for (const [reading, advice] of [
      [low - 1, /keep heating/],
      [high + 1, /let it cool/],
    ] as const) {
      const state = foldCard(
        [...good.slice(0, 5), timed({ type: 'reading-taken', temperatureC: reading, confirmed: false }, 50)],
        context,
      );
      expect(refusalOf(state, { type: 'melt-ready' })).toMatch(advice);
    }
  });

  it('marks a late pour, an early quench and a loss over the limit', () => {
    const late = foldCard(
      [
        ...good.slice(0, 8),
        timed({ type: 'poured' }, 120 + context.figures.pourWindowS + 5),
        timed({ type: 'quenched' }, 400),
        timed({ type: 'closed', buttonMassG: 9, lossMassG: 2, look: 'porous', note: '' }, 500),
      ],
      context,
    );
    expect(late.departures.map(({ kind }) => kind)).toEqual([
      'poured-late',
      'quenched-early',
      'loss-over-limit',
      'cast-fault',
    ]);
  });

  it('does nothing while work is stopped, then goes on where it was', () => {
    const stopped = foldCard(
      [...good.slice(0, 6), timed({ type: 'stopped', reason: 'spill' }, 105)],
      context,
    );
    expect(refusalOf(stopped, { type: 'melt-ready' })).toMatch(/Work is stopped/);
    const resumed = applyEvent(stopped, timed({ type: 'resumed' }, 130), context);
    expect(resumed.ok && resumed.value.step).toBe('melt');
  });

  it('refuses everything once it is over', () => {
    expect(refusalOf(after(11), { type: 'resumed' })).toMatch(/closed/);
    expect(refusalOf(freshCard, { type: 'poured' })).toMatch(/not been opened/);
  });

  it('refuses more metal out than went in', () => {
    expect(
      refusalOf(after(10), { type: 'closed', buttonMassG: 90, lossMassG: 0, look: 'full', note: '' }),
    ).toMatch(/only 84\.20 g went in/);
  });
});
