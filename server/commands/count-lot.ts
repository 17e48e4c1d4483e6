import type { z } from 'zod';
import type { countLotRequest } from '#shared/contracts/lot.ts';
import { contentsOf } from '#shared/domain/metal/contents.ts';
import { storeOf, toMilligrams } from '#shared/domain/metal/ledger.ts';
import { fieldError } from '../errors.ts';
import type { Lot } from '../models/lot.ts';
import type { User } from '../models/user.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { contentsTaken, lockLot } from './lock-lot.ts';
import { verifyCountersign } from './verify-countersign.ts';
import { writeMovement } from './write-movement.ts';

type CountLot = z.output<typeof countLotRequest>;

const explainDifference = async (
  services: Services,
  actor: SignedIn,
  lot: Lot,
  request: CountLot & { readonly signer: User | null },
): Promise<string> => {
  const { key, explanation, signer } = request;
  if (explanation === '')
    throw fieldError('explanation', 'The count and the ledger differ: say why, as far as you know.');
  if (!signer) throw fieldError('countersign', 'The count and the ledger differ: a second person must sign.');
  const change = toMilligrams(request.countedG) - lot.balanceMg;
  const store = storeOf(lot.kind);
  const massMg = Math.abs(change);
  const movement = await writeMovement(services, {
    key,
    kind: 'counted',
    ...(change < 0 ? { from: store, to: 'adjustment' } : { from: 'adjustment', to: store }),
    massMg,
    contentsMg: change < 0 ? contentsTaken(lot, massMg) : contentsOf(massMg, lot.compositionWt),
    lot,
    reason: explanation,
    userId: actor.person.id,
    countersignedBy: signer.id,
    occurredAt: services.now(),
  });
  return movement.id;
};

/** Writes down what a lot weighs on the balance; a difference from the ledger becomes a movement that two people sign. */
export const countLot = async (
  services: Services,
  actor: SignedIn,
  lotId: string,
  request: CountLot,
): Promise<void> => {
  const { models, sequelize, now } = services;
  const signer = request.countersign && (await verifyCountersign(services, actor, request.countersign));
  await sequelize.transaction(async () => {
    if (await models.MetalMovement.findOne({ where: { key: request.key, lotId, kind: 'counted' } })) return;
    const lot = await lockLot(services, lotId);
    const countedMg = toMilligrams(request.countedG);
    const isAsExpected = countedMg === lot.balanceMg;
    await models.StockCount.create({
      lotId,
      expectedMg: lot.balanceMg,
      countedMg,
      explanation: request.explanation,
      movementId: isAsExpected ? null : await explainDifference(services, actor, lot, { ...request, signer }),
      userId: actor.person.id,
      countedAt: now(),
    });
  });
};
