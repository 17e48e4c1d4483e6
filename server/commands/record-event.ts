import { isDeepStrictEqual } from 'node:util';
import type { z } from 'zod';
import type { recordEventRequest } from '#shared/contracts/card.ts';
import type { CardEvent } from '#shared/domain/pour-card/card-event.ts';
import { judgeReading } from '#shared/domain/pour-card/judge-reading.ts';
import { AppError, notFound } from '../errors.ts';
import type { Melt } from '../models/melt.ts';
import type { MeltEvent } from '../models/melt-event.ts';
import type { AtTerminal } from '../policies/actor.ts';
import { meltPolicy } from '../policies/melt.ts';
import { can } from '../policies/policy.ts';
import type { Services } from '../services/services.ts';
import { appendEvent, keyUsed } from './append-event.ts';
import { lockRow } from './lock-row.ts';
import { refuseUnsigned } from './refuse-unsigned.ts';
import { tellOfStop } from './tell-of-stop.ts';
import { withCertificate } from './with-certificate.ts';

type RecordEvent = z.output<typeof recordEventRequest>;

/** Refuses what only a caster or the owner decides: to end a card, or to stand by a doubtful reading. */
const refuseUndecided = (actor: AtTerminal, melt: Melt, event: CardEvent): void => {
  const decides =
    event.type === 'abandoned' ||
    (event.type === 'reading-taken' && event.confirmed) ||
    (event.type === 'charge-closed' && event.offPlan === true);
  if (!decides || can(meltPolicy.decide, actor, melt)) return;
  throw new AppError('not-allowed', 'A caster or the owner has to decide this. Ask one to sign in here.');
};

/** Judges a reading as the terminal does, whatever the terminal did; returns it with `confirmed` only where it was needed. */
const judged = (melt: Melt, event: CardEvent): CardEvent => {
  if (event.type !== 'reading-taken') return event;
  const verdict = judgeReading(event.temperatureC, 'C', melt.context.figures, melt.context.limits);
  if (verdict.kind === 'refuse' || (verdict.kind === 'question' && !event.confirmed)) {
    throw new AppError('reading-questioned', verdict.sentence);
  }
  return { ...event, confirmed: verdict.kind === 'question' };
};

/** A certificate may be amended between two deliveries of one weighing: they are the same all the same. */
const withoutCertificate = (event: CardEvent): object =>
  'lot' in event && event.lot ? { ...event, lot: event.lot.id } : event;

/** An event that was delivered before: the one on record, refused when the key was used for something else. */
const alreadyRecorded = async (
  { models }: Services,
  melt: Melt,
  key: string,
  event: CardEvent,
): Promise<MeltEvent | null> => {
  const recorded = await models.MeltEvent.findOne({ where: { key } });
  if (!recorded) return null;
  const isSame = isDeepStrictEqual(withoutCertificate(recorded.event), withoutCertificate(event));
  if (recorded.meltId === melt.id && isSame) return recorded;
  throw keyUsed();
};

/** Locks a melt after its casting, in the order in which cards are opened, so that the two never wait for each other. */
const lockMelt = async ({ models }: Services, id: string): Promise<Melt> => {
  const melt = await models.Melt.findByPk(id);
  if (!melt) throw notFound('melt');
  await models.Casting.findByPk(melt.castingId, { lock: true });
  await lockRow(melt);
  return melt;
};

interface Recorded {
  readonly melt: Melt;
  readonly event: MeltEvent;
  /** False for an event that was delivered before. */
  readonly isNew: boolean;
}

const recordOnce = (
  services: Services,
  actor: AtTerminal,
  meltId: string,
  request: RecordEvent,
): Promise<Recorded> =>
  services.sequelize.transaction(async () => {
    const melt = await lockMelt(services, meltId);
    const reported = judged(melt, request.event);
    const recorded = await alreadyRecorded(services, melt, request.key, reported);
    if (recorded) return { melt, event: recorded, isNew: false };
    if (!can(meltPolicy.record, actor, melt)) {
      throw new AppError(
        'card-elsewhere',
        'This card went on at another terminal meanwhile. Scan the flask to see who has it.',
      );
    }
    refuseUndecided(actor, melt, reported);
    await refuseUnsigned(services, melt, reported);
    const certified = await withCertificate(services, reported);
    const event = await appendEvent(services, actor, melt, { ...request, event: certified });
    return { melt, event, isNew: true };
  });

/** Records one event of a card, exactly once however often it is delivered; the owners are told when it stops the work. */
export const recordEvent = async (
  services: Services,
  actor: AtTerminal,
  meltId: string,
  request: RecordEvent,
): Promise<MeltEvent> => {
  const { melt, event, isNew } = await recordOnce(services, actor, meltId, request);
  if (isNew && event.event.type === 'stopped') tellOfStop(services, actor, melt);
  return event;
};
