import type { PushReadingsRequest } from '#shared/contracts/instrument-reading.ts';
import { readsTemperature } from '#shared/domain/instrument/instrument.ts';
import { thermocouples } from '#shared/domain/instrument/thermocouple.ts';
import { AppError, fieldError, notFound } from '../errors.ts';
import type { InstrumentReading } from '../models/instrument-reading.ts';
import type { Instrument } from '../models/instrument.ts';
import type { Actor } from '../policies/actor.ts';
import { loadCheckAt } from '../queries/load-instrument.ts';
import type { Services } from '../services/services.ts';
import { occurredBetween } from './occurred-between.ts';
import { onceByKey } from './once-by-key.ts';

type Sent = PushReadingsRequest['readings'][number];

/** The instrument a delivery is of: the token's own, or the one a terminal names. */
const instrumentFor = async (
  { models }: Services,
  { instrument }: Actor,
  named: string | undefined,
): Promise<Instrument> => {
  if (instrument && named !== undefined && named !== instrument.id)
    throw fieldError('instrumentId', `This token is ${instrument.name}’s; leave the instrument out.`);
  const id = instrument?.id ?? named;
  if (id === undefined) throw fieldError('instrumentId', 'With a terminal’s token, name the instrument.');
  const found = await models.Instrument.findByPk(id);
  if (!found) throw notFound('instrument');
  if (!found.active)
    throw new AppError('reading-refused', `${found.name} was ended at the desk; its readings are not taken.`);
  if (!readsTemperature(found.kind))
    throw new AppError(
      'reading-refused',
      `${found.name} is a balance: masses are weighed in at the terminal.`,
    );
  return found;
};

/** Refuses what the instrument's own thermocouple cannot have read. */
const refuseOutOfRange = ({ thermocouple }: Instrument, readings: readonly Sent[]): void => {
  if (thermocouple === null) return;
  const { lowestC, highestC } = thermocouples[thermocouple];
  const place = readings.findIndex(
    ({ temperatureC }) => temperatureC !== undefined && (temperatureC < lowestC || temperatureC > highestC),
  );
  if (place < 0) return;
  throw fieldError(
    `readings.${place}.temperatureC`,
    `A thermocouple of type ${thermocouple} reads from ${lowestC} to ${highestC} °C. Send a fault instead.`,
  );
};

const isSameAs =
  (instrument: Instrument, readings: readonly Sent[]) =>
  (recorded: readonly InstrumentReading[]): boolean =>
    recorded.length === readings.length &&
    recorded.every(
      ({ instrumentId, rawC, fault }, place) =>
        instrumentId === instrument.id &&
        rawC === (readings[place]?.temperatureC ?? null) &&
        fault === (readings[place]?.fault ?? null),
    );

/** What became of a delivery. */
export interface Pushed {
  readonly instrument: Instrument;
  readonly readings: readonly InstrumentReading[];
  readonly again: boolean;
}

/** Records what a logger sends, exactly once however often it is delivered; each reading with the offset that held then. */
export const pushReadings = async (
  services: Services,
  actor: Actor,
  { key, instrumentId: named, readings }: PushReadingsRequest,
): Promise<Pushed> => {
  const { models, now } = services;
  const instrument = await instrumentFor(services, actor, named);
  refuseOutOfRange(instrument, readings);
  const times = readings.map(({ takenAt }) => occurredBetween(takenAt ?? now().toISOString(), null, now()));
  const find = async (): Promise<InstrumentReading[] | null> => {
    const found = await models.InstrumentReading.findAll({ where: { key }, order: [['place', 'ASC']] });
    return found.length === 0 ? null : found;
  };
  const write = async (): Promise<InstrumentReading[]> => {
    const check = await loadCheckAt(services, instrument.id, now());
    return models.InstrumentReading.bulkCreate(
      readings.map(({ temperatureC, fault, sequence }, place) => ({
        key,
        place,
        instrumentId: instrument.id,
        terminalId: actor.terminal?.id ?? null,
        userId: actor.person?.id ?? null,
        rawC: temperatureC ?? null,
        fault: fault ?? null,
        offsetC: check?.offsetC ?? 0,
        sequence: sequence ?? null,
        takenAt: times[place] ?? now(),
        recordedAt: now(),
      })),
    );
  };
  const { recorded, again } = await onceByKey(services, {
    find,
    isSame: isSameAs(instrument, readings),
    write,
  });
  return { instrument, readings: recorded, again };
};
