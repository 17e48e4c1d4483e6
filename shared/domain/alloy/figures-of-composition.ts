import { ok, refuse, type Result } from '#shared/lib/result.ts';
import { density, ENGINE_VERSION, meltingRange } from '#shared/metallurgy/index.ts';
import type { AlloyFigures } from './alloy-figures.ts';

/** The supplier's measured range, for an alloy that the phase model does not hold. */
export interface MeasuredRange {
  readonly solidusC: number;
  readonly liquidusC: number;
  readonly densityGPerCm3: number;
  readonly source: string;
}

/** An alloy's figures, and why they are measured where they could not be computed. */
export interface FiguresOfComposition {
  readonly figures: AlloyFigures;
  /** Empty when the figures are computed. */
  readonly outsideModel: string;
}

const measuredFigures = ({ source, ...range }: MeasuredRange): AlloyFigures => ({
  ...range,
  asCastSolidusC: null,
  solvusC: null,
  basis: 'measured',
  source,
  engineVersion: null,
});

/**
 * Figures of a composition in wt%: computed by phase equilibrium where the model holds it, else the supplier's measured
 * range; refused with the model's reason when there is neither.
 */
export const figuresOfComposition = (
  compositionWt: Readonly<Record<string, number>>,
  measured: MeasuredRange | null,
): Result<FiguresOfComposition> => {
  const range = meltingRange(compositionWt);
  const mass = density(compositionWt);
  if (range.withinModel && mass.withinModel) {
    const { liquidusC, solidusC, asCastSolidusC, solvusC } = range;
    return ok({
      figures: {
        liquidusC,
        solidusC,
        asCastSolidusC,
        solvusC,
        densityGPerCm3: mass.gPerCm3,
        basis: 'computed',
        source: `Phase equilibrium by least Gibbs energy, engine ${ENGINE_VERSION}; density by additive volumes.`,
        engineVersion: ENGINE_VERSION,
      },
      outsideModel: '',
    });
  }
  const reason = !range.withinModel ? range.reason : mass.withinModel ? '' : mass.reason;
  return measured ? ok({ figures: measuredFigures(measured), outsideModel: reason }) : refuse(reason);
};

/** How far a recomputed temperature may lie from a frozen one before the revision must be approved anew, °C. */
const driftLimitC = 2;

const comparable = [
  ['liquidusC', 'Liquidus'],
  ['solidusC', 'Solidus'],
  ['asCastSolidusC', 'As-cast limit'],
] as const;

/** What today's engine makes of frozen figures where it differs by more than 2 °C, one sentence each. */
export const driftOfFigures = (
  compositionWt: Readonly<Record<string, number>>,
  frozen: AlloyFigures,
): readonly string[] => {
  if (frozen.basis !== 'computed' || frozen.engineVersion === ENGINE_VERSION) return [];
  const now = meltingRange(compositionWt);
  if (!now.withinModel) return [`Engine ${ENGINE_VERSION} no longer computes this alloy: ${now.reason}`];
  return comparable.flatMap(([key, name]) => {
    const [before, after] = [frozen[key], now[key]];
    if (before === after || (before !== null && after !== null && Math.abs(after - before) <= driftLimitC))
      return [];
    const words = (value: number | null): string => (value === null ? 'none' : `${value.toFixed(1)} °C`);
    return [`${name}: ${words(before)} when approved, ${words(after)} with engine ${ENGINE_VERSION}.`];
  });
};
