import { afterEach, beforeEach, describe, expect, inject, it } from 'vitest';
import { createDatabase } from '#server/models/database.ts';
import { createMigrator, migrate, pendingMigrations } from '#server/services/migrator.ts';
import { cloneTemplate, type TestDatabase } from '#tests/support/template-database.ts';

let database: TestDatabase;
beforeEach(async () => {
  database = await cloneTemplate(inject('postgresUrl'), { template: false });
});
afterEach(() => database.drop());

const tables = async (): Promise<number> => {
  const [rows] = await database.sequelize.query(
    "SELECT count(*)::int AS tables FROM information_schema.tables WHERE table_schema = 'public'",
  );
  return (rows as { tables: number }[])[0]?.tables ?? -1;
};

describe('migrate', () => {
  it('tells what is pending without writing anything', async () => {
    expect((await pendingMigrations(database.sequelize)).length).toBeGreaterThan(0);
    expect(await tables()).toBe(0);
  });

  it('does the work once when two servers start on an empty database', async () => {
    const other = createDatabase(database.url);
    const all = await pendingMigrations(database.sequelize);
    const [mine, theirs] = await Promise.all([migrate(database.sequelize), migrate(other)]);
    expect([...mine, ...theirs]).toEqual(all);
    expect(await pendingMigrations(other)).toEqual([]);
    await other.close();
  });

  it('goes all the way down and up again', async () => {
    await migrate(database.sequelize);
    const full = await tables();
    await createMigrator(database.sequelize).down({ to: 0 });
    expect(await tables()).toBe(1);
    await migrate(database.sequelize);
    expect(await tables()).toBe(full);
  });

  it('refuses a database that a newer version has used, and leaves it as it is', async () => {
    await migrate(database.sequelize);
    await database.sequelize.query("INSERT INTO schema_migrations (name) VALUES ('2999-01-01T0000-later')");
    await expect(migrate(database.sequelize)).rejects.toThrow(/newer version of Ladlemark \(it has 2999/);
  });

  it('leaves nothing half done when a migration fails', async () => {
    await database.sequelize.query('CREATE TABLE users (id int)');
    await expect(migrate(database.sequelize)).rejects.toThrow();
    expect(await tables()).toBe(1);
  });
});
