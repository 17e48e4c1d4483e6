import { describe, expect, it } from 'vitest';
import { defaultInstruction } from './default-instruction.ts';
import type { InstructionStep } from './instruction-step.ts';
import { judgeInstruction } from './judge-instruction.ts';

const always = { methods: [], families: [], roles: [], hazards: [] };
const step = (values: Partial<InstructionStep> & object): InstructionStep =>
  ({
    key: 'new',
    kind: 'say',
    before: 'close',
    sentence: 'Do it.',
    when: always,
    maySkip: true,
    ...values,
  }) as InstructionStep;

const faultsWith = (...more: readonly InstructionStep[]): readonly string[] =>
  judgeInstruction({ ...defaultInstruction, steps: [...defaultInstruction.steps, ...more] }).map(
    ({ sentence }) => sentence,
  );

describe('an instruction', () => {
  it('is shipped without a fault', () => {
    expect(judgeInstruction(defaultInstruction)).toEqual([]);
  });

  it.each<[string, InstructionStep, RegExp]>([
    ['a step between flask out and pour', step({ before: 'pour' }), /mould cools/],
    [
      'a wait before the quench',
      step({ before: 'quench', kind: 'wait', seconds: 5 }),
      /words and checks only/,
    ],
    ['a step out of its order', step({ before: 'melt' }), /further up/],
    ['a key twice', step({ key: 'face' }), /same mark/],
    ['one answer', step({ kind: 'choose', options: [{ words: 'Yes', isVariance: false }] }), /two answers/],
    [
      'an answer twice',
      step({
        kind: 'choose',
        options: [
          { words: 'Yes', isVariance: false },
          { words: 'Yes', isVariance: true },
        ],
      }),
      /the same/,
    ],
    ['limits the wrong way round', step({ kind: 'weigh', limitsG: { low: 2, high: 1 } }), /above the upper/],
  ])('is at fault with %s', (_what, added, fault) => {
    expect(faultsWith(added).some((sentence) => fault.test(sentence))).toBe(true);
  });

  it('is at fault without a check of the guard that everyone sees', () => {
    const steps = defaultInstruction.steps.filter(
      ({ before, when }) => before !== 'guard' || when.hazards.length > 0,
    );
    expect(judgeInstruction({ ...defaultInstruction, steps })).toMatchObject([{ stepKey: null }]);
  });
});
