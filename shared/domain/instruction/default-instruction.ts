import { defaultSteps } from './default-steps.ts';
import type { WorkInstruction } from './work-instruction.ts';

/** The instruction a new studio begins with: usual cautions of the trade (common practice, no source); the owner edits them. */
export const defaultInstruction: WorkInstruction = {
  title: 'Pour one flask',
  sentences: {
    guard: 'Before anything is hot: check each point and touch it.',
    charge: 'Weigh the metal into the crucible.',
    melt: 'Melt and read the temperature.',
    'flask-out': 'Take the flask out now.',
    pour: 'Flask is out. Pour now.',
    quench: 'Let it stand before the quench.',
    close: 'Weigh the button and close the card.',
  },
  steps: defaultSteps,
  emergencyText:
    'Step back. Warn the others. Burner or power off if you can reach it. Cool a burn under running water for 20 minutes and call for help.',
  deference:
    'Usual cautions. Local codes, the supplier’s data sheet and your studio’s competent person come first.',
};
