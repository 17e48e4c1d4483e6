import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { PourCard } from '#shared/contracts/card.ts';
import { defaultStudioLimits } from '#shared/domain/studio/studio-limits.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { buildTerminal } from '#tests/factories/build-terminal.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { askForCard, openCard } from '#tests/support/ask-for-card.ts';
import { deliverEvent } from '#tests/support/deliver-event.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, START, type TerminalClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let here: TerminalClient;
let there: TerminalClient;
beforeAll(async () => {
  server = await startTestServer();
  here = await server.terminalAs('caster');
  there = await server.terminalAs('caster');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const eventsOf = (meltId: string): Promise<number> =>
  server.services.models.MeltEvent.count({ where: { meltId } });

describe('opening a card', () => {
  it('begins a melt with a number and code of its own, at this terminal', async () => {
    const { id } = await buildCasting(server.services);
    const { card, meltId } = await openCard(here.client, id);
    expect(card.melt).toMatchObject({ openedBy: here.user.name, terminal: here.terminal.name });
    expect(card.melt?.code).toMatch(/^M-\d{4,}-\d$/);
    expect(card.events).toMatchObject([
      {
        seq: 1,
        event: { type: 'card-opened' },
        person: here.user.name,
        occurredAt: START,
        recordedAt: START,
      },
    ]);
    expect(card.abilities.record).toBe(true);
    const other = await openCard(here.client, (await buildCasting(server.services)).id);
    expect(other.card.melt?.code).not.toBe(card.melt?.code);
    expect(other.meltId).not.toBe(meltId);
  });

  it('goes on with the same card when it is asked for again here, and writes nothing twice', async () => {
    const { id } = await buildCasting(server.services);
    const key = randomUUID();
    const [first, again, third] = [
      await askForCard(here.client, id, { key }).expect(200),
      await askForCard(here.client, id, { key }).expect(200),
      await askForCard(here.client, id).expect(200),
    ];
    const { melt } = first.body as PourCard;
    expect([again, third].map(({ body }) => (body as PourCard).melt?.id)).toEqual([melt?.id, melt?.id]);
    expect(await eventsOf(melt?.id ?? '')).toBe(1);
  });

  it('gives the flask to one of two terminals, and tells the other who has it', async () => {
    for (let round = 0; round < 5; round += 1) {
      const { id } = await buildCasting(server.services);
      const answers = await Promise.all([here, there].map(({ client }) => askForCard(client, id)));
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
      const [winner, loser] = answers[0]?.status === 200 ? [here, answers[1]] : [there, answers[0]];
      if (!loser) throw new Error('One of two answers is missing.');
      expect(problemIdOf(loser)).toBe('card-elsewhere');
      expect(sentenceOf(loser)).toBe(
        `${winner.user.name} has this flask at ${winner.terminal.name}. Ask there, or choose another flask.`,
      );
      expect(await server.services.models.Melt.count({ where: { castingId: id } })).toBe(1);
    }
  });

  it('is refused with a key that stands for something else', async () => {
    const { id } = await buildCasting(server.services);
    const key = randomUUID();
    await askForCard(here.client, id, { key }).expect(200);
    const other = await buildCasting(server.services);
    const response = await askForCard(here.client, other.id, { key });
    expect([response.status, problemIdOf(response)]).toEqual([409, 'event-refused']);
    expect((await other.reload()).meltId).toBeNull();
  });

  it('is refused for a casting that is not there', async () => {
    expect(problemIdOf(await askForCard(here.client, randomUUID()))).toBe('not-found');
    expect(problemIdOf(await askForCard(here.client, 'F-0147-8'))).toBe('invalid-request');
  });

  it('begins another melt when the first was ended and the flask is holding again', async () => {
    const { id } = await buildCasting(server.services);
    const { meltId } = await openCard(here.client, id);
    await deliverEvent(here.client, meltId, { type: 'abandoned', note: 'Torch ran dry.' }).expect(201);
    expect(problemIdOf(await askForCard(here.client, id))).toBe('wrong-state');
    await here.client.post(`/api/castings/${id}/move`).send({ to: 'holding' }).expect(200);
    const second = await openCard(here.client, id);
    expect(second.meltId).not.toBe(meltId);
    expect(second.card.events).toHaveLength(1);
  });
});

describe('carrying a card on', () => {
  it('takes one’s own card to another terminal, when asked for, and leaves the first without it', async () => {
    const { id } = await buildCasting(server.services);
    const { meltId } = await openCard(here.client, id);
    const second = await server.terminalAs(here.user);
    expect(problemIdOf(await askForCard(second.client, id))).toBe('card-elsewhere');
    const body = bodyOf(await askForCard(second.client, id, { carryOn: true }).expect(200));
    expect(body).toMatchObject({
      melt: { id: meltId, terminal: second.terminal.name },
      abilities: { record: true },
      events: [{ seq: 1 }, { seq: 2, event: { type: 'carried-on' }, terminal: second.terminal.name }],
    });
    const late = await deliverEvent(here.client, meltId, { type: 'guard-confirmed', prompts: [] });
    expect([late.status, problemIdOf(late)]).toEqual([409, 'card-elsewhere']);
    await deliverEvent(second.client, meltId, { type: 'guard-confirmed', prompts: [] }).expect(201);
  });

  it('answers the terminal that lost the card as before, for what it had already delivered', async () => {
    const { id } = await buildCasting(server.services);
    const { meltId } = await openCard(here.client, id);
    const key = randomUUID();
    const event = { type: 'guard-confirmed', prompts: [] };
    const first = await deliverEvent(here.client, meltId, event, { key }).expect(201);
    const second = await server.terminalAs(here.user);
    await askForCard(second.client, id, { carryOn: true }).expect(200);
    expect((await deliverEvent(here.client, meltId, event, { key }).expect(201)).body).toEqual(first.body);
  });

  it('is not for someone else’s card elsewhere', async () => {
    const { id } = await buildCasting(server.services);
    await openCard(here.client, id);
    const response = await askForCard(there.client, id, { carryOn: true });
    expect(problemIdOf(response)).toBe('card-elsewhere');
    expect(sentenceOf(response)).toContain(here.user.name);
  });

  it('lets the owner take a card from a terminal that is gone', async () => {
    const { id } = await buildCasting(server.services);
    const gone = await server.terminalAs('caster');
    const { meltId } = await openCard(gone.client, id);
    await gone.terminal.update({ revokedAt: server.services.now() });
    const owner = await server.terminalAs('owner');
    const body = bodyOf(await askForCard(owner.client, id, { carryOn: true }).expect(200));
    expect(body).toMatchObject({
      melt: { id: meltId, openedBy: owner.user.name, terminal: owner.terminal.name },
    });
  });

  it('hands a card over to whoever signs in at its own terminal', async () => {
    const { id } = await buildCasting(server.services);
    const built = await buildTerminal(server.services);
    const first = await server.terminalAs('caster', built);
    const { meltId } = await openCard(first.client, id);
    const second = await server.terminalAs('apprentice', built);
    const body = bodyOf(await askForCard(second.client, id).expect(200));
    expect(body).toMatchObject({
      melt: { id: meltId, openedBy: second.user.name },
      events: [{}, { person: second.user.name }],
    });
  });

  it('never waits for an event that is written at the same moment', async () => {
    for (let round = 0; round < 5; round += 1) {
      const casting = await buildCasting(server.services);
      const melt = await buildMelt(server.services, {
        castingId: casting.id,
        user: here.user,
        terminal: here.terminal,
        step: 'pour',
      });
      const second = await server.terminalAs(here.user);
      const [poured, carried] = await Promise.all([
        deliverEvent(here.client, melt.id, { type: 'poured' }),
        askForCard(second.client, casting.id, { carryOn: true }),
      ]);
      expect(carried.status).toBe(200);
      expect([201, 409]).toContain(poured.status);
    }
  });
});

describe('what a card is judged against', () => {
  it('is fixed when it is opened, whatever the owner changes afterwards', async () => {
    const { id } = await buildCasting(server.services);
    const { card } = await openCard(here.client, id);
    const studio = await server.services.models.StudioSettings.findByPk(1, { rejectOnEmpty: true });
    await studio.update({ limits: { ...defaultStudioLimits, furnaceMaxC: 1000 }, temperatureUnit: 'F' });
    const read = async (castingId: string): Promise<PourCard> =>
      (await here.client.get(`/api/cards/${castingId}`).expect(200)).body as PourCard;
    expect((await read(id)).context).toEqual(card.context);
    const fresh = await read((await buildCasting(server.services)).id);
    expect(fresh.context).toMatchObject({ limits: { furnaceMaxC: 1000 }, units: { temperature: 'F' } });
    await studio.update({ limits: defaultStudioLimits, temperatureUnit: 'C' });
  });
});
