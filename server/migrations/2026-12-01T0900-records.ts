import type { Migration } from '../services/migration.ts';

const tables = /* sql */ `
create table studio_settings (
  id smallint primary key default 1 check (id = 1),
  version integer not null default 1,
  name text not null,
  temperature_unit text not null check (temperature_unit in ('C', 'F')),
  mass_unit text not null check (mass_unit in ('g', 'dwt', 'ozt')),
  time_zone text not null,
  idle_lock_s integer not null check (idle_lock_s between 30 and 3600),
  process_tables jsonb not null,
  limits jsonb not null,
  created_at timestamptz not null default now(),
  updated_at timestamptz not null default now()
);

create table users (
  id uuid primary key default gen_random_uuid(),
  name text not null,
  login text not null,
  roles text[] not null check (cardinality(roles) > 0),
  active boolean not null default true,
  password_hash text not null,
  pin_hash text,
  pin_failures integer not null default 0,
  pin_wait_until timestamptz,
  pin_locked_at timestamptz,
  password_failures integer not null default 0,
  password_wait_until timestamptz,
  created_at timestamptz not null default now(),
  updated_at timestamptz not null default now()
);
create unique index users_login_key on users (lower(login));

create table terminals (
  id uuid primary key default gen_random_uuid(),
  name text not null,
  bay text not null,
  token_hash text not null unique,
  enrolled_at timestamptz not null default now(),
  last_seen_at timestamptz,
  revoked_at timestamptz
);

create table terminal_enrolments (
  id uuid primary key default gen_random_uuid(),
  code_hash text not null unique,
  name text not null,
  bay text not null,
  created_by uuid references users,
  expires_at timestamptz not null,
  used_at timestamptz,
  created_at timestamptz not null default now()
);

create table alloys (
  id uuid primary key default gen_random_uuid(),
  name text not null,
  family text not null check (family in ('silver', 'yellow-gold', 'rose-gold', 'white-gold')),
  created_at timestamptz not null default now()
);
create unique index alloys_name_key on alloys (lower(name));

create table alloy_revisions (
  id uuid primary key default gen_random_uuid(),
  alloy_id uuid not null references alloys,
  number integer not null check (number > 0),
  status text not null default 'draft' check (status in ('draft', 'checked', 'approved', 'superseded')),
  composition_wt jsonb not null,
  tolerance_wt jsonb not null default '{}',
  fineness integer not null check (fineness between 1 and 1000),
  figures jsonb not null,
  outside_model text not null default '',
  quench jsonb not null,
  measured jsonb,
  note text not null default '',
  drafted_by uuid not null references users,
  checked_by uuid references users,
  checked_at timestamptz,
  approved_by uuid references users,
  approved_at timestamptz,
  created_at timestamptz not null default now(),
  unique (alloy_id, number),
  check ((status in ('draft', 'checked')) = (approved_at is null))
);
create unique index alloy_revisions_one_approved on alloy_revisions (alloy_id) where status = 'approved';

create table flasks (
  id uuid primary key default gen_random_uuid(),
  code text not null unique,
  diameter_mm numeric(6, 1) not null check (diameter_mm > 0),
  height_mm numeric(6, 1) not null check (height_mm > 0),
  created_at timestamptz not null default now()
);

create table trees (
  id uuid primary key default gen_random_uuid(),
  code text not null unique,
  description text not null,
  wax_mass_g numeric(9, 3) not null check (wax_mass_g > 0),
  thinnest_section_mm numeric(5, 2) not null check (thinnest_section_mm > 0),
  pieces integer not null check (pieces > 0),
  created_at timestamptz not null default now()
);

create table work_instruction_revisions (
  id uuid primary key default gen_random_uuid(),
  number integer not null unique check (number > 0),
  content jsonb not null,
  approved_by uuid references users,
  approved_at timestamptz not null default now()
);

create sequence melt_numbers as integer;

create table melts (
  id uuid primary key default gen_random_uuid(),
  number integer not null unique default nextval('melt_numbers'),
  code text not null unique,
  casting_id uuid not null,
  alloy_revision_id uuid not null references alloy_revisions,
  work_instruction_revision_id uuid not null references work_instruction_revisions,
  context jsonb not null,
  state jsonb not null,
  opened_by uuid not null references users,
  terminal_id uuid not null references terminals,
  opened_at timestamptz not null,
  over_at timestamptz
);

create table castings (
  id uuid primary key default gen_random_uuid(),
  flask_id uuid not null references flasks,
  tree_id uuid not null references trees,
  alloy_revision_id uuid not null references alloy_revisions,
  method text not null check (method in ('vacuum', 'centrifugal')),
  state text not null check (state in ('invested', 'dewaxed', 'burning-out', 'holding', 'poured', 'quenched', 'broken-out', 'cut', 'released', 'held', 'scrapped')),
  state_reason text not null default '',
  planned_metal_g numeric(9, 3) not null check (planned_metal_g > 0),
  planned_pour_at timestamptz not null,
  bay text not null,
  planned_by uuid not null references users,
  caster_id uuid references users,
  melt_id uuid references melts,
  created_at timestamptz not null default now(),
  updated_at timestamptz not null default now()
);
create unique index castings_one_open_per_flask on castings (flask_id)
  where state in ('invested', 'dewaxed', 'burning-out', 'holding', 'poured', 'quenched', 'held');
create unique index castings_one_open_per_tree on castings (tree_id) where state <> 'scrapped';
create index castings_planned_pour_at on castings (planned_pour_at);
create index castings_melt_id on castings (melt_id);
alter table melts add foreign key (casting_id) references castings;
create index melts_casting_id on melts (casting_id);

create table melt_events (
  id bigint generated always as identity primary key,
  melt_id uuid not null references melts,
  seq integer not null check (seq > 0),
  key uuid not null unique,
  event jsonb not null,
  user_id uuid not null references users,
  terminal_id uuid references terminals,
  occurred_at timestamptz not null,
  recorded_at timestamptz not null default now(),
  unique (melt_id, seq)
);

create table readings (
  id bigint generated always as identity primary key,
  melt_id uuid not null references melts,
  melt_event_id bigint not null unique references melt_events,
  temperature_c double precision not null,
  taken_at timestamptz not null
);
create index readings_melt_id on readings (melt_id, taken_at);

create table melt_amendments (
  id bigint generated always as identity primary key,
  melt_id uuid not null references melts,
  seq integer,
  note text not null,
  user_id uuid not null references users,
  created_at timestamptz not null default now()
);
create index melt_amendments_melt_id on melt_amendments (melt_id);

create table casting_moves (
  id bigint generated always as identity primary key,
  casting_id uuid not null references castings,
  from_state text not null,
  to_state text not null,
  reason text not null default '',
  user_id uuid not null references users,
  created_at timestamptz not null default now()
);
create index casting_moves_casting_id on casting_moves (casting_id);

create table user_sessions (
  sid varchar not null primary key,
  sess json not null,
  expire timestamptz(6) not null
);
create index user_sessions_expire on user_sessions (expire);
`;

