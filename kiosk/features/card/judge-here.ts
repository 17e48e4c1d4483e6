import type { InstructionStep, StepAnswer } from '#shared/domain/instruction/instruction-step.ts';
import { judgeAnswer, type AnswerVerdict } from '#shared/domain/instruction/judge-answer.ts';
import type { RunningCard } from './use-running-card.ts';

/** Judges an answer before it is recorded, as the card's own rules will; time is left to them. */
export const judgeHere = (
  { card, state }: Pick<RunningCard, 'card' | 'state'>,
  step: InstructionStep,
  answer: StepAnswer,
): AnswerVerdict =>
  judgeAnswer(step, answer, {
    flaskCode: card.context.rules?.flaskCode ?? null,
    workerId: state.worker?.personId ?? null,
    sinceS: Infinity,
    units: card.context.units,
  });
