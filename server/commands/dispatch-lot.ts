import { storeOf, toMilligrams } from '#shared/domain/metal/ledger.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { contentsTaken, lockLot } from './lock-lot.ts';
import { writeMovement } from './write-movement.ts';

/** Sends metal of a lot away to the refiner. */
export const dispatchLot = (
  services: Services,
  { person }: SignedIn,
  lotId: string,
  { key, massG, reason }: { readonly key: string; readonly massG: number; readonly reason: string },
): Promise<void> =>
  services.sequelize.transaction(async () => {
    if (await services.models.MetalMovement.findOne({ where: { key, lotId, kind: 'dispatched' } })) return;
    const lot = await lockLot(services, lotId);
    const massMg = toMilligrams(massG);
    await writeMovement(services, {
      key,
      kind: 'dispatched',
      from: storeOf(lot.kind),
      to: 'refiner',
      massMg,
      contentsMg: contentsTaken(lot, massMg),
      lot,
      reason,
      userId: person.id,
      occurredAt: services.now(),
    });
  });
