import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { PourCard } from '#shared/contracts/card.ts';
import type { Melt } from '#shared/contracts/melt.ts';
import { foldCard } from '#shared/domain/pour-card/apply-event.ts';
import { buildCasting, PLANNED_G } from '#tests/factories/build-casting.ts';
import { eventsTo, guarded } from '#tests/factories/card-events.ts';
import { openCard } from '#tests/support/ask-for-card.ts';
import { deliverEvent } from '#tests/support/deliver-event.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, START, type TerminalClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let terminal: TerminalClient;
let apprentice: TerminalClient;
beforeAll(async () => {
  server = await startTestServer();
  terminal = await server.terminalAs('caster');
  apprentice = await server.terminalAs('apprentice');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

let castingId = '';
let meltId = '';
let card: PourCard;
beforeEach(async () => {
  castingId = (await buildCasting(server.services)).id;
  ({ card, meltId } = await openCard(terminal.client, castingId));
});

const deliver = (event: object, stamp = {}) => deliverEvent(terminal.client, meltId, event, stamp);

const readMelt = async (): Promise<Melt> =>
  (await terminal.client.get(`/api/melts/${meltId}`).expect(200)).body as Melt;

const leadTo = async (step: Parameters<typeof eventsTo>[0]): Promise<void> => {
  for (const event of eventsTo(step, card.context)) await deliver(event).expect(201);
};

const stateOfCasting = async (): Promise<string> =>
  (await server.services.models.Casting.findByPk(castingId, { rejectOnEmpty: true })).state;

describe('a pour card', () => {
  it('goes from guard to close, and its state is what its events come to', async () => {
    await leadTo('done');
    const melt = await readMelt();
    expect(melt.step).toBe('done');
    expect(melt.events.map(({ event }) => event.type)).toEqual([
      'card-opened',
      ...eventsTo('done', card.context).map(({ type }) => type),
    ]);
    expect(melt.events.map(({ seq }) => seq)).toEqual(melt.events.map((_, index) => index + 1));
    expect(melt.state).toEqual(foldCard(melt.events, melt.context));
    expect(melt).toMatchObject({
      metalInG: PLANNED_G,
      castMassG: PLANNED_G - 10.1,
      lossMassG: 0.1,
      pourMeltC: card.context.figures.pourC.target,
      person: terminal.user.name,
      terminal: terminal.terminal.name,
    });
  });

  it('takes its casting along: poured, quenched, each move with who', async () => {
    await leadTo('pour');
    expect(await stateOfCasting()).toBe('holding');
    await deliver({ type: 'poured' }).expect(201);
    expect(await stateOfCasting()).toBe('poured');
    await deliver({ type: 'quenched' }).expect(201);
    expect(await stateOfCasting()).toBe('quenched');
    const moves = await server.services.models.CastingMove.findAll({ where: { castingId }, order: ['id'] });
    expect(moves.map(({ fromState, toState, userId }) => [fromState, toState, userId])).toEqual([
      ['holding', 'poured', terminal.user.id],
      ['poured', 'quenched', terminal.user.id],
    ]);
  });

  it('holds its casting when it is ended early, with the reason, and takes no more', async () => {
    await leadTo('melt');
    await deliver({ type: 'abandoned', note: 'The crucible cracked.' }).expect(201);
    const casting = await server.services.models.Casting.findByPk(castingId, { rejectOnEmpty: true });
    expect([casting.state, casting.stateReason]).toEqual(['held', 'The crucible cracked.']);
    expect(problemIdOf(await deliver({ type: 'resumed' }))).toBe('event-refused');
    expect(problemIdOf(await deliver({ type: 'abandoned', note: ' ' }))).toBe('invalid-request');
  });

  it('refuses an event of another step, and what no terminal sends', async () => {
    for (const event of [
      { type: 'poured' },
      { type: 'charge-closed' },
      { type: 'melt-ready' },
      { type: 'resumed' },
    ])
      expect(problemIdOf(await deliver(event))).toBe('event-refused');
    for (const type of ['card-opened', 'carried-on', 'melted', '', 7, null])
      expect(problemIdOf(await deliver({ type }))).toBe('invalid-request');
    expect((await readMelt()).events).toHaveLength(1);
  });

  it('does nothing but resume or end while work is stopped', async () => {
    await leadTo('charge');
    await deliver({ type: 'stopped', reason: 'spill' }).expect(201);
    expect(sentenceOf(await deliver({ type: 'charge-closed' }))).toBe('Work is stopped. Resume it first.');
    expect((await readMelt()).stopped).toBe(true);
    await deliver({ type: 'resumed' }).expect(201);
    expect(await readMelt()).toMatchObject({ stopped: false, step: 'charge', departures: 1 });
  });
});

describe('an apprentice', () => {
  beforeEach(async () => {
    castingId = (await buildCasting(server.services)).id;
    ({ card, meltId } = await openCard(apprentice.client, castingId));
    for (const event of eventsTo('melt', card.context)) {
      await deliverEvent(apprentice.client, meltId, event).expect(201);
    }
  });

  const temperatureC = (): number => card.context.figures.pourC.high + card.context.limits.questionAboveC + 1;

  it('runs a card, but stands by no doubtful reading and ends no card', async () => {
    const decisions = [
      { type: 'reading-taken', temperatureC: temperatureC(), confirmed: true },
      { type: 'abandoned', note: 'I would rather stop.' },
    ];
    for (const event of decisions) {
      const response = await deliverEvent(apprentice.client, meltId, event);
      expect([response.status, problemIdOf(response)]).toEqual([403, 'not-allowed']);
      expect(sentenceOf(response)).toMatch(/A caster or the owner has to decide this/);
    }
    expect(await stateOfCasting()).toBe('holding');
    await deliverEvent(apprentice.client, meltId, { type: 'stopped', reason: 'burn' }).expect(201);
  });

  it('writes to no card that another terminal holds', async () => {
    const response = await deliver({ type: 'resumed' });
    expect([response.status, problemIdOf(response)]).toEqual([409, 'card-elsewhere']);
  });
});

describe('the guard', () => {
  it('closes only with every caution of the instruction, and names those left open', async () => {
    for (const prompts of [[], guarded.prompts.slice(1), ['face', 'face', 'none of ours']]) {
      const response = await deliver({ ...guarded, prompts });
      expect([response.status, problemIdOf(response)]).toEqual([409, 'event-refused']);
      expect(sentenceOf(response)).toMatch(/^Every caution has to be confirmed\. Still open: \S/);
    }
    expect((await readMelt()).events).toHaveLength(1);
    await deliver(guarded).expect(201);
  });
});

describe('when something happened', () => {
  const openedAt = Date.parse(START);
  const at = (seconds: number): string => new Date(openedAt + seconds * 1000).toISOString();

  it('is the terminal’s own moment, never in the future and never before the event it follows', async () => {
    server.advance(100);
    const now = server.services.now().toISOString();
    const guard = await deliver(guarded, { occurredAt: at(40) }).expect(201);
    expect(guard.body).toMatchObject({ occurredAt: at(40), recordedAt: now });
    const weigh = { type: 'charge-weighed', kind: 'grain', massG: 10 };
    expect((await deliver(weigh, { occurredAt: at(10) })).body).toMatchObject({
      occurredAt: at(40),
      recordedAt: now,
    });
    expect((await deliver(weigh, { occurredAt: at(86_400) })).body).toMatchObject({ occurredAt: now });
    expect((await deliver(weigh, { occurredAt: '2026-12-01T11:00:30+01:00' })).body).toMatchObject({
      occurredAt: now,
    });
    expect(problemIdOf(await deliver(weigh, { occurredAt: '1970-01-01T00:00:07Z' }))).toBe('invalid-request');
    const moments = (await readMelt()).events.map(({ occurredAt }) => occurredAt);
    expect(moments).toEqual([...moments].sort());
  });

  it.each([
    '',
    'yesterday',
    '2026-12-01',
    '2026-13-01T00:00:00Z',
    '2026-02-30T00:00:00Z',
    '2026-12-01T10:00:00',
    '0000-01-01T00:00:00Z',
    1_764_583_200_000,
    null,
  ])('is refused as %j', async (occurredAt) => {
    const response = await deliver(guarded, { occurredAt });
    expect(problemIdOf(response)).toBe('invalid-request');
  });
});

describe('the close', () => {
  beforeEach(() => leadTo('close'));

  const close = (values: object) =>
    deliver({ type: 'closed', buttonMassG: 10, lossMassG: 0.1, look: 'full', note: '', ...values });

  it('refuses more metal out than went in, and looks that are none of ours', async () => {
    expect(sentenceOf(await close({ buttonMassG: 100, lossMassG: 0.01 }))).toMatch(/only 100\.00 g went in/);
    for (const values of [
      { look: 'perfect' },
      { buttonMassG: -1 },
      { lossMassG: '0,1' },
      { note: 'x'.repeat(2001) },
    ])
      expect(problemIdOf(await close(values))).toBe('invalid-request');
  });

  it('marks a loss over the limit and a fault, and keeps the note', async () => {
    await close({ lossMassG: 2, look: 'porous', note: '  Two pits.  ' }).expect(201);
    const { state } = await readMelt();
    expect(state.departures.map(({ kind }) => kind)).toEqual(['loss-over-limit', 'cast-fault']);
    expect(state.step).toBe('close');
    expect(state.closing).toMatchObject({ castMassG: 88, note: 'Two pits.' });
  });
});
