import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { CreatedInstrument, Instrument, PyrometerCheck } from '#shared/contracts/instrument.ts';
import type { PushedReadings } from '#shared/contracts/instrument-reading.ts';
import { buildInstrument } from '#tests/factories/build-instrument.ts';
import { buildTerminal } from '#tests/factories/build-terminal.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { START, startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: Client;
beforeAll(async () => {
  server = await startTestServer();
  owner = (await server.deskAs('owner')).client;
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const thermometer = { name: 'Dip lance', kind: 'thermometer', thermocouple: 'K', terminalId: null };

const create = async (more: object = {}): Promise<CreatedInstrument> =>
  (
    await owner
      .post('/api/instruments')
      .send({ ...thermometer, name: `Lance ${randomUUID()}`, ...more })
      .expect(201)
  ).body as CreatedInstrument;

const readOne = async (id: string): Promise<Instrument> => {
  const all = (await owner.get('/api/instruments').expect(200)).body as Instrument[];
  const found = all.find((each) => each.id === id);
  if (!found) throw new Error('The instrument is not listed.');
  return found;
};

const check = (id: string, more: object = {}, client = owner) =>
  client
    .post(`/api/instruments/${id}/checks`)
    .send({ key: randomUUID(), point: 'silver', readC: 957.5, wanderC: 0.5, note: '', ...more });

const bearer = (token: string): Client => server.nobody().set('Authorization', `Bearer ${token}`);

const push = (client: Client, body: object) => client.post('/api/instrument-readings').send(body);

describe('an instrument', () => {
  it('is entered with a token that is told once, and listed with its state', async () => {
    const { instrument, token } = await create();
    expect(token).toMatch(/^[\w-]{43}$/);
    const listed = await owner.get('/api/instruments').expect(200);
    expect(JSON.stringify(listed.body)).not.toContain(token);
    expect(await readOne(instrument.id)).toMatchObject({
      kind: 'thermometer',
      thermocouple: 'K',
      lastReading: null,
      lastCheck: null,
      due: { state: 'never' },
      abilities: { revoke: true, check: true },
    });
  });

  it('stands at a terminal in use, or is refused', async () => {
    const { terminal } = await buildTerminal(server.services);
    expect((await create({ terminalId: terminal.id })).instrument.terminal?.name).toBe(terminal.name);
    const refused = await owner.post('/api/instruments').send({ ...thermometer, terminalId: randomUUID() });
    expect(refused.body).toMatchObject({ fields: [{ path: 'terminalId' }] });
  });

  it.each([
    ['a thermometer without a letter', { thermocouple: null }, 'thermocouple'],
    ['a balance with one', { kind: 'balance' }, 'thermocouple'],
    ['no name', { name: ' ' }, 'name'],
    ['a kind of no kind', { kind: 'sundial' }, 'kind'],
  ])('is refused with %s', async (_what, more, path) => {
    const response = await owner.post('/api/instruments').send({ ...thermometer, ...more });
    expect(response.body).toMatchObject({ fields: [{ path }] });
  });

  it('has a name of its own among those in use', async () => {
    const { instrument } = await create({ name: 'Twin' });
    const again = await owner.post('/api/instruments').send({ ...thermometer, name: 'twin' });
    expect(again.body).toMatchObject({ fields: [{ path: 'name' }] });
    await owner.post(`/api/instruments/${instrument.id}/revoke`).expect(200);
    await owner
      .post('/api/instruments')
      .send({ ...thermometer, name: 'twin' })
      .expect(201);
  });

  it('is ended once, and its token opens nothing any more', async () => {
    const { instrument, token } = await create();
    await owner.post(`/api/instruments/${instrument.id}/revoke`).expect(200);
    expect((await readOne(instrument.id)).active).toBe(false);
    const response = await push(bearer(token), { key: randomUUID(), temperatureC: 900 });
    expect([response.status, problemIdOf(response)]).toEqual([401, 'token-refused']);
    expect(problemIdOf(await owner.post(`/api/instruments/${instrument.id}/revoke`))).toBe('not-allowed');
    expect(problemIdOf(await check(instrument.id))).toBe('not-allowed');
  });
});

describe('a check at a freezing point', () => {
  it('gives the offset, in words too, and when the next is due', async () => {
    const { instrument } = await create();
    const body = (await check(instrument.id, { note: 'Graphite cover.' }).expect(201)).body as Instrument;
    expect(body.lastCheck).toMatchObject({ point: 'silver', offsetC: 4.3, uncertaintyC: 1.3 });
    expect(body.lastCheck?.sentence).toMatch(/^Reads 4\.3 °C low at 961\.78 °C/);
    expect(body.due).toMatchObject({ state: 'in-date', dueAt: '2026-12-31T10:00:00.000Z' });
  });

  it('is overdue after the studio’s interval, which the owner sets', async () => {
    const { instrument } = await create();
    await check(instrument.id, { checkedAt: '2026-11-20T10:00:00Z' }).expect(201);
    expect((await readOne(instrument.id)).due?.state).toBe('in-date');
    const { abilities: _, ...settings } = (await owner.get('/api/studio')).body as Record<string, unknown>;
    await owner
      .patch('/api/studio')
      .send({ ...settings, pyrometerCheckDays: 7 })
      .expect(200);
    expect((await readOne(instrument.id)).due).toMatchObject({
      state: 'overdue',
      sentence: 'Check overdue by 4 days.',
    });
    const { abilities: __, ...later } = (await owner.get('/api/studio')).body as Record<string, unknown>;
    await owner
      .patch('/api/studio')
      .send({ ...later, pyrometerCheckDays: 30 })
      .expect(200);
  });

  it('is recorded once however often it is sent, and a key is not used twice', async () => {
    const { instrument } = await create();
    const key = randomUUID();
    const answers = await Promise.all([1, 2, 3].map(() => check(instrument.id, { key })));
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    const kept = (await owner.get(`/api/instruments/${instrument.id}/checks`)).body as PyrometerCheck[];
    expect(kept).toHaveLength(1);
    expect(problemIdOf(await check(instrument.id, { key, readC: 950 }))).toBe('reading-refused');
  });

  it('is refused when its offset is absurd, or nothing stood still', async () => {
    const { instrument } = await create();
    for (const more of [{ readC: 1064 }, { wanderC: 9 }]) {
      const response = await check(instrument.id, more);
      expect([response.status, problemIdOf(response)]).toEqual([400, 'invalid-request']);
      expect(response.body).toMatchObject({ fields: [{ path: 'readC' }] });
    }
    expect((await readOne(instrument.id)).lastCheck).toBeNull();
  });

  it('is a caster’s to make at a terminal too, and none is made of a balance', async () => {
    const { instrument } = await create();
    const { client } = await server.terminalAs('caster');
    await check(instrument.id, {}, client).expect(201);
    const balance = await create({ kind: 'balance', thermocouple: null });
    expect(balance.instrument.due).toBeNull();
    expect(problemIdOf(await check(balance.instrument.id))).toBe('not-allowed');
  });
});

describe('a logger with its token', () => {
  it('sends one reading without any header of ours, and a terminal reads it with its offset', async () => {
    const { instrument, token } = await create();
    await check(instrument.id).expect(201);
    const response = await fetch(`${server.origin}/api/instrument-readings`, {
      method: 'POST',
      headers: { Authorization: `Bearer ${token}`, 'Content-Type': 'application/json' },
      body: JSON.stringify({ key: randomUUID(), temperatureC: 892.4, takenAt: START }),
    });
    expect(response.status).toBe(201);
    expect(await response.json()).toMatchObject({ recorded: 1, again: false });
    server.advance(3);
    const { client } = await server.terminalAs('apprentice');
    expect((await client.get(`/api/instruments/${instrument.id}/latest`).expect(200)).body).toEqual({
      reading: { rawC: 892.4, offsetC: 4.3, temperatureC: 896.7, fault: null, takenAt: START, ageS: 3 },
    });
  });

  it('sends a batch once, however often it is delivered, also at one moment', async () => {
    const { instrument, token } = await create();
    const client = bearer(token);
    const body = {
      key: randomUUID(),
      readings: [
        { temperatureC: 900, sequence: 1 },
        { temperatureC: 899, sequence: 2 },
        { fault: 'open', sequence: 3 },
      ],
    };
    const answers = await Promise.all([push(client, body), push(client, body), push(client, body)]);
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect(answers.filter(({ body: answer }) => !(answer as PushedReadings).again)).toHaveLength(1);
    expect(
      await server.services.models.InstrumentReading.count({ where: { instrumentId: instrument.id } }),
    ).toBe(3);
    const other = await push(client, { ...body, readings: [{ temperatureC: 1 }] });
    expect([other.status, problemIdOf(other)]).toEqual([409, 'reading-refused']);
    expect((await readOne(instrument.id)).lastReading).toMatchObject({ fault: 'open', temperatureC: null });
  });

  it('keeps a reading’s own time, but none that is still to come', async () => {
    const { instrument, token } = await create();
    await push(bearer(token), {
      key: randomUUID(),
      temperatureC: 900,
      takenAt: '2036-01-01T00:00:00Z',
    }).expect(201);
    expect((await readOne(instrument.id)).lastReading?.takenAt).toBe(server.services.now().toISOString());
  });

  it.each<[string, object, string]>([
    ['nothing', {}, 'readings'],
    ['an empty batch', { readings: [] }, 'readings'],
    ['a temperature and a fault', { temperatureC: 900, fault: 'open' }, 'readings.0.temperatureC'],
    ['words', { temperatureC: 'hot' }, 'readings.0.temperatureC'],
    ['what type K cannot read', { temperatureC: 1500 }, 'readings.0.temperatureC'],
    [
      'a time before there were records',
      { temperatureC: 900, takenAt: '1970-01-01T00:00:01Z' },
      'readings.0.takenAt',
    ],
    ['no key', { key: undefined, temperatureC: 900 }, 'key'],
  ])('is told at the field when it sends %s', async (_what, more, path) => {
    const { token } = await create();
    const response = await push(bearer(token), { key: randomUUID(), ...more });
    expect(response.status).toBe(400);
    expect(response.body).toMatchObject({ fields: [{ path }] });
    expect(sentenceOf(response)).toMatch(/\.$/);
  });

  it('opens nothing else', async () => {
    const { token } = await create();
    expect(problemIdOf(await bearer(token).get('/api/melts'))).toBe('not-signed-in');
    expect(problemIdOf(await bearer(token).get('/api/instruments'))).toBe('not-signed-in');
  });

  it('is slowed down when it sends without end', async () => {
    const { token } = await create();
    const client = bearer(token);
    let last = await push(client, {});
    for (let k = 0; k < 240; k++) last = await push(client, {});
    expect([last.status, problemIdOf(last)]).toEqual([429, 'too-many-requests']);
    expect(last.body).toMatchObject({ retryAfterS: 60 });
  });
});

describe('a terminal’s token', () => {
  it('sends readings of the instrument it names', async () => {
    const { token } = await buildTerminal(server.services);
    const { instrument } = await buildInstrument(server.services);
    const body = { key: randomUUID(), temperatureC: 900 };
    const unnamed = await push(bearer(token), body);
    expect(unnamed.body).toMatchObject({ fields: [{ path: 'instrumentId' }] });
    await push(bearer(token), { ...body, instrumentId: instrument.id }).expect(201);
    expect(
      problemIdOf(await push(bearer(token), { ...body, key: randomUUID(), instrumentId: randomUUID() })),
    ).toBe('not-found');
    await push(server.atTerminal(token), {
      key: randomUUID(),
      temperatureC: 901,
      instrumentId: instrument.id,
    }).expect(201);
  });

  it('is refused readings of a balance, of an ended instrument, and of another’s token', async () => {
    const { token } = await buildTerminal(server.services);
    const balance = await buildInstrument(server.services, { kind: 'balance', thermocouple: null });
    const ended = await create();
    await owner.post(`/api/instruments/${ended.instrument.id}/revoke`).expect(200);
    for (const { instrument } of [balance, ended]) {
      const response = await push(bearer(token), {
        key: randomUUID(),
        temperatureC: 900,
        instrumentId: instrument.id,
      });
      expect(problemIdOf(response)).toBe('reading-refused');
    }
    const one = await create();
    const crossed = await push(bearer(one.token), {
      key: randomUUID(),
      temperatureC: 900,
      instrumentId: balance.instrument.id,
    });
    expect(crossed.body).toMatchObject({ fields: [{ path: 'instrumentId' }] });
  });
});

describe('without a token that is known', () => {
  it.each(['Bearer nonsense', `Bearer ${'x'.repeat(43)}`, 'Basic abc'])('%s is refused', async (header) => {
    const response = await server
      .nobody()
      .set('Authorization', header)
      .post('/api/instrument-readings')
      .send({});
    expect([response.status, problemIdOf(response)]).toEqual([401, 'token-refused']);
  });

  it('another site cannot send in a logger’s name from a browser', async () => {
    const { token } = await create();
    const response = await bearer(token)
      .post('/api/instrument-readings')
      .set('Origin', 'https://example.org')
      .send({ key: randomUUID(), temperatureC: 900 });
    expect(problemIdOf(response)).toBe('foreign-request');
  });
});
