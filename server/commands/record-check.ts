import type { z } from 'zod';
import type { recordCheckRequest } from '#shared/contracts/instrument.ts';
import { judgePlateau } from '#shared/domain/instrument/pyrometer-check.ts';
import { fieldError } from '../errors.ts';
import type { Instrument } from '../models/instrument.ts';
import type { PyrometerCheck } from '../models/pyrometer-check.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { occurredBetween } from './occurred-between.ts';
import { onceByKey } from './once-by-key.ts';

/** Records a check of an instrument at a freezing point, with the offset that follows from it; an absurd one is refused. */
export const recordCheck = async (
  services: Services,
  { person, terminal }: SignedIn,
  instrument: Instrument,
  { key, point, readC, wanderC, note, checkedAt }: z.output<typeof recordCheckRequest>,
): Promise<PyrometerCheck> => {
  const { models, now } = services;
  const finding = judgePlateau({ point, readC, wanderC });
  if (!finding.ok) throw fieldError('readC', finding.error);
  const { offsetC, uncertaintyC } = finding.value;
  const { recorded } = await onceByKey(services, {
    find: () => models.PyrometerCheck.findOne({ where: { key } }),
    isSame: (check) =>
      check.instrumentId === instrument.id &&
      check.fixedPoint === point &&
      check.readC === readC &&
      check.wanderC === wanderC,
    write: () =>
      models.PyrometerCheck.create({
        key,
        instrumentId: instrument.id,
        fixedPoint: point,
        readC,
        wanderC,
        offsetC,
        uncertaintyC,
        note,
        userId: person.id,
        terminalId: terminal?.id ?? null,
        checkedAt: occurredBetween(checkedAt ?? now().toISOString(), null, now()),
        recordedAt: now(),
      }),
  });
  return recorded;
};
