import { Op, QueryTypes, type Includeable, type WhereOptions } from 'sequelize';
import type { z } from 'zod';
import type { listLotsQuery } from '#shared/contracts/lot.ts';
import { parseLotCode, splitCode } from '#shared/lib/codes.ts';
import { AppError, notFound } from '../errors.ts';
import type { Alloy } from '../models/alloy.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import type { Models } from '../models/index.ts';
import type { Lot } from '../models/lot.ts';
import type { LotAmendment } from '../models/lot-amendment.ts';
import type { LotDocument } from '../models/lot-document.ts';
import type { Melt } from '../models/melt.ts';
import type { User } from '../models/user.ts';
import type { Services } from '../services/services.ts';

/** A lot with all that its line in the list names. */
export type LoadedLot = Lot & {
  readonly alloyRevision: (AlloyRevision & { readonly alloy: Alloy }) | null;
  readonly melt: Melt | null;
  readonly receiver: User;
};

/** A melt that a lot's metal went into, net of what was taken out again, mg. */
export interface TouchedMelt {
  readonly id: string;
  readonly code: string;
  readonly massMg: number;
}

/** A lot with its papers, its amendments and where its metal went. */
export interface LotWithHistory {
  readonly lot: LoadedLot;
  readonly documents: readonly (LotDocument & { readonly user: User })[];
  readonly amendments: readonly (LotAmendment & { readonly user: User })[];
  readonly melts: readonly TouchedMelt[];
  readonly becameLots: readonly Lot[];
}

const lotIncludes = ({ AlloyRevision, Alloy, Melt, User }: Models): Includeable[] => [
  { model: AlloyRevision, as: 'alloyRevision', include: [{ model: Alloy, as: 'alloy' }] },
  { model: Melt, as: 'melt', attributes: ['id', 'code'] },
  { model: User, as: 'receiver' },
];

const containing = (text: string) => ({ [Op.iLike]: `%${text.replace(/[\\%_]/g, '\\$&')}%` });

const whereOf = (query: z.output<typeof listLotsQuery>): WhereOptions<Lot> => {
  const { kind, onHand, quarantined, alloyRevisionId, search } = query;
  const filters: WhereOptions<Lot>[] = [];
  if (kind !== undefined) filters.push({ kind });
  if (alloyRevisionId !== undefined) filters.push({ alloyRevisionId });
  if (onHand !== undefined) filters.push({ balanceMg: onHand === 'yes' ? { [Op.gt]: 0 } : 0 });
  if (quarantined !== undefined)
    filters.push({ quarantineReason: quarantined === 'yes' ? { [Op.ne]: null } : null });
  if (search) {
    const found = containing(search);
    filters.push({
      [Op.or]: [{ code: found }, { name: found }, { supplier: found }, { supplierReference: found }],
    });
  }
  return { [Op.and]: filters };
};

/** The lots that a query asks for, the oldest first. */
export const listLots = async (
  { models }: Services,
  query: z.output<typeof listLotsQuery>,
): Promise<LoadedLot[]> => {
  const lots = await models.Lot.findAll({
    where: whereOf(query),
    include: lotIncludes(models),
    order: [
      ['receivedAt', 'ASC'],
      ['number', 'ASC'],
    ],
  });
  return lots as LoadedLot[];
};

/** One lot with all that its line names. */
export const loadLot = async ({ models }: Services, id: string): Promise<LoadedLot> => {
  const lot = await models.Lot.findByPk(id, { include: lotIncludes(models) });
  if (!lot) throw notFound('lot');
  return lot as LoadedLot;
};

/** Finds what a scanned or typed lot code means; each way it can fail is one sentence with what to do. */
export const findLot = async (services: Services, text: string): Promise<LoadedLot> => {
  const parsed = parseLotCode(text);
  if (!parsed.ok) throw new AppError('lot-code-refused', parsed.error);
  const lot = await services.models.Lot.findOne({ where: { code: parsed.value } });
  if (!lot) {
    const { main } = splitCode(parsed.value);
    throw new AppError('lot-code-refused', `${main} is not one of this studio's lots. Check the label.`);
  }
  return loadLot(services, lot.id);
};

/** The melts that hold, or held, metal of a lot, in the order of their numbers. */
const touchedMelts = ({ sequelize }: Services, lotId: string): Promise<TouchedMelt[]> =>
  sequelize.query<TouchedMelt>(
    /* sql */ `
      select melts.id, melts.code,
        sum(case when to_place = 'crucible' then mass_mg else -mass_mg end)::integer as "massMg"
      from metal_movements join melts on melts.id = metal_movements.melt_id
      where lot_id = :lotId and metal_movements.kind <> 'returned' and 'crucible' in (from_place, to_place)
        and (corrects_id is null or corrects_id not in (select id from metal_movements where kind = 'returned'))
      group by melts.id, melts.code, melts.number having sum(case when to_place = 'crucible' then mass_mg else -mass_mg end) > 0
      order by melts.number`,
    { type: QueryTypes.SELECT, replacements: { lotId } },
  );

/** One lot with its papers, its amendments and where its metal went. */
export const loadLotWithHistory = async (services: Services, id: string): Promise<LotWithHistory> => {
  const { models } = services;
  const lot = await loadLot(services, id);
  const withUser = { where: { lotId: id }, include: [{ model: models.User, as: 'user' }] };
  const [documents, amendments, melts] = await Promise.all([
    models.LotDocument.findAll({ ...withUser, order: [['createdAt', 'ASC']] }),
    models.LotAmendment.findAll({ ...withUser, order: [['id', 'ASC']] }),
    touchedMelts(services, id),
  ]);
  const becameLots = await models.Lot.findAll({
    where: { meltId: melts.map((melt) => melt.id) },
    order: [['number', 'ASC']],
  });
  return {
    lot,
    documents: documents as LotWithHistory['documents'][number][],
    amendments: amendments as LotWithHistory['amendments'][number][],
    melts,
    becameLots,
  };
};
