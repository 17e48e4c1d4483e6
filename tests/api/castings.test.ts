import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Casting } from '#shared/contracts/casting.ts';
import type { Flask } from '#shared/contracts/flask.ts';
import {
  castingStates,
  castingStatesByHand,
  type CastingState,
} from '#shared/domain/casting/casting-state.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildFlask } from '#tests/factories/build-flask.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type SignedInClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let caster: SignedInClient;
beforeAll(async () => {
  server = await startTestServer();
  caster = await server.deskAs('caster');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const move = (id: string, to: string, reason = '') =>
  caster.client.post(`/api/castings/${id}/move`).send({ to, reason });

describe('moving a casting by hand', () => {
  it.each(castingStates)('from %s goes only where its life allows', async (from) => {
    const byHand = castingStatesByHand(from);
    const casting = await buildCasting(server.services, { state: from });
    for (const to of castingStates) {
      const { status } = await move(casting.id, to, 'Because of a test.');
      const isAllowed = byHand.includes(to);
      const refusal = byHand.length > 0 ? 409 : 403;
      expect([to, status]).toEqual([to, isAllowed ? 200 : refusal]);
      expect((await casting.reload()).state).toBe(isAllowed ? to : from);
      await casting.update({ state: from });
    }
  });

  it('is written down with who and why', async () => {
    const { id } = await buildCasting(server.services);
    const body = bodyOf(await move(id, 'held', '  Crack seen. ').expect(200));
    expect(body).toMatchObject({ state: 'held', stateReason: 'Crack seen.' });
    const moves = await server.services.models.CastingMove.findAll({ where: { castingId: id } });
    expect(
      moves.map(({ fromState, toState, reason, userId }) => [fromState, toState, reason, userId]),
    ).toEqual([['holding', 'held', 'Crack seen.', caster.user.id]]);
  });

  it.each<CastingState>(['held', 'scrapped'])('to %s wants a reason', async (to) => {
    const { id } = await buildCasting(server.services);
    const response = await move(id, to, '   ');
    expect(response.body).toMatchObject({ fields: [{ path: 'reason', message: 'Say why.' }] });
  });

  it('is refused while its pour card is open', async () => {
    const { id } = await buildCasting(server.services);
    await buildMelt(server.services, { castingId: id });
    const response = await move(id, 'held', 'A test.');
    expect([response.status, problemIdOf(response)]).toEqual([409, 'wrong-state']);
    expect(sentenceOf(response)).toMatch(/pour card is open/);
  });

  it('is done once when two do it at the same moment', async () => {
    const { id } = await buildCasting(server.services, { state: 'invested' });
    const answers = await Promise.all([move(id, 'dewaxed'), move(id, 'dewaxed')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(await server.services.models.CastingMove.count({ where: { castingId: id } })).toBe(1);
  });

  it('does not put a casting back into a flask that another one is in', async () => {
    const flask = await buildFlask(server.services);
    const first = await buildCasting(server.services, { flaskId: flask.id, state: 'broken-out' });
    await buildCasting(server.services, { flaskId: flask.id });
    const response = await move(first.id, 'held', 'Porous.');
    expect([response.status, problemIdOf(response)]).toEqual([409, 'wrong-state']);
    expect(sentenceOf(response)).toMatch(/holds another casting/);
    expect(await server.services.models.CastingMove.count({ where: { castingId: first.id } })).toBe(0);
  });

  it('is refused for a casting that is not there and a state that is none', async () => {
    expect(problemIdOf(await move(randomUUID(), 'held', 'A test.'))).toBe('not-found');
    const { id } = await buildCasting(server.services);
    expect(problemIdOf(await move(id, 'melted'))).toBe('invalid-request');
  });
});

describe('the list of castings', () => {
  const idsOn = async (on: string): Promise<string[]> =>
    ((await caster.client.get('/api/castings').query({ on }).expect(200)).body as Casting[]).map(
      ({ id }) => id,
    );

  it('holds the castings of a local day, by the time of their pour', async () => {
    const studio = await server.services.models.StudioSettings.findByPk(1, { rejectOnEmpty: true });
    await studio.update({ timeZone: 'Pacific/Auckland' });
    const at = (moment: string) => buildCasting(server.services, { plannedPourAt: new Date(moment) });
    // Auckland is 13 hours ahead in January.
    const [evening, last, first, morning] = [
      await at('2027-01-14T10:00:00Z'),
      await at('2027-01-14T10:59:59.999Z'),
      await at('2027-01-14T11:00:00Z'),
      await at('2027-01-14T20:00:00Z'),
    ];
    expect(await idsOn('2027-01-14')).toEqual([evening.id, last.id]);
    expect(await idsOn('2027-01-15')).toEqual([first.id, morning.id]);
    expect(await idsOn('2027-01-16')).toEqual([]);
  });

  it.each(['tomorrow', '2027-02-30', '2027-1-5', '0000-01-01', '9999-12-31', '+12027-01-01', ''])(
    'refuses %j as a day',
    async (on) => {
      expect(problemIdOf(await caster.client.get('/api/castings').query({ on }))).toBe('invalid-request');
    },
  );

  it('holds every casting that is still in its flask when no day is asked for', async () => {
    const [open, gone] = [
      await buildCasting(server.services),
      await buildCasting(server.services, { state: 'cut' }),
    ];
    const body = bodyOf(await caster.client.get('/api/castings').expect(200));
    const ids = (body as Casting[]).map(({ id }) => id);
    expect(ids).toContain(open.id);
    expect(ids).not.toContain(gone.id);
  });
});

describe('the list of flasks', () => {
  it('says which casting is in each', async () => {
    const [used, free] = [await buildFlask(server.services), await buildFlask(server.services)];
    await buildCasting(server.services, { flaskId: used.id, state: 'released' });
    const { id } = await buildCasting(server.services, { flaskId: used.id, state: 'dewaxed' });
    const flasks = (await caster.client.get('/api/flasks').expect(200)).body as Flask[];
    expect(flasks.find(({ code }) => code === used.code)?.openCastingId).toBe(id);
    expect(flasks.find(({ code }) => code === free.code)?.openCastingId).toBeNull();
  });
});
