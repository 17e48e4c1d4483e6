import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Session } from '#shared/contracts/session.ts';
import { buildUser, PASSWORD } from '#tests/factories/build-user.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { setCookiesOf } from '#tests/support/set-cookies.ts';
import { startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const signIn = (client: Client, login: string, password: string) =>
  client.post('/api/session/desk').send({ login, password });

const whoIs = async (client: Client): Promise<Session> =>
  (await client.get('/api/session').expect(200)).body as Session;

describe('signing in at the desk', () => {
  it('opens a session that says who it is and what they may do', async () => {
    const owner = await buildUser(server.services, { roles: ['owner'] });
    const client = server.nobody();
    const body = bodyOf(await signIn(client, owner.login, PASSWORD).expect(200));
    expect(body).toMatchObject({
      person: { id: owner.id, name: owner.name, roles: ['owner'] },
      via: 'desk',
      terminal: null,
      abilities: { seeDesk: true, managePeople: true, runCards: false },
    });
    expect(await whoIs(client)).toEqual(body);
  });

  it('sends the session in a cookie no script can read and no other site can send', async () => {
    const { login } = await buildUser(server.services);
    const response = await signIn(server.nobody(), login, PASSWORD).expect(200);
    const [cookie] = response.get('Set-Cookie') ?? [];
    expect(cookie).toMatch(/^ladlemark-desk=.*HttpOnly.*SameSite=Strict/);
  });

  it('forgives blanks around the name, and capitals in it, beyond ASCII too', async () => {
    await buildUser(server.services, { login: 'Ægir.Ödman' });
    await signIn(server.nobody(), '  ægir.öDMAN ', PASSWORD).expect(200);
  });

  it('answers an unknown name, a wrong password and someone who has left in the same words', async () => {
    const { login } = await buildUser(server.services);
    const left = await buildUser(server.services, { active: false });
    const answers = [
      await signIn(server.nobody(), 'nobody.here', PASSWORD),
      await signIn(server.nobody(), login, 'not the password'),
      await signIn(server.nobody(), left.login, PASSWORD),
    ];
    for (const answer of answers) expect(problemIdOf(answer)).toBe('wrong-sign-in');
    expect(new Set(answers.map(({ body }) => JSON.stringify(body))).size).toBe(1);
  });

  it('makes each wrong try after the third wait longer, and looks at no password meanwhile', async () => {
    const { login } = await buildUser(server.services);
    const client = server.nobody();
    for (let tries = 0; tries < 3; tries += 1) {
      expect(problemIdOf(await signIn(client, login, 'wrong'))).toBe('wrong-sign-in');
    }
    for (const seconds of [1, 2, 4, 8, 16, 32, 60, 60]) {
      const early = await signIn(client, login, PASSWORD).expect(429);
      expect(problemIdOf(early)).toBe('sign-in-delayed');
      expect(early.body).toMatchObject({ retryAfterS: seconds });
      expect(early.get('Retry-After')).toBe(String(seconds));
      server.advance(seconds);
      expect(problemIdOf(await signIn(client, login, 'wrong'))).toBe('wrong-sign-in');
    }
    server.advance(60);
    await signIn(client, login, PASSWORD).expect(200);
    expect(problemIdOf(await signIn(server.nobody(), login, 'wrong'))).toBe('wrong-sign-in');
  });

  it('slows down whoever tries many names from one address', async () => {
    const client = server.nobody();
    const tries = await Promise.all(
      Array.from({ length: 61 }, (_, index) =>
        client.post('/api/session/desk').send({ login: `guess${index}` }),
      ),
    );
    const refused = tries.filter(({ status }) => status === 429);
    expect(refused.map(problemIdOf)).toEqual(['too-many-requests']);
    const { login } = await buildUser(server.services);
    await signIn(server.nobody(), login, PASSWORD).expect(200);
  });
});

describe('a session at the desk', () => {
  it('is renewed at sign-in, so that one fixed beforehand is worth nothing', async () => {
    const [caster, owner] = [
      await buildUser(server.services),
      await buildUser(server.services, { roles: ['owner'] }),
    ];
    const client = server.nobody();
    const before = setCookiesOf(await signIn(client, caster.login, PASSWORD));
    const after = setCookiesOf(await signIn(client, owner.login, PASSWORD));
    expect(after).not.toBe(before);
    expect((await whoIs(server.nobody().set('Cookie', before))).person).toBeNull();
    expect((await whoIs(server.nobody().set('Cookie', after))).person?.id).toBe(owner.id);
  });

  it('is not taken from a made-up or altered cookie', async () => {
    const { login } = await buildUser(server.services);
    const cookie = setCookiesOf(await signIn(server.nobody(), login, PASSWORD));
    for (const altered of [
      'ladlemark-desk=s%3Aabc.def',
      cookie.slice(0, -4),
      `${cookie}x`,
      'ladlemark-desk=%',
    ])
      expect((await whoIs(server.nobody().set('Cookie', altered))).person).toBeNull();
  });

  it('ends at sign-out, wherever its cookie has been copied to', async () => {
    const { login } = await buildUser(server.services);
    const client = server.nobody();
    const cookie = setCookiesOf(await signIn(client, login, PASSWORD));
    await client.post('/api/session/end').expect(204);
    expect((await whoIs(client)).person).toBeNull();
    expect((await whoIs(server.nobody().set('Cookie', cookie))).person).toBeNull();
    await server.nobody().post('/api/session/end').expect(204);
  });

  it('is dead as soon as its person is deactivated, and changes with their roles', async () => {
    const owner = await server.deskAs('owner');
    const { user, client } = await server.deskAs('caster');
    await owner.client
      .patch(`/api/people/${user.id}`)
      .send({ roles: ['owner'] })
      .expect(200);
    await client.get('/api/people').expect(200);
    await owner.client.patch(`/api/people/${user.id}`).send({ active: false }).expect(200);
    expect(problemIdOf(await client.get('/api/people'))).toBe('not-signed-in');
    expect((await whoIs(client)).person).toBeNull();
  });

  it('does not open a terminal, nor does a password sign in there', async () => {
    const { user, client } = await server.deskAs('caster');
    expect((await whoIs(client.set('Ladlemark-Place', 'terminal'))).person).toBeNull();
    const response = await signIn(server.nobody('terminal'), user.login, PASSWORD);
    expect(problemIdOf(response)).toBe('invalid-request');
    expect(sentenceOf(response)).toMatch(/Passwords are for the desk/);
  });
});
