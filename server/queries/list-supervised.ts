import { QueryTypes } from 'sequelize';
import type { SupervisedStep } from '#shared/contracts/supervised.ts';
import type { Services } from '../services/services.ts';

/** A person is an apprentice on a card from when they opened it or took it over, whatever they have become since. */
const sql = /* sql */ `
select melts.id as "meltId", melts.code as "meltCode", e.occurred_at as "at",
  case e.event->>'type' when 'step-done' then 'step' else 'variance' end as kind,
  coalesce(case e.event->>'type'
    when 'step-done' then (select step->>'sentence' from jsonb_array_elements(melts.context #> '{rules,steps}') step
      where step->>'key' = e.event->>'key' limit 1)
    else melts.state #>> array['departures', e.event->>'index', 'sentence'] end, '') as sentence,
  coalesce(e.event->>'words', '') as words,
  sign.by->>'name' as "signedBy", (sign.by->>'onDevice')::boolean as "onDevice"
from melt_events e
join melts on melts.id = e.melt_id
cross join lateral (select coalesce(e.event #> '{answer,by}', e.event->'by') as by) sign
where e.user_id = :personId
  and (e.event->>'type' = 'step-done' and e.event #>> '{answer,kind}' = 'countersign'
    or e.event->>'type' = 'variance-explained' and jsonb_typeof(e.event->'by') = 'object')
  and (select began.event #>> '{worker,role}' from melt_events began
    where began.melt_id = e.melt_id and began.seq < e.seq and began.event ? 'worker'
    order by began.seq desc limit 1) = 'apprentice'
order by e.occurred_at desc, e.id desc`;

interface Row extends Omit<SupervisedStep, 'at'> {
  readonly at: Date;
}

/** What a person did under supervision as an apprentice, newest first. */
export const listSupervised = async (
  { sequelize }: Services,
  personId: string,
): Promise<SupervisedStep[]> => {
  const rows = await sequelize.query<Row>(sql, { replacements: { personId }, type: QueryTypes.SELECT });
  return rows.map((row) => ({ ...row, at: row.at.toISOString() }));
};
