import { QueryTypes } from 'sequelize';
import type { z } from 'zod';
import type { receiveLotRequest } from '#shared/contracts/lot.ts';
import { contentsOf } from '#shared/domain/metal/contents.ts';
import { faultOfAssay, questionsOfLot } from '#shared/domain/metal/judge-lot.ts';
import { storeOf, toMilligrams } from '#shared/domain/metal/ledger.ts';
import { buildCode } from '#shared/lib/codes.ts';
import { AppError, fieldError } from '../errors.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import type { Lot } from '../models/lot.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { writeMovement } from './write-movement.ts';

type ReceiveLot = z.output<typeof receiveLotRequest>;

/** The next lot's number and code. */
export const nextLotCode = async ({
  sequelize,
}: Services): Promise<{ readonly number: number; readonly code: string }> => {
  const [row] = await sequelize.query<{ number: number }>(`select nextval('lot_numbers')::int as number`, {
    type: QueryTypes.SELECT,
  });
  if (!row) throw new Error('The sequence of lot numbers gave none.');
  return { number: row.number, code: buildCode('L', row.number) };
};

const loadAlloy = async ({ models }: Services, id: string | null): Promise<AlloyRevision | null> => {
  const revision = id === null ? null : await models.AlloyRevision.findByPk(id);
  if (id !== null && !revision) throw fieldError('alloyRevisionId', 'There is no such alloy revision.');
  return revision;
};

/** Refuses what cannot be a lot, and what looks odd until the person stands by it. */
const refuseOdd = (request: ReceiveLot, alloy: AlloyRevision | null, now: Date): void => {
  const fault = faultOfAssay(request.kind, request);
  if (fault) throw fieldError(fault.field, fault.message);
  if (Date.parse(request.receivedAt) > now.getTime() + 60_000)
    throw fieldError('receivedAt', 'That is in the future.');
  const questions = request.confirmed ? [] : questionsOfLot(request, alloy);
  if (questions.length === 0) return;
  throw new AppError('entry-questioned', questions.map(({ message }) => message).join(' '), {
    fields: questions.map(({ field, message }) => ({ path: field, message })),
  });
};

const receivedBefore = async ({ models }: Services, key: string): Promise<Lot | null> => {
  const movement = await models.MetalMovement.findOne({ where: { key } });
  if (!movement) return null;
  if (movement.kind !== 'received' || movement.lotId === null)
    throw new AppError(
      'changed-meanwhile',
      'This was sent before, as another movement. Load the page again.',
    );
  return models.Lot.findByPk(movement.lotId, { rejectOnEmpty: true });
};

/**
 * Takes a lot in: its label, and its metal as a movement from the supplier; a second delivery of one key takes in nothing.
 * Joins the caller's transaction.
 */
export const takeLotIn = async (
  services: Services,
  { person }: SignedIn,
  request: ReceiveLot,
): Promise<Lot> => {
  const before = await receivedBefore(services, request.key);
  if (before) return before;
  refuseOdd(request, await loadAlloy(services, request.alloyRevisionId), services.now());
  const massMg = toMilligrams(request.massG);
  if (massMg < 1) throw fieldError('massG', 'That is less than a milligram.');
  const lot = await services.models.Lot.create({
    ...(await nextLotCode(services)),
    name: request.name,
    kind: request.kind,
    alloyRevisionId: request.alloyRevisionId,
    meltId: null,
    compositionWt: request.compositionWt,
    toleranceWt: request.toleranceWt,
    supplier: request.supplier,
    supplierReference: request.supplierReference,
    place: request.place,
    receivedMg: massMg,
    receivedAt: new Date(request.receivedAt),
    receivedBy: person.id,
    createdAt: services.now(),
  });
  await writeMovement(services, {
    key: request.key,
    kind: 'received',
    from: 'supplier',
    to: storeOf(lot.kind),
    massMg,
    contentsMg: contentsOf(massMg, lot.compositionWt),
    lot,
    userId: person.id,
    occurredAt: lot.receivedAt,
  });
  if (request.quarantineReason !== '') {
    await services.models.LotAmendment.create({
      lotId: lot.id,
      kind: 'quarantined',
      reason: request.quarantineReason,
      userId: person.id,
      createdAt: services.now(),
    });
  }
  return lot.reload();
};

/** Takes a lot in. */
export const receiveLot = (services: Services, actor: SignedIn, request: ReceiveLot): Promise<Lot> =>
  services.sequelize.transaction(() => takeLotIn(services, actor, request));
