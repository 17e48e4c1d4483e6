import type { Migration } from '../services/migration.ts';

/** What was approved, or dropped, stays as it was read: cards refer to it for ever. */
const freeze = /* sql */ `
create function refuse_instruction_change() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' then
    raise exception 'revisions of the work instruction are never removed' using errcode = 'restrict_violation';
  end if;
  if old.status <> 'draft' then
    raise exception 'a revision of the work instruction that is % is frozen', old.status using errcode = 'restrict_violation';
  end if;
  return new;
end $$;
create trigger work_instruction_revisions_frozen before update or delete on work_instruction_revisions
  for each row execute function refuse_instruction_change();
create trigger work_instruction_revisions_no_truncate before truncate on work_instruction_revisions
  for each statement execute function refuse_change();
`;

export const up: Migration = async ({ context }) => {
  await context.sequelize.query(freeze);
};

export const down: Migration = async ({ context }) => {
  await context.sequelize.query(/* sql */ `
    drop trigger work_instruction_revisions_no_truncate on work_instruction_revisions;
    drop trigger work_instruction_revisions_frozen on work_instruction_revisions;
    drop function refuse_instruction_change();
  `);
};
