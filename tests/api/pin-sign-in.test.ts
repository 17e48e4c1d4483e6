import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Session } from '#shared/contracts/session.ts';
import { buildTerminal } from '#tests/factories/build-terminal.ts';
import { buildUser, PASSWORD, PIN } from '#tests/factories/build-user.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { problemIdOf } from '#tests/support/problem-id.ts';
import { setCookiesOf } from '#tests/support/set-cookies.ts';
import { startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

const WRONG = '000000';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const enrolled = async (): Promise<Client> => server.atTerminal((await buildTerminal(server.services)).token);

const signIn = (client: Client, personId: string, pin: string) =>
  client.post('/api/session/terminal').send({ personId, pin });

const whoIs = async (client: Client): Promise<Session> =>
  (await client.get('/api/session').expect(200)).body as Session;

describe('signing in at a terminal', () => {
  it('takes a person and a PIN, and shows those who work at the furnace', async () => {
    const { terminal, token } = await buildTerminal(server.services);
    const client = server.atTerminal(token);
    const [apprentice, jeweller, withoutPin, left] = [
      await buildUser(server.services, { roles: ['apprentice'] }),
      await buildUser(server.services, { roles: ['jeweller'] }),
      await buildUser(server.services, { pinHash: null }),
      await buildUser(server.services, { active: false }),
    ];
    const body = bodyOf(await client.get('/api/terminal/people').expect(200));
    const ids = (body as { id: string }[]).map(({ id }) => id);
    expect(ids).toContain(apprentice.id);
    for (const user of [jeweller, withoutPin, left]) {
      expect(ids).not.toContain(user.id);
      expect(problemIdOf(await signIn(client, user.id, PIN))).toBe('wrong-sign-in');
    }
    const session = await signIn(client, apprentice.id, PIN).expect(200);
    expect(session.body).toMatchObject({
      person: { id: apprentice.id },
      terminal: { id: terminal.id },
      via: 'terminal',
      abilities: { seeDesk: false, runCards: true },
    });
    expect(session.get('Set-Cookie')?.[0]).toMatch(/^ladlemark-terminal=.*HttpOnly.*SameSite=Strict/);
  });

  it('takes a PIN only on an enrolled device', async () => {
    const { id } = await buildUser(server.services);
    for (const client of [server.nobody('terminal'), server.nobody('desk'), server.atTerminal('made-up')]) {
      expect(problemIdOf(await signIn(client, id, PIN))).toBe('terminal-not-enrolled');
    }
  });

  it('takes no PIN for the desk, though the device is enrolled', async () => {
    const { id } = await buildUser(server.services, { roles: ['owner'] });
    const client = (await enrolled()).set('Ladlemark-Place', 'desk');
    expect(problemIdOf(await signIn(client, id, PIN))).toBe('invalid-request');
    expect((await whoIs(client)).person).toBeNull();
  });

  it('makes each wrong PIN after the third wait longer, and looks at none meanwhile', async () => {
    const { id } = await buildUser(server.services, { pinFailures: 2 });
    const client = await enrolled();
    for (const seconds of [1, 2, 4, 8]) {
      expect(problemIdOf(await signIn(client, id, WRONG))).toBe('wrong-sign-in');
      const early = await signIn(client, id, PIN).expect(429);
      expect(problemIdOf(early)).toBe('sign-in-delayed');
      expect(early.body).toMatchObject({ retryAfterS: seconds });
      server.advance(seconds);
    }
    await signIn(client, id, PIN).expect(200);
  });

  it('is locked by the tenth wrong PIN, refuses the right one from then on, and is opened by the owner', async () => {
    const user = await buildUser(server.services);
    const client = await enrolled();
    const answers: (string | null)[] = [];
    for (let tries = 1; tries <= 11; tries += 1) {
      answers.push(problemIdOf(await signIn(client, user.id, WRONG)));
      server.advance(60);
    }
    expect(answers.slice(0, 9)).toEqual(Array.from({ length: 9 }, () => 'wrong-sign-in'));
    expect(answers.slice(9)).toEqual(['sign-in-locked', 'sign-in-locked']);
    server.advance(3600);
    expect(problemIdOf(await signIn(client, user.id, PIN))).toBe('sign-in-locked');

    const owner = await server.deskAs('owner');
    const people = (await owner.client.get('/api/people')).body as { id: string; pinLocked: boolean }[];
    expect(people.find(({ id }) => id === user.id)).toMatchObject({
      pinLocked: true,
      abilities: { unlock: true },
    });
    const opened = await owner.client.post(`/api/people/${user.id}/unlock`).expect(200);
    expect(opened.body).toMatchObject({ pinLocked: false, abilities: { unlock: false } });
    await signIn(client, user.id, PIN).expect(200);
  });

  it('is opened by a new PIN as well', async () => {
    const user = await buildUser(server.services, { pinFailures: 10, pinLockedAt: server.services.now() });
    const owner = await server.deskAs('owner');
    await owner.client.patch(`/api/people/${user.id}`).send({ pin: '918273' }).expect(200);
    const client = await enrolled();
    expect(problemIdOf(await signIn(client, user.id, PIN))).toBe('wrong-sign-in');
    await signIn(client, user.id, '918273').expect(200);
  });

  it('begins the count anew after a right PIN', async () => {
    const user = await buildUser(server.services, { pinFailures: 9 });
    const client = await enrolled();
    await signIn(client, user.id, PIN).expect(200);
    expect(problemIdOf(await signIn(client, user.id, WRONG))).toBe('wrong-sign-in');
    expect((await user.reload()).pinFailures).toBe(1);
  });

  it('counts every wrong PIN of two terminals at once', async () => {
    const user = await buildUser(server.services);
    const terminals = [await enrolled(), await enrolled()];
    const answers = await Promise.all(
      terminals.flatMap((client) => Array.from({ length: 6 }, () => signIn(client, user.id, WRONG))),
    );
    const looked = answers.filter((answer) => problemIdOf(answer) === 'wrong-sign-in');
    expect(looked).toHaveLength(3);
    expect(answers.map(problemIdOf).filter((id) => id === 'sign-in-delayed')).toHaveLength(9);
    expect((await user.reload()).pinFailures).toBe(3);
    await user.update({ pinFailures: 9, pinWaitUntil: null });
    const last = await Promise.all(terminals.map((client) => signIn(client, user.id, WRONG)));
    expect(last.map(problemIdOf)).toEqual(['sign-in-locked', 'sign-in-locked']);
    expect((await user.reload()).pinFailures).toBe(10);
  });
});

describe('a session at a terminal', () => {
  it('counts only at the terminal it was opened at', async () => {
    const { user, client } = await server.terminalAs('caster');
    const cookie = setCookiesOf(await signIn(client, user.id, PIN));
    const { token } = await buildTerminal(server.services);
    const elsewhere = server.nobody('terminal').set('Cookie', `${cookie}; ladlemark-token=${token}`);
    const session = await whoIs(elsewhere);
    expect([session.person, session.via]).toEqual([null, null]);
    expect((await whoIs(server.nobody('terminal').set('Cookie', cookie))).person).toBeNull();
    expect((await whoIs(client)).person?.id).toBe(user.id);
  });

  it('opens no desk, even under the name of the desk’s cookie', async () => {
    const { user, client } = await server.terminalAs('owner');
    const cookie = setCookiesOf(await signIn(client, user.id, PIN));
    const renamed = cookie.replace('ladlemark-terminal', 'ladlemark-desk');
    const desk = server.nobody('desk').set('Cookie', renamed);
    expect((await whoIs(desk)).person).toBeNull();
    expect(problemIdOf(await desk.get('/api/people'))).toBe('not-signed-in');
  });

  it('lives beside a session at the desk in one browser, and each ends alone', async () => {
    const { token } = await buildTerminal(server.services);
    const [owner, caster] = [
      await buildUser(server.services, { roles: ['owner'] }),
      await buildUser(server.services),
    ];
    const browser = server.atTerminal(token);
    await signIn(browser, caster.id, PIN).expect(200);
    browser.set('Ladlemark-Place', 'desk');
    expect((await whoIs(browser)).person).toBeNull();
    await browser.post('/api/session/desk').send({ login: owner.login, password: PASSWORD }).expect(200);
    browser.set('Ladlemark-Place', 'terminal');
    expect((await whoIs(browser)).person?.id).toBe(caster.id);
    await browser.post('/api/session/end').expect(204);
    expect((await whoIs(browser)).person).toBeNull();
    browser.set('Ladlemark-Place', 'desk');
    expect((await whoIs(browser)).person?.id).toBe(owner.id);
  });

  it('is dead as soon as its terminal is revoked or its person deactivated', async () => {
    const owner = await server.deskAs('owner');
    const [one, other] = [await server.terminalAs('caster'), await server.terminalAs('caster')];
    await owner.client.post(`/api/terminals/${one.terminal.id}/revoke`).expect(200);
    expect(problemIdOf(await one.client.get('/api/castings'))).toBe('not-signed-in');
    expect(problemIdOf(await signIn(one.client, one.user.id, PIN))).toBe('terminal-not-enrolled');
    await owner.client.patch(`/api/people/${other.user.id}`).send({ active: false }).expect(200);
    expect(problemIdOf(await other.client.get('/api/castings'))).toBe('not-signed-in');
  });
});
