import { DatabaseError, UniqueConstraintError } from 'sequelize';
import type { Contents } from '#shared/domain/metal/contents.ts';
import { fromMilligrams, type MetalPlace, type MovementKind } from '#shared/domain/metal/ledger.ts';
import { AppError } from '../errors.ts';
import type { Lot } from '../models/lot.ts';
import type { MetalMovement } from '../models/metal-movement.ts';
import type { Services } from '../services/services.ts';

/** A movement to be written. */
export interface NewMovement {
  readonly key: string;
  readonly kind: MovementKind;
  readonly from: MetalPlace;
  readonly to: MetalPlace;
  readonly massMg: number;
  readonly contentsMg: Contents;
  /** The lot it concerns, with its row locked. */
  readonly lot?: Lot | undefined;
  readonly meltId?: string | null;
  readonly reason?: string;
  readonly correctsId?: string;
  readonly userId: string;
  readonly terminalId?: string | null;
  readonly countersignedBy?: string | null;
  readonly occurredAt: Date;
}

const refusalOf = (error: unknown, lot: Lot | undefined): AppError | null => {
  if (error instanceof UniqueConstraintError)
    return new AppError(
      'changed-meanwhile',
      'This was sent before, as another movement. Load the page again.',
    );
  const { constraint } = error instanceof DatabaseError ? (error.parent as { constraint?: string }) : {};
  switch (constraint) {
    case 'lots_balance_not_negative':
      return notEnough(lot);
    case 'crucibles_balance_not_negative':
      return new AppError('not-enough-metal', 'There is not that much metal in the crucible.');
    default:
      return null;
  }
};

/** The error for taking more of a lot than it holds. */
export const notEnough = (lot: Lot | undefined): AppError =>
  new AppError(
    'not-enough-metal',
    lot
      ? `Lot ${lot.code} holds only ${fromMilligrams(lot.balanceMg).toFixed(3)} g by the ledger. Weigh again, or count the lot at the desk.`
      : 'There is not that much metal there.',
  );

/** Writes one movement; the database moves the balances with it and refuses one that would fall below nought. */
export const writeMovement = async (
  { models, now }: Services,
  { from, to, lot, meltId = null, reason = '', correctsId, ...movement }: NewMovement,
): Promise<MetalMovement> => {
  try {
    return await models.MetalMovement.create({
      ...movement,
      fromPlace: from,
      toPlace: to,
      lotId: lot?.id ?? null,
      meltId,
      reason,
      correctsId: correctsId ?? null,
      recordedAt: now(),
    });
  } catch (error) {
    throw refusalOf(error, lot) ?? error;
  }
};
