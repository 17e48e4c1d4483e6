import type { CoolingCurve } from '#shared/contracts/cooling-curve.ts';
import { computeCooling } from '#shared/domain/cooling-curve/compute-cooling.ts';
import type { CurvePoint } from '#shared/domain/cooling-curve/curve-point.ts';

/** The curves are laid over one another so far above both liquidus temperatures, °C. */
const aboveC = 8;
const roomC = 25;

/** When a falling curve last passes a temperature, s; null where it does not. */
const passing = (points: readonly CurvePoint[], temperatureC: number): number | null => {
  const k = points.findIndex(
    (point, at) =>
      at > 0 && point.temperatureC <= temperatureC && (points[at - 1]?.temperatureC ?? 0) > temperatureC,
  );
  return points[k]?.seconds ?? null;
};

/**
 * The alloy's computed cooling curve, laid over a logged one where both are liquid and cooling as fast as that did; empty
 * where nothing was found on the logged curve, or the model does not hold the alloy.
 */
export const computedCurve = (
  { points, verdict: { observed, computed } }: Pick<CoolingCurve, 'points' | 'verdict'>,
  compositionWt: Readonly<Record<string, number>>,
): readonly CurvePoint[] => {
  if (!observed || !computed) return [];
  const highest = points.reduce((best, point) => (point.temperatureC > best.temperatureC ? point : best));
  const cooling = points.filter(({ seconds }) => seconds >= highest.seconds);
  const meetC = Math.min(Math.max(observed.liquidusC, computed.liquidusC) + aboveC, highest.temperatureC - 1);
  const curve = computeCooling(compositionWt, 'scheil', {
    startC: meetC + 20,
    untilC: Math.min(...cooling.map(({ temperatureC }) => temperatureC)),
    surroundingsC: roomC,
    ratePerSecond: observed.liquidRate,
    everyS: 2,
  });
  const [here, there] = [passing(cooling, meetC), curve && passing(curve, meetC)];
  if (!curve || here === null || there === null) return [];
  return curve.map(({ seconds, temperatureC }) => ({ seconds: seconds + here - there, temperatureC }));
};
