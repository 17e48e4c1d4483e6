import { describe, expect, it } from 'vitest';
import { studioClock } from './studio-clock.ts';

describe('studioClock', () => {
  it('reads moments by the studio’s time zone, not the browser’s', () => {
    const auckland = studioClock('Pacific/Auckland');
    expect(auckland.time('2026-12-01T11:30:00Z')).toBe('00:30');
    expect(auckland.dayOf(Date.parse('2026-12-01T11:30:00Z'))).toBe('2026-12-02');
    expect(studioClock('UTC').dayAndTime('2026-12-01T11:30:00Z')).toBe('1 Dec 11:30');
  });

  it('counts days over the end of a month', () => {
    expect(studioClock('Europe/Lisbon').dayAfter('2026-11-30', 1)).toBe('2026-12-01');
    expect(studioClock('Europe/Lisbon').dayAfter('2026-03-01', -1)).toBe('2026-02-28');
  });

  it('keeps local midnight and the length of a day across a change of the clocks', () => {
    const berlin = studioClock('Europe/Berlin');
    expect(new Date(berlin.hourOf('2026-03-29', 0)).toISOString()).toBe('2026-03-28T23:00:00.000Z');
    expect(berlin.dayAfter('2026-03-29', 1)).toBe('2026-03-30');
    expect(berlin.hourOf('2026-03-30', 0) - berlin.hourOf('2026-03-29', 0)).toBe(23 * 3_600_000);
  });

  it('names the year of a day only when it is another year', () => {
    expect(studioClock('UTC').longDay('2026-12-01', 2026)).toBe('Tuesday 1 December');
    expect(studioClock('UTC').longDay('2025-12-01', 2026)).toBe('Monday 1 December 2025');
  });
});
