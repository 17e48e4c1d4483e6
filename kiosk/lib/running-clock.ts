import type { PourCard } from '#shared/contracts/card.ts';
import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { openSteps } from '#shared/domain/pour-card/apply-steps.ts';
import { isOver, type CardContext, type CardState } from '#shared/domain/pour-card/card-state.ts';
import { cardStepNames, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import { secondsUntil } from '#shared/domain/pour-card/flask-cooling.ts';
import { formatClock } from '#shared/lib/units.ts';

/** What a card waits for: a pour before its window ends, a quench between two moments, or the end of a wait. Milliseconds since the epoch. */
export type RunningTime =
  | { readonly kind: 'pour'; readonly fromMs: number; readonly untilMs: number }
  | { readonly kind: 'wait'; readonly fromMs: number; readonly untilMs: number }
  | {
      readonly kind: 'quench';
      readonly fromMs: number;
      readonly earliestMs: number;
      readonly latestMs: number | null;
    };

/** A running card of this terminal, small enough to be remembered while nobody is signed in. */
export interface RunningClock {
  readonly castingId: string;
  readonly flaskCode: string;
  readonly alloyName: string;
  readonly metal: 'gold' | 'silver';
  readonly person: string;
  readonly step: CardStep;
  readonly isStopped: boolean;
  readonly time: RunningTime | null;
}

/** Seconds from flask out to the latest pour, for the temperature the flask really came out at. */
export const pourWindowS = (startC: number, { figures }: Pick<CardContext, 'figures'>): number =>
  secondsUntil({ startC, roomC: figures.roomC, perSecond: figures.coolingPerSecond }, figures.flaskPourLowC);

const timeOf = (state: CardState, context: CardContext): RunningTime | null => {
  const [open] = openSteps(state, context);
  if (open?.kind === 'wait' && state.since !== undefined) {
    const fromMs = Date.parse(state.since);
    return { kind: 'wait', fromMs, untilMs: fromMs + open.seconds * 1000 };
  }
  if (state.step === 'pour' && state.flaskOut) {
    const fromMs = Date.parse(state.flaskOut.at);
    return { kind: 'pour', fromMs, untilMs: fromMs + pourWindowS(state.flaskOut.startC, context) * 1000 };
  }
  if (state.step === 'quench' && state.pour) {
    const fromMs = Date.parse(state.pour.at);
    const { earliestS, latestS } = context.figures.quench;
    const latestMs = latestS === null ? null : fromMs + latestS * 1000;
    return { kind: 'quench', fromMs, earliestMs: fromMs + earliestS * 1000, latestMs };
  }
  return null;
};

/** The clock of a card, or null when it is not running. */
export const runningClockOf = ({
  card,
  state,
}: {
  card: PourCard;
  state: CardState;
}): RunningClock | null => {
  if (!card.melt || isOver(state)) return null;
  const { id, flask, alloy } = card.casting;
  return {
    castingId: id,
    flaskCode: flask.code,
    alloyName: alloy.name,
    metal: markedMetal(alloy.family) === 'Ag' ? 'silver' : 'gold',
    person: card.melt.openedBy,
    step: state.step as CardStep,
    isStopped: state.stopped !== null,
    time: timeOf(state, card.context),
  };
};

/** What a clock shows at one moment. */
export interface ClockFace {
  readonly clock: string;
  readonly words: string;
  /** The one word that stands beside the clock where there is room for no more; empty for none. */
  readonly unit: 'left' | 'late' | '';
  readonly state: 'ready' | 'wait' | 'caution';
  readonly isUrgent: boolean;
  /** Share of the time still left, 1 to 0. */
  readonly left: number;
}

/** The last part of a window in which the clock turns urgent, s. */
export const urgentS = 30;

const shareLeft = (fromMs: number, untilMs: number, nowMs: number): number =>
  untilMs > fromMs ? Math.min(1, Math.max(0, (untilMs - nowMs) / (untilMs - fromMs))) : 0;

// Rounded up while counting down, so that the clock reads nought only when nothing is left.
const down = (ms: number): string => formatClock(Math.ceil(ms / 1000));
const past = (ms: number): string => `+${formatClock(-ms / 1000)}`;

const deadlineFace = (fromMs: number, untilMs: number, nowMs: number, verb: string): ClockFace => {
  const leftMs = untilMs - nowMs;
  const left = shareLeft(fromMs, untilMs, nowMs);
  if (leftMs <= 0)
    return {
      clock: past(leftMs),
      words: `too late to ${verb}`,
      unit: 'late',
      state: 'caution',
      isUrgent: true,
      left,
    };
  return {
    clock: down(leftMs),
    words: `left to ${verb}`,
    unit: 'left',
    state: 'ready',
    isUrgent: leftMs <= urgentS * 1000,
    left,
  };
};

const waitFace = (fromMs: number, untilMs: number, nowMs: number): ClockFace => {
  const isWaiting = nowMs < untilMs;
  return {
    clock: down(Math.max(0, untilMs - nowMs)),
    words: isWaiting ? 'to wait' : 'the wait is over',
    unit: isWaiting ? 'left' : '',
    state: isWaiting ? 'wait' : 'ready',
    isUrgent: false,
    left: shareLeft(fromMs, untilMs, nowMs),
  };
};

/** Reads a running time at `nowMs`. */
export const clockFace = (time: RunningTime, nowMs: number): ClockFace => {
  if (time.kind === 'wait') return waitFace(time.fromMs, time.untilMs, nowMs);
  if (time.kind === 'pour') return deadlineFace(time.fromMs, time.untilMs, nowMs, 'pour');
  const { fromMs, earliestMs, latestMs } = time;
  if (nowMs < earliestMs) {
    const left = shareLeft(fromMs, earliestMs, nowMs);
    return {
      clock: down(earliestMs - nowMs),
      words: 'to the quench',
      unit: '',
      state: 'wait',
      isUrgent: false,
      left,
    };
  }
  if (latestMs !== null) return deadlineFace(earliestMs, latestMs, nowMs, 'quench');
  return {
    clock: past(earliestMs - nowMs),
    words: 'quench now',
    unit: '',
    state: 'ready',
    isUrgent: false,
    left: 0,
  };
};

/** What a running card without a clock is doing, in a few words. */
export const stepWords = ({ step, isStopped }: RunningClock): string =>
  isStopped ? 'Work is stopped' : `At “${cardStepNames[step]}”`;
