import { type CreationAttributes, UniqueConstraintError } from 'sequelize';
import type { CardEvent } from '#shared/domain/pour-card/card-event.ts';
import { applyEvent } from '#shared/domain/pour-card/apply-event.ts';
import { isOver, type CardState } from '#shared/domain/pour-card/card-state.ts';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';
import { AppError } from '../errors.ts';
import type { Melt } from '../models/melt.ts';
import type { MeltEvent } from '../models/melt-event.ts';
import type { AtTerminal } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { moveMetalAlong } from './move-metal-along.ts';
import { occurredBetween } from './occurred-between.ts';
import { writeCastingState } from './write-casting-state.ts';

/** The error for a delivery whose key already stands for another event. */
export const keyUsed = (): AppError =>
  new AppError('event-refused', 'This delivery carries the mark of another event. Scan the flask again.');

/** An event as it comes from a terminal. */
export interface ReportedEvent {
  readonly key: string;
  readonly occurredAt: string;
  readonly event: CardEvent;
}

/** Where an event takes the casting, with the reason to be written beside it. */
const castingStateAfter = (
  event: CardEvent,
  state: CardState,
): { readonly to: CastingState; readonly reason?: string } | null => {
  const held = state.step === 'done' && state.departures.find(({ explained }) => explained?.hold);
  if (held) return { to: 'held', reason: held.sentence };
  switch (event.type) {
    case 'poured':
      return { to: 'poured' };
    case 'quenched':
      return { to: 'quenched' };
    case 'abandoned':
      return { to: 'held', reason: event.note };
    default:
      return null;
  }
};

const moveCastingAlong = async (
  services: Services,
  actor: AtTerminal,
  melt: Melt,
  event: CardEvent,
): Promise<void> => {
  const move = castingStateAfter(event, melt.state);
  if (!move) return;
  const casting = await services.models.Casting.findByPk(melt.castingId, { lock: true });
  if (!casting) throw new Error(`Melt ${melt.code} has lost its casting.`);
  await writeCastingState(services, casting, move.to, { userId: actor.person.id, reason: move.reason });
};

const writeOnce = async ({ models }: Services, values: CreationAttributes<MeltEvent>): Promise<MeltEvent> => {
  try {
    return await models.MeltEvent.create(values);
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    throw keyUsed();
  }
};

/**
 * Writes one event at the end of a melt, with its reading and the state it leads to; refused when the card's own rules
 * refuse it. Joins the caller's transaction, which holds the melt's lock.
 */
export const appendEvent = async (
  services: Services,
  actor: AtTerminal,
  melt: Melt,
  { key, occurredAt: reported, event }: ReportedEvent,
): Promise<MeltEvent> => {
  const { models, now } = services;
  const last = await models.MeltEvent.findOne({ where: { meltId: melt.id }, order: [['seq', 'DESC']] });
  const occurredAt = occurredBetween(reported, last?.occurredAt ?? null, now());
  const applied = applyEvent(melt.state, { event, occurredAt: occurredAt.toISOString() }, melt.context);
  if (!applied.ok) throw new AppError('event-refused', applied.error);
  const recorded = await writeOnce(services, {
    meltId: melt.id,
    seq: (last?.seq ?? 0) + 1,
    key,
    event,
    userId: actor.person.id,
    terminalId: actor.terminal.id,
    occurredAt,
    recordedAt: now(),
  });
  if (event.type === 'reading-taken') {
    await models.Reading.create({
      meltId: melt.id,
      meltEventId: recorded.id,
      temperatureC: event.temperatureC,
      takenAt: occurredAt,
    });
  }
  await melt.update({ state: applied.value, overAt: isOver(applied.value) ? occurredAt : null });
  await moveMetalAlong(services, actor, melt, recorded);
  await moveCastingAlong(services, actor, melt, event);
  return recorded;
};
