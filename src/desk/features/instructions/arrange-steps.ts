import { cardSteps, type CardStep } from '#shared/domain/pour-card/card-step.ts';
import { newKey, type StepValues } from './step-values.ts';

/** Nothing may stand before the pour: the mould cools. */
export const partsWithSteps: readonly CardStep[] = cardSteps.filter((part) => part !== 'pour');

const placeOf = ({ before }: Pick<StepValues, 'before'>): number => cardSteps.indexOf(before);

/** The steps in the order of the card's parts; within a part they keep their order. */
const inOrder = (steps: readonly StepValues[]): StepValues[] =>
  steps.toSorted((one, other) => placeOf(one) - placeOf(other));

/** Puts a step last before its part. */
export const addStep = (steps: readonly StepValues[], step: StepValues): StepValues[] =>
  inOrder([...steps, step]);

/** Puts a step back where it stood. */
export const putBack = (steps: readonly StepValues[], index: number, step: StepValues): StepValues[] =>
  inOrder(steps.toSpliced(index, 0, step));

/** Leaves a step out. */
export const removeStep = (steps: readonly StepValues[], index: number): StepValues[] =>
  steps.toSpliced(index, 1);

/** Puts a copy of a step behind it, with a key of its own. */
export const duplicateStep = (steps: readonly StepValues[], index: number): StepValues[] => {
  const step = steps[index];
  return step ? steps.toSpliced(index + 1, 0, { ...step, key: newKey(step.kind) }) : [...steps];
};

/** Takes a step to another part of the card, last before it. */
export const takeToPart = (steps: readonly StepValues[], index: number, before: CardStep): StepValues[] => {
  const step = steps[index];
  return step ? addStep(removeStep(steps, index), { ...step, before }) : [...steps];
};

/** Moves a step one place up or down; from the end of a part it goes to the part beside it. Null where there is no place. */
export const moveStep = (
  steps: readonly StepValues[],
  index: number,
  way: 'up' | 'down',
): StepValues[] | null => {
  const step = steps[index];
  if (!step) return null;
  const by = way === 'up' ? -1 : 1;
  const neighbour = steps[index + by];
  if (neighbour?.before === step.before)
    return steps.toSpliced(
      Math.min(index, index + by),
      2,
      ...(way === 'up' ? [step, neighbour] : [neighbour, step]),
    );
  const part = partsWithSteps[partsWithSteps.indexOf(step.before) + by];
  if (!part) return null;
  // Across a border the order of all stays as it is: only the part changes.
  return steps.map((each, i) => (i === index ? { ...each, before: part } : each));
};
