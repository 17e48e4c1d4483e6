import type { CardStep } from './card-step.ts';

/** Pictures that may stand beside a safety prompt. */
export const safetySigns = [
  'face-shield',
  'heat-gloves',
  'apron',
  'closed-shoes',
  'dry-charge',
  'hot-surface',
  'ventilation',
  'shaded-glasses',
  'steam',
  'nickel',
] as const;
/** One picture of a safety prompt. */
export type SafetySign = (typeof safetySigns)[number];

/** A caution that must be confirmed before the work begins. */
export interface SafetyPrompt {
  readonly key: string;
  readonly sign: SafetySign;
  readonly sentence: string;
}

/** A work instruction: the one sentence of each step, and the cautions of the guard. */
export interface WorkInstruction {
  readonly title: string;
  readonly prompts: readonly SafetyPrompt[];
  readonly sentences: Readonly<Record<CardStep, string>>;
  readonly emergencyText: string;
  readonly deference: string;
}

/** The instruction a new studio begins with: usual cautions of the trade (common practice, no source); the owner edits them. */
export const defaultInstruction: WorkInstruction = {
  title: 'Pour one flask',
  prompts: [
    { key: 'face', sign: 'face-shield', sentence: 'Face shield down.' },
    {
      key: 'hands',
      sign: 'heat-gloves',
      sentence: 'Heat gloves and apron on, natural-fibre clothes, closed shoes.',
    },
    { key: 'eyes', sign: 'shaded-glasses', sentence: 'Shaded glasses at hand for looking into the melt.' },
    {
      key: 'dry',
      sign: 'dry-charge',
      sentence: 'Metal, crucible and tools are dry and warm: water under metal explodes.',
    },
    { key: 'air', sign: 'ventilation', sentence: 'Extraction is running.' },
    {
      key: 'hot',
      sign: 'hot-surface',
      sentence: 'The way from furnace to mould is clear. A hot flask looks like a cold one.',
    },
  ],
  sentences: {
    guard: 'Before anything is hot: check each point and touch it.',
    charge: 'Weigh the metal into the crucible.',
    melt: 'Melt and read the temperature.',
    'flask-out': 'Take the flask out now.',
    pour: 'Flask is out. Pour now.',
    quench: 'Let it stand before the quench.',
    close: 'Weigh the button and close the card.',
  },
  emergencyText:
    'Step back. Warn the others. Burner or power off if you can reach it. Cool a burn under running water for 20 minutes and call for help.',
  deference:
    'Usual cautions. Local codes, the supplier’s data sheet and your studio’s competent person come first.',
};
