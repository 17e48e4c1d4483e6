import { gzipSync } from 'node:zlib';
import fc from 'fast-check';
import type { Response, Test } from 'supertest';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { routes } from '#server/routes/index.ts';
import { ANSWER_MS, expectCalm } from '#tests/support/expect-calm.ts';
import { oddJson, spoilt } from '#tests/support/odd-json.ts';
import { problemIdOf } from '#tests/support/problem-id.ts';
import { buildRequestTargets, type RequestTarget } from '#tests/support/request-targets.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let targets: Readonly<Record<string, RequestTarget>>;
beforeAll(async () => {
  server = await startTestServer();
  targets = await buildRequestTargets(server);
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const withBody = routes.filter(({ body }) => body).map(({ method, path }) => `${method} ${path}`);

const targetOf = (key: string): RequestTarget => {
  const target = targets[key];
  if (!target) throw new Error(`${key} reads a body and is not tried here.`);
  return target;
};

let addresses = 0;
const begin = (key: string): Test => {
  const { client, path } = targetOf(key);
  const method = key.startsWith('patch') ? 'patch' : 'post';
  addresses += 1;
  // From a new address each time, or the limit of sign-ins would answer in place of the route.
  return client[method](path)
    .set('X-Forwarded-For', `10.9.${addresses >> 8}.${addresses & 255}`)
    .timeout(ANSWER_MS);
};

const send = async (key: string, json: string): Promise<Response> => {
  const response = await begin(key).type('json').send(json);
  expectCalm(response);
  return response;
};

describe.each(withBody)('%s', (key) => {
  it('takes any JSON calmly', async () => {
    await fc.assert(
      fc.asyncProperty(oddJson(), async (value) => {
        await send(key, JSON.stringify(value));
      }),
      { numRuns: 8, seed: 20_261_201 },
    );
  });

  it('takes a good request with something odd in it calmly', async () => {
    await fc.assert(
      fc.asyncProperty(spoilt(targetOf(key).good), async (value) => {
        await send(key, JSON.stringify(value));
      }),
      { numRuns: 25, seed: 20_261_201 },
    );
  });

  it('refuses the wrong shape as a bad request', async () => {
    for (const json of ['{}', '[]', '[{}]', '{"__proto__":{"isOwner":true}}'])
      expect([json, problemIdOf(await send(key, json))]).toEqual([json, 'invalid-request']);
  });
});

describe('a body that is no JSON', () => {
  const key = 'post /api/terminals/codes';

  it.each([
    ['empty', ''],
    ['half', '{"name":'],
    ['more than one', '{}{}'],
    ['a bare word', 'true'],
    ['null', 'null'],
    ['a number', '42'],
    ['a text', '"text"'],
    ['not a number', '{"name":NaN}'],
    ['a null character in a text', '{"name":"a\\u0000b","bay":"bay"}'],
    ['a null character in a key', '{"a\\u0000":1}'],
    ['half a surrogate pair', '{"name":"\\ud800","bay":"bay"}'],
    ['nested out of reason', '['.repeat(100_000)],
    ['nested out of reason and closed', `${'['.repeat(100_000)}${']'.repeat(100_000)}`],
    ['objects nested out of reason', `${'{"a":'.repeat(30_000)}1${'}'.repeat(30_000)}`],
  ])('is refused when it is %s', async (_what, json) => {
    expect(problemIdOf(await send(key, json))).toBe('invalid-request');
  });

  it('is refused when it is larger than 256 kB, packed or not', async () => {
    const large = JSON.stringify({ name: 'x'.repeat(300_000), bay: 'bay' });
    const plain = await send(key, large);
    expect([plain.status, problemIdOf(plain)]).toEqual([413, 'too-large']);
    const packed = await begin(key)
      .set('Content-Encoding', 'gzip')
      .type('json')
      .serialize((body: unknown) => body as string)
      .send(gzipSync(large) as never);
    expect([packed.status, problemIdOf(packed)]).toEqual([413, 'too-large']);
  });

  it.each(['gzip', 'deflate', 'br', 'zstd', 'nothing-of-the-kind'])(
    'is refused when it is said to be packed with %s and is not',
    async (encoding) => {
      const response = await begin(key)
        .set('Content-Encoding', encoding)
        .type('json')
        .send('{"name":"a","bay":"b"}');
      expectCalm(response);
      expect(problemIdOf(response)).toBe('invalid-request');
    },
  );

  it.each([
    'text/plain',
    'application/x-www-form-urlencoded',
    'multipart/form-data',
    'application/octet-stream',
    'application/json; charset=latin1',
    'application/xml',
    'nonsense',
  ])('is refused when it comes as %s', async (type) => {
    const response = await begin(key).set('Content-Type', type).send('{"name":"a","bay":"b"}');
    expectCalm(response);
    expect(problemIdOf(response)).toBe('invalid-request');
  });
});
