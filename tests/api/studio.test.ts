import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Studio, UpdateStudioRequest } from '#shared/contracts/studio.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { problemIdOf } from '#tests/support/problem-id.ts';
import { startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: Client;
beforeAll(async () => {
  server = await startTestServer();
  owner = (await server.deskAs('owner')).client;
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const read = async (): Promise<UpdateStudioRequest> => {
  const { abilities, ...settings } = (await owner.get('/api/studio').expect(200)).body as Studio;
  expect(abilities.update).toBe(true);
  return settings as UpdateStudioRequest;
};

const store = (settings: object) => owner.patch('/api/studio').send(settings);

describe('the studio’s settings', () => {
  it('are stored as sent, and shown to everyone who signs in', async () => {
    const before = await read();
    const settings = { ...before, temperatureUnit: 'F', massUnit: 'dwt', idleLockS: 90 };
    const body = bodyOf(await store(settings).expect(200));
    expect(body).toMatchObject({ temperatureUnit: 'F', massUnit: 'dwt', version: before.version + 1 });
    expect((await server.nobody().get('/api/session')).body).toMatchObject({
      studio: { units: { temperature: 'F', mass: 'dwt' }, idleLockS: 90 },
    });
  });

  it('are refused when someone else stored others since they were read', async () => {
    const settings = await read();
    await store({ ...settings, name: 'First' }).expect(200);
    const late = await store({ ...settings, name: 'Second' });
    expect([late.status, problemIdOf(late)]).toEqual([409, 'changed-meanwhile']);
    expect((await read()).name).toBe('First');
  });

  it('are taken from one of two who store at once', async () => {
    const settings = await read();
    const answers = await Promise.all(['One', 'Other'].map((name) => store({ ...settings, name })));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  const bands = { thin: { low: 90, high: 100 }, medium: { low: 70, high: 80 }, heavy: { low: 50, high: 60 } };

  it.each<[string, (settings: UpdateStudioRequest) => object, string]>([
    [
      'a range upside down',
      ({ processTables }) => ({
        processTables: {
          ...processTables,
          superheat: { vacuum: { ...bands, thin: { low: 100, high: 90 } }, centrifugal: bands },
        },
      }),
      'processTables.superheat.vacuum.thin.high',
    ],
    [
      'a range that holds no whole degree',
      ({ processTables }) => ({
        processTables: {
          ...processTables,
          superheat: { vacuum: { ...bands, heavy: { low: 50.2, high: 50.7 } }, centrifugal: bands },
        },
      }),
      'processTables.superheat.vacuum.heavy.high',
    ],
    [
      'a missing section',
      ({ processTables }) => ({
        processTables: {
          ...processTables,
          flask: { ...processTables.flask, silver: { thin: bands.thin, heavy: bands.heavy } },
        },
      }),
      'processTables.flask.silver.medium',
    ],
    [
      'no flask size at all',
      ({ processTables }) => ({ processTables: { ...processTables, flaskCooling: [] } }),
      'processTables.flaskCooling',
    ],
    [
      'a flask that may cool down to the room',
      ({ processTables }) => ({
        processTables: {
          ...processTables,
          flask: { ...processTables.flask, silver: { ...bands, heavy: { low: 40, high: 60 } } },
        },
      }),
      'processTables.flaskDropC',
    ],
    [
      'a number without a source',
      ({ processTables }) => ({
        processTables: { ...processTables, sources: { ...processTables.sources, wax: ' ' } },
      }),
      'processTables.sources.wax',
    ],
    [
      'a share above one',
      ({ limits }) => ({ limits: { ...limits, returnsShare: 1.5 } }),
      'limits.returnsShare',
    ],
    ['a time zone that is none', () => ({ timeZone: 'Mars/Olympus' }), 'timeZone'],
    ['a lock of one second', () => ({ idleLockS: 1 }), 'idleLockS'],
    ['a unit of no scale', () => ({ temperatureUnit: 'K' }), 'temperatureUnit'],
  ])('refuse %s at its field', async (_what, change, path) => {
    const settings = await read();
    const response = await store({ ...settings, ...change(settings) });
    expect(problemIdOf(response)).toBe('invalid-request');
    expect(response.body).toMatchObject({ fields: [{ path }] });
    expect((await read()).version).toBe(settings.version);
  });
});
