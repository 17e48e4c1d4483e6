import { describe, expect, it } from 'vitest';
import { warningsBetween } from './clock-warning.ts';
import type { RunningClock, RunningTime } from './running-clock.ts';

const clock = (time: RunningTime, overrides: Partial<RunningClock> = {}): RunningClock => ({
  castingId: 'casting',
  flaskCode: 'F-0147-2',
  alloyName: '18 ct yellow',
  metal: 'gold',
  person: 'Ines',
  step: 'pour',
  isStopped: false,
  time,
  ...overrides,
});

const pour = clock({ kind: 'pour', fromMs: 0, untilMs: 52_000 });
const rose = clock({ kind: 'quench', fromMs: 0, earliestMs: 180_000, latestMs: 300_000 });
const yellow = clock({ kind: 'quench', fromMs: 0, earliestMs: 720_000, latestMs: null });
const wait = clock({ kind: 'wait', fromMs: 0, untilMs: 240_000 });

const signalsOf = (...args: Parameters<typeof warningsBetween>) =>
  warningsBetween(...args).map(({ signal, atMs }) => `${signal} ${atMs}`);

describe('warningsBetween', () => {
  it('warns half a minute before the pour window ends, and at its end', () => {
    expect(signalsOf([pour], 0, 60_000)).toEqual(['soon 22000', 'end 52000']);
    expect(warningsBetween([pour], 0, 22_000).map(({ words }) => words)).toEqual([
      'F-0147: 30 seconds left to pour.',
    ]);
  });

  it('warns once of each, however the looks fall', () => {
    expect(signalsOf([pour], 21_999, 22_000)).toEqual(['soon 22000']);
    expect(signalsOf([pour], 22_000, 22_250)).toEqual([]);
  });

  it('warns when the quench opens, and when it is late where the alloy has an end', () => {
    expect(signalsOf([rose], 0, 400_000)).toEqual(['open 180000', 'end 300000']);
    expect(signalsOf([yellow], 0, 9_000_000)).toEqual(['open 720000']);
  });

  it('warns when a wait is over, in the order in which several cards fall due', () => {
    expect(signalsOf([rose, wait], 0, 300_000)).toEqual(['open 180000', 'open 240000', 'end 300000']);
  });

  it('keeps silent on a card whose work is stopped', () => {
    expect(signalsOf([{ ...pour, isStopped: true }], 0, 60_000)).toEqual([]);
  });
});
