import { randomUUID } from 'node:crypto';
import type { z } from 'zod';
import type { correctMovementRequest } from '#shared/contracts/ledger.ts';
import { addContents, contentsOf, partsOfContents, type Contents } from '#shared/domain/metal/contents.ts';
import { isStore, toMilligrams } from '#shared/domain/metal/ledger.ts';
import { AppError, fieldError, notFound } from '../errors.ts';
import type { MetalMovement } from '../models/metal-movement.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { lockLot } from './lock-lot.ts';
import { verifyCountersign } from './verify-countersign.ts';
import { writeMovement, type NewMovement } from './write-movement.ts';

type CorrectMovement = z.output<typeof correctMovementRequest>;

/** What a movement comes to after the corrections made so far. */
const correctedSoFar = async (
  { models }: Services,
  movement: MetalMovement,
): Promise<{ readonly massMg: number; readonly contentsMg: Contents }> => {
  const places = [movement.fromPlace, movement.toPlace];
  const corrections = (await models.MetalMovement.findAll({ where: { correctsId: movement.id } })).filter(
    ({ fromPlace, toPlace }) => places.includes(fromPlace) && places.includes(toPlace),
  );
  const sign = (correction: MetalMovement): 1 | -1 => (correction.fromPlace === movement.fromPlace ? 1 : -1);
  return {
    massMg: corrections.reduce((sum, each) => sum + sign(each) * each.massMg, movement.massMg),
    contentsMg: corrections.reduce(
      (sum, each) => addContents(sum, each.contentsMg, sign(each)),
      movement.contentsMg,
    ),
  };
};

/** A card that is still open is put right at its terminal, where the caster sees the crucible. */
const refuseWhileCardRuns = async ({ models }: Services, meltId: string | null): Promise<void> => {
  const melt = meltId === null ? null : await models.Melt.findByPk(meltId, { lock: true });
  if (!melt || melt.overAt !== null) return;
  throw new AppError(
    'wrong-state',
    `The card of ${melt.code} is open: take the metal out or weigh more in there.`,
  );
};

type Way = Pick<NewMovement, 'from' | 'to'>;

/**
 * What left the crucible of a melt that is closed out was worked out from what went in: when that changes, the castings,
 * which were never weighed, change with it. Null where nothing else changes.
 */
const balancingWay = async (
  { models }: Services,
  { meltId }: MetalMovement,
  way: Way,
): Promise<Way | null> => {
  const crucible = meltId === null ? null : await models.Crucible.findByPk(meltId);
  if (!crucible || crucible.balanceMg > 0) return null;
  return way.to === 'crucible' ? { from: 'crucible', to: 'castings' } : { from: 'castings', to: 'crucible' };
};

const write = async (
  services: Services,
  movement: MetalMovement,
  { key, rightMassG, reason }: CorrectMovement,
  people: { readonly userId: string; readonly countersignedBy: string },
): Promise<void> => {
  await refuseWhileCardRuns(services, movement.meltId);
  const lot = movement.lotId === null ? undefined : await lockLot(services, movement.lotId);
  const before = await correctedSoFar(services, movement);
  const change = toMilligrams(rightMassG) - before.massMg;
  if (change === 0) throw fieldError('rightMassG', 'That is what the ledger says already.');
  const massMg = Math.abs(change);
  const isUndone = change < 0;
  const all = isUndone && massMg === before.massMg;
  const way = isUndone
    ? { from: movement.toPlace, to: movement.fromPlace }
    : { from: movement.fromPlace, to: movement.toPlace };
  const common = {
    kind: 'corrected' as const,
    massMg,
    contentsMg: all ? before.contentsMg : contentsOf(massMg, partsOfContents(movement.contentsMg)),
    meltId: movement.meltId,
    reason,
    correctsId: movement.id,
    ...people,
    occurredAt: services.now(),
  };
  const balance = await balancingWay(services, movement, way);
  const own = { ...common, ...way, key, lot: isStore(way.from) || isStore(way.to) ? lot : undefined };
  const other = balance ? [{ ...common, ...balance, key: randomUUID() }] : [];
  // The crucible must never seem to hold less than nothing in between.
  const inOrder = balance?.to === 'crucible' ? [...other, own] : [own, ...other];
  for (const next of inOrder) await writeMovement(services, next);
};

/** Corrects a movement to what it should have been, by a counter-movement that two people sign. */
export const correctMovement = async (
  services: Services,
  actor: SignedIn,
  id: string,
  request: CorrectMovement,
): Promise<void> => {
  const signer = await verifyCountersign(services, actor, request.countersign);
  const people = { userId: actor.person.id, countersignedBy: signer.id };
  await services.sequelize.transaction(async () => {
    if (await services.models.MetalMovement.findOne({ where: { key: request.key, correctsId: id } })) return;
    const movement = await services.models.MetalMovement.findByPk(id);
    if (!movement) throw notFound('movement');
    await write(services, movement, request, people);
  });
};
