import { describe, expect, it } from 'vitest';
import { addStep, duplicateStep, moveStep, putBack, removeStep, takeToPart } from './arrange-steps.ts';
import { emptyStep, type StepValues } from './step-values.ts';

const step = (key: string, before: StepValues['before']): StepValues => ({
  ...emptyStep('say', before),
  key,
});
const steps = [step('g', 'guard'), step('c1', 'charge'), step('c2', 'charge'), step('q', 'quench')];
const places = (list: readonly StepValues[] | null) => list?.map(({ key, before }) => `${key} ${before}`);

describe('the order of steps', () => {
  it('takes a new step last before its part', () => {
    expect(places(addStep(steps, step('g2', 'guard')))).toEqual([
      'g guard',
      'g2 guard',
      'c1 charge',
      'c2 charge',
      'q quench',
    ]);
  });

  it('moves a step within its part', () => {
    expect(places(moveStep(steps, 2, 'up'))).toEqual(['g guard', 'c2 charge', 'c1 charge', 'q quench']);
    expect(places(moveStep(steps, 1, 'down'))).toEqual(['g guard', 'c2 charge', 'c1 charge', 'q quench']);
  });

  it('moves a step over the border of its part, past the pour', () => {
    expect(places(moveStep(steps, 1, 'up'))?.[1]).toBe('c1 guard');
    expect(places(moveStep(steps, 3, 'up'))?.[3]).toBe('q flask-out');
    const beforeFlaskOut = [step('f', 'flask-out')];
    expect(places(moveStep(beforeFlaskOut, 0, 'down'))).toEqual(['f quench']);
  });

  it('has an end at either side', () => {
    expect(moveStep(steps, 0, 'up')).toBeNull();
    expect(moveStep([step('z', 'close')], 0, 'down')).toBeNull();
  });

  it('puts back what was removed where it stood', () => {
    const removed = removeStep(steps, 1);
    expect(places(removed)).toEqual(['g guard', 'c2 charge', 'q quench']);
    expect(putBack(removed, 1, steps[1] ?? step('c1', 'charge'))).toEqual(steps);
  });

  it('copies a step under a key of its own, and takes one to another part', () => {
    const copied = duplicateStep(steps, 0);
    expect(copied).toHaveLength(5);
    expect(new Set(copied.map(({ key }) => key)).size).toBe(5);
    expect(places(takeToPart(steps, 0, 'close'))?.at(-1)).toBe('g close');
  });
});
