import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { MeltEvent, PourCard } from '#shared/contracts/card.ts';
import type { Melt } from '#shared/contracts/melt.ts';
import { buildCasting, PLANNED_G } from '#tests/factories/build-casting.ts';
import { eventsTo } from '#tests/factories/card-events.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { openCard } from '#tests/support/ask-for-card.ts';
import { deliverEvent } from '#tests/support/deliver-event.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, START, type TerminalClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let terminal: TerminalClient;
beforeAll(async () => {
  server = await startTestServer();
  terminal = await server.terminalAs('caster');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

let meltId = '';
let card: PourCard;
beforeEach(async () => {
  const { id } = await buildCasting(server.services);
  ({ card, meltId } = await openCard(terminal.client, id));
});

const deliver = (event: object, stamp = {}) => deliverEvent(terminal.client, meltId, event, stamp);

const readMelt = async (): Promise<Melt> =>
  (await terminal.client.get(`/api/melts/${meltId}`).expect(200)).body as Melt;

const leadTo = async (step: Parameters<typeof eventsTo>[0]): Promise<void> => {
  for (const event of eventsTo(step, card.context)) await deliver(event).expect(201);
};

describe('the charge', () => {
  beforeEach(() => leadTo('charge'));

  const weigh = (massG: unknown, kind = 'grain') => deliver({ type: 'charge-weighed', kind, massG });

  it.each([
    [-1, /above zero/],
    [0, /above zero/],
    [1e9, /more than a studio could melt/],
    ['12,5', /mass in numbers/],
    ['abc', /mass in numbers/],
    ['12.5', /mass in numbers/],
    [null, /mass in numbers/],
    [[12.5], /mass in numbers/],
    [true, /mass in numbers/],
  ])('refuses a mass of %j, and writes nothing', async (massG, reason) => {
    const response = await weigh(massG);
    expect(problemIdOf(response)).toBe('invalid-request');
    expect(sentenceOf(response)).toMatch(reason);
    expect(response.body).toMatchObject({ fields: [{ path: 'event.massG' }] });
    expect((await readMelt()).metalInG).toBe(0);
  });

  it.each(['NaN', 'Infinity', '-Infinity', '1e999', '0x10', '.5', '+5'])(
    'refuses a bare %s where JSON wants a number',
    async (text) => {
      const event = `{"type":"charge-weighed","kind":"grain","massG":${text}}`;
      const response = await terminal.client
        .post(`/api/melts/${meltId}/events`)
        .type('json')
        .send(`{"key":"${crypto.randomUUID()}","occurredAt":"${START}","event":${event}}`);
      expect(problemIdOf(response)).toBe('invalid-request');
      expect((await readMelt()).metalInG).toBe(0);
    },
  );

  it('is closed only when it is near the planned mass, with no more returns than the studio allows', async () => {
    await weigh(PLANNED_G * 0.97).expect(201);
    expect(sentenceOf(await deliver({ type: 'charge-closed' }))).toBe(
      'The charge is 97.00 g. The card wants between 98.00 g and 102.00 g: weigh more in.',
    );
    await weigh(PLANNED_G * 0.06).expect(201);
    expect(sentenceOf(await deliver({ type: 'charge-closed' }))).toMatch(/take some out/);
    await deliver({ type: 'charge-taken-out', kind: 'grain', massG: 60 }).expect(201);
    await weigh(57, 'returns').expect(201);
    expect(sentenceOf(await deliver({ type: 'charge-closed' }))).toMatch(/57 % of the charge is returns/);
    expect(problemIdOf(await deliver({ type: 'charge-taken-out', kind: 'returns', massG: 57.01 }))).toBe(
      'event-refused',
    );
    await deliver({ type: 'charge-taken-out', kind: 'returns', massG: 10 }).expect(201);
    await weigh(10).expect(201);
    await deliver({ type: 'charge-closed' }).expect(201);
    expect(await readMelt()).toMatchObject({ step: 'melt', metalInG: PLANNED_G });
  });
});

describe('a reading', () => {
  beforeEach(() => leadTo('melt'));

  const read = (temperatureC: unknown, confirmed = false) =>
    deliver({ type: 'reading-taken', temperatureC, confirmed });

  const farOver = (): number => card.context.figures.pourC.high + card.context.limits.questionAboveC + 1;

  it('is kept as an event and beside it, with its moment', async () => {
    await read(880.5).expect(201);
    const rows = await server.services.models.Reading.findAll({ where: { meltId } });
    expect(rows.map(({ temperatureC, takenAt }) => [temperatureC, takenAt.toISOString()])).toEqual([
      [880.5, START],
    ]);
  });

  it.each([9800, 2001, -11, '980', null])(
    'of %j is refused as no temperature of a workshop',
    async (value) => {
      const response = await read(value, true);
      expect(problemIdOf(response)).toBe('invalid-request');
      expect(await server.services.models.Reading.count({ where: { meltId } })).toBe(0);
    },
  );

  it('of 1750 is refused on a Celsius terminal, with what was meant, even if someone stands by it', async () => {
    for (const confirmed of [false, true]) {
      const response = await read(1750, confirmed);
      expect([response.status, problemIdOf(response)]).toEqual([422, 'reading-questioned']);
      expect(sentenceOf(response)).toBe(
        '1750 °C is hotter than the furnace goes (1400 °C). Did you mean 1750 °F?',
      );
    }
  });

  it('far over the window is questioned, and kept only when a caster stands by it', async () => {
    const questioned = await read(farOver());
    expect([questioned.status, problemIdOf(questioned)]).toEqual([422, 'reading-questioned']);
    expect(sentenceOf(questioned)).toMatch(/over the pour window\. Is that right\?/);
    await read(farOver(), true).expect(201);
    expect((await readMelt()).state.departures.map(({ kind }) => kind)).toEqual(['reading-confirmed']);
  });

  it('within reason leaves no mark, though the terminal called it confirmed', async () => {
    const body = bodyOf(await read(card.context.figures.pourC.target, true).expect(201));
    expect((body as MeltEvent).event).toMatchObject({ confirmed: false });
    expect((await readMelt()).departures).toBe(0);
  });

  it('outside the window does not let the flask come out', async () => {
    const { low, high } = card.context.figures.pourC;
    expect(sentenceOf(await deliver({ type: 'melt-ready' }))).toBe('Take a reading of the melt first.');
    await read(low - 1).expect(201);
    expect(sentenceOf(await deliver({ type: 'melt-ready' }))).toMatch(/keep heating/);
    await read(high + 1).expect(201);
    expect(sentenceOf(await deliver({ type: 'melt-ready' }))).toMatch(/let it cool/);
    await read(low).expect(201);
    await deliver({ type: 'melt-ready' }).expect(201);
  });
});
