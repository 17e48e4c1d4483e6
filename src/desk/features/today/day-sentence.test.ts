import { describe, expect, it } from 'vitest';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';
import { daySentence, nextCasting, spanWords, type DayCasting } from './day-sentence.ts';

const nowMs = Date.parse('2026-12-01T10:17:00Z');
const alloy = {
  id: 'a',
  name: '18 ct yellow',
  family: 'yellow-gold',
  fineness: 750,
  revisionId: 'r',
  revision: 1,
} as const;

const casting = (id: string, state: CastingState, inMinutes: number): DayCasting => ({
  id,
  alloy,
  state,
  flask: { code: `${id}-2`, diameterMm: 89, heightMm: 102 },
  plannedPourAt: new Date(nowMs + inMinutes * 60_000).toISOString(),
});

const none: ReadonlySet<string> = new Set();

describe('daySentence', () => {
  it('counts the day and names what pours next', () => {
    const day = [
      casting('F-0110', 'quenched', -130),
      casting('F-0150', 'holding', 63),
      casting('F-0147', 'holding', 8),
      casting('F-0088', 'held', 2),
    ];
    expect(daySentence(day, none, nowMs)).toBe(
      '4 pours planned, 1 poured, 1 on hold. Next: F-0147, 18 ct yellow, in 8 min.',
    );
  });

  it('passes over what a terminal has already taken up', () => {
    const day = [casting('F-0147', 'holding', -2), casting('F-0150', 'holding', 63)];
    expect(daySentence(day, new Set(['F-0147']), nowMs)).toBe(
      '2 pours planned, 0 poured, 1 at the furnace. Next: F-0150, 18 ct yellow, in 1 h 3 min.',
    );
  });

  it('counts a casting whose card still runs at the furnace, not as poured', () => {
    expect(daySentence([casting('F-0147', 'poured', -2)], new Set(['F-0147']), nowMs)).toBe(
      '1 pour planned, 0 poured, 1 at the furnace.',
    );
  });

  it('says how late the next pour is', () => {
    expect(daySentence([casting('F-0147', 'holding', -95)], none, nowMs)).toMatch(/due 1 h 35 min ago\.$/);
    expect(daySentence([casting('F-0147', 'holding', 0)], none, nowMs)).toMatch(/due now\.$/);
  });

  it('speaks of no next pour on another day', () => {
    expect(daySentence([casting('F-0147', 'holding', 8)], none, null)).toBe('1 pour planned, 0 poured.');
  });
});

describe('nextCasting', () => {
  it('is nothing when all is poured, held or scrapped', () => {
    expect(nextCasting([casting('a', 'poured', 1), casting('b', 'scrapped', 2)], none)).toBeNull();
  });
});

describe('spanWords', () => {
  it('writes hours from sixty minutes', () => {
    expect(spanWords(59.4)).toBe('59 min');
    expect(spanWords(59.6)).toBe('1 h');
    expect(spanWords(160)).toBe('2 h 40 min');
  });
});
