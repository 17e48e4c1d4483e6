import type { CardFigures } from '#shared/domain/pour-card/card-figures.ts';
import { meltConditionAt } from '#shared/domain/pour-card/melt-condition.ts';
import { formatPercent } from '#shared/lib/units.ts';
import type { UnitWriter } from '#kiosk/lib/unit-writer.ts';

/** What a melt reading means, in the words of the melt step. */
export interface MeltWords {
  readonly sentence: string;
  readonly state: 'wait' | 'ready' | 'caution';
  readonly stateWords: string;
  /** What the next step waits for; null when it is open. */
  readonly blocked: string | null;
}

type Figures = Pick<CardFigures, 'liquidusC' | 'solidusC' | 'pourC' | 'meltHoldC'>;

/** Puts a reading in °C into words; `solidMassFraction` is null where it is not known, and then no share is named. */
export const meltWords = (
  readingC: number,
  figures: Figures,
  solidMassFraction: number | null,
  write: UnitWriter,
): MeltWords => {
  const { low, high } = figures.pourC;
  const { state, superheatC, advice } = meltConditionAt(readingC, figures);
  const opens = `Flask out opens at ${write.temperature(low)}`;
  const over = `${write.difference(superheatC)} over liquidus`;
  switch (advice) {
    case 'ready':
      return {
        sentence: 'The melt is ready to pour.',
        state: 'ready',
        stateWords: `Ready. ${over}`,
        blocked: null,
      };
    case 'too-hot':
      return {
        sentence: 'Turn down. Let the melt cool into the window.',
        state: 'caution',
        stateWords: `Too hot. ${over}`,
        blocked: `Flask out opens below ${write.temperature(high)}`,
      };
    case 'wait':
      break;
  }
  if (state === 'liquid') {
    return {
      sentence: 'All liquid. Heat a little more.',
      state: 'wait',
      stateWords: `Wait. ${over}`,
      blocked: opens,
    };
  }
  const isSolid = state === 'solid';
  const share =
    solidMassFraction === null ? 'Partly solid' : `${formatPercent(solidMassFraction)} still solid`;
  return {
    sentence: isSolid
      ? 'Keep heating. The metal is all solid.'
      : 'Keep heating. The metal is not all liquid yet.',
    state: 'wait',
    stateWords: `Wait. ${isSolid ? 'All solid' : share}`,
    blocked: opens,
  };
};
