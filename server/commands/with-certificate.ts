import { chargeKindOf, type CardEvent } from '#shared/domain/pour-card/card-event.ts';
import { AppError, notFound } from '../errors.ts';
import type { Services } from '../services/services.ts';

/** A weighing with its lot as our own records have it, whatever the terminal knew; other events as they are. */
export const withCertificate = async ({ models }: Services, event: CardEvent): Promise<CardEvent> => {
  if (event.type !== 'charge-weighed' && event.type !== 'charge-taken-out') return event;
  if (!event.lot) return event;
  const lot = await models.Lot.findByPk(event.lot.id);
  if (!lot) throw notFound('lot');
  if (chargeKindOf(lot.kind) !== event.kind) {
    throw new AppError(
      'event-refused',
      `Lot ${lot.code} counts as ${chargeKindOf(lot.kind)}: weigh it in as that.`,
    );
  }
  const { id, code, kind, compositionWt, toleranceWt } = lot;
  return { ...event, lot: { id, code, kind, compositionWt, toleranceWt } };
};