/** What is written stays: these tables only ever grow, whoever asks. */
const appendOnly = ['melt_events', 'readings', 'melt_amendments', 'casting_moves'];

const guards = /* sql */ `
create function refuse_change() returns trigger language plpgsql as $$
begin
  raise exception '% is append-only: % is refused', tg_table_name, tg_op using errcode = 'restrict_violation';
end $$;

${appendOnly
  .map(
    (table) => `
create trigger ${table}_append_only before update or delete on ${table} for each row execute function refuse_change();
create trigger ${table}_no_truncate before truncate on ${table} for each statement execute function refuse_change();`,
  )
  .join('\n')}

create function refuse_revision_change() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' then
    raise exception 'alloy revisions are never removed' using errcode = 'restrict_violation';
  end if;
  if old.status in ('approved', 'superseded') and
     (to_jsonb(new) - 'status') is distinct from (to_jsonb(old) - 'status') then
    raise exception 'an approved alloy revision is frozen' using errcode = 'restrict_violation';
  end if;
  if old.status = 'superseded' and new.status <> 'superseded' or old.status = 'approved' and new.status not in ('approved', 'superseded') then
    raise exception 'an approved alloy revision can only be superseded' using errcode = 'restrict_violation';
  end if;
  return new;
end $$;
create trigger alloy_revisions_frozen before update or delete on alloy_revisions for each row execute function refuse_revision_change();
create trigger alloy_revisions_no_truncate before truncate on alloy_revisions for each statement execute function refuse_change();
`;

export const up: Migration = async ({ context }) => {
  await context.sequelize.query(tables);
  await context.sequelize.query(guards);
};

export const down: Migration = async ({ context }) => {
  await context.sequelize.query(/* sql */ `
    alter table melts drop constraint melts_casting_id_fkey;
    drop table user_sessions, casting_moves, melt_amendments, readings, melt_events, castings, melts,
      work_instruction_revisions, trees, flasks, alloy_revisions, alloys, terminal_enrolments, terminals, users, studio_settings;
    drop sequence melt_numbers;
    drop function refuse_change();
    drop function refuse_revision_change();
  `);
};
