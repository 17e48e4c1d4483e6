import { describe, expect, it } from 'vitest';
import { clockFace, type RunningTime } from './running-clock.ts';

const pour: RunningTime = { kind: 'pour', fromMs: 0, untilMs: 52_000 };
const rose: RunningTime = { kind: 'quench', fromMs: 0, earliestMs: 180_000, latestMs: 300_000 };
const yellow: RunningTime = { kind: 'quench', fromMs: 0, earliestMs: 1_200_000, latestMs: null };

describe('clockFace of a pour', () => {
  it('counts the window down, urgent in its last half minute', () => {
    expect(clockFace(pour, 11_000)).toMatchObject({
      clock: '0:41',
      unit: 'left',
      state: 'ready',
      isUrgent: false,
    });
    expect(clockFace(pour, 22_000)).toMatchObject({ clock: '0:30', isUrgent: true });
  });

  it('reads nought only when nothing is left, then says how late it is', () => {
    expect(clockFace(pour, 51_600)).toMatchObject({ clock: '0:01', unit: 'left' });
    expect(clockFace(pour, 52_000)).toMatchObject({ clock: '+0:00', unit: 'late', state: 'caution' });
    expect(clockFace(pour, 64_000)).toMatchObject({ clock: '+0:12', words: 'too late to pour', left: 0 });
  });

  it('empties its ring with the window', () => {
    expect(clockFace(pour, 0).left).toBe(1);
    expect(clockFace(pour, 26_000).left).toBeCloseTo(0.5, 9);
  });
});

describe('clockFace of a quench', () => {
  it('waits for the earliest moment', () => {
    expect(clockFace(yellow, 8_000)).toMatchObject({ clock: '19:52', words: 'to the quench', state: 'wait' });
    expect(clockFace(yellow, 1_200_000)).toMatchObject({ words: 'quench now', state: 'ready' });
  });

  it('counts to the latest moment where the alloy has one', () => {
    expect(clockFace(rose, 180_000)).toMatchObject({
      clock: '2:00',
      words: 'left to quench',
      state: 'ready',
      left: 1,
    });
    expect(clockFace(rose, 275_000)).toMatchObject({ clock: '0:25', isUrgent: true });
    expect(clockFace(rose, 301_000)).toMatchObject({
      clock: '+0:01',
      state: 'caution',
      words: 'too late to quench',
    });
  });
});
