import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { IntakePreview, IntakeResult } from '#shared/contracts/lot-intake.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type SignedInClient, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
beforeAll(async () => {
  server = await startTestServer();
  owner = await server.deskAs('owner');
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const header = 'name;kind;mass;unit;alloy;supplier;reference;place;received;Au;Ag;Cu;Ag ±';
const good = (name: string, mass = '250,5') =>
  `${name};grain;${mass};g;;a refiner;R-1;safe;2026-11-20;;92,65;7,35;0,1`;
const sheet = (...rows: readonly string[]): string => [header, ...rows].join('\n');

const preview = async (text: string): Promise<IntakePreview> =>
  (await owner.client.post('/api/lot-intake/preview').send({ text }).expect(200)).body as IntakePreview;
/** The faults of a sheet's first row, each after the name of its column. */
const faultsOf = ({ columns, rows }: IntakePreview): readonly string[] =>
  (rows[0]?.faults ?? []).map(({ column, message }) =>
    column === null ? message : `${columns[column]}: ${message}`,
  );
const take = (text: string, options: object = {}) =>
  owner.client.post('/api/lot-intake').send({ key: randomUUID(), text, ...options });
const lots = () => server.services.models.Lot.count();

describe('looking through a sheet', () => {
  it.each([
    ['semicolons and decimal commas', sheet(good('a'))],
    ['commas and decimal points', sheet(good('a').replaceAll(',', '.')).replaceAll(';', ',')],
    ['tabs', sheet(good('a')).replaceAll(';', '\t')],
    ['a byte order mark and Windows line ends', `\uFEFF${sheet(good('a')).replaceAll('\n', '\r\n')}`],
    [
      'quoted decimal commas between commas',
      `${header.replaceAll(';', ',')}\na,grain,"250,5",g,,a refiner,R-1,safe,2026-11-20,,"92,65","7,35","0,1"`,
    ],
  ])('reads %s', async (_what, text) => {
    expect(await preview(text)).toMatchObject({
      fault: '',
      good: 1,
      rows: [
        {
          line: 2,
          name: 'a',
          kind: 'grain',
          massG: 250.5,
          compositionWt: { Ag: 92.65, Cu: 7.35 },
          faults: [],
        },
      ],
    });
  });

  it.each([
    ['mass: “abc” is not a number.', good('a', 'abc')],
    ['mass: It is missing.', good('a', '')],
    ['mass: -5 g is not a mass a studio could have.', good('a', '-5')],
    ['kind: “grains” is none of fine, grain, master, returns, scrap.', good('a').replace('grain', 'grains')],
    ['unit: “oz” is none of g, kg, dwt, ozt.', good('a').replace(';g;', ';oz;')],
    ['unit: It is missing.', good('a').replace(';g;', ';;')],
    ['name: It is missing.', good('')],
    ['The parts come to 99.00 wt%; they must come to 100 wt%.', good('a').replace('7,35', '6,35')],
    ['Ag ±: 9 is not between 0 and 5.', good('a').replace(';0,1', ';9')],
    ['received: Write the day as year-month-day.', good('a').replace('2026-11-20', '20.11.2026')],
    ['received: Write the day as year-month-day.', good('a').replace('2026-11-20', '2026-02-30')],
    ['alloy: There is no approved alloy “Electrum”.', good('a').replace(';g;;', ';g;Electrum;')],
  ])('names the fault: %s', async (fault, row) => {
    expect(faultsOf(await preview(sheet(row)))).toEqual([fault]);
  });

  it('tells a decimal comma that was read as a separator', async () => {
    const text = `${header.replaceAll(';', ',')}\n${good('a').replaceAll(';', ',')}`;
    expect(faultsOf(await preview(text))[0]).toContain('a decimal comma may have been read as a separator');
  });

  it.each([
    ['another separator', sheet(good('a')).replaceAll(';', '|'), 'it lacks name, kind, mass, unit'],
    ['no first line', good('a'), 'it lacks name, kind, mass, unit'],
    ['no rows', header, 'no rows below its first line'],
    ['an open quotation mark', sheet(good('"a')), 'cannot be read'],
  ])('says what is wrong with a sheet that has %s', async (_what, text, fault) => {
    expect((await preview(text)).fault).toContain(fault);
  });

  it('converts units, finds alloys by name, and asks about odd masses', async () => {
    const revision = await buildAlloyRevision(server.services, { toleranceWt: { Ag: 0.3, Cu: 0.3 } });
    const alloy = await server.services.models.Alloy.findByPk(revision.alloyId, { rejectOnEmpty: true });
    const ounces = good('a', '10').replace(';g;;', `;oz t;${alloy.name.toUpperCase()};`);
    const { rows, questioned } = await preview(sheet(ounces, good('b', '0,5')));
    expect(rows[0]).toMatchObject({ massG: 311.035, faults: [], questions: [] });
    expect([questioned, rows[1]?.questions[0]]).toEqual([
      1,
      { column: 2, message: expect.stringContaining('is it in grams, not ounces?') as string },
    ]);
  });
});

describe('taking a sheet in', () => {
  it('takes all of a good sheet, once, and none of one with faults unless told to', async () => {
    const text = sheet(good('a'), good('b'), good('c', 'x'));
    const before = await lots();
    expect(problemIdOf(await take(text))).toBe('entry-questioned');
    expect(await lots()).toBe(before);
    const key = randomUUID();
    const first = (await take(text, { onlyGood: true, key }).expect(201)).body as IntakeResult;
    const again = (await take(text, { onlyGood: true, key }).expect(201)).body as IntakeResult;
    expect([first.codes.length, first.left, again.codes]).toEqual([2, 1, first.codes]);
    expect(await lots()).toBe(before + 2);
    const nothing = await take(sheet(good('c', 'x')), { onlyGood: true });
    expect([problemIdOf(nothing), sentenceOf(nothing)]).toEqual([
      'invalid-request',
      'No row of the sheet can be taken in.',
    ]);
  });

  it('leaves rows with questions unless someone stands by them', async () => {
    const text = sheet(good('d'), good('e', '0,5'));
    expect(((await take(text, { onlyGood: true }).expect(201)).body as IntakeResult).left).toBe(1);
    expect(((await take(text, { confirmed: true }).expect(201)).body as IntakeResult).codes).toHaveLength(2);
  });

  it('asks about a lot that is in already and a row that stands twice, but not when the same delivery comes again', async () => {
    const text = sheet(good('f'), good('g'), good('g'));
    const first = await preview(text);
    expect([first.good, first.questioned]).toEqual([2, 1]);
    expect(first.rows[2]?.questions).toEqual([{ column: 0, message: 'It repeats line 3. Is it another?' }]);
    const key = randomUUID();
    const taken = (await take(text, { key, onlyGood: true }).expect(201)).body as IntakeResult;
    expect((await take(text, { key, onlyGood: true }).expect(201)).body).toEqual(taken);
    const again = await preview(text);
    expect([again.good, again.questioned]).toEqual([0, 3]);
    expect(again.rows[0]?.questions[0]?.message).toContain(`It looks like ${taken.codes[0]}`);
    const mended = await preview(sheet(good('f'), good('h')));
    expect([mended.good, mended.questioned]).toEqual([1, 1]);
  });

  it('takes a thousand rows with ten faults: the preview names the ten, and 990 come in', async () => {
    const rows = Array.from({ length: 1000 }, (_, index) =>
      good(`lot ${index}`, index % 100 === 50 ? 'none' : '10,5'),
    );
    const text = sheet(...rows);
    const looked = await preview(text);
    expect([looked.good, looked.faulty]).toEqual([990, 10]);
    expect(looked.rows.filter(({ faults }) => faults.length > 0).map(({ line }) => line)).toEqual(
      Array.from({ length: 10 }, (_, hundred) => hundred * 100 + 52),
    );
    const before = await lots();
    const taken = (await take(text, { onlyGood: true }).expect(201)).body as IntakeResult;
    expect([taken.codes.length, taken.left, await lots()]).toEqual([990, 10, before + 990]);
  }, 60_000);
});
