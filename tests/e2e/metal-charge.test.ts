import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Lot } from '#server/models/lot.ts';
import { buildCode, buildFlaskCode } from '#shared/lib/codes.ts';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { driveCharge } from '#tests/support/charge-driver.ts';
import { installFakeSerial } from '#tests/support/fake-serial.ts';
import { demoLot, planChargeFor } from '#tests/support/plan-charge-for.ts';
import { pourOut } from '#tests/support/pour-out.ts';
import { makeQrVideo } from '#tests/support/qr-video.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import type { TerminalDriver } from '#tests/support/terminal-driver.ts';
import { openTerminalFloor, type TerminalFloor } from '#tests/support/terminal-floor.ts';
import { createTestDatabase, type TestDatabase } from '#tests/support/test-database.ts';
import { waitFor } from '#tests/support/wait-for.ts';

let database: TestDatabase;
let studio: ServedStudio;
/** The camera of this browser sees the label of the returns all the time. */
let floor: TerminalFloor;
let returns: Lot;
let grain: Lot;
let fine: Lot;
let master: Lot;

beforeAll(async () => {
  database = await createTestDatabase();
  studio = await serveStudio(database);
  const { services } = studio;
  returns = await demoLot(services, /18 ct yellow/, 'returns');
  grain = await demoLot(services, /18 ct yellow/, 'grain');
  fine = await demoLot(services, /Fine gold/, 'fine');
  master = await demoLot(services, /Master alloy/, 'master');
  floor = await openTerminalFloor(studio, { fakeVideo: await makeQrVideo(returns.code) });
});

afterAll(async () => {
  await floor.close();
  await studio.close();
  await database.drop();
});

/** A window at the terminal with someone signed in, a fake instrument at its serial port. */
const signedIn = async (login: string, { hasCamera = true } = {}) => {
  const terminal = await floor.atTerminal();
  const serial = await installFakeSerial(terminal.page);
  if (!hasCamera) {
    await terminal.page.addInitScript(() =>
      Object.defineProperty(navigator.mediaDevices, 'getUserMedia', { value: undefined }),
    );
  }
  await terminal.page.goto(`${studio.origin}/kiosk`);
  await terminal.signIn(login);
  return { terminal, serial, charge: driveCharge(terminal) };
};

const castingIn = async (flask: number): Promise<{ readonly id: string; readonly plannedG: number }> => {
  const { models } = studio.services;
  const { id: flaskId } = await models.Flask.findOne({
    where: { code: buildFlaskCode(flask) },
    rejectOnEmpty: true,
  });
  const { id, plannedMetalG } = await models.Casting.findOne({
    where: { flaskId, state: 'holding' },
    rejectOnEmpty: true,
  });
  return { id, plannedG: plannedMetalG };
};

const hundredths = (grams: number): number => Math.round(grams * 100) / 100;

/** A plan of 20 g of returns, 34 g of grain, and the rest of fine gold and master alloy in the alloy's own proportion. */
const planFor147 = async () => {
  const { id, plannedG } = await castingIn(147);
  const madeG = hundredths(plannedG - 54);
  const fineG = hundredths(madeG * 0.7507);
  const masterG = hundredths(madeG - fineG);
  await planChargeFor(studio.services, id, [
    { lot: returns, massG: 20 },
    { lot: grain, massG: 34 },
    { lot: fine, massG: fineG },
    { lot: master, massG: masterG },
  ]);
  return { plannedG, fineG, masterG };
};

const inMg = (grams: number): number => Math.round(grams * 1000);
const balanceMg = async (lot: Lot): Promise<number> => (await lot.reload()).balanceMg;
const numberOn = async ({ page }: TerminalDriver): Promise<string> =>
  (await page.locator('h1 + p > span').first().innerText()).trim();

