import { randomUUID } from 'node:crypto';
import { parse } from 'csv-parse/sync';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Reconciliation } from '#shared/contracts/reconciliation.ts';
import type { Movement, MovementPage } from '#shared/contracts/ledger.ts';
import { balances } from '#shared/domain/metal/ledger.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildLot } from '#tests/factories/build-lot.ts';
import { PASSWORD } from '#tests/factories/build-user.ts';
import { chargeOf, meltAtCharge } from '#tests/support/charge-by-lot.ts';
import { deliverEvent } from '#tests/support/deliver-event.ts';
import { problemIdOf } from '#tests/support/problem-id.ts';
import {
  startTestServer,
  type SignedInClient,
  type TerminalClient,
  type TestServer,
} from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
let other: SignedInClient;
let here: TerminalClient;
let meltId: string;

/** A month's work: lots received in November and December, one melt, a count, an assay, a dispatch. */
beforeAll(async () => {
  server = await startTestServer();
  owner = await server.deskAs('owner');
  other = await server.deskAs('caster');
  here = await server.terminalAs('caster');
  const { services } = server;
  const revision = await buildAlloyRevision(services, { toleranceWt: { Ag: 0.3, Cu: 0.3 } });
  const grain = await buildLot(services, { massG: 300, receivedAt: '2026-11-30T23:59:59Z' });
  const returns = await buildLot(services, {
    kind: 'returns',
    massG: 80.005,
    receivedAt: '2026-12-01T00:00:00Z',
  });
  const scrap = await buildLot(services, {
    kind: 'scrap',
    massG: 12,
    receivedAt: '2026-12-01T09:00:00Z',
    compositionWt: { Au: 33.3, Ag: 33.3, Cu: 33.4 },
    toleranceWt: { Au: 1, Ag: 1 },
  });
  const casting = await buildCasting(services, { alloyRevisionId: revision.id });
  const melt = await meltAtCharge(services, here, casting.id);
  meltId = melt.id;
  const send = (event: object) => deliverEvent(here.client, melt.id, event).expect(201);
  await send(chargeOf(returns, 40.003));
  await send(chargeOf(grain, 70));
  await send(chargeOf(grain, 9.5, 'charge-taken-out'));
  for (const event of [
    { type: 'charge-closed' },
    { type: 'reading-taken', temperatureC: melt.context.figures.pourC.target },
    { type: 'melt-ready' },
    { type: 'flask-out', furnaceC: null },
    { type: 'poured' },
    { type: 'quenched' },
    { type: 'closed', buttonMassG: 11.001, lossMassG: 0.201, look: 'full', note: '' },
  ])
    await send(event);
  const countersign = { login: other.user.login, password: PASSWORD };
  await owner.client
    .post(`/api/lots/${grain.id}/counts`)
    .send({ key: randomUUID(), countedG: 239.47, explanation: 'Grain under the balance.', countersign })
    .expect(201);
  await owner.client
    .post(`/api/lots/${returns.id}/amendments`)
    .send({
      kind: 'assay',
      compositionWt: { Ag: 92.41, Cu: 7.59 },
      toleranceWt: { Ag: 0.02 },
      reason: 'Assay 12',
    })
    .expect(201);
  await owner.client
    .post(`/api/lots/${scrap.id}/dispatches`)
    .send({ key: randomUUID(), massG: 5, reason: 'to the refiner' })
    .expect(201);
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const read = async (month: string): Promise<Reconciliation> =>
  (await owner.client.get('/api/metal/reconciliation').query({ month }).expect(200)).body as Reconciliation;

const movements = async (): Promise<readonly Movement[]> =>
  ((await owner.client.get('/api/metal/movements').query({ limit: 500 }).expect(200)).body as MovementPage)
    .movements;

describe('a month of metal', () => {
  it('reconciles to the milligram, in all and element by element', async () => {
    const { metals, total } = await read('2026-12');
    for (const m of [...metals, total]) {
      expect(m.opening + m.received - m.issued + m.returned - m.dispatched + m.counted + m.reassayed).toBe(
        m.closing,
      );
      expect(m.crucibleOpening + m.issued - m.cast - m.returned - m.lost).toBe(m.crucibleClosing);
    }
    expect(total).toMatchObject({
      opening: 300_000,
      received: 92_005,
      issued: 100_503,
      returned: 11_001,
      dispatched: 5000,
      counted: -30,
      reassayed: 0,
      closing: 297_473,
      cast: 89_301,
      lost: 201,
      crucibleClosing: 0,
    });
    expect(metals.find(({ element }) => element === 'Ag')?.reassayed).toBeLessThan(0);
  });

  it('closes at what the lots hold, element by element', async () => {
    const { metals } = await read('2026-12');
    const lots = await server.services.models.Lot.findAll();
    for (const { element, closing } of metals)
      expect([element, lots.reduce((sum, { contentsMg }) => sum + (contentsMg[element] ?? 0), 0)]).toEqual([
        element,
        closing,
      ]);
  });

  it('conserves mass: what all places hold together is nought', async () => {
    const sums = balances(
      (await movements()).map(({ from, to, massG }) => ({ from, to, massMg: Math.round(massG * 1000) })),
    );
    expect(Object.values(sums).reduce((sum, mg) => sum + mg, 0)).toBe(0);
    expect(sums.crucible).toBe(0);
  });

  it('begins where the month before ended, at midnight of the studio’s own time', async () => {
    const [november, december] = [await read('2026-11'), await read('2026-12')];
    expect(november.total).toMatchObject({ opening: 0, received: 300_000, closing: 300_000 });
    expect(december.total.opening).toBe(november.total.closing);
    expect((await read('2027-01')).total.opening).toBe(december.total.closing);
    expect(december.from).toBe('2026-12-01T00:00:00.000Z');
  });

  it('lists what was counted and what was not, and the loss by alloy, caster, furnace and terminal', async () => {
    const month = await read('2026-12');
    expect(month.counts).toMatchObject([
      { expectedMg: 239_500, countedMg: 239_470, explanation: 'Grain under the balance.' },
    ]);
    expect(month.uncounted).toHaveLength(3);
    expect(month.uncounted.map(({ expectedMg }) => expectedMg)).not.toContain(0);
    const rate = { melts: 1, metalInMg: 100_503, lostMg: 201 };
    expect(month.lossByCaster).toEqual([{ name: here.user.name, ...rate }]);
    expect(month.lossByFurnace).toEqual([{ name: here.terminal.bay, ...rate }]);
    expect(month.lossByTerminal).toEqual([{ name: here.terminal.name, ...rate }]);
    expect(month.lossByAlloy).toMatchObject([rate]);
  });

  it('keeps a melt balanced when what was weighed in is corrected afterwards', async () => {
    const before = await read('2026-12');
    const weighed = (await movements()).find(
      ({ kind, massG, melt }) => kind === 'weighed-in' && massG === 70 && melt?.id === meltId,
    );
    const correction = {
      key: randomUUID(),
      rightMassG: 69,
      reason: 'The pan was not empty.',
      countersign: { login: other.user.login, password: PASSWORD },
    };
    await owner.client.post(`/api/metal/movements/${weighed?.id}/corrections`).send(correction).expect(201);
    const { total } = await read('2026-12');
    expect([total.issued, total.cast, total.closing, total.crucibleClosing]).toEqual([
      before.total.issued - 1000,
      before.total.cast - 1000,
      before.total.closing + 1000,
      0,
    ]);
  });

  it('is refused for what is no month', async () => {
    for (const month of ['2026-13', '2026', '', '12-2026'])
      expect(problemIdOf(await owner.client.get('/api/metal/reconciliation').query({ month }))).toBe(
        'invalid-request',
      );
  });
});

describe('the month on paper', () => {
  it('comes as CSV that adds up again', async () => {
    const { text, headers } = await owner.client
      .get('/api/metal/reconciliation.csv')
      .query({ month: '2026-12' })
      .expect(200);
    expect(headers['content-disposition']).toBe('attachment; filename="metal-2026-12.csv"');
    const rows = parse(text, { bom: true, relax_column_count: true });
    const of = (label: string): number => Number(rows.find(([first]) => first === label)?.at(-1));
    const sum =
      of('On hand at the beginning') +
      of('received') -
      of('issued to melts') +
      of('returned from melts') -
      of('sent to the refiner') +
      of('found by counting');
    expect(sum).toBeCloseTo(of('on hand at the end'), 9);
  });

  it('comes as a PDF', async () => {
    const response = await owner.client
      .get('/api/metal/reconciliation.pdf')
      .query({ month: '2026-12' })
      .buffer()
      .parse((stream, done) => {
        const chunks: Buffer[] = [];
        stream.on('data', (chunk: Buffer) => chunks.push(chunk));
        stream.on('end', () => done(null, Buffer.concat(chunks)));
      })
      .expect(200);
    const pdf = response.body as Buffer;
    expect(response.headers['content-type']).toBe('application/pdf');
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    expect(pdf.subarray(-6).toString()).toContain('%%EOF');
  });
});
