import { literal } from 'sequelize';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import type { CardEvent } from '#shared/domain/pour-card/card-event.ts';
import { AppError } from '../errors.ts';
import type { Melt } from '../models/melt.ts';
import type { Services } from '../services/services.ts';

const signOf = (event: CardEvent): Countersigned | null => {
  if (event.type === 'variance-explained') return event.by;
  return event.type === 'step-done' && event.answer.kind === 'countersign' ? event.answer.by : null;
};

const signAgain = (): AppError =>
  new AppError('event-refused', 'The second person’s sign is not on record. Ask them to sign again.');

/** A sign counts once: an event that carries it already has used it up. */
const isUsed = async ({ models, sequelize }: Services, id: string): Promise<boolean> => {
  const quoted = sequelize.escape(id);
  const where = literal(`(event #>> '{by,id}' = ${quoted} or event #>> '{answer,by,id}' = ${quoted})`);
  return (await models.MeltEvent.count({ where })) > 0;
};

const maySign = async ({ models }: Services, { personId, name }: Countersigned): Promise<boolean> => {
  const user = await models.User.findByPk(personId);
  return (
    user !== null && user.name === name && user.roles.some((role) => role === 'owner' || role === 'caster')
  );
};

/**
 * Refuses an event whose countersign is not what it says: given on this melt, by that person, and not used before. One that
 * a terminal took without the server is believed of a person who may sign; the book marks it as such.
 */
export const refuseUnsigned = async (services: Services, melt: Melt, event: CardEvent): Promise<void> => {
  const sign = signOf(event);
  if (!sign) return;
  if (!(await maySign(services, sign)) || (await isUsed(services, sign.id))) throw signAgain();
  if (sign.onDevice) return;
  const given = await services.models.Countersign.findByPk(sign.id);
  if (given?.meltId !== melt.id || given.personId !== sign.personId) throw signAgain();
};
