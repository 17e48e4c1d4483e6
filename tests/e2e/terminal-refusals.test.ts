import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildCode, buildFlaskCode } from '#shared/lib/codes.ts';
import { askThrough } from '#tests/support/ask-through.ts';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { makeQrVideo } from '#tests/support/qr-video.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import { demoPerson, type TerminalDriver } from '#tests/support/terminal-driver.ts';
import { openTerminalFloor, type TerminalFloor } from '#tests/support/terminal-floor.ts';
import { createTestDatabase, type TestDatabase } from '#tests/support/test-database.ts';
import { waitFor } from '#tests/support/wait-for.ts';

let database: TestDatabase;
let studio: ServedStudio;
/** The camera of this browser sees a QR code from elsewhere, all the time. */
let floor: TerminalFloor;

const foreign = 'https://example.org/menu';
const notOurs = 'That is not one of our flask codes. Scan the code on the flask or its traveller card.';
const oneDigitWrong = 'One digit is wrong or missing. Scan again, or check the number on the flask.';
const mistyped = `014${(Number(buildFlaskCode(147).slice(5, 6)) + 1) % 10}${buildFlaskCode(147).slice(-1)}`;

beforeAll(async () => {
  database = await createTestDatabase();
  studio = await serveStudio(database);
  await studio.services.models.Flask.create({
    code: buildFlaskCode(700),
    diameterMm: 89,
    heightMm: 102,
  });
  floor = await openTerminalFloor(studio, { fakeVideo: await makeQrVideo(foreign) });
});

afterAll(async () => {
  await floor.close();
  await studio.close();
  await database.drop();
});

const signedIn = async (login: string): Promise<TerminalDriver> => {
  const terminal = await floor.atTerminal();
  await terminal.page.goto(`${studio.origin}/kiosk`);
  await terminal.signIn(login);
  return terminal;
};

const readingsOf = async (meltId: string): Promise<readonly number[]> => {
  const rows = await studio.services.models.Reading.findAll({ where: { meltId }, order: ['takenAt'] });
  return rows.map(({ temperatureC }) => Math.round(temperatureC));
};

