import { addContents, contentsOf, type Contents } from '#shared/domain/metal/contents.ts';
import { notFound } from '../errors.ts';
import type { Lot } from '../models/lot.ts';
import type { Services } from '../services/services.ts';
import { notEnough } from './write-movement.ts';

/** Locks a lot's row until the transaction ends, so that what its metal holds can be shared out exactly. */
export const lockLot = async ({ models }: Services, id: string): Promise<Lot> => {
  const lot = await models.Lot.findByPk(id, { lock: true });
  if (!lot) throw notFound('lot');
  return lot;
};

/** What leaves a locked lot with `massMg`: all it holds less what the rest will hold, so that an empty lot holds nothing. */
export const contentsTaken = (lot: Lot, massMg: number): Contents => {
  const restMg = lot.balanceMg - massMg;
  if (restMg < 0) throw notEnough(lot);
  return addContents(lot.contentsMg, contentsOf(restMg, lot.compositionWt), -1);
};
