import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { MeltEvent } from '#shared/contracts/card.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { openCard } from '#tests/support/ask-for-card.ts';
import { deliverEvent } from '#tests/support/deliver-event.ts';
import { problemIdOf } from '#tests/support/problem-id.ts';
import { startTestServer, type TerminalClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let terminal: TerminalClient;
beforeAll(async () => {
  server = await startTestServer();
  terminal = await server.terminalAs('caster');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

let meltId = '';
beforeEach(async () => {
  ({ meltId } = await openCard(terminal.client, (await buildCasting(server.services)).id));
  await deliverEvent(terminal.client, meltId, { type: 'guard-confirmed', prompts: ['face'] }).expect(201);
});

const weigh = (massG: number) => ({ type: 'charge-weighed', kind: 'grain', massG });

const weighed = async (): Promise<number[]> => {
  const events = await server.services.models.MeltEvent.findAll({ where: { meltId }, order: ['seq'] });
  return events.flatMap(({ event }) => (event.type === 'charge-weighed' ? [event.massG] : []));
};

const charge = async (): Promise<number | undefined> =>
  (await server.services.models.Melt.findByPk(meltId))?.state.charge.grain;

describe('an event that is delivered twice', () => {
  it('is written once, and answered both times alike', async () => {
    const key = randomUUID();
    const first = await deliverEvent(terminal.client, meltId, weigh(12.5), { key }).expect(201);
    const again = await deliverEvent(terminal.client, meltId, weigh(12.5), { key }).expect(201);
    expect(again.body).toEqual(first.body);
    expect([await weighed(), await charge()]).toEqual([[12.5], 12.5]);
  });

  it('is answered as written though the card has gone on or is over', async () => {
    const key = randomUUID();
    const first = await deliverEvent(terminal.client, meltId, weigh(12.5), { key }).expect(201);
    await deliverEvent(terminal.client, meltId, { type: 'abandoned', note: 'Furnace off.' }).expect(201);
    const late = await deliverEvent(terminal.client, meltId, weigh(12.5), { key }).expect(201);
    expect((late.body as MeltEvent).seq).toBe((first.body as MeltEvent).seq);
  });

  it('is written once however many deliveries arrive together', async () => {
    const key = randomUUID();
    const answers = await Promise.all(
      Array.from({ length: 10 }, () => deliverEvent(terminal.client, meltId, weigh(12.5), { key })),
    );
    expect(answers.map(({ status }) => status)).toEqual(Array.from({ length: 10 }, () => 201));
    expect(new Set(answers.map(({ body }) => (body as MeltEvent).seq)).size).toBe(1);
    expect([await weighed(), await charge()]).toEqual([[12.5], 12.5]);
  });
});

describe('a key', () => {
  it('stands for one event: another under it is refused', async () => {
    const key = randomUUID();
    await deliverEvent(terminal.client, meltId, weigh(12.5), { key }).expect(201);
    for (const event of [weigh(12.6), { type: 'charge-closed' }]) {
      const response = await deliverEvent(terminal.client, meltId, event, { key });
      expect([response.status, problemIdOf(response)]).toEqual([409, 'event-refused']);
    }
    expect(await weighed()).toEqual([12.5]);
  });

  it('stands for one melt, also when two use it at the same moment', async () => {
    const other = await openCard(terminal.client, (await buildCasting(server.services)).id);
    const guard = { type: 'stopped', reason: 'other' };
    for (let round = 0; round < 5; round += 1) {
      const key = randomUUID();
      const answers = await Promise.all(
        [meltId, other.meltId].map((id) => deliverEvent(terminal.client, id, guard, { key })),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
      const [winner] = answers[0]?.status === 201 ? [meltId] : [other.meltId];
      await deliverEvent(terminal.client, winner, { type: 'resumed' }).expect(201);
    }
  });

  it.each(['', 'key', 42, null])('is refused when it is %j', async (key) => {
    const response = await terminal.client
      .post(`/api/melts/${meltId}/events`)
      .send({ key, occurredAt: server.services.now().toISOString(), event: weigh(1) });
    expect(problemIdOf(response)).toBe('invalid-request');
  });
});

describe('events that arrive together', () => {
  it('are all written, one after the other', async () => {
    const masses = Array.from({ length: 12 }, (_, index) => index + 1);
    await Promise.all(masses.map((massG) => deliverEvent(terminal.client, meltId, weigh(massG)).expect(201)));
    expect((await weighed()).sort((one, other) => one - other)).toEqual(masses);
    expect(await charge()).toBe(78);
  });
});
