export * from './types.ts';
export { equilibrium } from './equilibrium.ts';
export { meltingRange } from './melting-range.ts';
export { freezingPath, solidFractionAt } from './freezing-path.ts';
export { leverRule, type LeverFractions } from './lever-rule.ts';
export { binarySection, tieLine } from './binary-section.ts';
export { rangeBand } from './range-band.ts';
export { density, metalFromWax, type Density } from './density.ts';
export { ordering, type Ordering } from './ordering.ts';
export {
  benchFigures,
  soldersBelow,
  FURNACE_MARGIN_C,
  SOLDER_MARGIN_C,
  type BenchFigures,
  type BenchLimit,
  type BenchWindow,
} from './bench-figures.ts';
export { ENGINE_VERSION, PROVENANCE, type ParameterSource } from './version.ts';
