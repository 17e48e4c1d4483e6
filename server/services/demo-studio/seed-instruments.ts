import { randomUUID } from 'node:crypto';
import { playMelt } from '#shared/domain/instrument/play-melt.ts';
import { meltingRange } from '#shared/metallurgy/index.ts';
import { createInstrument } from '../../commands/create-instrument.ts';
import { logFlask } from '../../commands/log-flask.ts';
import { pushReadings } from '../../commands/push-readings.ts';
import { recordCheck } from '../../commands/record-check.ts';
import { recordCurve } from '../../commands/record-curve.ts';
import type { Instrument } from '../../models/instrument.ts';
import type { SignedIn } from '../../policies/actor.ts';
import type { Services } from '../services.ts';
import type { SeededRecords } from './seed-records.ts';

const dayMs = 24 * 60 * 60 * 1000;

/** The services as they were so many days ago. */
const daysAgo = (services: Services, days: number): Services => {
  const then = services.now().getTime() - days * dayMs;
  return { ...services, now: () => new Date(then) };
};

/** How the studio's flasks of one size were seen to cool in a few trials: diameter, rate per second, how often. */
const trials = [
  { diameterMm: 102, perSecond: 0.00101, times: 4 },
  { diameterMm: 64, perSecond: 0.00131, times: 1 },
] as const;

/** What a thermocouple in a mould makes of it, °C: small, uneven, and the same each time. */
const unevenC = [1.2, -0.8, 0.3, -1.6, 0.9, -0.2, 1.4];
/** The workshop that day, °C. */
const roomC = 22;
const secondsOut = [15, 40, 70, 110, 160, 220];

const seedTrials = async (services: Services, actor: SignedIn, lance: Instrument): Promise<void> => {
  for (const { diameterMm, perSecond, times } of trials) {
    const flask = await services.models.Flask.findOne({ where: { diameterMm }, rejectOnEmpty: true });
    for (let time = 0; time < times; time++) {
      const startC = 480 + 25 * time;
      const readings = secondsOut.map((seconds, k) => {
        // In one trial the thermocouple slipped out of the mould for a moment.
        const slipped = time === 2 && k === 3 ? -55 : 0;
        const temperatureC = roomC + (startC - roomC) * Math.exp(-perSecond * seconds);
        const uneven = unevenC[(k + 2 * time) % unevenC.length] ?? 0;
        return { secondsOut: seconds, temperatureC: Math.round(10 * (temperatureC + uneven + slipped)) / 10 };
      });
      await logFlask(daysAgo(services, 9 - time), actor, {
        key: randomUUID(),
        flaskId: flask.id,
        outingId: randomUUID(),
        instrumentId: lance.id,
        roomC,
        readings,
      });
    }
  }
};

const sterling = { Ag: 92.5, Cu: 7.5 };

/** What the lance's check finds, °C. */
const lanceOffsetC = 2.6;

/** Into the pot of the misrun melt went sterling: its cooling curve says so. */
const seedCurve = async (services: Services, actor: SignedIn, lance: Instrument): Promise<void> => {
  const { models } = services;
  const melt = await models.Melt.findOne({
    include: [
      {
        model: models.AlloyRevision,
        as: 'alloyRevision',
        required: true,
        include: [{ model: models.Alloy, as: 'alloy', where: { family: 'silver' }, required: true }],
      },
    ],
    order: [['number', 'DESC']],
    rejectOnEmpty: true,
  });
  const range = meltingRange(sterling);
  if (!range.withinModel) throw new Error(range.reason);
  const points = playMelt(
    {
      composition: sterling,
      superheatC: 80,
      holdS: 40,
      heatingRate: 8,
      coolingRate: 0.9,
      noiseC: 0.5,
      seed: 7,
    },
    { liquidusC: range.liquidusC, endC: range.asCastSolidusC ?? range.solidusC },
  );
  await recordCurve(services, actor, melt.id, {
    key: randomUUID(),
    instrumentId: lance.id,
    // The lance reads low by what its check found.
    points: (points ?? []).map((point) => ({ ...point, temperatureC: point.temperatureC - lanceOffsetC })),
    note: 'Logged while the button cooled in the crucible.',
  });
};

/** Gives the demo studio its instruments with checks and readings, trials of how flasks cool, and a cooling curve. */
export const seedInstruments = async (services: Services, { people }: SeededRecords): Promise<void> => {
  const owner = people.get('maren');
  if (!owner) throw new Error('The demo studio has no owner.');
  const actor: SignedIn = { person: owner, terminal: null, via: 'desk' };
  const begun = daysAgo(services, 60);
  const enter = (name: string, request: Pick<Instrument, 'kind' | 'thermocouple'>) =>
    createInstrument(begun, actor, { name, ...request, terminalId: null });
  const { instrument: lance } = await enter('Dip lance', { kind: 'thermometer', thermocouple: 'K' });
  const { instrument: sight } = await enter('Sight pyrometer', { kind: 'pyrometer', thermocouple: null });
  await enter('Charge balance', { kind: 'balance', thermocouple: null });
  const check = { point: 'silver', wanderC: 0.6, note: '' } as const;
  await recordCheck(daysAgo(services, 12), actor, lance, { ...check, key: randomUUID(), readC: 959.2 });
  await recordCheck(daysAgo(services, 41), actor, sight, {
    ...check,
    key: randomUUID(),
    readC: 966.1,
    note: 'Fine silver under graphite.',
  });
  const lanceActor = {
    person: null,
    terminal: null,
    instrument: { id: lance.id, name: lance.name },
    via: null,
  };
  await pushReadings(services, lanceActor, {
    key: randomUUID(),
    readings: [{ temperatureC: 981.4, sequence: 1 }],
  });
  await seedTrials(services, actor, lance);
  await seedCurve(services, actor, lance);
};
