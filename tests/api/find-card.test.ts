import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import type { PourCard } from '#shared/contracts/card.ts';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildFlask } from '#tests/factories/build-flask.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { bodyOf } from '#tests/support/body-of.ts';
import { askForCard } from '#tests/support/ask-for-card.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import { startTestServer, type Client, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let terminal: Client;
beforeAll(async () => {
  server = await startTestServer();
  terminal = (await server.terminalAs('caster')).client;
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const find = (code: string) => terminal.get('/api/cards').query({ code });

const inFlask = async (
  state: CastingState,
  stateReason = '',
): Promise<{ code: string; castingId: string }> => {
  const flask = await buildFlask(server.services);
  const casting = await buildCasting(server.services, { flaskId: flask.id, state, stateReason });
  return { code: flask.code, castingId: casting.id };
};

/** `F-0147`, as people call it. */
const mainOf = (code: string): string => code.slice(0, -2);

const oneDigitWrong = (code: string): string =>
  code.replace(/\d(?=\d-\d$)/, (digit) => String((Number(digit) + 1) % 10));

describe('a scanned code', () => {
  it('finds the card of the flask it names, however it was read', async () => {
    const { code, castingId } = await inFlask('holding');
    for (const read of [code, ` ${code} `, code.toLowerCase(), code.replaceAll('-', ''), code.slice(2)]) {
      const body = bodyOf(await find(read).expect(200));
      expect(body).toMatchObject({ casting: { id: castingId, state: 'holding' }, melt: null });
      expect((body as PourCard).abilities).toEqual({ open: true, record: false });
    }
  });

  it('finds every number the card shows, each with where it comes from', async () => {
    const { code } = await inFlask('holding');
    const { context, instruction } = (await find(code).expect(200)).body as PourCard;
    const { figures } = context;
    expect(figures.pourC.low).toBeGreaterThan(figures.liquidusC);
    expect(figures.liquidusC).toBeGreaterThan(figures.solidusC);
    expect(figures.pourWindowS).toBeGreaterThan(0);
    for (const basis of Object.values(figures.basis)) expect(basis.source).not.toBe('');
    expect(instruction.sentences.pour).not.toBe('');
  });

  it.each([
    ['', /Nothing was read/],
    ['https://example.org/menu', /not one of our flask codes/],
    ['WIFI:S:studio;T:WPA;P:secret;;', /not one of our flask codes/],
    ['T-0398-1', /names a tree/],
    ['147', /too short/],
    ['٠١٤٧٨', /not one of our flask codes/],
    ['x'.repeat(500), /not one of our flask codes/],
  ])('is refused when it is %j', async (code, reason) => {
    const response = await find(code);
    expect([response.status, problemIdOf(response)]).toEqual([422, 'flask-code-refused']);
    expect(sentenceOf(response)).toMatch(reason);
  });

  it('is refused when one digit is wrong, though such a flask may exist', async () => {
    const { code } = await inFlask('holding');
    const response = await find(oneDigitWrong(code));
    expect(problemIdOf(response)).toBe('flask-code-refused');
    expect(sentenceOf(response)).toMatch(/One digit is wrong/);
  });

  it('is refused when it is well made and names no flask of the studio', async () => {
    const response = await find(buildFlaskCode(999_983));
    expect(problemIdOf(response)).toBe('flask-code-refused');
    expect(sentenceOf(response)).toMatch(/^F-999983 is not one of this studio's flasks/);
  });

  it('is refused when it is longer than any code', async () => {
    expect(problemIdOf(await find('1'.repeat(501)))).toBe('invalid-request');
    expect(problemIdOf(await terminal.get('/api/cards'))).toBe('invalid-request');
  });
});

describe('a flask with nothing to pour', () => {
  it('is free: no casting is planned in it', async () => {
    const { code } = await buildFlask(server.services);
    const response = await find(code);
    expect([response.status, problemIdOf(response)]).toEqual([404, 'no-open-casting']);
    expect(sentenceOf(response)).toContain(`No casting is planned in ${mainOf(code)}`);
  });

  it.each<CastingState>(['broken-out', 'cut', 'released', 'scrapped'])(
    'is free once its casting is %s',
    async (state) => {
      const { code } = await inFlask(state);
      expect(problemIdOf(await find(code))).toBe('no-open-casting');
    },
  );

  it.each<[CastingState, string, RegExp]>([
    ['invested', '', /is invested, waiting for dewax\. A card opens when it is holding/],
    ['dewaxed', '', /is dewaxed, waiting for burnout\./],
    ['burning-out', '', /is still burning out\./],
    ['quenched', '', /is quenched\./],
    ['held', 'Crack seen in the mould', /is on hold \(Crack seen in the mould\)\./],
  ])('says so when it is %s', async (state, reason, words) => {
    const { code, castingId } = await inFlask(state, reason);
    const response = await find(code);
    expect([response.status, problemIdOf(response)]).toEqual([409, 'wrong-state']);
    expect(sentenceOf(response)).toMatch(words);
    expect(problemIdOf(await askForCard(terminal, castingId))).toBe('wrong-state');
  });

  it.each(['draft', 'checked', 'superseded'] as const)(
    'opens no card on a revision that is %s',
    async (status) => {
      const { id } = await buildAlloyRevision(server.services, { status });
      const casting = await buildCasting(server.services, { alloyRevisionId: id });
      const response = await askForCard(terminal, casting.id);
      expect([response.status, problemIdOf(response)]).toEqual([409, 'alloy-not-approved']);
      expect(sentenceOf(response)).toMatch(/Revision 1 of Alloy \d+ is not approved\. Ask the owner/);
      expect(await server.services.models.Melt.count({ where: { castingId: casting.id } })).toBe(0);
    },
  );
});

describe('a card that is running', () => {
  it.each(['melt', 'pour', 'quench', 'close'] as const)(
    'is found at its step “%s”, with all that happened',
    async (step) => {
      const { code, castingId } = await inFlask('holding');
      const melt = await buildMelt(server.services, { castingId, step });
      const card = (await find(code).expect(200)).body as PourCard;
      expect(card.melt?.id).toBe(melt.id);
      expect(card.events.map(({ seq }) => seq)).toEqual(card.events.map((_, index) => index + 1));
      // It is at another terminal, so this one may look and not write.
      expect(card.abilities.record).toBe(false);
    },
  );

  it('is found no more once it is closed', async () => {
    const { code, castingId } = await inFlask('holding');
    await buildMelt(server.services, { castingId, step: 'done' });
    expect(problemIdOf(await find(code))).toBe('wrong-state');
  });
});
