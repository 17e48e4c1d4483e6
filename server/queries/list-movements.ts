import { Op, type WhereOptions } from 'sequelize';
import type { z } from 'zod';
import type { listMovementsQuery } from '#shared/contracts/ledger.ts';
import { notFound } from '../errors.ts';
import type { Lot } from '../models/lot.ts';
import type { Melt } from '../models/melt.ts';
import type { MetalMovement } from '../models/metal-movement.ts';
import type { Models } from '../models/index.ts';
import type { Terminal } from '../models/terminal.ts';
import type { User } from '../models/user.ts';
import type { Services } from '../services/services.ts';

/** A movement with all that its line names. */
export type LoadedMovement = MetalMovement & {
  readonly user: User;
  readonly countersigner: User | null;
  readonly terminal: Terminal | null;
  readonly lot: Lot | null;
  readonly melt: Melt | null;
};

const movementIncludes = ({ User, Terminal, Lot, Melt }: Models) => [
  { model: User, as: 'user' },
  { model: User, as: 'countersigner' },
  { model: Terminal, as: 'terminal' },
  { model: Lot, as: 'lot' },
  { model: Melt, as: 'melt', attributes: ['id', 'code'] },
];

const whereOf = (query: z.output<typeof listMovementsQuery>): WhereOptions<MetalMovement> => {
  const { lotId, meltId, kind, place, before } = query;
  const filters: WhereOptions<MetalMovement>[] = [];
  if (lotId !== undefined) filters.push({ lotId });
  if (meltId !== undefined) filters.push({ meltId });
  if (kind !== undefined) filters.push({ kind });
  if (place !== undefined) filters.push({ [Op.or]: [{ fromPlace: place }, { toPlace: place }] });
  if (before !== undefined) filters.push({ id: { [Op.lt]: before } });
  return { [Op.and]: filters };
};

/** A page of movements, newest first, and the id the next page begins before. */
export const listMovements = async (
  { models }: Services,
  query: z.output<typeof listMovementsQuery>,
): Promise<{ readonly movements: LoadedMovement[]; readonly next: string | null }> => {
  const found = (await models.MetalMovement.findAll({
    where: whereOf(query),
    include: movementIncludes(models),
    order: [['id', 'DESC']],
    limit: query.limit + 1,
  })) as LoadedMovement[];
  const movements = found.slice(0, query.limit);
  return { movements, next: found.length > query.limit ? (movements.at(-1)?.id ?? null) : null };
};

/** One movement with all that its line names. */
export const loadMovement = async ({ models }: Services, id: string): Promise<LoadedMovement> => {
  const movement = await models.MetalMovement.findByPk(id, { include: movementIncludes(models) });
  if (!movement) throw notFound('movement');
  return movement as LoadedMovement;
};
