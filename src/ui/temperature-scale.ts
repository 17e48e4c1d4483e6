/** The temperatures that divide an alloy's column, all in °C. */
export interface ColumnTemperatures {
  readonly solidusC: number;
  readonly liquidusC: number;
  /** Where the last-frozen metal of a casting melts again, when that is below the equilibrium solidus. */
  readonly asCastSolidusC?: number;
  /** Pour window of the melt, or null where there is none to show. */
  readonly windowC: { readonly low: number; readonly high: number } | null;
  /** Lowest and highest temperature of the picture. */
  readonly rangeC: { readonly low: number; readonly high: number };
}

/** Height of a temperature in the picture; it falls as the temperature rises and never leaves the picture. */
export type TemperatureScale = (celsius: number) => number;

type Zone = 'solid' | 'asCast' | 'mushy' | 'below' | 'window' | 'above';

// The mushy zone is a few degrees of a range of hundreds: it is stretched to a third of the picture so as to be read.
const shares: Readonly<Record<Zone, number>> = {
  solid: 0.12,
  asCast: 0.13,
  mushy: 0.32,
  below: 0.2,
  window: 0.16,
  above: 0.07,
};

const zoneOf = (celsius: number, column: ColumnTemperatures): Zone => {
  const { solidusC, liquidusC, asCastSolidusC, windowC } = column;
  if (celsius < solidusC)
    return asCastSolidusC !== undefined && celsius > asCastSolidusC ? 'asCast' : 'solid';
  if (celsius < liquidusC) return 'mushy';
  if (!windowC || celsius < windowC.low) return 'below';
  return celsius < windowC.high ? 'window' : 'above';
};

interface Segment {
  readonly low: number;
  readonly high: number;
  readonly zone: Zone;
}

const segmentsOf = (column: ColumnTemperatures): readonly Segment[] => {
  const { rangeC, windowC } = column;
  const marks = [column.solidusC, column.liquidusC, column.asCastSolidusC, windowC?.low, windowC?.high];
  const inside = marks.filter((mark) => mark !== undefined && mark > rangeC.low && mark < rangeC.high);
  const knots = [...new Set([rangeC.low, ...(inside as number[]), rangeC.high])].sort((a, b) => a - b);
  return knots.slice(1).map((high, index) => {
    const low = knots[index] ?? high;
    return { low, high, zone: zoneOf((low + high) / 2, column) };
  });
};

/** Length of each segment: its zone's share of the picture, divided among the zone's segments by their degrees. */
const weigh = (segments: readonly Segment[]): readonly number[] =>
  segments.map(({ low, high, zone }) => {
    const degrees = segments
      .filter((segment) => segment.zone === zone)
      .reduce((sum, segment) => sum + segment.high - segment.low, 0);
    return (shares[zone] * (high - low)) / degrees;
  });

/** A scale over `column` from `top` (its highest temperature) to `bottom` (its lowest), straight between its marks. */
export const temperatureScale = (
  column: ColumnTemperatures,
  top: number,
  bottom: number,
): TemperatureScale => {
  const segments = segmentsOf(column);
  const weights = weigh(segments);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  return (celsius) => {
    let share = 0;
    segments.forEach(({ low, high }, index) => {
      const part = Math.min(1, Math.max(0, (celsius - low) / (high - low)));
      share += part * (weights[index] ?? 0);
    });
    return bottom - (share / total) * (bottom - top);
  };
};
