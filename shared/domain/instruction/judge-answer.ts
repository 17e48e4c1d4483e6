import { formatClock, formatMass, formatTemperature, type Units } from '#shared/lib/units.ts';
import type { InstructionStep, Limits, StepAnswer } from './instruction-step.ts';

/** What a step is answered against. */
export interface AnswerGround {
  /** The code of the flask that the card is of; null on cards that do not know it. */
  readonly flaskCode: string | null;
  /** Who does the card: nobody signs for their own work. */
  readonly workerId: string | null;
  /** Seconds since the card came to this part. */
  readonly sinceS: number;
  readonly units: Units;
}

/** What an answer comes to: taken, taken but a variance, or refused; each with its sentence. */
export type AnswerVerdict =
  | { readonly kind: 'good' }
  | { readonly kind: 'variance'; readonly sentence: string }
  | { readonly kind: 'refused'; readonly sentence: string };

const good: AnswerVerdict = { kind: 'good' };
const refused = (sentence: string): AnswerVerdict => ({ kind: 'refused', sentence });

const ofNumber = (value: number, { low, high }: Limits, format: (value: number) => string): AnswerVerdict => {
  if (low !== null && value < low)
    return { kind: 'variance', sentence: `${format(value)} is below the ${format(low)} of the instruction.` };
  if (high !== null && value > high)
    return {
      kind: 'variance',
      sentence: `${format(value)} is above the ${format(high)} of the instruction.`,
    };
  return good;
};

/** Judges what was done at a step against what the step asks. */
export const judgeAnswer = (
  step: InstructionStep,
  answer: StepAnswer,
  { flaskCode, workerId, sinceS, units }: AnswerGround,
): AnswerVerdict => {
  if (step.kind !== answer.kind) return refused('That is not what this step asks for.');
  if (step.kind === 'weigh' && answer.kind === 'weigh')
    return ofNumber(answer.massG, step.limitsG, (grams) => formatMass(grams, units.mass));
  if (step.kind === 'read' && answer.kind === 'read')
    return ofNumber(answer.temperatureC, step.limitsC, (celsius) =>
      formatTemperature(celsius, units.temperature),
    );
  if (step.kind === 'wait' && sinceS < step.seconds)
    return refused(`Wait another ${formatClock(Math.ceil(step.seconds - sinceS))}.`);
  if (answer.kind === 'scan' && flaskCode !== null && answer.code !== flaskCode)
    return refused(
      `That is ${answer.code}; this card is of ${flaskCode}. Put it back and take the right flask.`,
    );
  if (step.kind === 'choose' && answer.kind === 'choose') {
    const option = step.options.find(({ words }) => words === answer.option);
    if (!option) return refused('Choose one of the answers.');
    return option.isVariance
      ? { kind: 'variance', sentence: `${step.sentence} “${option.words}” was chosen.` }
      : good;
  }
  if (answer.kind === 'countersign' && answer.by.personId === workerId)
    return refused('Someone else has to sign, not whoever does the work.');
  return good;
};
