import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { dispatchLot } from '#server/commands/dispatch-lot.ts';
import { onHandMg } from '#shared/domain/metal/ledger.ts';
import { buildKeeper, buildLot } from '#tests/factories/build-lot.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const refused = (statement: string) => expect(server.services.sequelize.query(statement)).rejects.toThrow();

describe('the ledger in the database', () => {
  it('refuses to change, remove or empty what was written', async () => {
    const { id } = await buildLot(server.services);
    await refused(`update metal_movements set mass_mg = 1`);
    await refused(`delete from metal_movements`);
    await refused(`truncate metal_movements cascade`);
    await refused(`update lots set balance_mg = 1 where id = '${id}'`);
    await refused(`update lots set composition_wt = '{"Ag": 100}' where id = '${id}'`);
    await refused(`delete from lots where id = '${id}'`);
    await refused(`insert into crucibles values ('${randomUUID()}', 1, '{"Ag": 1}')`);
  });

  it('refuses a movement of nothing, from a place to itself, between stores, or whose contents are not its mass', async () => {
    const { id, receivedBy } = await buildLot(server.services);
    const insert = (from: string, to: string, mass: number, contents: string) =>
      `insert into metal_movements (key, kind, from_place, to_place, mass_mg, contents_mg, lot_id, user_id, occurred_at)
       values ('${randomUUID()}', 'dispatched', '${from}', '${to}', ${mass}, '${contents}', '${id}', '${receivedBy}', now())`;
    await refused(insert('stock', 'refiner', 0, '{}'));
    await refused(insert('stock', 'stock', 10, '{"Ag": 10}'));
    await refused(insert('stock', 'returns', 10, '{"Ag": 10}'));
    await refused(insert('stock', 'refiner', 10, '{"Ag": 9}'));
    await refused(insert('stock', 'refiner', 10_000_000, '{"Ag": 10000000}'));
    await server.services.sequelize.query(insert('stock', 'refiner', 10, '{"Ag": 10}'));
  });
});

describe('a lot taken from at ten places at once', () => {
  it('gives what it holds and not a milligram more; balance and movements agree', async () => {
    const { services } = server;
    const lot = await buildLot(services, { massG: 50 });
    const keeper = await buildKeeper(services);
    const take = () =>
      dispatchLot(services, keeper, lot.id, { key: randomUUID(), massG: 7, reason: 'refiner' });
    const outcomes = await Promise.allSettled(Array.from({ length: 10 }, take));
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(7);
    for (const outcome of outcomes)
      if (outcome.status === 'rejected') expect(outcome.reason).toMatchObject({ id: 'not-enough-metal' });
    await lot.reload();
    const movements = await services.models.MetalMovement.findAll({ where: { lotId: lot.id } });
    const plain = movements.map(({ fromPlace, toPlace, massMg }) => ({
      from: fromPlace,
      to: toPlace,
      massMg,
    }));
    expect([lot.balanceMg, onHandMg(plain)]).toEqual([1000, 1000]);
    expect(lot.contentsMg).toEqual({ Ag: 927, Cu: 73 });
  });
});
