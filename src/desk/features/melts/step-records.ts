import type { MeltEvent } from '#shared/contracts/card.ts';
import type { Melt } from '#shared/contracts/melt.ts';
import type { InstructionStep, StepAnswer } from '#shared/domain/instruction/instruction-step.ts';

/** How a step of the instruction was settled on a melt: by which entry, and with what answer. */
export interface StepRecord {
  readonly step: InstructionStep;
  readonly how: 'done' | 'skipped';
  readonly entry: MeltEvent;
  readonly answer: StepAnswer | null;
}

const settles = ({ event }: MeltEvent, key: string): boolean => {
  switch (event.type) {
    case 'guard-confirmed':
      return event.prompts.includes(key);
    case 'checked':
      return event.keys.includes(key);
    case 'step-done':
    case 'step-skipped':
      return event.key === key;
    default:
      return false;
  }
};

/** The steps of the instruction that are behind on a melt, in its order. */
export const stepRecords = ({ steps, events }: Pick<Melt, 'steps' | 'events'>): readonly StepRecord[] =>
  steps.flatMap((step): readonly StepRecord[] => {
    const entry = events.find((each) => settles(each, step.key));
    if (!entry) return [];
    const { event } = entry;
    return [
      {
        step,
        entry,
        how: event.type === 'step-skipped' ? 'skipped' : 'done',
        answer: event.type === 'step-done' ? event.answer : null,
      },
    ];
  });

/** The sentence of a step by its key; the key itself where the instruction has no such step. */
export const sentenceOfStep =
  ({ steps }: Pick<Melt, 'steps'>) =>
  (key: string): string =>
    steps.find((step) => step.key === key)?.sentence ?? key;

/** Who has had the card, from when, in turn. */
export const handOvers = ({ events }: Pick<Melt, 'events'>): readonly MeltEvent[] =>
  events.filter(({ event }) => event.type === 'card-opened' || event.type === 'carried-on');
