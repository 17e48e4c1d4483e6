import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Countersigned, InstructionStep } from '#shared/domain/instruction/instruction-step.ts';
import type { CardState } from '#shared/domain/pour-card/card-state.ts';
import type { Melt } from '#server/models/melt.ts';
import { openCard } from '#server/commands/open-card.ts';
import { buildCasting, PLANNED_G } from '#tests/factories/build-casting.ts';
import { guardOnly } from '#tests/factories/build-studio.ts';
import { guarded } from '#tests/factories/card-events.ts';
import { buildUser, PIN } from '#tests/factories/build-user.ts';
import { deliverEvent } from '#tests/support/deliver-event.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type TerminalClient, type TestServer } from '#tests/support/test-server.ts';

const always = { methods: [], families: [], roles: [], hazards: [] };
const base = { when: always, maySkip: true };

const steps: readonly InstructionStep[] = [
  { ...base, key: 'crucible', kind: 'say', before: 'charge', sentence: 'Take the right crucible.' },
  {
    ...base,
    key: 'flux',
    kind: 'weigh',
    before: 'charge',
    sentence: 'Weigh the flux.',
    limitsG: { low: 1, high: 2 },
  },
  { ...base, key: 'same', kind: 'scan', before: 'melt', sentence: 'Scan the flask again.', maySkip: false },
  {
    ...base,
    key: 'look',
    kind: 'choose',
    before: 'melt',
    sentence: 'How does the crucible look?',
    options: [
      { words: 'Sound', isVariance: false },
      { words: 'Chipped', isVariance: true },
    ],
  },
  { ...base, key: 'hold', kind: 'wait', before: 'flask-out', sentence: 'Hold the melt.', seconds: 60 },
  {
    ...base,
    key: 'sign',
    kind: 'countersign',
    before: 'flask-out',
    sentence: 'A caster looks and signs.',
    when: { ...always, roles: ['apprentice'] },
    maySkip: false,
  },
];

let server: TestServer;
let caster: TerminalClient;
let apprentice: TerminalClient;
let melt: Melt;

const openAs = async (who: TerminalClient): Promise<Melt> => {
  const casting = await buildCasting(server.services);
  return openCard(
    server.services,
    { person: who.user, terminal: who.terminal, via: 'terminal' },
    casting.id,
    { key: randomUUID(), occurredAt: server.services.now().toISOString(), carryOn: false },
  );
};

