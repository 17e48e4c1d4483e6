import type { Migration } from '../services/migration.ts';

const places = `('stock', 'returns', 'scrap', 'supplier', 'crucible', 'castings', 'refiner', 'loss', 'adjustment')`;
const stores = `('stock', 'returns', 'scrap')`;

const tables = /* sql */ `
alter table studio_settings add column marks_place text not null default 'ISO 9202'
  check (marks_place in ('ISO 9202', 'United Kingdom', 'United States'));

create sequence lot_numbers as integer;

create table lots (
  id uuid primary key default gen_random_uuid(),
  number integer not null unique,
  code text not null unique,
  name text not null,
  kind text not null check (kind in ('fine', 'grain', 'master', 'returns', 'scrap')),
  alloy_revision_id uuid references alloy_revisions,
  melt_id uuid references melts,
  composition_wt jsonb not null,
  tolerance_wt jsonb not null,
  supplier text not null default '',
  supplier_reference text not null default '',
  place text not null default '',
  quarantine_reason text,
  balance_mg integer not null default 0,
  contents_mg jsonb not null default '{}',
  received_mg integer not null check (received_mg > 0),
  received_at timestamptz not null,
  received_by uuid not null references users,
  created_at timestamptz not null default now(),
  constraint lots_balance_not_negative check (balance_mg >= 0)
);
create index lots_on_hand on lots (kind, received_at) where balance_mg > 0;
create index lots_melt_id on lots (melt_id);

create table crucibles (
  melt_id uuid primary key references melts,
  balance_mg integer not null,
  contents_mg jsonb not null,
  constraint crucibles_balance_not_negative check (balance_mg >= 0)
);

create table metal_movements (
  id bigint generated always as identity primary key,
  key uuid not null unique,
  kind text not null check (kind in ('received', 'weighed-in', 'taken-out', 'cast', 'returned', 'lost', 'dispatched', 'counted', 'corrected')),
  from_place text not null check (from_place in ${places}),
  to_place text not null check (to_place in ${places}),
  mass_mg integer not null check (mass_mg > 0),
  contents_mg jsonb not null,
  lot_id uuid references lots,
  melt_id uuid references melts,
  reason text not null default '',
  corrects_id bigint references metal_movements,
  user_id uuid not null references users,
  terminal_id uuid references terminals,
  countersigned_by uuid references users,
  occurred_at timestamptz not null,
  recorded_at timestamptz not null default now(),
  check (from_place <> to_place),
  check (not (from_place in ${stores} and to_place in ${stores})),
  check ((lot_id is not null) = (from_place in ${stores} or to_place in ${stores})),
  check ((melt_id is not null) or not ('crucible' in (from_place, to_place))),
  check ((kind = 'corrected') = (corrects_id is not null)),
  check (countersigned_by is distinct from user_id),
  check (kind not in ('corrected', 'counted') or (reason <> '' and countersigned_by is not null))
);
create index metal_movements_lot_id on metal_movements (lot_id, id);
create index metal_movements_melt_id on metal_movements (melt_id, id);
create index metal_movements_occurred_at on metal_movements (occurred_at);
create index metal_movements_corrects_id on metal_movements (corrects_id);

create table lot_documents (
  id uuid primary key default gen_random_uuid(),
  lot_id uuid not null references lots,
  name text not null,
  media_type text not null check (media_type in ('application/pdf', 'image/jpeg', 'image/png', 'image/webp')),
  sha256 text not null check (sha256 ~ '^[0-9a-f]{64}$'),
  bytes integer not null check (bytes > 0),
  user_id uuid not null references users,
  created_at timestamptz not null default now()
);
create index lot_documents_lot_id on lot_documents (lot_id);

create table lot_amendments (
  id bigint generated always as identity primary key,
  lot_id uuid not null references lots,
  kind text not null check (kind in ('assay', 'quarantined', 'released', 'moved')),
  composition_wt jsonb,
  tolerance_wt jsonb,
  contents_change_mg jsonb not null default '{}',
  place text,
  reason text not null,
  user_id uuid not null references users,
  created_at timestamptz not null default now(),
  check ((kind = 'assay') = (composition_wt is not null and tolerance_wt is not null)),
  check ((kind = 'moved') = (place is not null)),
  check (kind = 'moved' or reason <> '')
);
create index lot_amendments_lot_id on lot_amendments (lot_id, id);

create table stock_counts (
  id bigint generated always as identity primary key,
  lot_id uuid not null references lots,
  expected_mg integer not null check (expected_mg >= 0),
  counted_mg integer not null check (counted_mg >= 0),
  explanation text not null default '',
  movement_id bigint references metal_movements,
  user_id uuid not null references users,
  counted_at timestamptz not null,
  check ((expected_mg = counted_mg) = (movement_id is null))
);
create index stock_counts_lot_id on stock_counts (lot_id, id);
create index stock_counts_counted_at on stock_counts (counted_at);

create table charge_plans (
  id bigint generated always as identity primary key,
  casting_ids uuid[] not null check (cardinality(casting_ids) > 0),
  alloy_revision_id uuid not null references alloy_revisions,
  wanted_mg integer not null check (wanted_mg > 0),
  lines jsonb not null,
  expected_ppt double precision not null,
  worst_ppt double precision not null,
  returns_share double precision not null,
  user_id uuid not null references users,
  created_at timestamptz not null default now()
);
create index charge_plans_casting_ids on charge_plans using gin (casting_ids);
`;

