import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Person } from '#shared/contracts/person.ts';
import { buildUser, PASSWORD } from '#tests/factories/build-user.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type SignedInClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
beforeAll(async () => {
  server = await startTestServer();
  owner = await server.deskAs('owner');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const request = {
  name: 'Wilma Trost',
  login: 'wilma',
  email: 'wilma@example.org',
  roles: ['caster', 'jeweller'],
  password: 'a long enough password',
  pin: '445566',
};

const change = (id: string, values: object) => owner.client.patch(`/api/people/${id}`).send(values);

describe('adding a person', () => {
  it('lets them sign in, and shows no secret', async () => {
    const response = await owner.client.post('/api/people').send(request).expect(201);
    const body = bodyOf(response);
    expect(body).toEqual({
      id: (body as Person).id,
      name: 'Wilma Trost',
      login: 'wilma',
      email: 'wilma@example.org',
      roles: ['caster', 'jeweller'],
      active: true,
      hasPin: true,
      pinLocked: false,
      apprenticeship: { alloyIds: null, parts: null },
      abilities: { update: true, unlock: false },
    });
    expect(response.text).not.toMatch(/hash|scrypt|445566/i);
    const { login, password } = request;
    await server.nobody().post('/api/session/desk').send({ login, password }).expect(200);
  });

  it('keeps neither password nor PIN in the clear', async () => {
    const { login, password, pin } = { ...request, login: 'wilma2' };
    await owner.client
      .post('/api/people')
      .send({ ...request, login })
      .expect(201);
    const row = await server.services.models.User.findOne({ where: { login }, raw: true });
    expect(JSON.stringify(row)).not.toContain(password);
    expect(JSON.stringify(row)).not.toContain(pin);
    expect(row?.passwordHash).toMatch(/^scrypt\$32768\$8\$1\$/);
  });

  it.each([
    ['a sign-in name that is taken', { login: 'TAKEN' }, 'already-exists', 'login'],
    ['a short password', { password: 'elevenchars' }, 'invalid-request', 'password'],
    ['a PIN of five digits', { pin: '12345' }, 'invalid-request', 'pin'],
    ['a PIN with letters', { pin: '12345a' }, 'invalid-request', 'pin'],
    ['no role', { roles: [] }, 'invalid-request', 'roles'],
    ['a role twice', { roles: ['owner', 'owner'] }, 'invalid-request', 'roles'],
    ['a role of ours that is none', { roles: ['admin'] }, 'invalid-request', 'roles.0'],
    ['a blank name', { name: '  ' }, 'invalid-request', 'name'],
    ['a sign-in name with a blank in it', { login: 'a b' }, 'invalid-request', 'login'],
    ['an address that is none', { email: 'wilma' }, 'invalid-request', 'email'],
  ])('refuses %s at its field', async (_what, values, id, path) => {
    if (id === 'already-exists') await buildUser(server.services, { login: 'taken' });
    const response = await owner.client
      .post('/api/people')
      .send({ ...request, login: 'someone.else', ...values });
    expect(problemIdOf(response)).toBe(id);
    expect(response.body).toMatchObject({ fields: [{ path }] });
    expect(await server.services.models.User.count({ where: { login: 'someone.else' } })).toBe(0);
  });

  it('gives a sign-in name to one of two who ask at once', async () => {
    const ask = () => owner.client.post('/api/people').send({ ...request, login: 'twin' });
    const answers = await Promise.all([ask(), ask()]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
  });
});

describe('changing a person', () => {
  it('changes what is sent and leaves the rest', async () => {
    const user = await buildUser(server.services, { email: 'old@example.org' });
    const body = bodyOf(await change(user.id, { name: 'New Name', pin: null }).expect(200));
    expect(body).toMatchObject({
      name: 'New Name',
      login: user.login,
      email: 'old@example.org',
      hasPin: false,
    });
    expect((await user.reload()).passwordHash).toBe(user.passwordHash);
  });

  it('ends the person’s sessions with a new password or PIN, but for the one that asks', async () => {
    for (const values of [{ password: 'another long password' }, { pin: '909090' }]) {
      const atDesk = await server.deskAs('caster');
      const atTerminal = await server.terminalAs(atDesk.user);
      await change(atDesk.user.id, { name: 'Renamed' }).expect(200);
      await atDesk.client.get('/api/castings').expect(200);
      await change(atDesk.user.id, values).expect(200);
      await atDesk.client.get('/api/castings').expect(401);
      await atTerminal.client.get('/api/castings').expect(401);
    }
    const elsewhere = await server.deskAs(owner.user);
    await change(owner.user.id, { password: PASSWORD }).expect(200);
    await elsewhere.client.get('/api/castings').expect(401);
    await owner.client.get('/api/castings').expect(200);
  });

  it('says in our own words that there is nothing in the request', async () => {
    const response = await owner.client.post('/api/people');
    expect([problemIdOf(response), sentenceOf(response)]).toEqual([
      'invalid-request',
      'Something is missing from the request.',
    ]);
  });

  it('refuses an empty change, a taken name and a person who is not there', async () => {
    const [user, other] = [await buildUser(server.services), await buildUser(server.services)];
    expect(problemIdOf(await change(user.id, {}))).toBe('invalid-request');
    expect(problemIdOf(await change(user.id, { login: other.login.toUpperCase() }))).toBe('already-exists');
    expect(problemIdOf(await change(crypto.randomUUID(), { name: 'Nobody' }))).toBe('not-found');
    expect(problemIdOf(await change('42', { name: 'Nobody' }))).toBe('invalid-request');
  });
});

describe('the last owner', () => {
  it.each([{ active: false }, { roles: ['caster'] }])('cannot be taken away by %j', async (values) => {
    const response = await change(owner.user.id, values);
    expect([response.status, problemIdOf(response)]).toEqual([409, 'changed-meanwhile']);
    expect(sentenceOf(response)).toMatch(/needs an owner/);
    expect(await owner.user.reload()).toMatchObject({ active: true, roles: ['owner'] });
  });

  it('does not count those who have left', async () => {
    await buildUser(server.services, { roles: ['owner'], active: false });
    expect((await change(owner.user.id, { active: false })).status).toBe(409);
  });

  it('stays when the owners remove each other at the same moment, time after time', async () => {
    const { models } = server.services;
    const [one, other] = [await server.deskAs('owner'), await server.deskAs('owner')];
    await owner.user.update({ roles: ['caster'] });
    for (let round = 0; round < 10; round += 1) {
      await models.User.update({ active: true }, { where: { id: [one.user.id, other.user.id] } });
      const answers = await Promise.all([
        one.client.patch(`/api/people/${other.user.id}`).send({ active: false }),
        other.client.patch(`/api/people/${one.user.id}`).send({ active: false }),
      ]);
      for (const { status } of answers) expect(status).toBeLessThan(500);
      const left = await models.User.count({ where: { active: true, id: [one.user.id, other.user.id] } });
      expect(left).toBe(1);
    }
    await owner.user.update({ roles: ['owner'] });
  });
});
