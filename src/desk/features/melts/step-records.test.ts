import { describe, expect, it } from 'vitest';
import type { MeltEvent } from '#shared/contracts/card.ts';
import type { InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import type { CardEvent } from '#shared/domain/pour-card/card-event.ts';
import { handOvers, sentenceOfStep, stepRecords } from './step-records.ts';

const step = (key: string): InstructionStep => ({
  kind: 'say',
  key,
  before: 'charge',
  sentence: `Say ${key}.`,
  when: { methods: [], families: [], roles: [], hazards: [] },
  maySkip: true,
});
const entry = (event: CardEvent, person = 'Ada'): MeltEvent => ({
  seq: 1,
  key: event.type,
  event,
  person,
  terminal: 'Terminal',
  occurredAt: '2026-12-01T10:00:00Z',
  recordedAt: '2026-12-01T10:00:00Z',
});
const steps = ['face', 'keys', 'mass', 'late', 'open'].map(step);
const answer = { kind: 'weigh', massG: 3 } as const;
const events = [
  entry({ type: 'card-opened' }),
  entry({ type: 'guard-confirmed', prompts: ['face'] }),
  entry({ type: 'checked', keys: ['keys'] }),
  entry({ type: 'carried-on' }, 'Ben'),
  entry({ type: 'step-done', key: 'mass', answer }),
  entry({ type: 'step-skipped', key: 'late' }),
];

describe('stepRecords', () => {
  it('finds how each step was settled, and leaves out what was not asked', () => {
    expect(
      stepRecords({ steps, events }).map(({ step: { key }, how, answer: said }) => [key, how, said]),
    ).toEqual([
      ['face', 'done', null],
      ['keys', 'done', null],
      ['mass', 'done', answer],
      ['late', 'skipped', null],
    ]);
  });

  it('knows who had the card, and the sentence of a step', () => {
    expect(handOvers({ events }).map(({ person }) => person)).toEqual(['Ada', 'Ben']);
    expect(sentenceOfStep({ steps })('mass')).toBe('Say mass.');
    expect(sentenceOfStep({ steps })('gone')).toBe('gone');
  });
});