const appendOnly = ['metal_movements', 'lot_amendments', 'lot_documents', 'stock_counts', 'charge_plans'];

const keepBalances = /* sql */ `
create function sum_contents(one jsonb, other jsonb, sign integer) returns jsonb language sql immutable as $$
  select coalesce(jsonb_object_agg(element, mg), '{}')
  from (
    select element, coalesce((one->>element)::integer, 0) + sign * coalesce((other->>element)::integer, 0) as mg
    from (select jsonb_object_keys(one) union select jsonb_object_keys(other)) as elements(element)
  ) as sums
  where mg <> 0
$$;

create function move_in_lot(lot uuid, mass integer, contents jsonb, sign integer) returns void language sql as $$
  update lots set balance_mg = balance_mg + sign * mass, contents_mg = sum_contents(contents_mg, contents, sign)
  where id = lot
$$;

create function move_in_crucible(melt uuid, mass integer, contents jsonb, sign integer) returns void language sql as $$
  insert into crucibles (melt_id, balance_mg, contents_mg) values (melt, 0, '{}') on conflict do nothing;
  update crucibles set balance_mg = balance_mg + sign * mass, contents_mg = sum_contents(contents_mg, contents, sign)
  where melt_id = melt
$$;

create function apply_movement() returns trigger language plpgsql as $$
begin
  if (select coalesce(sum(mg::integer), 0) from jsonb_each_text(new.contents_mg) as parts(element, mg)) <> new.mass_mg then
    raise exception 'the contents of a movement do not come to its mass' using errcode = 'check_violation';
  end if;
  if new.from_place = 'crucible' then perform move_in_crucible(new.melt_id, new.mass_mg, new.contents_mg, -1); end if;
  if new.from_place in ${stores} then perform move_in_lot(new.lot_id, new.mass_mg, new.contents_mg, -1); end if;
  if new.to_place = 'crucible' then perform move_in_crucible(new.melt_id, new.mass_mg, new.contents_mg, 1); end if;
  if new.to_place in ${stores} then perform move_in_lot(new.lot_id, new.mass_mg, new.contents_mg, 1); end if;
  return null;
end $$;
create trigger metal_movements_apply after insert on metal_movements for each row execute function apply_movement();

create function apply_amendment() returns trigger language plpgsql as $$
begin
  case new.kind
    when 'assay' then
      update lots set composition_wt = new.composition_wt, tolerance_wt = new.tolerance_wt,
        contents_mg = sum_contents(contents_mg, new.contents_change_mg, 1) where id = new.lot_id;
    when 'quarantined' then update lots set quarantine_reason = new.reason where id = new.lot_id;
    when 'released' then update lots set quarantine_reason = null where id = new.lot_id;
    when 'moved' then update lots set place = new.place where id = new.lot_id;
  end case;
  return null;
end $$;
create trigger lot_amendments_apply after insert on lot_amendments for each row execute function apply_amendment();
`;

const guards = /* sql */ `
${appendOnly
  .map(
    (table) => `
create trigger ${table}_append_only before update or delete on ${table} for each row execute function refuse_change();
create trigger ${table}_no_truncate before truncate on ${table} for each statement execute function refuse_change();`,
  )
  .join('\n')}

create function refuse_direct_change() returns trigger language plpgsql as $$
begin
  if pg_trigger_depth() < 2 then
    raise exception '% changes only by movements and amendments: % is refused', tg_table_name, tg_op
      using errcode = 'restrict_violation';
  end if;
  return new;
end $$;
create trigger lots_by_the_ledger before update or delete on lots for each row execute function refuse_direct_change();
create trigger crucibles_by_the_ledger before insert or update or delete on crucibles for each row execute function refuse_direct_change();

create function refuse_opening_balance() returns trigger language plpgsql as $$
begin
  if new.balance_mg <> 0 or new.contents_mg <> '{}' then
    raise exception 'a lot begins empty: its metal comes by a movement' using errcode = 'restrict_violation';
  end if;
  return new;
end $$;
create trigger lots_begin_empty before insert on lots for each row execute function refuse_opening_balance();
create trigger lots_no_truncate before truncate on lots for each statement execute function refuse_change();
create trigger crucibles_no_truncate before truncate on crucibles for each statement execute function refuse_change();
`;

export const up: Migration = async ({ context }) => {
  await context.sequelize.query(tables);
  await context.sequelize.query(keepBalances);
  await context.sequelize.query(guards);
};

export const down: Migration = async ({ context }) => {
  await context.sequelize.query(/* sql */ `
    drop table charge_plans, stock_counts, lot_amendments, lot_documents, metal_movements, crucibles, lots;
    drop function apply_movement(), apply_amendment(), move_in_lot(uuid, integer, jsonb, integer),
      move_in_crucible(uuid, integer, jsonb, integer), sum_contents(jsonb, jsonb, integer), refuse_direct_change(),
      refuse_opening_balance();
    drop sequence lot_numbers;
    alter table studio_settings drop column marks_place;
  `);
};
