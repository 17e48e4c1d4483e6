import type { MeltingRange, Section } from '#shared/metallurgy/index.ts';

/** Lowest and highest temperature of a picture, °C. */
export interface TemperatureSpan {
  readonly lowC: number;
  readonly highC: number;
}

const roundDown = (value: number, to: number): number => Math.floor(value / to) * to;
const roundUp = (value: number, to: number): number => Math.ceil(value / to) * to;

/** The span of a section's picture: room over the highest liquidus, and under the lowest solidus and the alloy's solvus. */
export const sectionSpan = (section: Section, solvusC: number | null): TemperatureSpan => {
  const of = (name: string) =>
    section.boundaries
      .filter((line) => line.name === name)
      .flatMap(({ points }) => points.map((p) => p.temperatureC));
  const lowest = Math.min(...of('solidus')) - 150;
  const low = solvusC !== null && solvusC > 350 ? Math.min(lowest, solvusC - 40) : lowest;
  return { lowC: roundDown(low, 50), highC: roundUp(Math.max(...of('liquidus')) + 12, 50) };
};

/** The span of a freezing curve's picture, with a little room at both ends. */
export const freezingSpan = ({ liquidusC, solidusC, asCastSolidusC }: MeltingRange): TemperatureSpan => {
  const low = Math.min(solidusC, asCastSolidusC ?? solidusC);
  const room = Math.max(8, (liquidusC - low) * 0.12);
  return { lowC: roundDown(low - room, 10), highC: roundUp(liquidusC + room, 10) };
};
