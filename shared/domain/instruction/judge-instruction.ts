import { cardSteps, cardStepNames } from '../pour-card/card-step.ts';
import type { InstructionStep, StepConditions } from './instruction-step.ts';
import type { WorkInstruction } from './work-instruction.ts';

/** A fault of an instruction, at the step it is found in; null for the instruction as a whole. */
export interface InstructionFault {
  readonly stepKey: string | null;
  readonly sentence: string;
}

const at = ({ key }: InstructionStep, sentence: string): InstructionFault => ({ stepKey: key, sentence });

const faultsOfStep = (step: InstructionStep): readonly InstructionFault[] => {
  const faults: InstructionFault[] = [];
  if (step.before === 'pour')
    faults.push(
      at(step, 'Nothing may stand between flask out and pour: the mould cools. Put it before flask out.'),
    );
  if (step.before === 'quench' && step.kind !== 'say' && step.kind !== 'check')
    faults.push(at(step, 'Before the quench there is time for words and checks only.'));
  if (step.kind === 'choose' && step.options.length < 2)
    faults.push(at(step, 'Give at least two answers to choose from.'));
  if (step.kind === 'choose' && new Set(step.options.map(({ words }) => words)).size < step.options.length)
    faults.push(at(step, 'Two answers are the same.'));
  if (step.kind === 'wait' && step.before === 'guard')
    faults.push(at(step, 'Nothing has begun before the guard, so there is nothing to wait for.'));
  const limits = step.kind === 'weigh' ? step.limitsG : step.kind === 'read' ? step.limitsC : null;
  if (limits && limits.low !== null && limits.high !== null && limits.low > limits.high)
    faults.push(at(step, 'The lower limit is above the upper one.'));
  return faults;
};

const order = (steps: readonly InstructionStep[]): readonly InstructionFault[] => {
  const places = steps.map(({ before }) => cardSteps.indexOf(before));
  const index = places.findIndex((place, i) => i > 0 && place < (places[i - 1] ?? 0));
  const step = steps[index];
  return step
    ? [at(step, `It comes before “${cardStepNames[step.before]}”, so it has to stand further up.`)]
    : [];
};

const isForEveryone = ({ methods, families, roles, hazards }: StepConditions): boolean =>
  [methods, families, roles, hazards].every((list) => list.length === 0);

/** The faults that keep an instruction from being approved; none when it may be. */
export const judgeInstruction = ({ steps }: WorkInstruction): readonly InstructionFault[] => {
  const keys = steps.map(({ key }) => key);
  const twice = steps.find(({ key }, i) => keys.indexOf(key) !== i);
  const unguarded = !steps.some(
    ({ before, kind, when }) => before === 'guard' && kind === 'check' && isForEveryone(when),
  );
  return [
    ...(unguarded
      ? [{ stepKey: null, sentence: 'The guard needs at least one check that everyone sees.' }]
      : []),
    ...(twice ? [at(twice, 'Two steps bear the same mark.')] : []),
    ...order(steps),
    ...steps.flatMap(faultsOfStep),
  ];
};
