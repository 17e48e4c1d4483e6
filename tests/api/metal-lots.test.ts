import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { MovementPage } from '#shared/contracts/ledger.ts';
import type { Lot, LotDetail } from '#shared/contracts/lot.ts';
import type { Problem } from '#shared/contracts/problem.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { buildLot, quarantineLot } from '#tests/factories/build-lot.ts';
import { PASSWORD } from '#tests/factories/build-user.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, START, type SignedInClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
let other: SignedInClient;
beforeAll(async () => {
  server = await startTestServer();
  owner = await server.deskAs('owner');
  other = await server.deskAs('caster');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const receipt = (overrides: object = {}) => ({
  key: randomUUID(),
  name: 'fine gold, granulated',
  kind: 'fine',
  compositionWt: { Au: 99.99 },
  toleranceWt: { Au: 0.005 },
  massG: 100,
  supplier: 'a refiner in the valley',
  supplierReference: 'V-118',
  place: 'safe, top shelf',
  receivedAt: START,
  ...overrides,
});

const receive = (overrides: object = {}) => owner.client.post('/api/lots').send(receipt(overrides));
const read = async (id: string): Promise<LotDetail> =>
  (await owner.client.get(`/api/lots/${id}`).expect(200)).body as LotDetail;
const movementsOf = async (lotId: string) =>
  ((await owner.client.get('/api/metal/movements').query({ lotId }).expect(200)).body as MovementPage)
    .movements;
const fieldsOf = ({ body }: { body: unknown }) => ((body as Problem).fields ?? []).map(({ path }) => path);

const sign = (who: SignedInClient) => ({ login: who.user.login, password: PASSWORD });

describe('taking a lot in', () => {
  it('gives it a code with its check digit, and its metal a movement from the supplier', async () => {
    const lot = (await receive().expect(201)).body as Lot;
    expect(lot.code).toMatch(/^L-\d{4}-\d$/);
    expect(lot).toMatchObject({
      balanceG: 100,
      contentsMg: { Au: 99_990, other: 10 },
      receivedBy: owner.user.name,
    });
    expect(await movementsOf(lot.id)).toMatchObject([
      { kind: 'received', from: 'supplier', to: 'stock', massG: 100, person: owner.user.name },
    ]);
    const found = await owner.client
      .get('/api/lots/by-code')
      .query({ code: lot.code.toLowerCase() })
      .expect(200);
    expect(found.body).toMatchObject({ id: lot.id });
  });

  it('takes one delivery in once, however often it comes', async () => {
    const request = receipt();
    const answers = [];
    for (let time = 0; time < 3; time += 1)
      answers.push(await owner.client.post('/api/lots').send(request).expect(201));
    expect(new Set(answers.map(({ body }) => (body as Lot).id)).size).toBe(1);
    expect(await movementsOf((answers[0]?.body as Lot).id)).toHaveLength(1);
  });

  it.each([
    [
      'parts that come to too little',
      { kind: 'grain', compositionWt: { Ag: 92.5, Cu: 6.5 }, toleranceWt: { Ag: 0.1 } },
      'compositionWt',
    ],
    [
      'parts that come to too much',
      { kind: 'grain', compositionWt: { Ag: 92.5, Cu: 8.5 }, toleranceWt: { Ag: 0.1 } },
      'compositionWt',
    ],
    ['no parts', { compositionWt: {} }, 'compositionWt'],
    ['no tolerance for a marked metal', { toleranceWt: {} }, 'toleranceWt'],
    ['a tolerance for what it does not hold', { toleranceWt: { Au: 0.1, Ni: 0.1 } }, 'toleranceWt'],
    ['no mass', { massG: 0 }, 'massG'],
    ['a mass below a milligram', { massG: 0.0002, confirmed: true }, 'massG'],
    ['a day to come', { receivedAt: '2027-01-01T00:00:00Z' }, 'receivedAt'],
    ['an alloy that is not there', { alloyRevisionId: randomUUID() }, 'alloyRevisionId'],
  ])('refuses %s at its field', async (_what, overrides, field) => {
    const response = await receive(overrides).expect(400);
    expect(fieldsOf(response)).toContain(field);
  });

  it('asks about a mass that looks like another unit, and takes it when someone stands by it', async () => {
    const asked = await receive({ massG: 0.5 }).expect(422);
    expect([problemIdOf(asked), fieldsOf(asked)]).toEqual(['entry-questioned', ['massG']]);
    await receive({ massG: 0.5, confirmed: true }).expect(201);
    expect(problemIdOf(await receive({ massG: 31_103 }))).toBe('entry-questioned');
  });

  it('asks about a certificate that is wider than its alloy, or of another alloy', async () => {
    const revision = await buildAlloyRevision(server.services, { toleranceWt: { Ag: 0.3, Cu: 0.3 } });
    const grain = { kind: 'grain', alloyRevisionId: revision.id, compositionWt: { Ag: 92.5, Cu: 7.5 } };
    const wide = await receive({ ...grain, toleranceWt: { Ag: 0.4, Cu: 0.3 } }).expect(422);
    expect(fieldsOf(wide)).toEqual(['toleranceWt']);
    const odd = { compositionWt: { Ag: 80, Cu: 20 }, toleranceWt: { Ag: 0.1 } };
    expect(fieldsOf(await receive({ ...grain, ...odd }).expect(422))).toEqual(['compositionWt']);
    await receive({ ...grain, toleranceWt: { Ag: 0.3, Cu: 0.3 } }).expect(201);
  });
});

describe('the list of lots', () => {
  it('filters by kind, stock, quarantine and words, the oldest first', async () => {
    const word = `crate ${randomUUID().slice(0, 8)}`;
    const later = await buildLot(server.services, { name: `${word} b`, receivedAt: '2026-11-20T10:00:00Z' });
    const earlier = await buildLot(server.services, {
      name: `${word} a`,
      receivedAt: '2026-11-10T10:00:00Z',
      kind: 'returns',
    });
    await quarantineLot(server.services, later);
    const codes = async (query: object) => {
      const response = await owner.client
        .get('/api/lots')
        .query({ search: word, ...query })
        .expect(200);
      return (response.body as Lot[]).map(({ code }) => code);
    };
    expect(await codes({})).toEqual([earlier.code, later.code]);
    expect(await codes({ kind: 'returns' })).toEqual([earlier.code]);
    expect(await codes({ quarantined: 'yes' })).toEqual([later.code]);
    expect(await codes({ onHand: 'no' })).toEqual([]);
    expect(await codes({ search: '%' })).not.toContain(later.code);
  });

  it('refuses a code with a wrong digit, of another thing, or of no lot', async () => {
    const sentence = async (code: string) => {
      const response = await owner.client.get('/api/lots/by-code').query({ code });
      expect(problemIdOf(response)).toBe('lot-code-refused');
      return sentenceOf(response);
    };
    expect(await sentence('F-0147-8')).toContain('names a flask');
    expect(await sentence('L-0001-9')).toContain('One digit is wrong');
    expect(await sentence('hello')).toContain('not one of our lot codes');
  });
});

describe('amending a lot', () => {
  it('keeps the first assay beside the new one, and moves what the ledger says is on hand', async () => {
    const lot = await buildLot(server.services, { massG: 100 });
    const assay = {
      kind: 'assay',
      compositionWt: { Ag: 92.4, Cu: 7.6 },
      toleranceWt: { Ag: 0.05, Cu: 0.05 },
      reason: 'Cupellation 77',
    };
    const amended = await owner.client.post(`/api/lots/${lot.id}/amendments`).send(assay).expect(201);
    expect(amended.body).toMatchObject({
      compositionWt: { Ag: 92.4, Cu: 7.6 },
      contentsMg: { Ag: 92_400, Cu: 7600 },
      balanceG: 100,
      amendments: [{ kind: 'assay', reason: 'Cupellation 77', person: owner.user.name }],
    });
    const bad = { ...assay, compositionWt: { Ag: 92.4, Cu: 6 } };
    expect(fieldsOf(await owner.client.post(`/api/lots/${lot.id}/amendments`).send(bad).expect(400))).toEqual(
      ['compositionWt'],
    );
  });

  it('puts a lot into quarantine once, and only the owner lets it out', async () => {
    const lot = await buildLot(server.services);
    const path = `/api/lots/${lot.id}`;
    const request = { kind: 'quarantined', reason: 'Lead suspected.' };
    await other.client.post(`${path}/amendments`).send(request).expect(201);
    expect(problemIdOf(await other.client.post(`${path}/amendments`).send(request))).toBe('wrong-state');
    expect((await read(lot.id)).quarantineReason).toBe('Lead suspected.');
    const reason = { reason: 'Assayed clean.' };
    expect(problemIdOf(await other.client.post(`${path}/release`).send(reason))).toBe('not-allowed');
    await owner.client.post(`${path}/release`).send(reason).expect(200);
    expect((await read(lot.id)).quarantineReason).toBeNull();
    expect(problemIdOf(await owner.client.post(`${path}/release`).send(reason))).toBe('not-allowed');
  });
});

describe('counting a lot', () => {
  it('asks for nothing when the count is right', async () => {
    const lot = await buildLot(server.services, { massG: 250 });
    await owner.client
      .post(`/api/lots/${lot.id}/counts`)
      .send({ key: randomUUID(), countedG: 250 })
      .expect(201);
    expect(await movementsOf(lot.id)).toHaveLength(1);
  });

  it('wants an explanation and a second person for a difference, and books it once', async () => {
    const lot = await buildLot(server.services, { massG: 250 });
    const count = (body: object) =>
      owner.client.post(`/api/lots/${lot.id}/counts`).send({ key: randomUUID(), countedG: 249.1, ...body });
    expect(fieldsOf(await count({}))).toEqual(['explanation']);
    expect(fieldsOf(await count({ explanation: 'Grain under the balance.' }))).toEqual(['countersign']);
    const whole = { key: randomUUID(), explanation: 'Grain under the balance.', countersign: sign(other) };
    await count(whole).expect(201);
    await count(whole).expect(201);
    expect((await read(lot.id)).balanceG).toBe(249.1);
    expect((await movementsOf(lot.id))[0]).toMatchObject({
      kind: 'counted',
      from: 'stock',
      to: 'adjustment',
      massG: 0.9,
      countersignedBy: other.user.name,
    });
    expect(await server.services.models.StockCount.count({ where: { lotId: lot.id } })).toBe(1);
  });
});

describe('correcting a movement', () => {
  const correct = (id: string, body: object) =>
    owner.client
      .post(`/api/metal/movements/${id}/corrections`)
      .send({ key: randomUUID(), reason: 'Typed 100, was 10.', ...body });

  it('writes a counter-movement that two people sign, and leaves the first as it was', async () => {
    const lot = await buildLot(server.services, { massG: 100 });
    const [received] = await movementsOf(lot.id);
    await correct(received?.id ?? '', { rightMassG: 10, countersign: sign(other) }).expect(201);
    expect((await read(lot.id)).balanceG).toBe(10);
    const [counter, first] = await movementsOf(lot.id);
    expect(first).toEqual({ ...received });
    expect(counter).toMatchObject({
      kind: 'corrected',
      from: 'stock',
      to: 'supplier',
      massG: 90,
      correctsId: received?.id,
    });
    await correct(received?.id ?? '', { rightMassG: 0, countersign: sign(other) }).expect(201);
    expect(await read(lot.id)).toMatchObject({ balanceG: 0, contentsMg: {} });
    expect(fieldsOf(await correct(received?.id ?? '', { rightMassG: 0, countersign: sign(other) }))).toEqual([
      'rightMassG',
    ]);
  });

  it('is refused without another owner or caster, with a wrong password, and for a correction', async () => {
    const lot = await buildLot(server.services, { massG: 100 });
    const [received] = await movementsOf(lot.id);
    const id = received?.id ?? '';
    const jeweller = await server.deskAs('jeweller');
    expect(fieldsOf(await correct(id, { rightMassG: 1, countersign: sign(owner) }))).toEqual(['countersign']);
    expect(fieldsOf(await correct(id, { rightMassG: 1, countersign: sign(jeweller) }))).toEqual([
      'countersign',
    ]);
    const wrong = await correct(id, { rightMassG: 1, countersign: { ...sign(other), password: 'guess' } });
    expect([wrong.status, fieldsOf(wrong)]).toEqual([400, ['countersign']]);
    await correct(id, { rightMassG: 1, countersign: sign(other) }).expect(201);
    const [counter] = await movementsOf(lot.id);
    expect(problemIdOf(await correct(counter?.id ?? '', { rightMassG: 1, countersign: sign(other) }))).toBe(
      'not-allowed',
    );
  });

  it('never takes back metal that is gone', async () => {
    const lot = await buildLot(server.services, { massG: 100 });
    await owner.client
      .post(`/api/lots/${lot.id}/dispatches`)
      .send({ key: randomUUID(), massG: 95, reason: 'to the refiner' })
      .expect(201);
    const [, received] = await movementsOf(lot.id);
    const response = await correct(received?.id ?? '', { rightMassG: 10, countersign: sign(other) });
    expect(problemIdOf(response)).toBe('not-enough-metal');
    expect((await read(lot.id)).balanceG).toBe(5);
  });
});
