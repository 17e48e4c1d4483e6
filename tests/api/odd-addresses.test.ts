import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { routes } from '#server/routes/index.ts';
import { ANSWER_MS, expectCalm } from '#tests/support/expect-calm.ts';
import { startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: Client;
let terminal: Client;
beforeAll(async () => {
  server = await startTestServer();
  owner = (await server.deskAs('owner')).client;
  terminal = (await server.terminalAs('caster')).client;
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const oddIds = [
  '%00',
  '%E0%A4%A',
  '%2e%2e%2fpeople',
  '%20',
  "'%20or%201=1--",
  '00000000-0000-0000-0000-000000000000',
  'FFFFFFFF-FFFF-FFFF-FFFF-FFFFFFFFFFFF',
  '1',
  '-1',
  '__proto__',
  'constructor',
  '%F0%9F%94%A5',
  'x'.repeat(4_000),
];

describe.each(routes.filter(({ params }) => params).map(({ method, path }) => `${method} ${path}`))(
  '%s',
  (key) => {
    it('takes any address calmly', async () => {
      const [method, path] = key.split(' ') as ['get' | 'post' | 'patch', string];
      const isOfTerminal = path.startsWith('/api/cards') || /\/(events|countersigns|photographs)$/.test(path);
      const client = isOfTerminal ? terminal : owner;
      for (const id of oddIds) {
        const response = await client[method](path.replace(':id', id)).timeout(ANSWER_MS);
        expectCalm(response);
        expect([400, 404]).toContain(response.status);
      }
    });
  },
);

describe('a question after the address', () => {
  const odd = [
    'code=%00',
    'code=%E0%A4%A',
    'code[]=1',
    'code=a&code=b',
    'code[$gt]=',
    '__proto__=x',
    '__proto__[a]=1',
    'constructor=1',
    'on=%00',
    'on=0000-01-01',
    'on=9999-12-31',
    'on=2026-12-01&on=2026-12-02',
    'limit=1e309',
    'limit=0x10',
    'limit=%20',
    'before=-1',
    'before=99999999999999999999',
    'before[]=1',
    'limit=1&limit=2',
    '&&&==',
    'a=1&'.repeat(1_500),
  ];

  it.each(['/api/castings', '/api/melts', '/api/cards', '/api/session', '/api/alloys'])(
    'is taken calmly by %s',
    async (path) => {
      const client = path === '/api/cards' ? terminal : owner;
      for (const query of odd) expectCalm(await client.get(`${path}?${query}`).timeout(ANSWER_MS));
    },
  );
});

describe('odd headers', () => {
  it.each([
    ['Cookie', 'ladlemark-desk=%; ladlemark-token=%00; ='],
    ['Cookie', 'ladlemark-token=<script>; ladlemark-terminal=s:x.y'],
    ['Ladlemark-Place', 'nowhere'],
    ['X-Forwarded-For', 'not an address, , ::1'],
    ['Accept', 'text/html'],
    ['If-None-Match', '*'],
    ['Range', 'bytes=0-'],
  ])('%s: %s is taken calmly', async (name, value) => {
    expectCalm(await server.nobody().get('/api/session').set(name, value));
    expectCalm(await server.nobody().post('/api/session/desk').set(name, value).send({}));
  });
});
