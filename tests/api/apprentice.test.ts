import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import type { Person } from '#shared/contracts/person.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildUser } from '#tests/factories/build-user.ts';
import { enforceShippedInstruction } from '#tests/factories/enforce-shipped-instruction.ts';
import { askForCard } from '#tests/support/ask-for-card.ts';
import { driveCard, leadToFlaskOut } from '#tests/support/drive-card.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type SignedInClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
beforeAll(async () => {
  server = await startTestServer();
  await enforceShippedInstruction(server.services);
  owner = await server.deskAs('owner');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const limit = (id: string, apprenticeship: object) =>
  owner.client.patch(`/api/people/${id}`).send({ apprenticeship });

describe('the limits of an apprentice', () => {
  it('are none until the owner sets them, and stay when something else is changed', async () => {
    const { id } = await buildUser(server.services, { roles: ['apprentice'] });
    const named = (await owner.client.patch(`/api/people/${id}`).send({ name: 'Someone' }).expect(200))
      .body as Person;
    expect(named.apprenticeship).toEqual({ alloyIds: null, parts: null });
    const parts = ['guard', 'charge', 'melt'];
    await limit(id, { alloyIds: [], parts }).expect(200);
    const after = (await owner.client.patch(`/api/people/${id}`).send({ name: 'Another' }).expect(200))
      .body as Person;
    expect(after.apprenticeship).toEqual({ alloyIds: [], parts });
  });

  it('keep an alloy from them, and say who may take the flask', async () => {
    const [allowed, other] = [
      await buildAlloyRevision(server.services),
      await buildAlloyRevision(server.services),
    ];
    const { user, client } = await server.terminalAs('apprentice');
    await limit(user.id, { alloyIds: [allowed.alloyId], parts: null }).expect(200);
    const mine = await buildCasting(server.services, { alloyRevisionId: allowed.id });
    const notMine = await buildCasting(server.services, { alloyRevisionId: other.id });
    const refused = await askForCard(client, notMine.id);
    expect(problemIdOf(refused)).toBe('not-allowed');
    expect(sentenceOf(refused)).toMatch(/Ask a caster/);
    await askForCard(client, mine.id).expect(200);
  });

  it('keep a part of the card from them until a caster takes it over', async () => {
    const { user, client, terminal, token } = await server.terminalAs('apprentice');
    await limit(user.id, { alloyIds: null, parts: ['guard', 'charge'] }).expect(200);
    const casting = await buildCasting(server.services);
    const card = await driveCard(server, client, casting.id);
    const { context } = await card.melt();
    await card.check();
    await card.write({ type: 'guard-confirmed', prompts: [] });
    await card.check();
    await card.write({ type: 'charge-weighed', kind: 'grain', massG: context.plannedMetalG });
    await card.write({ type: 'charge-closed' });
    const reading = { type: 'reading-taken', temperatureC: 900, confirmed: false } as const;
    const refused = await card.send(reading);
    expect(problemIdOf(refused)).toBe('event-refused');
    expect(sentenceOf(refused)).toMatch(/A caster has to take it over/);
    const caster = await server.terminalAs('caster', { terminal, token });
    const takenOver = await driveCard(server, caster.client, casting.id);
    await takenOver.write(reading);
    expect((await takenOver.melt()).openedBy).toBe(caster.user.id);
  });

  it.each([
    [{ alloyIds: null, parts: ['pour'] }, 'apprenticeship.parts'],
    [{ alloyIds: null, parts: ['flask-out', 'pour'] }, 'apprenticeship.parts'],
    [{ alloyIds: null, parts: ['lunch'] }, 'apprenticeship.parts.0'],
    [{ alloyIds: ['silver'], parts: null }, 'apprenticeship.alloyIds.0'],
    [{ alloyIds: null }, 'apprenticeship.parts'],
  ])('are refused as %j', async (apprenticeship, path) => {
    const { id } = await buildUser(server.services, { roles: ['apprentice'] });
    const response = await limit(id, apprenticeship);
    expect(problemIdOf(response)).toBe('invalid-request');
    expect(response.body).toMatchObject({ fields: [{ path }] });
  });
});

describe('what an apprentice does', () => {
  it('waits for another person’s sign before the flask comes out, which counts once', async () => {
    const { user, client } = await server.terminalAs('apprentice');
    const signer = await buildUser(server.services, { roles: ['caster'] });
    const card = await driveCard(server, client, (await buildCasting(server.services)).id);
    await leadToFlaskOut(card);
    const flaskOut = { type: 'flask-out', furnaceC: null } as const;
    expect(sentenceOf(await card.send(flaskOut))).toMatch(/signs for the pour/);
    const key = 'apprentice-pour';
    expect(sentenceOf(await card.send({ type: 'step-skipped', key }))).toMatch(/skips no step/);
    const forged = { id: randomUUID(), personId: signer.id, name: signer.name, onDevice: false };
    const signed = (by: Countersigned) =>
      ({ type: 'step-done', key, answer: { kind: 'countersign', by } }) as const;
    expect(sentenceOf(await card.send(signed(forged)))).toMatch(/not on record/);
    const own = { ...forged, personId: user.id, name: user.name };
    expect(problemIdOf(await card.send(signed(own)))).toBe('event-refused');
    const given = await card.sign(signer.id);
    await card.write(signed(given));
    await card.write(flaskOut);
    const again = await driveCard(server, client, (await buildCasting(server.services)).id);
    await leadToFlaskOut(again);
    expect(sentenceOf(await again.send(signed(given)))).toMatch(/not on record/);
  });

  it('is signed by nobody with their own PIN, nor by another apprentice', async () => {
    const { user, client } = await server.terminalAs('apprentice');
    const other = await buildUser(server.services, { roles: ['apprentice'] });
    const card = await driveCard(server, client, (await buildCasting(server.services)).id);
    await expect(card.sign(user.id)).rejects.toThrow(/400/);
    await expect(card.sign(other.id)).rejects.toThrow(/400/);
  });
});