describe('what a terminal refuses', () => {
  it('refuses a QR code from elsewhere before and after the sign-in', async () => {
    const terminal = await floor.atTerminal();
    await terminal.page.goto(`${studio.origin}/kiosk`);
    await terminal.page.getByRole('alert').getByText(notOurs).waitFor();
    await terminal.signIn('ines');
    await terminal.heading(/./).getByText(notOurs).waitFor();
    await terminal.page.getByText(foreign).waitFor();
  });

  it('says of each flask that cannot be poured why not', async () => {
    const terminal = await signedIn('ines');
    // The camera would go on reading its own code at the standby screen; scanned codes are looked up from here.
    await terminal.heading(/./).getByText(notOurs).waitFor();
    const refusals: readonly (readonly [code: string, sentence: string])[] = [
      [mistyped, oneDigitWrong],
      [buildCode('T', 416), 'That code names a tree, not a flask.'],
      [buildFlaskCode(699), "F-0699 is not one of this studio's flasks. Check the plate, or tell the owner."],
      [buildFlaskCode(700), 'No casting is planned in F-0700. Check the flask, or ask who invested it.'],
      [buildFlaskCode(93), 'F-0093 is still burning out. A card opens when it is holding.'],
      [
        buildFlaskCode(88),
        'F-0088 is on hold (Crack seen in the mould after burnout). A card opens when it is holding.',
      ],
    ];
    for (const [code, sentence] of refusals) {
      await terminal.scanWithWedge(code);
      await terminal.heading(/./).getByText(sentence, { exact: true }).waitFor();
    }
  });

  it('refuses a mistyped number on the pad of the sign-in screen', async () => {
    const terminal = await floor.atTerminal();
    const { page } = terminal;
    await page.goto(`${studio.origin}/kiosk`);
    await terminal.button('Type its number').click();
    await page.getByRole('dialog').waitFor();
    await terminal.type(mistyped);
    await terminal.button('Find this flask').click();
    await page.getByRole('alert').getByText(oneDigitWrong).waitFor();
  });

  it('questions a slipped digit and a reading in the other unit, and takes what was meant', async () => {
    const terminal = await signedIn('ines');
    const { castingId, meltId } = await cardAhead(terminal.page, studio, 147, 'melt');
    await terminal.openCard(castingId);
    await terminal.read('9800');
    await terminal.page.getByText(/9800\s°C is hotter than the furnace goes/).waitFor();
    expect(await readingsOf(meltId)).toEqual([]);
    await terminal.button(/I meant 980\s°C/).click();
    await terminal.button('Type a reading').waitFor();
    await terminal.read('1750');
    await terminal.page.getByText(/1750\s°C is hotter than the furnace goes/).waitFor();
    await terminal.button(/I meant 1750\s°F/).click();
    await terminal.button('Type a reading').waitFor();
    // 1750 °F is (1750 − 32) × 5/9 = 954.4 °C.
    await waitFor('both readings', async () => (await readingsOf(meltId)).length === 2);
    expect(await readingsOf(meltId)).toEqual([980, 954]);
  });

  it('takes a comma as a decimal point, and neither letters nor a mass no studio melts', async () => {
    const terminal = await signedIn('ines');
    const { page } = terminal;
    const card = await cardAhead(page, studio, 122, 'charge');
    await terminal.openCard(card.castingId);
    await terminal.withoutLots();
    await terminal.button('Grain in').click();
    await terminal.heading(/How much/).waitFor();
    for (const [typed, sentence] of [
      ['abc', /That is not a number/],
      ['1e9', /That is not a number/],
      ['-1', /A mass must be above zero/],
      ['999999999', /That is more than a studio could melt/],
    ] as const) {
      await terminal.type(typed);
      await page.getByRole('alert').getByText(sentence).waitFor();
      expect(await terminal.button('Type a mass').getAttribute('aria-disabled')).toBe('true');
      await terminal.button('Clear').click();
    }
    await terminal.type('12,5');
    await terminal.button(/Put in 12\.50\sg/).click();
    await page.getByText(/12\.50\sg is in/).waitFor();
    const weigh = (massG: unknown) => card.deliver({ type: 'charge-weighed', kind: 'grain', massG });
    for (const massG of [-1, 1e9, '12,5', 'abc']) expect((await weigh(massG)).status()).toBe(400);
    await page.reload();
    await page.getByText(/12\.50\sg is in/).waitFor();
  });

  it('lets an apprentice neither stand by a doubtful reading nor end a card', async () => {
    const terminal = await signedIn('yara');
    const { page } = terminal;
    const { castingId, meltId, deliver } = await cardAhead(page, studio, 150, 'melt');
    await terminal.openCard(castingId);
    await terminal.readOn();
    await terminal.read('1150');
    await page.getByText(/over the pour window\. Is that right\?/).waitFor();
    const blocked = terminal.button('A caster or the owner has to confirm this');
    expect(await blocked.getAttribute('aria-disabled')).toBe('true');
    expect(await terminal.button('Yes, it is right').count()).toBe(0);
    const doubtful = { type: 'reading-taken', temperatureC: 1150, confirmed: true };
    expect((await deliver(doubtful)).status()).toBe(403);
    expect(await readingsOf(meltId)).toEqual([]);

    await terminal.button('Stop work').click();
    await terminal.button('Equipment').click();
    await page.getByText('A caster or the owner can end the card.').waitFor();
    await terminal.button('All clear. Hold to resume').waitFor();
    expect(await terminal.button('End this card').count()).toBe(0);
    await waitFor('the stop in the melt book', async () => {
      const melt = await studio.services.models.Melt.findByPk(meltId, { rejectOnEmpty: true });
      return melt.state.stopped === 'equipment';
    });
    expect((await deliver({ type: 'abandoned', note: 'It ends here.' })).status()).toBe(403);
  });

  it('locks a sign-in after ten wrong PINs, until the owner unlocks it at the desk', async () => {
    const terminal = await floor.atTerminal();
    const { page } = terminal;
    await page.goto(`${studio.origin}/kiosk`);
    const { name } = demoPerson('tomas');
    const { id } = await studio.services.models.User.findOne({ where: { name }, rejectOnEmpty: true });
    const ask = askThrough(page, studio.origin, 'terminal');
    for (let tries = 1; tries < 10; tries += 1) {
      const refused = await ask.post('/api/session/terminal', { personId: id, pin: '000000' });
      expect(refused.status()).toBe(401);
      // Each wrong PIN makes the next one wait longer.
      studio.advance(10 * 60);
    }
    const tryPin = async (pin: string): Promise<void> => {
      await terminal.button(new RegExp(name)).click();
      await page.getByRole('group', { name: `PIN of ${name}` }).waitFor();
      await terminal.type(pin);
      await terminal.button('Sign in').click();
    };
    const isLocked = page.getByRole('alert').getByText(/locked after too many wrong PINs/);
    await tryPin('111111');
    await isLocked.waitFor();
    await terminal.button('Someone else').click();
    await tryPin(demoPerson('tomas').pin);
    await isLocked.waitFor();

    const desk = driveDesk(await (await floor.browser.newContext()).newPage(), studio.origin);
    await desk.signIn('maren');
    await desk.open('/people');
    await desk.page.getByRole('button', { name: `Unlock the PIN of ${name}` }).click();
    await desk.page.getByRole('button', { name: /Unlock the PIN/ }).waitFor({ state: 'detached' });
    await terminal.button('Someone else').click();
    await terminal.signIn('tomas');
    const session: unknown = await (await ask.get('/api/session')).json();
    expect(session).toMatchObject({ person: { name } });
  });
});
