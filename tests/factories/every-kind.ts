import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import type { InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';

const always = { methods: [], families: [], roles: [], hazards: [] } as const;
const base = { before: 'melt', when: always, maySkip: true } as const;

/** One step of each kind that has a screen of its own, all before the melt. */
export const everyKind: readonly InstructionStep[] = [
  {
    ...base,
    kind: 'weigh',
    key: 'flux',
    sentence: 'How much flux goes into the crucible?',
    limitsG: { low: 0.2, high: 1.5 },
  },
  {
    ...base,
    kind: 'read',
    key: 'flask-shows',
    sentence: 'What does the flask furnace show?',
    limitsC: { low: 450, high: 650 },
  },
  { ...base, kind: 'wait', key: 'purge', sentence: 'Let the cover gas fill the crucible.', seconds: 240 },
  { ...base, kind: 'photograph', key: 'crucible', sentence: 'Take a picture of the crucible.' },
  { ...base, kind: 'scan', key: 'flask-again', sentence: 'Show the code of the flask in the furnace.' },
  {
    ...base,
    kind: 'choose',
    key: 'wall',
    sentence: 'How does the wall of the crucible look?',
    options: [
      { words: 'Glazed and whole', isVariance: false },
      { words: 'Worn, but sound', isVariance: false },
      { words: 'Cracked', isVariance: true },
    ],
  },
  { ...base, kind: 'countersign', key: 'second-look', sentence: 'A second person looks into the crucible.' },
  {
    ...base,
    kind: 'hold-to-act',
    key: 'gas',
    sentence: 'Open the cover gas.',
    act: 'Valve open, flame soft, hood down.',
  },
];

/** The default instruction with a step of every kind before the melt. */
export const everyKindInstruction: WorkInstruction = {
  ...defaultInstruction,
  steps: defaultInstruction.steps.flatMap((step, index, all) =>
    step.before !== 'charge' && all[index - 1]?.before === 'charge' ? [...everyKind, step] : [step],
  ),
};
