import { Op } from 'sequelize';
import { checkDue, type CheckDue } from '#shared/domain/instrument/pyrometer-check.ts';
import { readsTemperature } from '#shared/domain/instrument/instrument.ts';
import type { KnownThermometer } from '#shared/domain/instrument/thermometer-uncertainty.ts';
import { notFound } from '../errors.ts';
import type { InstrumentReading } from '../models/instrument-reading.ts';
import type { Instrument } from '../models/instrument.ts';
import type { PyrometerCheck } from '../models/pyrometer-check.ts';
import type { Terminal } from '../models/terminal.ts';
import type { User } from '../models/user.ts';
import type { Services } from '../services/services.ts';
import { loadStudio } from './load-studio.ts';

/** A check with who made it. */
export type LoadedCheck = PyrometerCheck & { readonly user: User };

/** An instrument with its last reading and check, and when the next check is due. */
export interface LoadedInstrument {
  readonly instrument: Instrument & { readonly terminal: Terminal | null };
  readonly lastReading: InstrumentReading | null;
  readonly lastCheck: LoadedCheck | null;
  /** Null for what is not checked against freezing points. */
  readonly due: CheckDue | null;
}

/** One instrument. */
export const loadInstrument = async ({ models }: Services, id: string): Promise<Instrument> => {
  const instrument = await models.Instrument.findByPk(id);
  if (!instrument) throw notFound('instrument');
  return instrument;
};

/** The last reading an instrument sent, or null before the first. */
export const loadLatestReading = (
  { models }: Services,
  instrumentId: string,
): Promise<InstrumentReading | null> =>
  models.InstrumentReading.findOne({
    where: { instrumentId, flaskId: null },
    order: [
      ['takenAt', 'DESC'],
      ['id', 'DESC'],
    ],
  });

/** The check that held at a moment: the last made until then, or null. */
export const loadCheckAt = async (
  { models }: Services,
  instrumentId: string,
  at: Date,
): Promise<LoadedCheck | null> => {
  const check = await models.PyrometerCheck.findOne({
    where: { instrumentId, checkedAt: { [Op.lte]: at } },
    include: [{ model: models.User, as: 'user' }],
    order: [
      ['checkedAt', 'DESC'],
      ['id', 'DESC'],
    ],
  });
  return check as LoadedCheck | null;
};

/** Every check of an instrument, newest first. */
export const listChecks = async ({ models }: Services, instrumentId: string): Promise<LoadedCheck[]> => {
  const checks = await models.PyrometerCheck.findAll({
    where: { instrumentId },
    include: [{ model: models.User, as: 'user' }],
    order: [
      ['checkedAt', 'DESC'],
      ['id', 'DESC'],
    ],
  });
  return checks as LoadedCheck[];
};

const surround = async (services: Services, instrument: Instrument): Promise<LoadedInstrument> => {
  const now = services.now();
  const [studio, lastReading, lastCheck] = await Promise.all([
    loadStudio(services),
    loadLatestReading(services, instrument.id),
    loadCheckAt(services, instrument.id, now),
  ]);
  const checkedAt = lastCheck?.checkedAt.toISOString() ?? null;
  return {
    instrument: instrument as LoadedInstrument['instrument'],
    lastReading,
    lastCheck,
    due: readsTemperature(instrument.kind) ? checkDue(checkedAt, studio.pyrometerCheckDays, now) : null,
  };
};

/** One instrument with its last reading and check. */
export const loadInstrumentWithState = async (services: Services, id: string): Promise<LoadedInstrument> => {
  const { models } = services;
  const instrument = await models.Instrument.findByPk(id, {
    include: [{ model: models.Terminal, as: 'terminal' }],
  });
  if (!instrument) throw notFound('instrument');
  return surround(services, instrument);
};

/** Every instrument, those in use first. */
export const listInstruments = async (services: Services): Promise<LoadedInstrument[]> => {
  const { models } = services;
  const instruments = await models.Instrument.findAll({
    include: [{ model: models.Terminal, as: 'terminal' }],
    order: [
      ['active', 'DESC'],
      ['name', 'ASC'],
    ],
  });
  return Promise.all(instruments.map((instrument) => surround(services, instrument)));
};

/** What is known of how true an instrument reads now; null where none is named. */
export const knowThermometer = async (
  services: Services,
  instrumentId: string | null,
): Promise<{ readonly known: KnownThermometer | null; readonly offsetC: number }> => {
  if (instrumentId === null) return { known: null, offsetC: 0 };
  const { instrument, lastCheck, due } = await loadInstrumentWithState(services, instrumentId);
  const check = lastCheck && due ? { uncertaintyC: lastCheck.uncertaintyC, state: due.state } : null;
  return {
    known: { thermocouple: instrument.thermocouple, check },
    offsetC: lastCheck?.offsetC ?? 0,
  };
};
