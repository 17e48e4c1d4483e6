import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Melt, MeltPage } from '#shared/contracts/melt.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { problemIdOf } from '#tests/support/problem-id.ts';
import { startTestServer, type SignedInClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
beforeAll(async () => {
  server = await startTestServer();
  owner = await server.deskAs('owner');
  for (let count = 0; count < 5; count += 1) await buildMelt(server.services);
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const page = async (query: object): Promise<MeltPage> =>
  (await owner.client.get('/api/melts').query(query).expect(200)).body as MeltPage;

describe('the melt book', () => {
  it('is read page by page, newest first, and says where the next one begins', async () => {
    const first = await page({ limit: 2 });
    const second = await page({ limit: 2, before: first.next });
    const third = await page({ limit: 2, before: second.next });
    const numbers = [first, second, third].flatMap(({ melts }) => melts.map(({ number }) => number));
    expect(numbers).toEqual([5, 4, 3, 2, 1]);
    expect([first.next, second.next, third.next]).toEqual([4, 2, null]);
    expect((await page({})).melts).toHaveLength(5);
    expect(await page({ before: 1 })).toEqual({ melts: [], next: null });
    expect((await page({ before: Number.MAX_SAFE_INTEGER })).melts).toHaveLength(5);
  });

  it.each([
    { limit: 0 },
    { limit: 201 },
    { limit: 'all' },
    { before: 0 },
    { before: '' },
    { before: 1.5 },
    { limit: [1, 2] },
  ])('refuses to turn to %j', async (query) => {
    expect(problemIdOf(await owner.client.get('/api/melts').query(query))).toBe('invalid-request');
  });

  it('has no page for a melt that is not there', async () => {
    expect(problemIdOf(await owner.client.get(`/api/melts/${randomUUID()}`))).toBe('not-found');
  });
});

describe('an amendment', () => {
  it('is added beside what was written, which stays as it was', async () => {
    const { id } = await buildMelt(server.services, { step: 'melt' });
    const before = (await owner.client.get(`/api/melts/${id}`).expect(200)).body as Melt;
    expect(before).toMatchObject({ amendments: [], abilities: { amend: true } });
    const amend = (body: object) => owner.client.post(`/api/melts/${id}/amendments`).send(body);
    await amend({ seq: 3, note: 'It was 98 g, not 100.' }).expect(201);
    const after = (await amend({ seq: null, note: 'The scale has been replaced.' }).expect(201)).body as Melt;
    expect(after.amendments).toMatchObject([
      { seq: 3, note: 'It was 98 g, not 100.', person: owner.user.name },
      { seq: null, note: 'The scale has been replaced.', person: owner.user.name },
    ]);
    expect({ ...after, amendments: [] }).toEqual(before);
  });

  it.each([
    [{ seq: 99, note: 'No such entry.' }, 'seq'],
    [{ seq: 0, note: 'No such entry.' }, 'seq'],
    [{ seq: Number.MAX_SAFE_INTEGER, note: 'No such entry.' }, 'seq'],
    [{ seq: null, note: '  ' }, 'note'],
    [{ note: 'Which entry?' }, 'seq'],
  ])('is refused when it is %j', async (body, path) => {
    const { id } = await buildMelt(server.services);
    const response = await owner.client.post(`/api/melts/${id}/amendments`).send(body);
    expect(problemIdOf(response)).toBe('invalid-request');
    expect(response.body).toMatchObject({ fields: [{ path }] });
  });
});
