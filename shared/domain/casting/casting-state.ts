/** The life of a casting (one use of a flask), in order, and its two ways out. */
export const castingStates = [
  'invested',
  'dewaxed',
  'burning-out',
  'holding',
  'poured',
  'quenched',
  'broken-out',
  'cut',
  'released',
  'held',
  'scrapped',
] as const;

/** Where a casting stands in its life. */
export type CastingState = (typeof castingStates)[number];

/** States in which the flask is still occupied, so that it cannot be used again. */
export const openCastingStates: readonly CastingState[] = [
  'invested',
  'dewaxed',
  'burning-out',
  'holding',
  'poured',
  'quenched',
  'held',
];

/** Steps that only the pour card may take, because it records the proof. */
const takenByTheCard: readonly CastingState[] = ['poured', 'quenched'];

const forward: Readonly<Record<CastingState, readonly CastingState[]>> = {
  invested: ['dewaxed'],
  dewaxed: ['burning-out'],
  'burning-out': ['holding'],
  holding: ['poured'],
  poured: ['quenched'],
  quenched: ['broken-out'],
  'broken-out': ['cut'],
  cut: ['released'],
  released: [],
  held: ['invested', 'dewaxed', 'burning-out', 'holding', 'quenched', 'broken-out', 'cut'],
  scrapped: [],
};

const canLeave = (state: CastingState): boolean => state !== 'released' && state !== 'scrapped';

/** The states a casting may go to from here, whoever takes it there. */
export const nextCastingStates = (from: CastingState): readonly CastingState[] => {
  if (!canLeave(from)) return [];
  const ways: readonly CastingState[] = from === 'held' ? ['scrapped'] : ['held', 'scrapped'];
  return [...forward[from], ...ways];
};

/** The states a person may choose at the desk: all but those that the pour card records itself. */
export const castingStatesByHand = (from: CastingState): readonly CastingState[] =>
  nextCastingStates(from).filter((state) => !takenByTheCard.includes(state));

/** Whether leaving for this state needs a reason in words. */
export const needsReason = (to: CastingState): boolean => to === 'held' || to === 'scrapped';

const words: Readonly<Record<CastingState, string>> = {
  invested: 'invested, waiting for dewax',
  dewaxed: 'dewaxed, waiting for burnout',
  'burning-out': 'still burning out',
  holding: 'holding, ready to pour',
  poured: 'poured',
  quenched: 'quenched',
  'broken-out': 'broken out',
  cut: 'cut',
  released: 'released',
  held: 'on hold',
  scrapped: 'scrapped',
};

/** A casting's state in words, to stand after "it is". */
export const describeCastingState = (state: CastingState): string => words[state];
