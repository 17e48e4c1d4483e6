import { splitCode } from '#shared/lib/codes.ts';
import { urgentS, type RunningClock, type RunningTime } from './running-clock.ts';
import type { SignalName } from './signals.ts';

/** A moment of a running card at which people near must be told. */
export interface ClockWarning {
  readonly atMs: number;
  readonly signal: SignalName;
  /** One sentence, read out and shown. */
  readonly words: string;
}

const momentsOf = (time: RunningTime): readonly ClockWarning[] => {
  switch (time.kind) {
    case 'wait':
      return [{ atMs: time.untilMs, signal: 'open', words: 'The wait is over.' }];
    case 'pour':
      return [
        { atMs: time.untilMs - urgentS * 1000, signal: 'soon', words: `${urgentS} seconds left to pour.` },
        { atMs: time.untilMs, signal: 'end', words: 'The pour window has ended.' },
      ];
    case 'quench':
      return [
        { atMs: time.earliestMs, signal: 'open', words: 'Quench it now.' },
        ...(time.latestMs === null
          ? []
          : [{ atMs: time.latestMs, signal: 'end' as const, words: 'The quench is late.' }]),
      ];
  }
};

/** The warnings of the running cards that fall due after `fromMs` and up to `toMs`, each with its flask named, oldest first. */
export const warningsBetween = (
  clocks: readonly RunningClock[],
  fromMs: number,
  toMs: number,
): readonly ClockWarning[] =>
  clocks
    .filter(({ isStopped }) => !isStopped)
    .flatMap(({ time, flaskCode }) =>
      (time ? momentsOf(time) : []).map((warning) => ({
        ...warning,
        words: `${splitCode(flaskCode).main}: ${warning.words}`,
      })),
    )
    .filter(({ atMs }) => atMs > fromMs && atMs <= toMs)
    .toSorted((a, b) => a.atMs - b.atMs);
