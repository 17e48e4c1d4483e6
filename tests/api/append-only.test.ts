import { randomUUID } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { amendMelt } from '#server/commands/amend-melt.ts';
import { openCard } from '#server/commands/open-card.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildFlask } from '#tests/factories/build-flask.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { buildTerminal } from '#tests/factories/build-terminal.ts';
import { buildTree } from '#tests/factories/build-tree.ts';
import { buildUser } from '#tests/factories/build-user.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
  const melt = await buildMelt(server.services, { step: 'done' });
  const person = await buildUser(server.services, { roles: ['owner'] });
  const actor = { person, terminal: null, via: 'desk' } as const;
  await amendMelt(server.services, actor, melt, { seq: 1, note: 'A remark.' });
});
afterAll(() => server.close());

const run = (statement: string): Promise<unknown> => server.services.sequelize.query(statement);

const rowsOf = (table: string): Promise<object[]> =>
  server.services.sequelize.query(`select * from ${table} order by id`, { type: QueryTypes.SELECT });

describe.each(['melt_events', 'readings', 'melt_amendments', 'casting_moves'])('the table %s', (table) => {
  it.each(['update', 'delete', 'truncate', 'truncate with what hangs on it'])(
    'refuses to %s',
    async (verb) => {
      const before = await rowsOf(table);
      expect(before.length).toBeGreaterThan(0);
      const statement =
        {
          update: `update ${table} set id = id + 1000`,
          delete: `delete from ${table}`,
          truncate: `truncate ${table}`,
        }[verb] ?? `truncate ${table} cascade`;
      await expect(run(statement)).rejects.toThrow();
      expect(await rowsOf(table)).toEqual(before);
    },
  );
});

describe('a melt', () => {
  it('cannot be removed, for what belongs to it stays', async () => {
    await expect(run('delete from melts')).rejects.toThrow(/foreign key/);
  });
});

describe('an approved alloy revision', () => {
  it.each([
    `composition_wt = '{"Ag": 100}'`,
    'fineness = 999',
    `figures = '{}'`,
    `note = 'changed'`,
    `quench = '{}'`,
    'approved_at = now()',
    `status = 'draft', approved_at = null, approved_by = null`,
  ])('is frozen: it refuses to set %s', async (change) => {
    const { id } = await buildAlloyRevision(server.services);
    await expect(run(`update alloy_revisions set ${change} where id = '${id}'`)).rejects.toThrow(
      /frozen|superseded/,
    );
  });

  it('can be superseded, and never comes back', async () => {
    const { id } = await buildAlloyRevision(server.services);
    await run(`update alloy_revisions set status = 'superseded' where id = '${id}'`);
    await expect(run(`update alloy_revisions set status = 'approved' where id = '${id}'`)).rejects.toThrow(
      /superseded/,
    );
    await expect(run(`update alloy_revisions set fineness = 1 where id = '${id}'`)).rejects.toThrow(/frozen/);
  });

  it('is never removed, nor is a draft', async () => {
    const { id } = await buildAlloyRevision(server.services, { status: 'draft' });
    await expect(run(`delete from alloy_revisions where id = '${id}'`)).rejects.toThrow(/never removed/);
    await expect(run('truncate alloy_revisions cascade')).rejects.toThrow(/append-only|refused/);
  });

  it('is alone: an alloy has one at most', async () => {
    const first = await buildAlloyRevision(server.services);
    const second = { alloyId: first.alloyId, number: 2 };
    await expect(buildAlloyRevision(server.services, second)).rejects.toMatchObject({
      name: 'SequelizeUniqueConstraintError',
    });
  });
});

describe('a flask and a tree', () => {
  it('hold one open casting at a time, whoever writes', async () => {
    const flask = await buildFlask(server.services);
    const first = await buildCasting(server.services, { flaskId: flask.id, state: 'dewaxed' });
    await expect(buildCasting(server.services, { flaskId: flask.id })).rejects.toMatchObject({
      name: 'SequelizeUniqueConstraintError',
    });
    await first.update({ state: 'broken-out' });
    await buildCasting(server.services, { flaskId: flask.id });
    const tree = await buildTree(server.services);
    await buildCasting(server.services, { treeId: tree.id, state: 'released' });
    await expect(buildCasting(server.services, { treeId: tree.id })).rejects.toMatchObject({
      name: 'SequelizeUniqueConstraintError',
    });
  });
});

describe('a command', () => {
  it('leaves nothing behind when it fails half way', async () => {
    const { services } = server;
    const casting = await buildCasting(services);
    const { terminal } = await buildTerminal(services);
    const person = await buildUser(services);
    // The melt is inserted first and its event last; the clock fails between the two.
    let looks = 0;
    const failing = {
      ...services,
      now: () => {
        looks += 1;
        if (looks > 1) throw new Error('The clock stopped.');
        return services.now();
      },
    };
    const before = await services.models.Melt.count();
    const opening = openCard(failing, { person, terminal, via: 'terminal' }, casting.id, {
      key: randomUUID(),
      occurredAt: services.now().toISOString(),
      carryOn: false,
    });
    await expect(opening).rejects.toThrow('The clock stopped.');
    expect(looks).toBe(2);
    expect(await services.models.Melt.count()).toBe(before);
    expect((await casting.reload()).meltId).toBeNull();
  });

  it('writes nothing when the database refuses its last statement', async () => {
    const { services } = server;
    const before = await services.models.Alloy.count();
    const writing = services.sequelize.transaction(async () => {
      await services.models.Alloy.create({ name: 'Half an alloy', family: 'silver' });
      await run('delete from melt_events');
    });
    await expect(writing).rejects.toThrow(/append-only/);
    expect(await services.models.Alloy.count()).toBe(before);
  });

  it('keeps its writes from others until it is done', async () => {
    const { services } = server;
    const { Alloy } = services.models;
    let seen: readonly (number | null)[] = [];
    const name = 'Not yet seen';
    let begun = (): void => {};
    const inside = new Promise<void>((resolve) => (begun = resolve));
    let looked = (): void => {};
    const outside = new Promise<void>((resolve) => (looked = resolve));
    const writing = services.sequelize.transaction(async () => {
      await Alloy.create({ name, family: 'silver' });
      seen = [await Alloy.count({ where: { name } })];
      begun();
      await outside;
    });
    await inside;
    const fromOutside = await Alloy.count({ where: { name } });
    looked();
    await writing;
    expect([...seen, fromOutside, await Alloy.count({ where: { name } })]).toEqual([1, 0, 1]);
  });
});
