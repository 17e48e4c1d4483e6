import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Enrolment, Terminal } from '#shared/contracts/terminal.ts';
import { buildTerminal } from '#tests/factories/build-terminal.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: Client;
beforeAll(async () => {
  server = await startTestServer();
  owner = (await server.deskAs('owner')).client;
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const makeCode = async (): Promise<string> => {
  const body = bodyOf(
    await owner.post('/api/terminals/codes').send({ name: 'Terminal by the door', bay: 'bay 2' }).expect(201),
  );
  return (body as Enrolment).code;
};

const enrol = (client: Client, code: string) => client.post('/api/terminals').send({ code });

const isTerminal = async (client: Client): Promise<boolean> =>
  (await client.get('/api/terminal/people')).status === 200;

describe('an enrolment code', () => {
  it('has eight digits and makes the device that types it a terminal', async () => {
    const code = await makeCode();
    expect(code).toMatch(/^\d{8}$/);
    const device = server.nobody('terminal');
    expect(await isTerminal(device)).toBe(false);
    const response = await enrol(device, `${code.slice(0, 4)} ${code.slice(4)}`).expect(201);
    expect(response.body).toMatchObject({ name: 'Terminal by the door', bay: 'bay 2', revokedAt: null });
    expect(response.get('Set-Cookie')?.[0]).toMatch(/^ladlemark-token=.*HttpOnly.*SameSite=Strict/);
    expect(JSON.stringify(response.body)).not.toMatch(/token/i);
    expect(await isTerminal(device)).toBe(true);
  });

  it('works once', async () => {
    const code = await makeCode();
    await enrol(server.nobody('terminal'), code).expect(201);
    const again = await enrol(server.nobody('terminal'), code);
    expect([problemIdOf(again), sentenceOf(again)]).toEqual([
      'invalid-request',
      'That code is used up or too old. Make a new one at the desk.',
    ]);
  });

  it('works once for devices that type it at the same moment', async () => {
    const code = await makeCode();
    const answers = await Promise.all([1, 2, 3, 4].map(() => enrol(server.nobody('terminal'), code)));
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 400, 400, 400]);
  });

  it('is too old after fifteen minutes', async () => {
    const code = await makeCode();
    server.advance(15 * 60 - 1);
    const fresh = await makeCode();
    server.advance(1);
    const device = server.nobody('terminal');
    expect(sentenceOf(await enrol(device, code))).toMatch(/too old/);
    expect(await isTerminal(device)).toBe(false);
    await enrol(device, fresh).expect(201);
  });

  it.each(['00000000', '1234', '', 'code', '123456789'])('is refused when it is %j', async (code) => {
    const response = await enrol(server.nobody('terminal'), code);
    expect(problemIdOf(response)).toBe('invalid-request');
    expect(response.body).toMatchObject({ fields: [{ path: 'code' }] });
  });

  it('is not kept in the clear', async () => {
    const code = await makeCode();
    const rows = await server.services.models.TerminalEnrolment.findAll({ raw: true });
    expect(JSON.stringify(rows)).not.toContain(code);
  });
});

describe('the list of terminals', () => {
  it('shows when each was last seen, and lets one be revoked once', async () => {
    const { terminal, token } = await buildTerminal(server.services);
    const device = server.atTerminal(token);
    await device.get('/api/terminal/people').expect(200);
    const find = async (): Promise<Terminal | undefined> =>
      ((await owner.get('/api/terminals').expect(200)).body as Terminal[]).find(
        ({ id }) => id === terminal.id,
      );
    expect(await find()).toMatchObject({
      lastSeenAt: server.services.now().toISOString(),
      abilities: { revoke: true },
    });
    const body = bodyOf(await owner.post(`/api/terminals/${terminal.id}/revoke`).expect(200));
    expect(await find()).toMatchObject({
      revokedAt: (body as Terminal).revokedAt,
      abilities: { revoke: false },
    });
    expect(await isTerminal(device)).toBe(false);
    server.advance(60);
    await owner.post(`/api/terminals/${terminal.id}/revoke`).expect(200);
    expect((await find())?.revokedAt).toBe((body as Terminal).revokedAt);
  });
});
