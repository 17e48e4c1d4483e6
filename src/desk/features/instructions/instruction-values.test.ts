import { describe, expect, it } from 'vitest';
import type { Instruction } from '#shared/contracts/instruction.ts';
import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import type { InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import type { Units } from '#shared/lib/units.ts';
import { faultsOfFields, readInstruction, valuesOf } from './instruction-values.ts';
import { emptyStep, valuesOfStep } from './step-values.ts';

const metric: Units = { temperature: 'C', mass: 'g' };
const other: Units = { temperature: 'F', mass: 'dwt' };
const base = {
  before: 'charge',
  sentence: 'Do it.',
  maySkip: false,
  when: { methods: ['vacuum'], families: ['white-gold'], roles: ['apprentice'], hazards: ['nickel'] },
} as const;
const everyKind: readonly InstructionStep[] = [
  { ...base, key: 'a', kind: 'say' },
  { ...base, key: 'b', kind: 'check', sign: 'steam' },
  { ...base, key: 'c', kind: 'weigh', limitsG: { low: 1.5552, high: null } },
  { ...base, key: 'd', kind: 'read', limitsC: { low: null, high: 900 } },
  { ...base, key: 'e', kind: 'wait', seconds: 90 },
  { ...base, key: 'f', kind: 'photograph' },
  { ...base, key: 'g', kind: 'scan' },
  { ...base, key: 'h', kind: 'choose', options: [{ words: 'Yes', isVariance: false }] },
  { ...base, key: 'i', kind: 'countersign' },
  { ...base, key: 'j', kind: 'hold-to-act', act: 'Gas on' },
];
const content = { ...defaultInstruction, steps: everyKind };
const values = (units: Units) => valuesOf({ content, note: '' } as unknown as Instruction, units);

describe('a draft in its fields', () => {
  it.each([metric, other])('comes back as it went in, in %j', (units) => {
    expect(readInstruction(values(units), units).content).toEqual(content);
  });

  it('shows limits in the studio’s units', () => {
    const [, , weigh, read] = values(other).steps;
    expect(weigh?.low).toBe('1');
    expect(read?.high).toBe('1652');
  });

  it('has every fault at its field, and those of the instruction at their step', () => {
    const step = { ...emptyStep('read', 'guard'), key: 'late', low: 'hot', high: '5000' };
    const wait = { ...valuesOfStep({ ...base, key: 'w', kind: 'wait', seconds: 1 }, metric), seconds: '' };
    const read = readInstruction({ ...values(metric), title: '', steps: [step, wait] }, metric);
    expect(Object.fromEntries(read.fieldFaults)).toEqual({
      title: 'Give the instruction a title.',
      'steps.0.sentence': 'Say what to do.',
      'steps.0.low': 'That is not a number. Use digits and one decimal point or comma.',
      'steps.0.high': 'That is hotter than any furnace here.',
      'steps.1.seconds': 'Type a number.',
    });
    expect([...faultsOfFields(read, 0).keys()].toSorted()).toEqual(['high', 'low', 'sentence']);
    expect([...read.stepFaults]).toEqual([['', ['The guard needs at least one check that everyone sees.']]]);
  });
});