beforeAll(async () => {
  server = await startTestServer();
  await server.services.models.WorkInstructionRevision.create({
    number: 2,
    content: { ...guardOnly, steps: [...guardOnly.steps, ...steps] },
    approvedBy: null,
  });
  caster = await server.terminalAs('caster');
  const bench = { terminal: caster.terminal, token: caster.token };
  apprentice = await server.terminalAs('apprentice', bench);
});
beforeEach(async () => {
  melt = await openAs(caster);
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const send = (event: object, { client } = caster) =>
  deliverEvent(client, melt.id, event, { occurredAt: server.services.now().toISOString() });
const sendAll = async (events: readonly object[], as = caster): Promise<void> => {
  for (const event of events) await send(event, as).expect(201);
};
const state = async (): Promise<CardState> => (await melt.reload()).state;
const done = (key: string, answer: object) => ({ type: 'step-done', key, answer });
const flaskCode = (): string => melt.context.rules?.flaskCode ?? '';
const sign = (person: { readonly id: string }, as = caster, pin = PIN) =>
  as.client.post(`/api/melts/${melt.id}/countersigns`).send({ personId: person.id, pin });
const signed = async (person: { readonly id: string }, as = caster): Promise<Countersigned> =>
  (await sign(person, as).expect(201)).body as Countersigned;

const toCharge = [
  guarded,
  { type: 'checked', keys: ['crucible'] },
  done('flux', { kind: 'weigh', massG: 1.5 }),
];
const toMelt = [
  ...toCharge,
  { type: 'charge-weighed', kind: 'grain', massG: PLANNED_G },
  { type: 'charge-closed' },
];
const toFlaskOut = () => [
  ...toMelt,
  done('same', { kind: 'scan', code: flaskCode() }),
  done('look', { kind: 'choose', option: 'Sound' }),
  { type: 'reading-taken', temperatureC: melt.context.figures.pourC.target },
  { type: 'melt-ready' },
];

describe('the steps of an instruction', () => {
  it('come one after the other, before the part they belong to', async () => {
    await sendAll([guarded]);
    const weighing = { type: 'charge-weighed', kind: 'grain', massG: 1 };
    expect(sentenceOf(await send(weighing))).toBe('First: Take the right crucible.');
    expect(sentenceOf(await send(done('flux', { kind: 'weigh', massG: 1.5 })))).toContain(
      'not what the card asks',
    );
    expect(sentenceOf(await send({ type: 'checked', keys: ['flux'] }))).toContain('not what the card asks');
    await sendAll([{ type: 'checked', keys: ['crucible'] }]);
    expect(sentenceOf(await send(weighing))).toBe('First: Weigh the flux.');
    await sendAll([done('flux', { kind: 'weigh', massG: 1.5 }), weighing]);
    expect((await state()).settled).toMatchObject({ crucible: { how: 'done' }, flux: { how: 'done' } });
  });

  it('take a number out of its limits and mark it', async () => {
    await sendAll([
      guarded,
      { type: 'checked', keys: ['crucible'] },
      done('flux', { kind: 'weigh', massG: 3 }),
    ]);
    expect((await state()).departures).toMatchObject([
      { kind: 'step-answer', sentence: '3.00 g is above the 2.00 g of the instruction.' },
    ]);
  });

  it('tell another flask from the right one, and a choice from what is none', async () => {
    await sendAll(toMelt);
    expect(sentenceOf(await send(done('same', { kind: 'scan', code: 'LM-9999-9' })))).toContain(
      'take the right flask',
    );
    await sendAll([done('same', { kind: 'scan', code: flaskCode() })]);
    expect(sentenceOf(await send(done('look', { kind: 'choose', option: 'Fine' })))).toContain('Choose one');
    await sendAll([done('look', { kind: 'choose', option: 'Chipped' })]);
    expect((await state()).departures.map(({ kind }) => kind)).toEqual(['step-answer']);
  });

  it('wait their time since the card came to the part', async () => {
    await sendAll(toFlaskOut());
    server.advance(20);
    expect(sentenceOf(await send(done('hold', { kind: 'wait' })))).toBe('Wait another 0:40.');
    server.advance(40);
    await sendAll([done('hold', { kind: 'wait' }), { type: 'flask-out', furnaceC: null }]);
  });

  it('are skipped by a caster where that is allowed, and count as a measurement missing', async () => {
    await sendAll([guarded, { type: 'checked', keys: ['crucible'] }, { type: 'step-skipped', key: 'flux' }]);
    expect((await state()).departures).toMatchObject([
      { kind: 'instrument-missing', sentence: 'Not measured: Weigh the flux.', isMajor: true },
    ]);
    await sendAll(toMelt.slice(3));
    expect(sentenceOf(await send({ type: 'step-skipped', key: 'same' }))).toContain('lets nobody skip');
  });
});

describe('an apprentice', () => {
  beforeEach(async () => {
    melt = await openAs(apprentice);
  });

  it('skips no step', async () => {
    await sendAll([guarded, { type: 'checked', keys: ['crucible'] }], apprentice);
    expect(sentenceOf(await send({ type: 'step-skipped', key: 'flux' }, apprentice))).toContain(
      'skips no step',
    );
  });

  it('needs another person’s sign, on record, for this melt, used once', async () => {
    await sendAll(toFlaskOut(), apprentice);
    server.advance(60);
    await sendAll([done('hold', { kind: 'wait' })], apprentice);
    expect(sentenceOf(await send({ type: 'flask-out', furnaceC: null }, apprentice))).toContain(
      'First: A caster looks',
    );
    expect(problemIdOf(await sign(apprentice.user, apprentice))).toBe('invalid-request');
    const beside = await buildUser(server.services, { roles: ['apprentice'] });
    expect(problemIdOf(await sign(beside, apprentice))).toBe('invalid-request');
    expect(problemIdOf(await sign(caster.user, apprentice, '000000'))).toBe('invalid-request');

    const by = await signed(caster.user, apprentice);
    const made = { ...by, id: randomUUID() };
    const signing = (by: object) => send(done('sign', { kind: 'countersign', by }), apprentice);
    expect(sentenceOf(await signing(made))).toContain('not on record');
    expect(sentenceOf(await signing({ ...by, name: 'Someone else' }))).toContain('not on record');
    await signing(by).expect(201);
    const first = melt;
    melt = await openAs(apprentice);
    await sendAll(toFlaskOut(), apprentice);
    server.advance(60);
    await sendAll([done('hold', { kind: 'wait' })], apprentice);
    expect(sentenceOf(await signing(by))).toContain('not on record');
    expect(first.id).not.toBe(melt.id);
  });

  it('does only the parts and alloys that the owner has opened', async () => {
    const { models } = server.services;
    const limits = { alloyIds: null, parts: ['guard' as const] };
    const limited = await server.terminalAs(
      await buildUser(server.services, { roles: ['apprentice'], apprenticeship: limits }),
      { terminal: caster.terminal, token: caster.token },
    );
    melt = await openAs(limited);
    await sendAll([guarded], limited);
    expect(sentenceOf(await send({ type: 'checked', keys: ['crucible'] }, limited))).toContain(
      'take it over',
    );
    await models.User.update(
      { apprenticeship: { alloyIds: [], parts: null } },
      { where: { id: limited.user.id } },
    );
    await expect(openAs(limited)).rejects.toThrow('has not opened this alloy to you');
  });

  it('hands over to a caster, and the card asks from then on what it asks of a caster', async () => {
    await sendAll(toFlaskOut(), apprentice);
    server.advance(60);
    await caster.client
      .post(`/api/cards/${melt.castingId}/open`)
      .send({ key: randomUUID(), occurredAt: server.services.now().toISOString() })
      .expect(200);
    await sendAll([done('hold', { kind: 'wait' }), { type: 'flask-out', furnaceC: null }]);
    expect((await state()).worker).toMatchObject({ personId: caster.user.id, role: 'caster' });
  });
});

describe('a charge off its plan', () => {
  it('is a caster’s decision, and a departure', async () => {
    await sendAll([...toCharge, { type: 'charge-weighed', kind: 'grain', massG: PLANNED_G * 1.1 }]);
    expect(sentenceOf(await send({ type: 'charge-closed' }))).toContain('take some out');
    expect(problemIdOf(await send({ type: 'charge-closed', offPlan: true }, apprentice))).toBe('not-allowed');
    await sendAll([{ type: 'charge-closed', offPlan: true }]);
    expect((await state()).departures).toMatchObject([{ kind: 'charge-off-plan', isMajor: true }]);
  });
});

describe('a departure', () => {
  const reason = { type: 'variance-explained', index: 0, reason: 'time', words: '', hold: false, by: null };
  const close = { type: 'closed', buttonMassG: 10, lossMassG: 0, look: 'full', note: '' };
  const toClose = () => [
    ...toFlaskOut().map((event) =>
      event.type === 'step-done' && 'key' in event && event.key === 'look'
        ? done('look', { kind: 'choose', option: 'Chipped' })
        : event,
    ),
  ];
  const restAfterHold = [
    done('hold', { kind: 'wait' }),
    { type: 'flask-out', furnaceC: null },
    { type: 'poured' },
    { type: 'quenched' },
    close,
  ];
  const casting = () => server.services.models.Casting.findByPk(melt.castingId, { rejectOnEmpty: true });

  beforeEach(async () => {
    await sendAll(toClose());
    server.advance(60);
    await sendAll(restAfterHold);
  });

  it('keeps the card open until it has its reason', async () => {
    expect((await state()).step).toBe('close');
    expect(sentenceOf(await send(close))).toContain('What is left is the reasons');
    expect(sentenceOf(await send({ ...reason, index: 1 }))).toContain('no such departure');
    expect(sentenceOf(await send({ ...reason, reason: 'other' }))).toContain('Say in a few words');
    expect(problemIdOf(await send({ ...reason, reason: 'weather' }))).toBe('invalid-request');
    await sendAll([reason]);
    expect((await state()).step).toBe('done');
    expect((await casting()).state).toBe('quenched');
  });

  it('holds the pieces when its reason says so', async () => {
    await sendAll([{ ...reason, hold: true }]);
    expect(await casting()).toMatchObject({
      state: 'held',
      stateReason: 'How does the crucible look? “Chipped” was chosen.',
    });
  });
});

describe('a photograph', () => {
  const png = Buffer.from(
    'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
    'base64',
  );
  const put = (id: string, body: Buffer) =>
    caster.client
      .post(`/api/melts/${melt.id}/photographs?id=${id}`)
      .set('Content-Type', 'application/octet-stream')
      .send(body);

  it('is kept once however often it is sent, and read again', async () => {
    const id = randomUUID();
    await put(id, png).expect(201);
    await put(id, png).expect(201);
    expect(problemIdOf(await put(id, Buffer.concat([png, png])))).toBe('event-refused');
    expect(await server.services.models.Photograph.count({ where: { meltId: melt.id } })).toBe(1);
    const answer = await caster.client.get(`/api/melts/${melt.id}/photographs/${id}`).expect(200);
    expect(answer.body as Buffer).toEqual(png);
    expect(answer.get('content-type')).toBe('image/png');
  });

  it('is told by its content', async () => {
    expect(problemIdOf(await put(randomUUID(), Buffer.from('no picture')))).toBe('invalid-request');
  });
});
