import type { CardFigures } from '#shared/domain/pour-card/card-figures.ts';
import type { ColumnTemperatures } from '#src/ui/temperature-scale.ts';

/** What the temperature column of a card shows: the melting range, the pour window, and some room on both sides, °C. */
export const meltColumn = ({ solidusC, liquidusC, pourC }: CardFigures): ColumnTemperatures => ({
  solidusC,
  liquidusC,
  windowC: pourC,
  rangeC: { low: solidusC - 120, high: pourC.high + 60 },
});
