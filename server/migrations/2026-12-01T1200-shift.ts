import { QueryTypes } from 'sequelize';
import type { Migration } from '../services/migration.ts';

const tables = /* sql */ `
alter table work_instruction_revisions
  add column status text not null default 'approved' check (status in ('draft', 'approved', 'dropped')),
  add column version integer not null default 1,
  add column note text not null default '',
  add column exception text not null default '',
  add column drafted_by uuid references users,
  add column created_at timestamptz not null default now(),
  alter column approved_at drop not null,
  alter column approved_at drop default,
  add check ((status = 'approved') = (approved_at is not null));

-- What an apprentice may do: which alloys, which parts of a card; null for all of them.
alter table users add column apprenticeship jsonb;

create table countersigns (
  id uuid primary key,
  melt_id uuid not null references melts,
  person_id uuid not null references users,
  asked_by uuid not null references users,
  terminal_id uuid not null references terminals,
  signed_at timestamptz not null,
  check (person_id <> asked_by)
);

create table photographs (
  id uuid primary key,
  melt_id uuid not null references melts,
  sha256 text not null,
  media_type text not null,
  bytes integer not null check (bytes > 0),
  user_id uuid not null references users,
  terminal_id uuid not null references terminals,
  created_at timestamptz not null default now()
);
create index photographs_melt_id on photographs (melt_id);

update studio_settings set limits = limits || '{"countersignFactor": 1.5}';
`;

const appendOnly = ['countersigns', 'photographs'];

const guards = appendOnly
  .map(
    (table) => /* sql */ `
create trigger ${table}_append_only before update or delete on ${table} for each row execute function refuse_change();
create trigger ${table}_no_truncate before truncate on ${table} for each statement execute function refuse_change();`,
  )
  .join('\n');

/** An instruction used to hold the cautions of its guard only; each of them is a check before the guard now. */
const promptsToSteps = /* sql */ `
update work_instruction_revisions set content = content - 'prompts' || jsonb_build_object('steps', (
  select coalesce(jsonb_agg(jsonb_build_object(
    'kind', 'check', 'key', prompt->>'key', 'before', 'guard', 'sign', prompt->>'sign', 'sentence', prompt->>'sentence',
    'maySkip', false, 'when', '{"methods": [], "families": [], "roles": [], "hazards": []}'::jsonb) order by place), '[]')
  from jsonb_array_elements(content->'prompts') with ordinality as prompts(prompt, place)))
where content ? 'prompts';
`;

/** A card that is running keeps its cautions. */
const rulesOfRunning = /* sql */ `
update melts set context = context || jsonb_build_object('rules', jsonb_build_object(
  'steps', revision.content->'steps', 'flaskCode', flasks.code, 'countersignFactor', 1.5))
from work_instruction_revisions revision, castings, flasks
where melts.over_at is null and revision.id = melts.work_instruction_revision_id
  and castings.id = melts.casting_id and flasks.id = castings.flask_id;
`;

const stepsToPrompts = /* sql */ `
update work_instruction_revisions set content = content - 'steps' || jsonb_build_object('prompts', (
  select coalesce(jsonb_agg(jsonb_build_object('key', step->>'key', 'sign', step->>'sign', 'sentence', step->>'sentence')
    order by place), '[]')
  from jsonb_array_elements(content->'steps') with ordinality as steps(step, place)
  where step->>'before' = 'guard' and step->>'kind' = 'check' and step->>'sign' is not null));
update melts set context = context - 'rules' where over_at is null;
update studio_settings set limits = limits - 'countersignFactor';
`;

export const up: Migration = async ({ context }) => {
  for (const part of [tables, guards, promptsToSteps, rulesOfRunning]) await context.sequelize.query(part);
};

export const down: Migration = async ({ context }) => {
  const { sequelize } = context;
  const [unapproved] = await sequelize.query<{ count: number }>(
    `select count(*)::int as count from work_instruction_revisions where status <> 'approved'`,
    { type: QueryTypes.SELECT },
  );
  if (unapproved && unapproved.count > 0)
    throw new Error(
      'There are work instructions that nobody has approved: the older version cannot hold them.',
    );
  await sequelize.query(stepsToPrompts);
  await sequelize.query(/* sql */ `
    drop table photographs, countersigns;
    alter table users drop column apprenticeship;
    update work_instruction_revisions set approved_at = created_at where approved_at is null;
    alter table work_instruction_revisions drop column status, drop column version, drop column note,
      drop column exception, drop column drafted_by, drop column created_at,
      alter column approved_at set default now(), alter column approved_at set not null;
  `);
};
