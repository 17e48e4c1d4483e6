import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { PourCard } from '#shared/contracts/card.ts';
import type { MeltCurves } from '#shared/contracts/cooling-curve.ts';
import type { FlaskSizeCooling } from '#shared/contracts/flask-cooling.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildFlask } from '#tests/factories/build-flask.ts';
import { buildInstrument } from '#tests/factories/build-instrument.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { randomStream } from '#tests/checks/support/random.ts';
import { playCooling, plainMelt } from '#tests/support/play-cooling.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: Client;
let caster: Client;
beforeAll(async () => {
  server = await startTestServer();
  owner = (await server.deskAs('owner')).client;
  caster = (await server.terminalAs('caster')).client;
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const perSecond = 0.0016;

const readings = (startC: number) =>
  [15, 45, 75, 105, 150].map((secondsOut) => ({
    secondsOut,
    temperatureC: 22 + (startC - 22) * Math.exp(-perSecond * secondsOut),
  }));

const log = (body: object, client = caster) =>
  client.post('/api/flask-cooling').send({ key: randomUUID(), ...body });

const sizeOf = async (diameterMm: number): Promise<FlaskSizeCooling> => {
  const sizes = (await owner.get('/api/flask-cooling').expect(200)).body as FlaskSizeCooling[];
  const size = sizes.find((each) => each.diameterMm === diameterMm);
  if (!size) throw new Error(`Nothing is said of ${diameterMm} mm.`);
  return size;
};

const cardOf = async (castingId: string): Promise<PourCard> =>
  (await caster.get(`/api/cards/${castingId}`).expect(200)).body as PourCard;

describe('how flasks cool', () => {
  it('is the table’s until enough was logged, then fitted, and the card says which', async () => {
    const flask = await buildFlask(server.services, { diameterMm: 77 });
    const casting = await buildCasting(server.services, { flaskId: flask.id });
    const before = (await cardOf(casting.id)).context.figures;
    expect(before.basis.pourWindow.source).toMatch(
      /^The table’s default for \d+ mm; no reading stands behind it\./,
    );
    for (const startC of [500, 530]) {
      await log({ flaskId: flask.id, outingId: randomUUID(), readings: readings(startC) }).expect(201);
    }
    expect((await sizeOf(77)).chosen.from).toBe('default');
    await log({ castingId: casting.id, readings: readings(480) }).expect(201);
    const size = await sizeOf(77);
    expect(size.chosen).toMatchObject({ from: 'fitted', readings: 15 });
    expect(size.chosen.perSecond).toBeCloseTo(perSecond, 5);
    expect(size.outings).toHaveLength(3);
    const after = (await cardOf(casting.id)).context.figures;
    expect(after.coolingPerSecond).toBeCloseTo(perSecond, 5);
    expect(after.pourWindowS).toBeLessThan(before.pourWindowS);
    expect(after.basis.pourWindow.source).toMatch(/^Fitted to 15 readings of 3 flasks of this size/);
    expect(after.basis.pourWindow.inputs).toContainEqual({
      label: 'Readings behind the rate',
      value: '15',
      unit: 'text',
    });
  });

  it('of one size says nothing of another', async () => {
    expect((await sizeOf(89)).chosen).toMatchObject({ from: 'default', readings: 0 });
  });

  it('is logged once however often it is sent', async () => {
    const casting = await buildCasting(server.services);
    const key = randomUUID();
    const body = { key, castingId: casting.id, readings: readings(500) };
    const answers = await Promise.all([log(body), log(body)]);
    expect(answers.map(({ status }) => status)).toEqual([201, 201]);
    expect(await server.services.models.InstrumentReading.count({ where: { castingId: casting.id } })).toBe(
      5,
    );
    const other = await log({ ...body, readings: readings(510) });
    expect(problemIdOf(other)).toBe('reading-refused');
  });

  it.each<[string, object]>([
    ['neither casting nor flask', {}],
    ['a flask without an outing', { flaskId: randomUUID() }],
  ])('is refused with %s', async (_what, more) => {
    const response = await log({ readings: readings(500), ...more });
    expect(response.body).toMatchObject({ fields: [{ path: 'castingId' }] });
  });

  it('is refused of a casting that is none of ours', async () => {
    expect(problemIdOf(await log({ castingId: randomUUID(), readings: readings(500) }))).toBe('not-found');
  });
});

const curve = (composition: Readonly<Record<string, number>>) =>
  playCooling(
    { ...plainMelt, composition, noiseC: 0.4, undercoolingC: 4, lagS: 1, everyS: 2, heldS: 6 },
    randomStream(31),
  ).map(({ seconds, temperatureC }) => ({ seconds, temperatureC: Math.round(10 * temperatureC) / 10 }));

const handIn = (meltId: string, body: object, client = owner) =>
  client.post(`/api/melts/${meltId}/cooling-curves`).send({ key: randomUUID(), ...body });

const lastOf = ({ body }: { readonly body: unknown }) => {
  const last = (body as MeltCurves).curves.at(-1);
  if (!last) throw new Error('There is no curve.');
  return last;
};

describe('a melt’s cooling curve', () => {
  it('handed in as points from a terminal agrees with the alloy', async () => {
    const melt = await buildMelt(server.services, { step: 'charge' });
    const answer = await handIn(melt.id, { points: curve({ Ag: 92.5, Cu: 7.5 }) }, caster).expect(201);
    expect(lastOf(answer)).toMatchObject({ source: 'live', verdict: { kind: 'agrees' }, instrument: null });
    expect(lastOf(await owner.get(`/api/melts/${melt.id}/cooling-curves`)).verdict.sentence).toMatch(
      /^Agrees: /,
    );
  });

  it('handed in as a table with decimal commas and °F betrays a wrong alloy', async () => {
    const melt = await buildMelt(server.services, { step: 'charge' });
    const rows = curve({ Ag: 89, Cu: 11 }).map(
      ({ seconds, temperatureC }) =>
        `${seconds};${((temperatureC * 9) / 5 + 32).toFixed(1).replace('.', ',')}`,
    );
    const table = ['Time (s);Temperature °F', ...rows].join('\r\n');
    const { verdict, pointCount } = lastOf(await handIn(melt.id, { table }).expect(201));
    expect(pointCount).toBe(rows.length);
    expect(verdict).toMatchObject({ kind: 'differs', element: 'Cu' });
    expect(verdict.kind === 'differs' && verdict.moreWt).toBeCloseTo(3.5, 0);
    expect(verdict.sentence).toMatch(/more copper\.$/);
  });

  it('is read with the offset of its instrument, and judged by how well that is known', async () => {
    const { instrument } = await buildInstrument(server.services);
    await owner
      .post(`/api/instruments/${instrument.id}/checks`)
      .send({ key: randomUUID(), point: 'silver', readC: 951.8, wanderC: 0.5 })
      .expect(201);
    const melt = await buildMelt(server.services, { step: 'charge' });
    const points = curve({ Ag: 92.5, Cu: 7.5 }).map(({ seconds, temperatureC }) => ({
      seconds,
      temperatureC: temperatureC - 10,
    }));
    const unchecked = lastOf(await handIn(melt.id, { points }).expect(201));
    expect(unchecked).toMatchObject({ offsetC: 0, verdict: { kind: 'differs' } });
    expect(unchecked.thermometerC).toBeGreaterThan(6);
    const checked = lastOf(await handIn(melt.id, { points, instrumentId: instrument.id }).expect(201));
    expect(checked).toMatchObject({ offsetC: 10, thermometerC: 1.3, verdict: { kind: 'agrees' } });
  });

  it('that tells nothing says why, and is kept all the same', async () => {
    const melt = await buildMelt(server.services, { step: 'charge' });
    const answer = await handIn(melt.id, { table: 'time;temp\n0;900\n60;880' }).expect(201);
    expect(lastOf(answer).verdict.sentence).toMatch(/^Cannot tell, because /);
  });

  it('is kept once however often it is sent', async () => {
    const melt = await buildMelt(server.services, { step: 'charge' });
    const body = { key: randomUUID(), points: curve({ Ag: 92.5, Cu: 7.5 }) };
    const answers = await Promise.all([handIn(melt.id, body), handIn(melt.id, body)]);
    expect(answers.map(({ status }) => status)).toEqual([201, 201]);
    expect(await server.services.models.CoolingCurve.count({ where: { meltId: melt.id } })).toBe(1);
    expect(problemIdOf(await handIn(melt.id, { ...body, points: body.points.slice(5) }))).toBe(
      'reading-refused',
    );
  });

  it.each<[string, string, RegExp]>([
    ['no columns we know', 'a;b\n1;2', /must name a column of time/],
    [
      'decimal commas between commas',
      'time,temp\n0,0,960,5',
      /decimal comma may have been read as a separator/,
    ],
    ['a quotation mark left open', 'time;temp\n"0;960', /quotation mark/],
  ])('in a table with %s is refused at its field', async (_what, table, words) => {
    const melt = await buildMelt(server.services, { step: 'charge' });
    const response = await handIn(melt.id, { table });
    expect(response.body).toMatchObject({ fields: [{ path: 'table' }] });
    expect(sentenceOf(response)).toMatch(words);
  });

  it('of no melt is refused', async () => {
    expect(problemIdOf(await handIn(randomUUID(), { table: 'time;temp\n0;960' }))).toBe('not-found');
  });
});

describe('what was written', () => {
  it.each(['pyrometer_checks', 'instrument_readings', 'cooling_curves'])('stays in %s', async (table) => {
    const { sequelize } = server.services;
    const [before] = await sequelize.query(`select count(*) from ${table}`);
    expect(before).not.toEqual([{ count: '0' }]);
    for (const statement of [
      `update ${table} set note = ''`,
      `update ${table} set id = default`,
      `delete from ${table}`,
      `truncate ${table} cascade`,
    ])
      await expect(sequelize.query(statement)).rejects.toThrow();
    const [after] = await sequelize.query(`select count(*) from ${table}`);
    expect(after).toEqual(before);
  });
});
