import type {
  Instrument as InstrumentContract,
  InstrumentReading as ReadingContract,
  PyrometerCheck as CheckContract,
} from '#shared/contracts/instrument.ts';
import { correctReading, judgePlateau } from '#shared/domain/instrument/pyrometer-check.ts';
import type { InstrumentReading } from '../models/instrument-reading.ts';
import type { Actor } from '../policies/actor.ts';
import { instrumentPolicy } from '../policies/instrument.ts';
import { can } from '../policies/policy.ts';
import type { LoadedCheck, LoadedInstrument } from '../queries/load-instrument.ts';

/** A reading as it came and with its offset. */
export const presentReading = (
  { rawC, offsetC, fault, takenAt }: InstrumentReading,
  now: Date,
): ReadingContract => ({
  rawC,
  offsetC,
  temperatureC: rawC === null ? null : correctReading(rawC, offsetC).temperatureC,
  fault,
  takenAt: takenAt.toISOString(),
  ageS: Math.max(0, Math.round((now.getTime() - takenAt.getTime()) / 1000)),
});

/** A check with what it found, in words. */
export const presentCheck = (check: LoadedCheck): CheckContract => {
  const { fixedPoint: point, readC, wanderC } = check;
  const finding = judgePlateau({ point, readC, wanderC });
  return {
    id: check.id,
    point,
    readC,
    wanderC,
    offsetC: check.offsetC,
    uncertaintyC: check.uncertaintyC,
    sentence: finding.ok ? finding.value.sentence : finding.error,
    note: check.note,
    person: check.user.name,
    checkedAt: check.checkedAt.toISOString(),
  };
};

/** An instrument with its last reading and check. */
export const presentInstrument = (
  { instrument, lastReading, lastCheck, due }: LoadedInstrument,
  actor: Actor,
  now: Date,
): InstrumentContract => {
  const { terminal } = instrument;
  return {
    id: instrument.id,
    name: instrument.name,
    kind: instrument.kind,
    thermocouple: instrument.thermocouple,
    terminal: terminal && { id: terminal.id, name: terminal.name, bay: terminal.bay },
    active: instrument.active,
    createdAt: instrument.createdAt.toISOString(),
    revokedAt: instrument.revokedAt?.toISOString() ?? null,
    lastReading: lastReading && presentReading(lastReading, now),
    lastCheck: lastCheck && presentCheck(lastCheck),
    due,
    abilities: {
      revoke: can(instrumentPolicy.revoke, actor, instrument),
      check: can(instrumentPolicy.check, actor, instrument),
    },
  };
};
