import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildUser, PASSWORD } from '#tests/factories/build-user.ts';
import { problemIdOf } from '#tests/support/problem-id.ts';
import { setCookiesOf } from '#tests/support/set-cookies.ts';
import { startTestServer, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let cookie = '';
beforeAll(async () => {
  server = await startTestServer();
  const owner = await buildUser(server.services, { roles: ['owner'] });
  const response = await server
    .nobody()
    .post('/api/session/desk')
    .send({ login: owner.login, password: PASSWORD })
    .expect(200);
  cookie = setCookiesOf(response);
});
afterAll(() => server.close());

const makeCode = (headers: Readonly<Record<string, string>>) =>
  request(server.origin)
    .post('/api/terminals/codes')
    .set('Cookie', cookie)
    .set(headers)
    .send({ name: 'Terminal', bay: 'bay' });

const place = { 'Ladlemark-Place': 'desk' };

describe('a write from another site, with the owner’s own cookie', () => {
  it.each([
    ['without our header, which another page cannot set', {}],
    ['from another origin', { ...place, Origin: 'https://example.org' }],
    ['from the same host at another port', { ...place, Origin: 'http://127.0.0.1:1' }],
    ['from a page with no origin to tell', { ...place, Origin: 'null' }],
    ['from an origin that is none', { ...place, Origin: 'not an origin' }],
  ])('is refused %s', async (_how, headers) => {
    const response = await makeCode(headers);
    expect([response.status, problemIdOf(response)]).toEqual([403, 'foreign-request']);
    expect(await server.services.models.TerminalEnrolment.count()).toBe(0);
  });

  it('is refused as a plain form, though it carries no origin', async () => {
    const response = await request(server.origin)
      .post('/api/terminals/codes')
      .set('Cookie', cookie)
      .type('form')
      .send({ name: 'Terminal', bay: 'bay' });
    expect(problemIdOf(response)).toBe('foreign-request');
  });
});

describe('a write from our own pages', () => {
  it('is taken with our header, with or without our own origin', async () => {
    await makeCode(place).expect(201);
    await makeCode({ ...place, Origin: server.origin }).expect(201);
  });

  it('invites no other site in', async () => {
    const response = await request(server.origin)
      .options('/api/terminals/codes')
      .set('Origin', 'https://example.org')
      .set('Access-Control-Request-Method', 'POST');
    expect(response.headers).not.toHaveProperty('access-control-allow-origin');
  });
});

describe('reading', () => {
  it('needs no header of ours', async () => {
    await request(server.origin).get('/api/session').expect(200);
    server.expectNoSurprises();
  });
});
