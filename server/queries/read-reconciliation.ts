import { Op, QueryTypes } from 'sequelize';
import type { CountedLot, LossRate, Reconciliation, UncountedLot } from '#shared/contracts/reconciliation.ts';
import { reconcile, totalOfMonth, type Flow, type Reassay } from '#shared/domain/metal/reconcile.ts';
import type { Lot } from '../models/lot.ts';
import type { User } from '../models/user.ts';
import { boundsOfLocalDay } from '../services/local-day.ts';
import type { Services } from '../services/services.ts';
import { loadStudio } from './load-studio.ts';

interface Bounds {
  readonly from: Date;
  readonly to: Date;
}

/** The instants between which a local month lies. */
const boundsOfMonth = (month: string, timeZone: string): Bounds => {
  const [year = 0, number = 1] = month.split('-').map(Number);
  const next = number === 12 ? `${year + 1}-01` : `${year}-${String(number + 1).padStart(2, '0')}`;
  return {
    from: boundsOfLocalDay(`${month}-01`, timeZone).from,
    to: boundsOfLocalDay(`${next}-01`, timeZone).from,
  };
};

const readFlows = ({ sequelize }: Services, replacements: object): Promise<Flow[]> =>
  sequelize.query<Flow>(
    /* sql */ `
      select parts.element, moved.occurred_at < :from as "isBefore", moved.from_place as "from", moved.to_place as "to",
        coalesce(corrected.kind, moved.kind) as kind, sum(parts.mg::integer)::double precision as mg
      from metal_movements moved
        left join metal_movements corrected on corrected.id = moved.corrects_id
        cross join lateral jsonb_each_text(moved.contents_mg) as parts(element, mg)
      where moved.occurred_at < :to
      group by 1, 2, 3, 4, 5`,
    { type: QueryTypes.SELECT, replacements: { ...replacements } },
  );

const readReassays = ({ sequelize }: Services, replacements: object): Promise<Reassay[]> =>
  sequelize.query<Reassay>(
    /* sql */ `
      select parts.element, created_at < :from as "isBefore", sum(parts.mg::integer)::double precision as mg
      from lot_amendments cross join lateral jsonb_each_text(contents_change_mg) as parts(element, mg)
      where created_at < :to
      group by 1, 2`,
    { type: QueryTypes.SELECT, replacements: { ...replacements } },
  );

const groups = {
  alloy: 'alloys.name',
  caster: 'users.name',
  furnace: 'terminals.bay',
  terminal: 'terminals.name',
} as const;

/** What melts that were closed out in the month lost; a correction of the month counts too. */
const readLoss = (
  { sequelize }: Services,
  replacements: object,
  group: keyof typeof groups,
): Promise<LossRate[]> =>
  sequelize.query<LossRate>(
    /* sql */ `
      with closed as (
        select metal_movements.melt_id,
          sum(case when from_place = 'crucible' then mass_mg else -mass_mg end) as out_mg,
          sum(case when to_place = 'loss' then mass_mg when from_place = 'loss' then -mass_mg else 0 end) as lost_mg
        from metal_movements left join lots on lots.id = lot_id
        where metal_movements.melt_id is not null and occurred_at >= :from and occurred_at < :to
          and ('castings' in (from_place, to_place) or 'loss' in (from_place, to_place) or lots.melt_id = metal_movements.melt_id)
        group by metal_movements.melt_id
      )
      select ${groups[group]} as name, count(*)::integer as melts,
        sum(out_mg)::double precision as "metalInMg", sum(lost_mg)::double precision as "lostMg"
      from closed join melts on melts.id = closed.melt_id
        join alloy_revisions on alloy_revisions.id = melts.alloy_revision_id
        join alloys on alloys.id = alloy_revisions.alloy_id
        join users on users.id = melts.opened_by
        join terminals on terminals.id = melts.terminal_id
      group by 1 order by 1`,
    { type: QueryTypes.SELECT, replacements: { ...replacements } },
  );

const readCounts = async ({ models }: Services, { from, to }: Bounds): Promise<CountedLot[]> => {
  const counts = await models.StockCount.findAll({
    where: { countedAt: { [Op.gte]: from, [Op.lt]: to } },
    include: [
      { model: models.Lot, as: 'lot' },
      { model: models.User, as: 'user' },
    ],
    order: [['id', 'ASC']],
  });
  return counts.map(({ lot, user, expectedMg, countedMg, explanation, countedAt }) => ({
    id: (lot as Lot).id,
    code: (lot as Lot).code,
    name: (lot as Lot).name,
    expectedMg,
    countedMg,
    explanation,
    person: (user as User).name,
    at: countedAt.toISOString(),
  }));
};

const onHandMg = /* sql */ `sum(case when to_place in ('stock', 'returns', 'scrap') then mass_mg else -mass_mg end)`;

/** Lots that had metal at the end of the month. */
const readOnHand = ({ sequelize }: Services, replacements: object): Promise<UncountedLot[]> =>
  sequelize.query<UncountedLot>(
    /* sql */ `
      select lots.id, lots.code, lots.name, ${onHandMg}::double precision as "expectedMg"
      from lots join metal_movements on metal_movements.lot_id = lots.id
      where occurred_at < :to
      group by lots.id, lots.code, lots.name, lots.number
      having ${onHandMg} > 0
      order by lots.number`,
    { type: QueryTypes.SELECT, replacements: { ...replacements } },
  );

/** A local month's metal: balances by element, counts, and loss by alloy, caster, furnace and terminal. */
export const readReconciliation = async (services: Services, month: string): Promise<Reconciliation> => {
  const { timeZone } = await loadStudio(services);
  const bounds = boundsOfMonth(month, timeZone);
  const [flows, reassays, counts, onHand, ...losses] = await Promise.all([
    readFlows(services, bounds),
    readReassays(services, bounds),
    readCounts(services, bounds),
    readOnHand(services, bounds),
    readLoss(services, bounds, 'alloy'),
    readLoss(services, bounds, 'caster'),
    readLoss(services, bounds, 'furnace'),
    readLoss(services, bounds, 'terminal'),
  ]);
  const [lossByAlloy, lossByCaster, lossByFurnace, lossByTerminal] = losses;
  const metals = reconcile(flows, reassays);
  const counted = new Set(counts.map(({ id }) => id));
  return {
    month,
    from: bounds.from.toISOString(),
    to: bounds.to.toISOString(),
    metals,
    total: totalOfMonth(metals),
    counts,
    uncounted: onHand.filter(({ id }) => !counted.has(id)),
    lossByAlloy,
    lossByCaster,
    lossByFurnace,
    lossByTerminal,
  };
};
