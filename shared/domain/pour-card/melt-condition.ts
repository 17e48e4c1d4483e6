import type { Celsius } from '#shared/lib/units.ts';
import type { CardFigures } from './card-figures.ts';

/** What the metal in the crucible is, and what to do about it. */
export type MeltAdvice = 'wait' | 'ready' | 'too-hot';

/** The metal at a reading: its state, superheat over the liquidus (negative below it) and the advice. */
export interface MeltCondition {
  readonly state: 'solid' | 'mushy' | 'liquid';
  readonly superheatC: number;
  readonly advice: MeltAdvice;
}

/** Judges a melt reading in °C against the card's melting range and pour window. */
export const meltConditionAt = (
  readingC: Celsius,
  { liquidusC, solidusC, pourC }: Pick<CardFigures, 'liquidusC' | 'solidusC' | 'pourC'>,
): MeltCondition => {
  const state = readingC >= liquidusC ? 'liquid' : readingC <= solidusC ? 'solid' : 'mushy';
  const advice = readingC < pourC.low ? 'wait' : readingC <= pourC.high ? 'ready' : 'too-hot';
  return { state, superheatC: readingC - liquidusC, advice };
};
