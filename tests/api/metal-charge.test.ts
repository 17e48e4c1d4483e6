import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import type { FilledCrucible } from '#shared/contracts/charge.ts';
import type { LotDetail } from '#shared/contracts/lot.ts';
import type { AlloyRevision } from '#server/models/alloy-revision.ts';
import type { Lot } from '#server/models/lot.ts';
import type { Melt } from '#server/models/melt.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { buildCasting, PLANNED_G } from '#tests/factories/build-casting.ts';
import { buildLot, quarantineLot } from '#tests/factories/build-lot.ts';
import { PIN } from '#tests/factories/build-user.ts';
import { chargeOf, meltAtCharge, snapshotOf } from '#tests/support/charge-by-lot.ts';
import { deliverEvent } from '#tests/support/deliver-event.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import {
  startTestServer,
  type SignedInClient,
  type TerminalClient,
  type TestServer,
} from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
let here: TerminalClient;
let sterling: AlloyRevision;
beforeAll(async () => {
  server = await startTestServer();
  owner = await server.deskAs('owner');
  here = await server.terminalAs('caster');
  sterling = await buildAlloyRevision(server.services, { toleranceWt: { Ag: 0.3, Cu: 0.3 } });
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const castingOfSterling = () => buildCasting(server.services, { alloyRevisionId: sterling.id });

const cardAtCharge = async () =>
  (await meltAtCharge(server.services, here, (await castingOfSterling()).id)).id;

const balanceOf = async (lot: Lot): Promise<number> => (await lot.reload()).balanceMg / 1000;
const send = (meltId: string, event: object) => deliverEvent(here.client, meltId, event);
const readLot = async (id: string): Promise<LotDetail> =>
  (await owner.client.get(`/api/lots/${id}`).expect(200)).body as LotDetail;

/** Leads a card from its closed charge to its last step. */
const pourOut = async (meltId: string): Promise<void> => {
  const melt = await server.services.models.Melt.findByPk(meltId, { rejectOnEmpty: true });
  const temperatureC = melt.context.figures.pourC.target;
  const rest = [
    { type: 'charge-closed' },
    { type: 'reading-taken', temperatureC },
    { type: 'melt-ready' },
    { type: 'flask-out', furnaceC: null },
    { type: 'poured' },
    { type: 'quenched' },
  ];
  for (const event of rest) await send(meltId, event).expect(201);
};

describe('weighing a lot in', () => {
  it('moves its metal into the crucible once, however often it is delivered', async () => {
    const lot = await buildLot(server.services, { massG: 200 });
    const meltId = await cardAtCharge();
    const key = randomUUID();
    for (let time = 0; time < 3; time += 1)
      await deliverEvent(here.client, meltId, chargeOf(lot, 60), { key }).expect(201);
    expect(await balanceOf(lot)).toBe(140);
    await send(meltId, chargeOf(lot, 20, 'charge-taken-out')).expect(201);
    await send(meltId, chargeOf(lot, 40, 'charge-taken-out')).expect(201);
    expect(await balanceOf(lot)).toBe(200);
    expect(await server.services.models.Crucible.findByPk(meltId)).toMatchObject({
      balanceMg: 0,
      contentsMg: {},
    });
    const more = await send(meltId, chargeOf(lot, 1, 'charge-taken-out'));
    expect(problemIdOf(more)).toBe('event-refused');
  });

  it('writes the server’s own certificate down, not the terminal’s', async () => {
    const lot = await buildLot(server.services);
    const meltId = await cardAtCharge();
    const event = {
      ...chargeOf(lot, 10),
      lot: { ...snapshotOf(lot), compositionWt: { Ag: 100 }, toleranceWt: { Ag: 0 } },
    };
    const { body } = (await send(meltId, event).expect(201)) as { body: { event: unknown } };
    expect(body.event).toMatchObject({ lot: { compositionWt: lot.compositionWt } });
  });

  it('refuses a lot in quarantine, scrap, one of the wrong kind, and more than it holds', async () => {
    const meltId = await cardAtCharge();
    const held = await buildLot(server.services);
    await quarantineLot(server.services, held);
    expect(sentenceOf(await send(meltId, chargeOf(held, 10)))).toContain(
      'is in quarantine: Colour of the grain is off.',
    );
    const scrap = await buildLot(server.services, { kind: 'scrap' });
    expect(sentenceOf(await send(meltId, chargeOf(scrap, 10)))).toContain('scrap for refining');
    const grain = await buildLot(server.services, { massG: 10 });
    expect(sentenceOf(await send(meltId, { ...chargeOf(grain, 5), kind: 'returns' }))).toContain(
      'counts as grain',
    );
    const tooMuch = await send(meltId, chargeOf(grain, 10.001));
    expect([problemIdOf(tooMuch), await balanceOf(grain)]).toEqual(['not-enough-metal', 10]);
    const gone = { ...chargeOf(grain, 1), lot: { ...snapshotOf(grain), id: randomUUID() } };
    expect(problemIdOf(await send(meltId, gone))).toBe('not-found');
  });

  it('never gives more than there is to ten terminals at once', async () => {
    const lot = await buildLot(server.services, { massG: 100 });
    const terminals = await Promise.all(Array.from({ length: 10 }, () => server.terminalAs('caster')));
    const melts: Melt[] = [];
    for (const { user, terminal } of terminals) {
      const casting = await castingOfSterling();
      melts.push(await meltAtCharge(server.services, { user, terminal }, casting.id));
    }
    const answers = await Promise.all(
      terminals.map(({ client }, index) => deliverEvent(client, melts[index]?.id ?? '', chargeOf(lot, 15))),
    );
    const statuses = answers.map(({ status }) => status).sort();
    expect(statuses).toEqual([201, 201, 201, 201, 201, 201, 409, 409, 409, 409]);
    expect(await balanceOf(lot)).toBe(10);
    // Refused by the ledger, the book has no such weighing either.
    const refusedAt = answers.findIndex(({ status }) => status === 409);
    expect((await melts[refusedAt]?.reload())?.state.charge.grain).toBe(0);
  });
});

describe('closing a charge by lots', () => {
  it('is refused when the fineness could fall below the mark at the certificates’ lower bounds', async () => {
    const poor = await buildLot(server.services, {
      compositionWt: { Ag: 92.55, Cu: 7.45 },
      toleranceWt: { Ag: 0.1, Cu: 0.1 },
    });
    const meltId = await cardAtCharge();
    await send(meltId, chargeOf(poor, PLANNED_G)).expect(201);
    const refused = await send(meltId, { type: 'charge-closed' });
    expect(sentenceOf(refused)).toContain('holds 924.5 parts per thousand of silver; the mark wants 925');
    const rich = await buildLot(server.services);
    await send(meltId, chargeOf(poor, PLANNED_G, 'charge-taken-out')).expect(201);
    await send(meltId, chargeOf(rich, PLANNED_G)).expect(201);
    await send(meltId, { type: 'charge-closed' }).expect(201);
  });

  it('is refused while some metal is of no lot, and goes as before where none is', async () => {
    const lot = await buildLot(server.services);
    const mixed = await cardAtCharge();
    await send(mixed, { type: 'charge-weighed', kind: 'grain', massG: 40 }).expect(201);
    await send(mixed, chargeOf(lot, 60)).expect(201);
    expect(sentenceOf(await send(mixed, { type: 'charge-closed' }))).toContain(
      '40.00 g in the crucible is of no lot',
    );
    const plain = await cardAtCharge();
    await send(plain, { type: 'charge-weighed', kind: 'grain', massG: PLANNED_G }).expect(201);
    await send(plain, { type: 'charge-closed' }).expect(201);
  });

  it('is remarked on when an element is outside the alloy', async () => {
    const odd = await buildLot(server.services, {
      compositionWt: { Ag: 92.65, Cu: 7.25, Zn: 0.1 },
      toleranceWt: { Ag: 0.05 },
    });
    const zinc = await buildLot(server.services, {
      compositionWt: { Ag: 93.15, Cu: 5.85, Zn: 1 },
      toleranceWt: { Ag: 0.05 },
    });
    const meltId = await cardAtCharge();
    await send(meltId, chargeOf(odd, 50)).expect(201);
    await send(meltId, chargeOf(zinc, 50)).expect(201);
    await send(meltId, { type: 'charge-closed' }).expect(201);
    const melt = await server.services.models.Melt.findByPk(meltId, { rejectOnEmpty: true });
    expect(melt.state.departures.map(({ sentence }) => sentence)).toEqual([
      "By the lots' certificates the charge holds 0.40 wt% too much silver and 0.95 wt% too little copper and 0.55 wt% too much zinc.",
    ]);
  });
});

describe('closing a melt by lots', () => {
  it('makes a lot of the button, shares out every milligram, and shows which melts a lot touched', async () => {
    const grain = await buildLot(server.services, { massG: 200 });
    const returns = await buildLot(server.services, {
      kind: 'returns',
      massG: 100,
      compositionWt: { Ag: 92.6, Cu: 7.4 },
      toleranceWt: { Ag: 0.05, Cu: 0.05 },
    });
    const meltId = await cardAtCharge();
    await send(meltId, chargeOf(returns, 40)).expect(201);
    await send(meltId, chargeOf(grain, 60.123)).expect(201);
    await pourOut(meltId);
    await send(meltId, { type: 'closed', buttonMassG: 11.5, lossMassG: 0.2, look: 'full', note: '' }).expect(
      201,
    );
    const { models } = server.services;
    expect(await models.Crucible.findByPk(meltId)).toMatchObject({ balanceMg: 0, contentsMg: {} });
    const movements = await models.MetalMovement.findAll({ where: { meltId }, order: [['id', 'ASC']] });
    expect(movements.map(({ kind, massMg }) => [kind, massMg])).toEqual([
      ['weighed-in', 40_000],
      ['weighed-in', 60_123],
      ['lost', 200],
      ['returned', 11_500],
      ['cast', 88_423],
    ]);
    const button = await models.Lot.findOne({ where: { meltId }, rejectOnEmpty: true });
    const silver = (40 * 92.6 + 60.123 * 92.65) / 100.123;
    expect(button).toMatchObject({ kind: 'returns', balanceMg: 11_500, alloyRevisionId: sterling.id });
    expect(button.compositionWt.Ag).toBeCloseTo(silver, 4);
    const tolerance = (40 * 0.05 + 60.123 * 0.1) / 100.123;
    expect(button.toleranceWt.Ag).toBeGreaterThanOrEqual(tolerance);
    expect(button.toleranceWt.Ag).toBeLessThan(tolerance + 2e-4);
    expect(await readLot(grain.id)).toMatchObject({
      melts: [{ id: meltId, massG: 60.123 }],
      becameLots: [{ id: button.id }],
    });
    expect((await readLot(button.id)).melts).toEqual([]);
  });

  it('takes a loss over the limit as it is, and wants its reason before the card is done', async () => {
    const lot = await buildLot(server.services);
    const meltId = await cardAtCharge();
    await send(meltId, chargeOf(lot, 100)).expect(201);
    await pourOut(meltId);
    await send(meltId, { type: 'closed', buttonMassG: 10, lossMassG: 3, look: 'full', note: '' }).expect(201);
    const stepNow = async () =>
      (await server.services.models.Melt.findByPk(meltId, { rejectOnEmpty: true })).state.step;
    expect(await stepNow()).toBe('close');
    const button = await server.services.models.Lot.findOne({ where: { meltId }, rejectOnEmpty: true });
    expect(button.balanceMg).toBe(10_000);
    const reason = {
      type: 'variance-explained',
      index: 0,
      reason: 'mistake',
      words: 'Spilt on the hearth.',
      hold: false,
    };
    expect(sentenceOf(await send(meltId, { ...reason, by: null }))).toContain('A second person has to sign');
    const sign = await here.client
      .post(`/api/melts/${meltId}/countersigns`)
      .send({ personId: owner.user.id, pin: PIN })
      .expect(201);
    await send(meltId, { ...reason, by: sign.body as Countersigned }).expect(201);
    expect(await stepNow()).toBe('done');
  });

  it('leaves the metal of an ended card in its crucible until the desk closes it out', async () => {
    const lot = await buildLot(server.services);
    const meltId = await cardAtCharge();
    await send(meltId, chargeOf(lot, 50)).expect(201);
    const closeOut = (body: object) =>
      owner.client
        .post(`/api/melts/${meltId}/close-out`)
        .send({ buttonG: 49.9, lossG: 0.1, note: 'Let freeze in the crucible.', ...body });
    expect(problemIdOf(await closeOut({}))).toBe('wrong-state');
    const crucibles = async () =>
      ((await owner.client.get('/api/metal/crucibles').expect(200)).body as FilledCrucible[]).filter(
        ({ melt }) => melt.id === meltId,
      );
    expect(await crucibles()).toMatchObject([{ massG: 50, endedAt: null }]);
    await send(meltId, { type: 'abandoned', note: 'Torch ran dry.' }).expect(201);
    const { compositionWt } = lot;
    const ended = await crucibles();
    expect(ended).toMatchObject([{ massG: 50, compositionWt }]);
    expect(ended[0]?.endedAt).not.toBeNull();
    expect(problemIdOf(await closeOut({ buttonG: 51 }))).toBe('not-enough-metal');
    await closeOut({}).expect(200);
    expect(problemIdOf(await closeOut({}))).toBe('wrong-state');
    const button = await server.services.models.Lot.findOne({ where: { meltId }, rejectOnEmpty: true });
    expect(button).toMatchObject({ balanceMg: 49_900, contentsMg: { Ag: 46_232, Cu: 3668 } });
    expect(await crucibles()).toEqual([]);
  });
});
