import type { CoolingCurve as CurveContract } from '#shared/contracts/cooling-curve.ts';
import type { CurvePoint } from '#shared/domain/cooling-curve/curve-point.ts';
import type { LoadedCurve } from '../queries/list-cooling-curves.ts';

/** More points than this no picture shows. */
const mostDrawn = 600;

const thinned = (points: readonly CurvePoint[], offsetC: number): readonly CurvePoint[] => {
  const every = Math.max(1, Math.ceil(points.length / mostDrawn));
  return points
    .filter((_, k) => k % every === 0 || k === points.length - 1)
    .map(({ seconds, temperatureC }) => ({ seconds, temperatureC: temperatureC + offsetC }));
};

/** A melt's cooling curve with what was made of it when it came. */
export const presentCoolingCurve = (curve: LoadedCurve): CurveContract => ({
  id: curve.id,
  source: curve.source,
  points: thinned(curve.points, curve.offsetC),
  pointCount: curve.points.length,
  offsetC: curve.offsetC,
  thermometerC: curve.thermometerC,
  verdict: curve.verdict,
  note: curve.note,
  instrument: curve.instrument?.name ?? null,
  person: curve.user.name,
  at: curve.recordedAt.toISOString(),
});
