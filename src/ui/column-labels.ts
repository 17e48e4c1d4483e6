import { spreadLabels } from './spread-labels.ts';
import type { ColumnTemperatures, TemperatureScale } from './temperature-scale.ts';

/** One label at the side of a temperature column: a marked temperature, the pour window, or a zone's name. */
export interface ColumnLabel {
  readonly key: string;
  readonly text: string;
  readonly look: 'mark' | 'window' | 'zone';
  /** Height of the label's middle in the picture. */
  readonly y: number;
}

const gap = 26;
const lowest = 556;

/** The labels of a column from the hottest down, moved apart where they would touch. */
export const columnLabels = (
  column: ColumnTemperatures,
  scale: TemperatureScale,
  format: (celsius: number) => string,
): readonly ColumnLabel[] => {
  const { windowC, solidusC, liquidusC, asCastSolidusC } = column;
  const mark = (key: string, celsius: number): ColumnLabel => ({
    key,
    text: format(celsius),
    look: 'mark',
    y: scale(celsius),
  });
  const between = (
    key: string,
    text: string,
    look: ColumnLabel['look'],
    a: number,
    b: number,
  ): ColumnLabel => ({
    key,
    text,
    look,
    y: (scale(a) + scale(b)) / 2,
  });
  const window = windowC
    ? [
        mark('window-high', windowC.high),
        between('window', 'pour', 'window', windowC.low, windowC.high),
        mark('window-low', windowC.low),
      ]
    : [];
  const hotEnd = windowC ? windowC.low : column.rangeC.high;
  const labels: readonly ColumnLabel[] = [
    ...window,
    between('liquid', 'liquid', 'zone', liquidusC, hotEnd),
    mark('liquidus', liquidusC),
    ...(liquidusC > solidusC
      ? [between('mushy', 'mushy', 'zone', solidusC, liquidusC), mark('solidus', solidusC)]
      : []),
    ...(asCastSolidusC === undefined
      ? []
      : [
          between('as-cast-zone', 'as cast', 'zone', asCastSolidusC, solidusC),
          mark('as-cast', asCastSolidusC),
        ]),
    { key: 'solid', text: 'solid', look: 'zone', y: scale(column.rangeC.low) + 20 },
  ];
  const heights = spreadLabels(
    labels.map((label) => label.y),
    gap,
    lowest,
  );
  return labels.map((label, index) => ({ ...label, y: heights[index] ?? label.y }));
};
