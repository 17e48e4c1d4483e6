import { isDeepStrictEqual } from 'node:util';
import type { z } from 'zod';
import type { recordCurveRequest } from '#shared/contracts/cooling-curve.ts';
import type { CurvePoint } from '#shared/domain/cooling-curve/curve-point.ts';
import { judgeCurve } from '#shared/domain/cooling-curve/judge-curve.ts';
import { readCurveTable } from '#shared/domain/cooling-curve/read-curve-table.ts';
import { thermometerUncertainty } from '#shared/domain/instrument/thermometer-uncertainty.ts';
import { fieldError, notFound } from '../errors.ts';
import type { CoolingCurve } from '../models/cooling-curve.ts';
import type { SignedIn } from '../policies/actor.ts';
import { knowThermometer } from '../queries/load-instrument.ts';
import { loadStudio } from '../queries/load-studio.ts';
import { parseTable } from '../services/parse-table.ts';
import type { Services } from '../services/services.ts';
import { onceByKey } from './once-by-key.ts';

type RecordCurve = z.output<typeof recordCurveRequest>;

const pointsOf = ({ points, table }: RecordCurve): readonly CurvePoint[] => {
  if (points) return points;
  const rows = parseTable(table ?? '');
  if (typeof rows === 'string') throw fieldError('table', rows);
  const read = readCurveTable(rows);
  if (!read.ok) throw fieldError('table', read.error);
  return read.value;
};

/** Keeps a melt's cooling curve as it was logged, with what is made of it today; exactly once by its key. */
export const recordCurve = async (
  services: Services,
  { person, terminal }: SignedIn,
  meltId: string,
  request: RecordCurve,
): Promise<CoolingCurve> => {
  const { models, now } = services;
  const melt = await models.Melt.findByPk(meltId, {
    include: [{ model: models.AlloyRevision, as: 'alloyRevision' }],
  });
  if (!melt?.alloyRevision) throw notFound('melt');
  const { compositionWt, toleranceWt, figures } = melt.alloyRevision;
  const points = pointsOf(request);
  const studio = await loadStudio(services);
  const { known, offsetC } = await knowThermometer(services, request.instrumentId);
  const thermometerC = thermometerUncertainty(known, figures.liquidusC);
  const verdict = judgeCurve({
    points: points.map(({ seconds, temperatureC }) => ({ seconds, temperatureC: temperatureC + offsetC })),
    compositionWt,
    toleranceWt,
    thermometerC,
    unit: studio.temperatureUnit,
  });
  const { recorded } = await onceByKey(services, {
    find: () => models.CoolingCurve.findOne({ where: { key: request.key } }),
    isSame: (curve) => curve.meltId === meltId && isDeepStrictEqual(curve.points, points),
    write: () =>
      models.CoolingCurve.create({
        key: request.key,
        meltId,
        instrumentId: request.instrumentId,
        source: request.table === undefined ? 'live' : 'table',
        points,
        offsetC,
        thermometerC,
        verdict,
        note: request.note,
        userId: person.id,
        terminalId: terminal?.id ?? null,
        recordedAt: now(),
      }),
  });
  return recorded;
};
