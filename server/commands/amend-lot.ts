import type { z } from 'zod';
import type { amendLotRequest } from '#shared/contracts/lot.ts';
import { addContents, contentsOf } from '#shared/domain/metal/contents.ts';
import { faultOfAssay } from '#shared/domain/metal/judge-lot.ts';
import { AppError, fieldError } from '../errors.ts';
import type { SignedIn } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { lockLot } from './lock-lot.ts';

type AmendLot = z.output<typeof amendLotRequest>;

/** Amends a lot by its id: a new assay, a quarantine, another place; the database takes it over from the amendment. */
export const amendLot = (
  services: Services,
  { person }: SignedIn,
  lotId: string,
  request: AmendLot,
): Promise<void> =>
  services.sequelize.transaction(async () => {
    const lot = await lockLot(services, lotId);
    if (request.kind === 'quarantined' && lot.quarantineReason !== null)
      throw new AppError('wrong-state', `Lot ${lot.code} is in quarantine already.`);
    const common = { lotId, kind: request.kind, userId: person.id, createdAt: services.now() };
    if (request.kind !== 'assay') {
      await services.models.LotAmendment.create({
        ...common,
        reason: request.reason,
        place: request.kind === 'moved' ? request.place : null,
      });
      return;
    }
    const fault = faultOfAssay(lot.kind, request);
    if (fault) throw fieldError(fault.field, fault.message);
    const { compositionWt, toleranceWt, reason } = request;
    await services.models.LotAmendment.create({
      ...common,
      reason,
      compositionWt,
      toleranceWt,
      contentsChangeMg: addContents(contentsOf(lot.balanceMg, compositionWt), lot.contentsMg, -1),
    });
  });

/** Lets a lot out of quarantine. */
export const releaseLot = (
  services: Services,
  { person }: SignedIn,
  lotId: string,
  reason: string,
): Promise<void> =>
  services.sequelize.transaction(async () => {
    const lot = await lockLot(services, lotId);
    if (lot.quarantineReason === null)
      throw new AppError('changed-meanwhile', `Lot ${lot.code} is out of quarantine already.`);
    await services.models.LotAmendment.create({
      lotId,
      kind: 'released',
      reason,
      userId: person.id,
      createdAt: services.now(),
    });
  });
