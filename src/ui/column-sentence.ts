import type { ColumnTemperatures } from './temperature-scale.ts';

/** Where a reading stands in an alloy's melting range; null without a reading. */
export type MeltState = 'solid' | 'mushy' | 'liquid' | null;

/** The state of metal in equilibrium at a reading in °C. */
export const meltStateAt = (
  readingC: number | null,
  { solidusC, liquidusC }: Pick<ColumnTemperatures, 'solidusC' | 'liquidusC'>,
): MeltState => {
  if (readingC === null) return null;
  if (readingC >= liquidusC) return 'liquid';
  return readingC <= solidusC ? 'solid' : 'mushy';
};

const stateWords = { solid: 'all solid', mushy: 'partly solid', liquid: 'all liquid' } as const;

/** What a temperature column shows, in words, for those who cannot see it. */
export const columnSentence = (
  column: ColumnTemperatures,
  readingC: number | null,
  format: (celsius: number) => string,
  unit: string,
): string => {
  const write = (celsius: number): string => `${format(celsius)} ${unit}`;
  const state = meltStateAt(readingC, column);
  return [
    readingC === null || state === null
      ? 'No reading yet.'
      : `Reading ${write(readingC)}: ${stateWords[state]}.`,
    `All solid below ${write(column.solidusC)}, all liquid above ${write(column.liquidusC)}.`,
    column.asCastSolidusC === undefined ? '' : `A casting melts again from ${write(column.asCastSolidusC)}.`,
    column.windowC
      ? `Pour window ${write(column.windowC.low)} to ${write(column.windowC.high)}.`
      : 'No pour window.',
  ]
    .filter(Boolean)
    .join(' ');
};
