/** The steps of a pour card, in order. */
export const cardSteps = ['guard', 'charge', 'melt', 'flask-out', 'pour', 'quench', 'close'] as const;

/** One step of a pour card. */
export type CardStep = (typeof cardSteps)[number];

/** The steps on which something is hot, so that stop work is always at hand. */
export const hotSteps: readonly CardStep[] = ['charge', 'melt', 'flask-out', 'pour', 'quench'];

/** A step's name in a word or two. */
export const cardStepNames: Readonly<Record<CardStep, string>> = {
  guard: 'Guard',
  charge: 'Charge',
  melt: 'Melt',
  'flask-out': 'Flask out',
  pour: 'Pour',
  quench: 'Quench',
  close: 'Close',
};
