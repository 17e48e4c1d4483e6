import { describe, expect, it } from 'vitest';
import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import type { InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import { compareInstructions } from './compare-instructions.ts';

const units = { temperature: 'F', mass: 'g' } as const;
const when = { methods: [], families: [], roles: [], hazards: [] };
const say = (key: string, more: object = {}): InstructionStep => ({
  kind: 'say',
  key,
  before: 'charge',
  sentence: `Say ${key}.`,
  when,
  maySkip: true,
  ...more,
});
const having = (...steps: InstructionStep[]) => ({ ...defaultInstruction, steps });
const [a, b, c] = [say('a'), say('b'), say('c')];
const differences = (before: readonly InstructionStep[], now: readonly InstructionStep[]) =>
  compareInstructions(having(...before), having(...now), units).steps.map(({ key, how, changes }) => [
    key,
    how,
    ...changes,
  ]);

describe('compareInstructions', () => {
  it('finds nothing between a revision and itself', () => {
    expect(compareInstructions(defaultInstruction, defaultInstruction, units)).toEqual({
      steps: [],
      texts: [],
    });
  });

  it('tells what was added and what was removed', () => {
    expect(differences([a, b], [a, c])).toEqual([
      ['c', 'added'],
      ['b', 'removed'],
    ]);
  });

  it('tells in words what of a step has changed, in the studio’s units', () => {
    const before: InstructionStep = { ...say('r'), kind: 'read', limitsC: { low: null, high: 900 } };
    const now: InstructionStep = {
      ...before,
      sentence: 'Read it.',
      maySkip: false,
      limitsC: { low: 800, high: 900 },
      when: { ...when, roles: ['apprentice'] },
    };
    expect(differences([before], [now])).toEqual([
      [
        'r',
        'changed',
        'Sentence: “Read it.”, before “Say r.”.',
        'Asks: “between 1472 °F and 1652 °F”, before “at most 1652 °F”.',
        'Where: “asked of an apprentice”, before “everyone, everywhere”.',
        'Nobody may skip it any more.',
      ],
    ]);
  });

  it('names only the step that was moved, not those it passed', () => {
    expect(differences([a, b, c], [c, a, b])).toEqual([['c', 'changed', 'It stands at another place.']]);
    expect(differences([a, b, c], [a, c])).toEqual([['b', 'removed']]);
  });

  it('sets words that differ side by side', () => {
    const now = { ...defaultInstruction, title: 'Pour two flasks' };
    expect(compareInstructions(defaultInstruction, now, units).texts).toEqual([
      { what: 'Title', before: 'Pour one flask', now: 'Pour two flasks' },
    ]);
  });
});
