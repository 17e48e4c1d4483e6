import type { z } from 'zod';
import type { logFlaskRequest } from '#shared/contracts/flask-cooling.ts';
import { notFound } from '../errors.ts';
import type { InstrumentReading } from '../models/instrument-reading.ts';
import type { SignedIn } from '../policies/actor.ts';
import { knowThermometer } from '../queries/load-instrument.ts';
import { loadStudio } from '../queries/load-studio.ts';
import type { Services } from '../services/services.ts';
import { onceByKey } from './once-by-key.ts';

type LogFlask = z.output<typeof logFlaskRequest>;

/** Which flask it is and which of its times out of the furnace; a casting has one. */
const outingOf = async ({ models }: Services, { castingId, flaskId, outingId }: LogFlask) => {
  if (castingId !== undefined) {
    const casting = await models.Casting.findByPk(castingId);
    if (!casting) throw notFound('casting');
    return { flaskId: casting.flaskId, castingId, outingId: castingId };
  }
  const flask = flaskId === undefined ? null : await models.Flask.findByPk(flaskId);
  if (!flask || outingId === undefined) throw notFound('flask');
  return { flaskId: flask.id, castingId: null, outingId };
};

/** Logs how warm a flask's mould is so many seconds out of the furnace, exactly once however often it is delivered. */
export const logFlask = async (
  services: Services,
  { person, terminal }: SignedIn,
  request: LogFlask,
): Promise<void> => {
  const { models, now } = services;
  const { key, readings } = request;
  const outing = await outingOf(services, request);
  const studio = await loadStudio(services);
  const instrumentId = request.instrumentId ?? null;
  const { offsetC } = await knowThermometer(services, instrumentId);
  const find = async (): Promise<InstrumentReading[] | null> => {
    const found = await models.InstrumentReading.findAll({ where: { key }, order: [['place', 'ASC']] });
    return found.length === 0 ? null : found;
  };
  await onceByKey(services, {
    find,
    isSame: (recorded) =>
      recorded.length === readings.length &&
      recorded.every(
        ({ outingId, secondsOut, rawC }, place) =>
          outingId === outing.outingId &&
          secondsOut === readings[place]?.secondsOut &&
          rawC === readings[place]?.temperatureC,
      ),
    write: () =>
      models.InstrumentReading.bulkCreate(
        readings.map(({ secondsOut, temperatureC }, place) => ({
          key,
          place,
          instrumentId,
          terminalId: terminal?.id ?? null,
          userId: person.id,
          rawC: temperatureC,
          offsetC,
          ...outing,
          secondsOut,
          roomC: request.roomC ?? studio.processTables.roomC,
          takenAt: now(),
          recordedAt: now(),
        })),
      ),
  });
};
