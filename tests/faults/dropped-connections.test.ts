import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { MeltEvent } from '#shared/contracts/card.ts';
import { foldCard } from '#shared/domain/pour-card/apply-event.ts';
import { chargedG } from '#shared/domain/pour-card/card-state.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { deliverEvent } from '#tests/support/deliver-event.ts';
import { startTestServer, type TerminalClient, type TestServer } from '#tests/support/test-server.ts';

const WRITERS = 50;

let server: TestServer;
let terminal: TerminalClient;
let killer: pg.Client;
beforeAll(async () => {
  server = await startTestServer();
  terminal = await server.terminalAs('caster');
  const { username, password, host, port, database } = server.services.sequelize.config;
  killer = new pg.Client({ user: username, password: password ?? '', host, port: Number(port), database });
  await killer.connect();
});
afterAll(async () => {
  await killer.end();
  await server.close();
});

/** Ends every connection the server holds, as a restart of the database does; gives how many there were. */
const dropConnections = async (): Promise<number> => {
  const { rowCount } = await killer.query(
    'select pg_terminate_backend(pid) from pg_stat_activity where datname = current_database() and pid <> pg_backend_pid()',
  );
  return rowCount ?? 0;
};

interface Delivery {
  readonly key: string;
  readonly massG: number;
  readonly seq: number;
}

/** Sends one event under one key until it is acknowledged, as a terminal does; anything but “not ready” is a fault. */
const deliverUntilAcknowledged = async (meltId: string, massG: number): Promise<Delivery> => {
  const key = randomUUID();
  const event = { type: 'charge-weighed', kind: 'grain', massG };
  for (let tries = 1; tries <= 200; tries += 1) {
    const answer = await deliverEvent(terminal.client, meltId, event, { key }).catch(() => null);
    if (answer?.status === 201) return { key, massG, seq: (answer.body as MeltEvent).seq };
    // A connection that broke while the session was stored cuts the answer off: the terminal sends it again.
    if (answer !== null) expect([answer.status, answer.text]).toEqual([503, expect.any(String)]);
  }
  throw new Error(`An event of ${massG} g was not acknowledged in 200 tries.`);
};

describe('connections to the database that are cut under fifty writers', () => {
  it('lose nothing that was acknowledged, and write nothing twice', async () => {
    const { user, terminal: device } = terminal;
    const castings = [await buildCasting(server.services), await buildCasting(server.services)];
    const melts = await Promise.all(
      castings.map(({ id }) =>
        buildMelt(server.services, { castingId: id, user, terminal: device, step: 'charge' }),
      ),
    );
    const ids = melts.map(({ id }) => id);
    let isWriting = true;
    const writing = Promise.all(
      Array.from({ length: WRITERS }, (_, index) =>
        deliverUntilAcknowledged(ids[index % ids.length] ?? '', index + 1),
      ),
    ).finally(() => (isWriting = false));
    let dropped = 0;
    let drops = 0;
    while (isWriting && drops < 12) {
      dropped += await dropConnections();
      drops += 1;
      await Promise.race([writing, server.nobody().get('/api/health')]);
    }
    const acknowledged = await writing;
    expect(dropped).toBeGreaterThan(0);

    const { models } = server.services;
    const events = await models.MeltEvent.findAll({ where: { meltId: ids }, order: ['seq'] });
    const recorded = events.flatMap(({ key, event, seq }) =>
      event.type === 'charge-weighed' ? [{ key, massG: event.massG, seq }] : [],
    );
    const byMass = (one: Delivery, other: Delivery): number => one.massG - other.massG;
    expect(recorded.sort(byMass)).toEqual([...acknowledged].sort(byMass));

    for (const melt of await models.Melt.findAll({ where: { id: ids } })) {
      const own = events.filter(({ meltId }) => meltId === melt.id);
      expect(own.map(({ seq }) => seq)).toEqual(own.map((_, index) => index + 1));
      const timed = own.map(({ event, occurredAt }) => ({ event, occurredAt: occurredAt.toISOString() }));
      expect(melt.state).toEqual(foldCard(timed, melt.context));
      expect(chargedG(melt.state)).toBeGreaterThan(0);
    }
  });

  it('are opened anew for the next request', async () => {
    await dropConnections();
    await expect.poll(async () => (await server.nobody().get('/api/session')).status).toBe(200);
    await server.nobody().get('/api/health').expect(200);
  });
});
