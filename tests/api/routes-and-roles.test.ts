import { randomUUID } from 'node:crypto';
import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { ProblemId } from '#shared/contracts/problem.ts';
import { routes } from '#server/routes/index.ts';
import { buildInstrument } from '#tests/factories/build-instrument.ts';
import { buildTerminal } from '#tests/factories/build-terminal.ts';
import { problemIdOf } from '#tests/support/problem-id.ts';
import { startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

/** Everyone who may ask: nobody in particular, a device in three conditions, an instrument with its token, and each role at each place. */
const callers = [
  'nobody',
  'unenrolled device',
  'idle terminal',
  'instrument',
  'owner at the desk',
  'caster at the desk',
  'apprentice at the desk',
  'jeweller at the desk',
  'owner at a terminal',
  'caster at a terminal',
  'apprentice at a terminal',
] as const;
type Caller = (typeof callers)[number];

const everyone = callers;
const signedIn = callers.filter((caller) => caller.includes(' at '));
const atTerminal = callers.filter((caller) => caller.endsWith('at a terminal'));
const ownerAtDesk: readonly Caller[] = ['owner at the desk'];
const decidersAtDesk: readonly Caller[] = ['owner at the desk', 'caster at the desk'];
const enrolledDevices: readonly Caller[] = ['idle terminal', ...atTerminal];

/** Who gets past the door of each route; whoever is not named is refused. */
const whoGetsIn: Readonly<Record<string, readonly Caller[]>> = {
  'GET /api/health': everyone,
  'GET /api/session': everyone,
  'POST /api/session/desk': everyone,
  'POST /api/session/terminal': enrolledDevices,
  'POST /api/session/end': everyone,
  'GET /api/terminals': ownerAtDesk,
  'POST /api/terminals/codes': ownerAtDesk,
  'POST /api/terminals': everyone,
  'POST /api/terminals/:id/revoke': ownerAtDesk,
  'GET /api/people': ownerAtDesk,
  'GET /api/terminal/people': enrolledDevices,
  'POST /api/people': ownerAtDesk,
  'PATCH /api/people/:id': ownerAtDesk,
  'POST /api/people/:id/unlock': ownerAtDesk,
  'GET /api/people/:id/supervised': ownerAtDesk,
  'GET /api/people/:id/supervised.csv': ownerAtDesk,
  'GET /api/instructions': signedIn,
  'GET /api/instructions/:id': signedIn,
  'POST /api/instructions': ownerAtDesk,
  'PATCH /api/instructions/:id': ownerAtDesk,
  'POST /api/instructions/:id/drop': ownerAtDesk,
  'POST /api/instructions/:id/approve': decidersAtDesk,
  'GET /api/studio': ownerAtDesk,
  'PATCH /api/studio': ownerAtDesk,
  'GET /api/alloys': signedIn,
  'GET /api/alloys/:id': signedIn,
  'POST /api/alloys': ownerAtDesk,
  'POST /api/alloys/:id/revisions': ownerAtDesk,
  'POST /api/alloy-revisions/:id/check': decidersAtDesk,
  'POST /api/alloy-revisions/:id/approve': ownerAtDesk,
  'GET /api/flasks': signedIn,
  'GET /api/castings': signedIn,
  'POST /api/castings/:id/move': [...decidersAtDesk, 'owner at a terminal', 'caster at a terminal'],
  'GET /api/cards': atTerminal,
  'GET /api/cards/:id': atTerminal,
  'POST /api/cards/:id/open': atTerminal,
  'GET /api/melts': signedIn,
  'GET /api/melts/:id': signedIn,
  'POST /api/melts/:id/events': atTerminal,
  'POST /api/melts/:id/countersigns': atTerminal,
  'POST /api/melts/:id/photographs': atTerminal,
  'GET /api/melts/:id/photographs/:photographId': signedIn,
  'POST /api/melts/:id/amendments': decidersAtDesk,
  'GET /api/lots': [...decidersAtDesk, ...atTerminal],
  'GET /api/lots/by-code': [...decidersAtDesk, ...atTerminal],
  'GET /api/lots/:id': [...decidersAtDesk, ...atTerminal],
  'POST /api/lots': decidersAtDesk,
  'POST /api/lots/:id/amendments': decidersAtDesk,
  'POST /api/lots/:id/release': ownerAtDesk,
  'POST /api/lots/:id/counts': decidersAtDesk,
  'POST /api/lots/:id/dispatches': decidersAtDesk,
  'POST /api/lots/:id/documents': decidersAtDesk,
  'GET /api/lots/:id/documents/:documentId': decidersAtDesk,
  'POST /api/lot-intake/preview': decidersAtDesk,
  'POST /api/lot-intake': decidersAtDesk,
  'GET /api/metal/movements': decidersAtDesk,
  'POST /api/metal/movements/:id/corrections': decidersAtDesk,
  'GET /api/metal/reconciliation': ownerAtDesk,
  'GET /api/metal/reconciliation.csv': ownerAtDesk,
  'GET /api/metal/reconciliation.pdf': ownerAtDesk,
  'POST /api/charge-plans/proposals': decidersAtDesk,
  'POST /api/charge-plans/pot': decidersAtDesk,
  'POST /api/charge-plans': decidersAtDesk,
  'GET /api/charge-plans': [...decidersAtDesk, ...atTerminal],
  'GET /api/melts/:id/charge': [...decidersAtDesk, ...atTerminal],
  'GET /api/metal/crucibles': decidersAtDesk,
  'POST /api/melts/:id/close-out': decidersAtDesk,
  'GET /api/instruments': [...decidersAtDesk, ...atTerminal],
  'POST /api/instruments': ownerAtDesk,
  'POST /api/instruments/:id/revoke': ownerAtDesk,
  'GET /api/instruments/:id/latest': [...decidersAtDesk, ...atTerminal],
  'GET /api/instruments/:id/checks': [...decidersAtDesk, ...atTerminal],
  'POST /api/instruments/:id/checks': [...decidersAtDesk, 'owner at a terminal', 'caster at a terminal'],
  'POST /api/instrument-readings': [...enrolledDevices, 'instrument'],
  'GET /api/flask-cooling': [...decidersAtDesk, ...atTerminal],
  'POST /api/flask-cooling': [...decidersAtDesk, ...atTerminal],
  'GET /api/melts/:id/cooling-curves': [...decidersAtDesk, ...atTerminal],
  'POST /api/melts/:id/cooling-curves': [...decidersAtDesk, ...atTerminal],
};

/** Where a device, not a person, is wanted, those outside are told so. */
const wantsTerminal = ['POST /api/session/terminal', 'GET /api/terminal/people'];

/** Where a token is wanted, not a person. */
const wantsToken = ['POST /api/instrument-readings'];

const keyOf = ({ method, path }: { readonly method: string; readonly path: string }): string =>
  `${method.toUpperCase()} ${path}`;

const refusals: readonly (ProblemId | null)[] = [
  'not-signed-in',
  'not-allowed',
  'terminal-not-enrolled',
  'token-refused',
];

const expectedAnswer = (route: string, caller: Caller): string => {
  if (whoGetsIn[route]?.includes(caller)) return 'gets in';
  if (wantsTerminal.includes(route)) return 'terminal-not-enrolled';
  if (wantsToken.includes(route)) return 'token-refused';
  return signedIn.includes(caller) ? 'not-allowed' : 'not-signed-in';
};

/** What the door said. Requests are empty and name no record of ours, so whoever gets in may still be told so. */
const answerOf = (response: Response): string => {
  const id = problemIdOf(response);
  if (response.status >= 500) return `failed with ${response.status}`;
  return id !== null && refusals.includes(id) ? id : 'gets in';
};

let server: TestServer;
let clients: Readonly<Record<Caller, Client>>;
beforeAll(async () => {
  server = await startTestServer();
  clients = {
    nobody: server.nobody('desk'),
    'unenrolled device': server.nobody('terminal'),
    'idle terminal': server.atTerminal((await buildTerminal(server.services)).token),
    instrument: server
      .nobody()
      .set('Authorization', `Bearer ${(await buildInstrument(server.services)).token}`),
    'owner at the desk': (await server.deskAs('owner')).client,
    'caster at the desk': (await server.deskAs('caster')).client,
    'apprentice at the desk': (await server.deskAs('apprentice')).client,
    'jeweller at the desk': (await server.deskAs('jeweller')).client,
    'owner at a terminal': (await server.terminalAs('owner')).client,
    'caster at a terminal': (await server.terminalAs('caster')).client,
    'apprentice at a terminal': (await server.terminalAs('apprentice')).client,
  };
});
afterAll(() => server.close());

describe('every route', () => {
  it('declares who may, and has its line in the table above', () => {
    expect(routes.map(keyOf).sort()).toEqual(Object.keys(whoGetsIn).sort());
    for (const { policy } of routes) expect(policy.who).toBeTypeOf('function');
  });

  it('is mounted by the list of routes, and nothing else is', () => {
    const mounted = server.handler.router.stack.flatMap(({ route }) =>
      route ? [...new Set(route.stack.map(({ method }) => keyOf({ method, path: route.path })))] : [],
    );
    expect(mounted.sort()).toEqual(routes.map(keyOf).sort());
  });
});

describe.each(callers)('%s', (caller) => {
  // Ending the session comes last, for it ends it.
  const walk = [...routes].sort(
    (one, other) => Number(one.path.endsWith('/end')) - Number(other.path.endsWith('/end')),
  );

  it('is answered at every route as the table says', async () => {
    const answers: Record<string, string> = {};
    for (const { method, path } of walk) {
      const response = await clients[caller][method](path.replace(':id', randomUUID()));
      answers[keyOf({ method, path })] = answerOf(response);
    }
    const keys = walk.map(keyOf);
    expect(answers).toEqual(Object.fromEntries(keys.map((key) => [key, expectedAnswer(key, caller)])));
    server.expectNoSurprises();
  });
});

describe('the whole API', () => {
  it('knows nothing at other addresses', async () => {
    for (const path of ['/api/', '/api/nothing', '/api/people/x/y', '/api/session/desk/']) {
      const response = await clients.nobody.get(path);
      expect([response.status, problemIdOf(response)]).toEqual([404, 'not-found']);
    }
  });
});
