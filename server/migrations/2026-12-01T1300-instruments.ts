import type { Migration } from '../services/migration.ts';

const tables = /* sql */ `
alter table studio_settings add column pyrometer_check_days integer not null default 30
  check (pyrometer_check_days between 1 and 366);

create table instruments (
  id uuid primary key default gen_random_uuid(),
  name text not null,
  kind text not null check (kind in ('thermometer', 'pyrometer', 'balance')),
  thermocouple text check (thermocouple in ('K', 'N', 'S')),
  terminal_id uuid references terminals,
  token_hash text not null unique,
  active boolean not null default true,
  created_by uuid not null references users,
  created_at timestamptz not null default now(),
  revoked_at timestamptz,
  check ((kind = 'thermometer') = (thermocouple is not null)),
  check (active = (revoked_at is null))
);
create unique index instruments_name_key on instruments (lower(name)) where active;

create table pyrometer_checks (
  id bigint generated always as identity primary key,
  key uuid not null unique,
  instrument_id uuid not null references instruments,
  fixed_point text not null check (fixed_point in ('silver', 'silver-copper', 'gold')),
  read_c double precision not null,
  wander_c double precision not null check (wander_c >= 0),
  offset_c double precision not null,
  uncertainty_c double precision not null check (uncertainty_c > 0),
  note text not null default '',
  user_id uuid not null references users,
  terminal_id uuid references terminals,
  checked_at timestamptz not null,
  recorded_at timestamptz not null default now()
);
create index pyrometer_checks_instrument_id on pyrometer_checks (instrument_id, checked_at);

create table instrument_readings (
  id bigint generated always as identity primary key,
  key uuid not null,
  place integer not null check (place >= 0),
  instrument_id uuid references instruments,
  terminal_id uuid references terminals,
  user_id uuid references users,
  raw_c double precision,
  fault text check (fault in ('open', 'over-range', 'under-range', 'other')),
  offset_c double precision not null default 0,
  sequence integer,
  flask_id uuid references flasks,
  casting_id uuid references castings,
  outing_id uuid,
  seconds_out double precision check (seconds_out >= 0),
  room_c double precision,
  taken_at timestamptz not null,
  recorded_at timestamptz not null default now(),
  unique (key, place),
  check ((raw_c is null) = (fault is not null)),
  check (instrument_id is not null or flask_id is not null),
  check (num_nulls(flask_id, outing_id, seconds_out, room_c) in (0, 4)),
  check (casting_id is null or flask_id is not null)
);
create index instrument_readings_latest on instrument_readings (instrument_id, taken_at desc, id desc) where flask_id is null;
create index instrument_readings_flask_id on instrument_readings (flask_id) where flask_id is not null;

create table cooling_curves (
  id bigint generated always as identity primary key,
  key uuid not null unique,
  melt_id uuid not null references melts,
  instrument_id uuid references instruments,
  source text not null check (source in ('live', 'table')),
  points jsonb not null,
  offset_c double precision not null default 0,
  thermometer_c double precision not null,
  verdict jsonb not null,
  note text not null default '',
  user_id uuid not null references users,
  terminal_id uuid references terminals,
  recorded_at timestamptz not null default now()
);
create index cooling_curves_melt_id on cooling_curves (melt_id, id);
`;

const appendOnly = ['pyrometer_checks', 'instrument_readings', 'cooling_curves'];

const guards = appendOnly
  .map(
    (table) => /* sql */ `
create trigger ${table}_append_only before update or delete on ${table} for each row execute function refuse_change();
create trigger ${table}_no_truncate before truncate on ${table} for each statement execute function refuse_change();`,
  )
  .join('\n');

export const up: Migration = async ({ context }) => {
  await context.sequelize.query(tables);
  await context.sequelize.query(guards);
};

export const down: Migration = async ({ context }) => {
  await context.sequelize.query(/* sql */ `
    drop table cooling_curves, instrument_readings, pyrometer_checks, instruments;
    alter table studio_settings drop column pyrometer_check_days;
  `);
};
