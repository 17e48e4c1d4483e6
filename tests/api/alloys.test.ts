import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Alloy, AlloyRevision, CreateAlloyRequest } from '#shared/contracts/alloy.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: Client;
let caster: Client;
beforeAll(async () => {
  server = await startTestServer();
  owner = (await server.deskAs('owner')).client;
  caster = (await server.deskAs('caster')).client;
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

let alloys = 0;
const sterling = (): CreateAlloyRequest => ({
  name: `Sterling ${(alloys += 1)}`,
  family: 'silver',
  compositionWt: { Ag: 92.5, Cu: 7.5 },
  toleranceWt: { Ag: 0.3 },
  fineness: 925,
  quench: { earliestS: 900, latestS: null, medium: 'water', why: 'Let it set through.', source: 'Test.' },
});

const create = async (values: Partial<CreateAlloyRequest> = {}): Promise<Alloy> =>
  (
    await owner
      .post('/api/alloys')
      .send({ ...sterling(), ...values })
      .expect(201)
  ).body as Alloy;

const newest = ({ revisions: [revision] }: Alloy): AlloyRevision => {
  if (!revision) throw new Error('The alloy has no revision.');
  return revision;
};

const step = (client: Client, revision: AlloyRevision, verb: 'check' | 'approve') =>
  client.post(`/api/alloy-revisions/${revision.id}/${verb}`);

const revise = async ({ id }: Alloy): Promise<Alloy> => {
  const { quench, compositionWt, fineness } = sterling();
  return (
    await owner.post(`/api/alloys/${id}/revisions`).send({ quench, compositionWt, fineness }).expect(201)
  ).body as Alloy;
};

describe('an alloy’s life', () => {
  it('begins as a draft with computed figures, is checked, then approved', async () => {
    const draft = newest(await create());
    expect(draft).toMatchObject({ number: 1, status: 'draft', outsideModel: '', approvedBy: null });
    // What the figures are is held to published values elsewhere; here it matters that there are some.
    expect(draft.figures.liquidusC).toBeGreaterThan(draft.figures.solidusC);
    expect(draft.figures.basis).toBe('computed');
    expect(draft.abilities).toEqual({ check: true, approve: false });

    const checked = newest((await step(caster, draft, 'check').expect(200)).body as Alloy);
    expect(checked).toMatchObject({ status: 'checked', abilities: { check: false, approve: false } });
    const approved = newest((await step(owner, draft, 'approve').expect(200)).body as Alloy);
    expect(approved).toMatchObject({ status: 'approved', figures: draft.figures });
    expect(approved.checkedBy).toBe(checked.checkedBy);
    expect(approved.approvedAt).toBe(server.services.now().toISOString());
  });

  it('goes in this order only', async () => {
    const draft = newest(await create());
    expect(problemIdOf(await step(owner, draft, 'approve'))).toBe('not-allowed');
    await step(owner, draft, 'check').expect(200);
    expect(problemIdOf(await step(owner, draft, 'check'))).toBe('not-allowed');
    await step(owner, draft, 'approve').expect(200);
    expect(problemIdOf(await step(owner, draft, 'approve'))).toBe('not-allowed');
  });

  it('retires the approved revision when the next is approved, and keeps it in the list', async () => {
    const alloy = await create();
    const first = newest(alloy);
    await step(owner, first, 'check').expect(200);
    await step(owner, first, 'approve').expect(200);
    const second = newest(await revise(alloy));
    expect(second).toMatchObject({ number: 2, status: 'draft' });
    await step(owner, second, 'check').expect(200);
    const body = bodyOf(await step(owner, second, 'approve').expect(200));
    expect((body as Alloy).revisions.map(({ number, status }) => [number, status])).toEqual([
      [2, 'approved'],
      [1, 'superseded'],
    ]);
  });

  it('leaves one approved revision when two are approved at once', async () => {
    const alloy = await create();
    const pair = [newest(alloy), newest(await revise(alloy))];
    for (const revision of pair) await step(owner, revision, 'check').expect(200);
    const answers = await Promise.all(pair.map((revision) => step(owner, revision, 'approve')));
    expect(answers.map(({ status }) => status)).toEqual([200, 200]);
    const body = bodyOf(await owner.get(`/api/alloys/${alloy.id}`).expect(200));
    expect((body as Alloy).revisions.map(({ status }) => status).sort()).toEqual(['approved', 'superseded']);
  });

  it('numbers drafts that are added at once one after the other', async () => {
    const alloy = await create();
    await Promise.all([revise(alloy), revise(alloy), revise(alloy)]);
    const body = bodyOf(await owner.get(`/api/alloys/${alloy.id}`).expect(200));
    expect((body as Alloy).revisions.map(({ number }) => number)).toEqual([4, 3, 2, 1]);
  });

  it('does not go on with figures that an older engine computed otherwise', async () => {
    const revision = await buildAlloyRevision(server.services, { status: 'checked' });
    const { figures } = revision;
    await revision.update({
      figures: { ...figures, liquidusC: figures.liquidusC + 5, engineVersion: '0.0' },
    });
    const response = await owner.post(`/api/alloy-revisions/${revision.id}/approve`);
    expect(problemIdOf(response)).toBe('changed-meanwhile');
    expect(sentenceOf(response)).toMatch(/Liquidus.*Draft the revision again/);
  });
});

describe('an alloy’s numbers', () => {
  const refused: [string, Partial<CreateAlloyRequest>, string, RegExp][] = [
    ['a fineness above what the composition holds', { fineness: 926 }, 'fineness', /holds 925\.0 parts/],
    ['parts that come to 99 %', { compositionWt: { Ag: 92.5, Cu: 6.5 } }, 'compositionWt', /100 wt%/],
    ['parts below nothing', { compositionWt: { Ag: 107.5, Cu: -7.5 } }, 'compositionWt.Ag', /Not above 100/],
    ['no parts', { compositionWt: {} }, 'compositionWt', /one to twelve/],
    [
      'a symbol that is no element',
      { compositionWt: { Ag: 92.5, Xx: 7.5 } },
      'measured',
      /Xx is not the symbol/,
    ],
    ['a name that is no symbol', { compositionWt: { silver: 100 } }, 'compositionWt.silver', /./],
    [
      'a tolerance for what it does not hold',
      { toleranceWt: { Zn: 0.1 } },
      'toleranceWt',
      /tolerance for Zn/,
    ],
    [
      'an element outside the model, with no measured range',
      { compositionWt: { Ag: 93, Pd: 7 } },
      'measured',
      /Pd.*with its source/,
    ],
    [
      'a quench that ends before it begins',
      { quench: { ...sterling().quench, latestS: 600 } },
      'quench.latestS',
      /after the earliest/,
    ],
  ];

  it.each(refused)('refuse %s', async (_what, values, path, reason) => {
    const request = { ...sterling(), ...values };
    const response = await owner.post('/api/alloys').send(request);
    expect(problemIdOf(response)).toBe('invalid-request');
    const { fields } = response.body as { fields: { path: string; message: string }[] };
    expect(fields[0]?.path).toBe(path);
    expect(fields[0]?.message).toMatch(reason);
    // The alloy is not left behind without its revision.
    expect(await server.services.models.Alloy.count({ where: { name: request.name } })).toBe(0);
  });

  it('take a mark exactly as high as the composition', async () => {
    const alloy = await create({
      compositionWt: { Au: 75, Ag: 12.5, Cu: 12.5 },
      toleranceWt: {},
      family: 'yellow-gold',
      fineness: 750,
    });
    expect(newest(alloy).fineness).toBe(750);
  });

  it('are the supplier’s measured range, and say so, where the model does not hold the alloy', async () => {
    const measured = { solidusC: 1080, liquidusC: 1125, densityGPerCm3: 15.9, source: 'Supplier’s sheet.' };
    const values = {
      family: 'white-gold',
      fineness: 750,
      compositionWt: { Au: 75, Pd: 15, Cu: 10 },
      toleranceWt: {},
    } as const;
    const revision = newest(await create({ ...values, measured }));
    expect(revision.figures).toMatchObject({
      basis: 'measured',
      liquidusC: 1125,
      solidusC: 1080,
      asCastSolidusC: null,
      engineVersion: null,
    });
    expect(revision.outsideModel).toMatch(/Pd/);
    const noSource = await owner
      .post('/api/alloys')
      .send({ ...sterling(), ...values, measured: { ...measured, source: ' ' } });
    expect(noSource.body).toMatchObject({ fields: [{ path: 'measured.source' }] });
    const upsideDown = await owner
      .post('/api/alloys')
      .send({ ...sterling(), ...values, measured: { ...measured, liquidusC: 1000 } });
    expect(upsideDown.body).toMatchObject({ fields: [{ path: 'measured.liquidusC' }] });
  });

  it('refuse a name that is taken, whatever its capitals', async () => {
    const { name } = await create();
    const response = await owner.post('/api/alloys').send({ ...sterling(), name: name.toUpperCase() });
    expect([response.status, problemIdOf(response)]).toEqual([409, 'already-exists']);
  });
});
