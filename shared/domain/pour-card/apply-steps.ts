import { ok, refuse } from '#shared/lib/result.ts';
import type { InstructionStep, StepKind } from '../instruction/instruction-step.ts';
import { judgeAnswer } from '../instruction/judge-answer.ts';
import { stepsBefore } from '../instruction/step-applies.ts';
import { isOver, type CardContext, type CardState, type SettledStep } from './card-state.ts';
import type { CardStep } from './card-step.ts';
import { secondsBetween, type Handler } from './card-handler.ts';
import type { Departure } from './variance.ts';

/** The steps of the instruction that are still open before the card's present part, in order. */
export const openSteps = (
  state: CardState,
  { rules }: Pick<CardContext, 'rules'>,
): readonly InstructionStep[] => {
  if (!rules || isOver(state)) return [];
  const asked = stepsBefore(rules.steps, state.step as CardStep, state.worker?.role ?? 'caster');
  return asked.filter(({ key }) => !state.settled?.[key]);
};

/** Whether a step is one to read or touch, so that several of them stand on one screen. */
export const isRead = ({ kind }: InstructionStep): boolean => kind === 'say' || kind === 'check';

/** The open steps that are shown together: a run to be read and touched, or one of another kind. */
export const openRun = (open: readonly InstructionStep[]): readonly InstructionStep[] => {
  const [first] = open;
  if (!first) return [];
  if (!isRead(first)) return [first];
  const end = open.findIndex((step) => !isRead(step));
  return end === -1 ? open : open.slice(0, end);
};

const settle = (state: CardState, keys: readonly string[], settled: SettledStep): CardState => ({
  ...state,
  settled: { ...state.settled, ...Object.fromEntries(keys.map((key) => [key, settled])) },
});

const stillOpen = (steps: readonly InstructionStep[]): string =>
  `Every caution has to be confirmed. Still open: ${steps.map(({ sentence }) => sentence).join(' ')}`;

/** Settles what was read and touched; refused when a caution is left out or the card asks something else first. */
export const check: Handler<'checked'> = (state, { keys }, context, at) => {
  const run = openRun(openSteps(state, context)).filter(isRead);
  const isAsked = run.length > 0 && keys.every((key) => run.some((step) => step.key === key));
  if (!isAsked) return refuse('That is not what the card asks for now.');
  const left = run.filter(({ key }) => !keys.includes(key));
  return left.length > 0 ? refuse(stillOpen(left)) : ok(settle(state, keys, { at, how: 'done' }));
};

/** Settles the cautions of the guard and opens the charge; refused while one of them is open. */
export const confirmGuard: Handler<'guard-confirmed'> = (state, { prompts }, context, at) => {
  const left = openSteps(state, context).filter((step) => !isRead(step) || !prompts.includes(step.key));
  if (left.length > 0) return refuse(stillOpen(left));
  return ok({ ...settle(state, prompts, { at, how: 'done' }), step: 'charge' });
};

/** Settles one step with its answer; an answer out of its limits is taken and marked. */
export const doStep: Handler<'step-done'> = (state, { key, answer }, context, at) => {
  const [step] = openSteps(state, context);
  if (step?.key !== key) return refuse('That is not what the card asks for now.');
  const verdict = judgeAnswer(step, answer, {
    flaskCode: context.rules?.flaskCode ?? null,
    workerId: state.worker?.personId ?? null,
    sinceS: state.since === undefined ? Infinity : secondsBetween(state.since, at),
    units: context.units,
  });
  if (verdict.kind === 'refused') return refuse(verdict.sentence);
  const settled = settle(state, [key], { at, how: 'done' });
  if (verdict.kind === 'good') return ok(settled);
  const departure = { kind: 'step-answer', sentence: verdict.sentence, at } as const;
  return ok({ ...settled, departures: [...state.departures, departure] });
};

/** What takes an instrument, and is not done, is a measurement missing. */
const measured: readonly StepKind[] = ['weigh', 'read', 'photograph'];

const skipped = ({ kind, sentence }: InstructionStep): Pick<Departure, 'kind' | 'sentence'> =>
  measured.includes(kind)
    ? { kind: 'instrument-missing', sentence: `Not measured: ${sentence}` }
    : { kind: 'step-skipped', sentence: `Skipped: ${sentence}` };

/** Leaves a step out; a caster may where the instruction allows it, an apprentice never. */
export const skipStep: Handler<'step-skipped'> = (state, { key }, context, at) => {
  const [step] = openSteps(state, context);
  if (step?.key !== key) return refuse('That is not what the card asks for now.');
  if (state.worker?.role === 'apprentice') return refuse('An apprentice skips no step. Ask a caster.');
  if (!step.maySkip) return refuse('The instruction lets nobody skip this step.');
  const departure = { ...skipped(step), at, isMajor: true };
  return ok({
    ...settle(state, [key], { at, how: 'skipped' }),
    departures: [...state.departures, departure],
  });
};
