import { describe, expect, it } from 'vitest';
import type { Departure } from '#shared/domain/pour-card/variance.ts';
import { emptyVariance, judgeVariance } from './variance-draft.ts';

const late: Departure = { kind: 'poured-late', sentence: 'Late.', at: '2026-12-01T10:00:00.000Z' };
const caster = { worker: { personId: 'ines', role: 'caster', parts: null } } as const;
const apprentice = { worker: { personId: 'yara', role: 'apprentice', parts: null } } as const;

describe('judgeVariance', () => {
  it('waits for a reason first', () => {
    expect(judgeVariance(emptyVariance, late, caster)).toMatchObject({ ready: false, waitsFor: 'reason' });
  });

  it('takes a reason of a small departure without words', () => {
    expect(judgeVariance({ ...emptyVariance, reason: 'time' }, late, caster)).toEqual({
      ready: true,
      reason: 'time',
      wantsSign: false,
    });
  });

  it.each([
    ['another reason', late, caster, 'other'],
    ['a major departure', { ...late, isMajor: true }, caster, 'time'],
    ['an apprentice', late, apprentice, 'time'],
  ] as const)('wants words for %s', (_what, departure, state, reason) => {
    expect(judgeVariance({ ...emptyVariance, reason, words: ' ' }, departure, state)).toMatchObject({
      ready: false,
      waitsFor: 'words',
    });
  });

  it('wants a second person for a major departure and from an apprentice', () => {
    const draft = { ...emptyVariance, reason: 'time', words: 'The door stuck.' } as const;
    expect(judgeVariance(draft, { ...late, isMajor: true }, caster)).toMatchObject({ wantsSign: true });
    expect(judgeVariance(draft, late, apprentice)).toMatchObject({ wantsSign: true });
  });
});