describe('a charge weighed in lot by lot', () => {
  it('goes by its plan, corrects an over-weigh, and leaves a button that is a lot', async () => {
    const { fineG, masterG } = await planFor147();
    const before = await Promise.all([returns, grain, fine, master].map(balanceMg));
    const { terminal, serial, charge } = await signedIn('ines');
    const { page, button } = terminal;
    const { castingId, meltId } = await cardAhead(page, studio, 147, 'charge');
    await terminal.openCard(castingId);

    await charge.asksFor(returns.code);
    await charge.showLot(returns.code);
    await charge.putIn('20,00');

    await charge.asksFor(grain.code);
    await charge.scanLot(grain.code);
    await charge.connectBalance();
    await charge.putInFromBalance(serial, '34.00');

    await charge.asksFor(fine.code);
    await charge.touchLot(fine.code);
    await charge.putIn((fineG + 3).toFixed(2));
    await terminal.heading(/3\.00\sg more than is wanted/).waitFor();
    await button('Take some off, weigh again').click();
    // A little is left too much, and it stays: 0.60 g is more than 2 % of some 22.6 g.
    const overG = hundredths(fineG + 0.6);
    await charge.putIn(overG.toFixed(2));
    await terminal.heading(/0\.60\sg more than is wanted/).waitFor();
    await button('Keep it, correct the rest').click();

    await charge.asksFor(master.code);
    await page.getByText(new RegExp(`Instead of ${masterG.toFixed(2)}`)).waitFor();
    const correctedG = Number(await numberOn(terminal));
    expect(correctedG).toBeGreaterThan(masterG);
    await charge.touchLot(master.code);
    // The figure of a balance left in troy ounces.
    await charge.putIn((correctedG / 31.1034768).toFixed(4));
    await terminal.heading(/was it weighed in troy ounces\?/).waitFor();
    await button('Weigh again').click();
    await charge.putIn(correctedG.toFixed(2));

    await terminal.heading(/The whole charge is in/).waitFor();
    await charge.close();
    await terminal.read('980');
    await pourOut(terminal, studio);

    const { models } = studio.services;
    const totalMg = inMg(54 + overG + correctedG);
    const read = () => models.MetalMovement.findAll({ where: { meltId }, order: [['id', 'ASC']] });
    // The terminal is done before the server has the last record.
    await waitFor('the close in the ledger', async () => (await read()).some(({ kind }) => kind === 'cast'));
    const movements = await read();
    expect(movements.map(({ kind, massMg }) => [kind, massMg])).toEqual([
      ['weighed-in', 20_000],
      ['weighed-in', 34_000],
      ['weighed-in', inMg(overG)],
      ['weighed-in', inMg(correctedG)],
      ['lost', 200],
      ['returned', 9100],
      ['cast', totalMg - 9300],
    ]);
    const after = await Promise.all([returns, grain, fine, master].map(balanceMg));
    expect(before.map((mg, index) => mg - (after[index] ?? 0))).toEqual([
      20_000,
      34_000,
      inMg(overG),
      inMg(correctedG),
    ]);
    const buttonLot = await models.Lot.findOne({ where: { meltId }, rejectOnEmpty: true });
    expect(buttonLot).toMatchObject({ kind: 'returns', balanceMg: 9100 });
    const gold = movements
      .filter(({ kind }) => kind === 'weighed-in')
      .reduce((sum, { contentsMg }) => sum + (contentsMg.Au ?? 0), 0);
    expect(buttonLot.compositionWt.Au).toBeCloseTo((gold / totalMg) * 100, 2);
    // At the certificates' lower bounds the button itself holds the mark.
    expect((buttonLot.compositionWt.Au ?? 0) - (buttonLot.toleranceWt.Au ?? 0)).toBeGreaterThanOrEqual(74.99);
  });

  it('refuses what is not to go in, takes a mass however it comes, and stops at a breach', async () => {
    const { services } = studio;
    const sterling = await demoLot(services, /Sterling, clean/, 'returns');
    const sterlingGrain = await demoLot(services, /Sterling, casting/, 'grain');
    const held = await demoLot(services, /without a label/, 'returns');
    const scrap = await demoLot(services, /Sweeps/, 'scrap');
    const { plannedG } = await castingIn(150);
    // As typed: 55 % of the charge in, a tenth of it out again, 55 % of grain.
    const [mostG, someG] = [(plannedG * 0.55).toFixed(2), (plannedG * 0.1).toFixed(2)];
    const { terminal, charge, serial } = await signedIn('ines', { hasCamera: false });
    const { page, button } = terminal;
    const { castingId, meltId } = await cardAhead(page, studio, 150, 'charge');
    await terminal.openCard(castingId);
    await terminal.heading(/Scan a lot, then weigh it in/).waitFor();

    for (const [code, sentence] of [
      [held.code, /is in quarantine: Found without a label.* Put it aside/],
      [scrap.code, /is scrap for refining: it does not go into a crucible/],
      [buildFlaskCode(147), /That code names a flask, not a lot/],
      ['https://example.org/menu', /That is not one of our lot codes/],
      [buildCode('L', 9999), /L-9999 is not one of this studio's lots/],
    ] as const) {
      await terminal.scanWithWedge(code);
      await terminal.heading(sentence).waitFor();
    }
    await button('Back').click();

    // Too many returns: typed by a balance that is a keyboard.
    await charge.scanLot(sterling.code);
    await charge.balanceTypes(`  ${mostG} g`);
    await button(/^Put in/).click();
    await terminal.heading(new RegExp(`Take .* of lot ${sterling.code} out`)).waitFor();
    await page.getByText(/Returns over 50/).waitFor();
    await charge.takeOut(sterling.code, someG);

    // The balance's cable is pulled out in the middle, and put back.
    await terminal.heading(/Scan a lot, then weigh it in/).waitFor();
    await charge.scanLot(sterlingGrain.code);
    await charge.connectBalance();
    await serial.unplug();
    await page.getByText(/no longer answers/).waitFor();
    await serial.plugIn();
    await page.getByText('The balance is connected.').waitFor();
    await charge.putInFromBalance(serial, mostG);
    await terminal.heading(/The whole charge is in/).waitFor();
    await charge.close();
    await button('Type a reading').waitFor();
    await waitFor('the closed charge in the melt book', async () => {
      const melt = await services.models.Melt.findByPk(meltId, { rejectOnEmpty: true });
      return melt.state.step === 'melt';
    });
    const charged = (await services.models.Melt.findByPk(meltId, { rejectOnEmpty: true })).state.lots;
    expect(charged?.map(({ code, massG }) => [code, massG])).toEqual([
      [sterling.code, hundredths(Number(mostG) - Number(someG))],
      [sterlingGrain.code, Number(mostG)],
    ]);
  });

  it('goes on without the server, says that the rest is not corrected, and corrects it later', async () => {
    const { services } = studio;
    const rose = await demoLot(services, /18 ct rose/, 'grain');
    const silver = await demoLot(services, /Fine silver/, 'fine');
    const copper = await demoLot(services, /Copper/, 'fine');
    const { id, plannedG } = await castingIn(122);
    const madeG = hundredths(plannedG / 2);
    const goldG = hundredths(madeG * 0.7507);
    const silverG = hundredths(madeG * 0.045);
    await planChargeFor(services, id, [
      { lot: rose, massG: hundredths(plannedG - madeG) },
      { lot: fine, massG: goldG },
      { lot: silver, massG: silverG },
      { lot: copper, massG: hundredths(madeG - goldG - silverG) },
    ]);
    const { terminal, charge } = await signedIn('ines', { hasCamera: false });
    const { page, button } = terminal;
    const { castingId } = await cardAhead(page, studio, 122, 'charge');
    // A lot can be weighed in without the server once the terminal has seen its certificate.
    const seen = page.waitForResponse(/api\/lots\?onHand=yes/);
    await terminal.openCard(castingId);
    await (await seen).finished();
    await charge.asksFor(rose.code);
    await studio.suspend();
    try {
      await charge.touchLot(rose.code);
      await charge.putIn((plannedG - madeG + 1.2).toFixed(2));
      await button('Keep it, correct the rest').click();
      await charge.asksFor(fine.code);
      await page.getByText(/what remains is not corrected/).waitFor();
    } finally {
      await studio.resume();
    }
    await page.getByText(/^Instead of/).waitFor();
    expect(Number(await numberOn(terminal))).toBeLessThan(goldG);
  });
});
