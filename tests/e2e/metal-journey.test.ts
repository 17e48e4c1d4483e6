import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { driveCharge } from '#tests/support/charge-driver.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { driveMetal } from '#tests/support/metal-driver.ts';
import { pourOut } from '#tests/support/pour-out.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import type { TerminalDriver } from '#tests/support/terminal-driver.ts';
import { openTerminalFloor, type TerminalFloor } from '#tests/support/terminal-floor.ts';
import { createTestDatabase, type TestDatabase } from '#tests/support/test-database.ts';
import { waitFor } from '#tests/support/wait-for.ts';

let database: TestDatabase;
let studio: ServedStudio;
let floor: TerminalFloor;

beforeAll(async () => {
  database = await createTestDatabase();
  studio = await serveStudio(database);
  floor = await openTerminalFloor(studio);
});

afterAll(async () => {
  await floor.close();
  await studio.close();
  await database.drop();
});

const atDesk = async () => {
  const page = await (await floor.browser.newContext({ viewport: { width: 1280, height: 900 } })).newPage();
  await driveDesk(page, studio.origin).signIn('maren');
  return driveMetal(page, studio.origin);
};

/** The lot that the screen asks for, and how much of it; null once the whole charge is in. */
const askedFor = async ({ page }: TerminalDriver): Promise<readonly [code: string, mass: string] | null> => {
  const sentence = page.getByRole('heading', { level: 1, name: /Weigh in .*L-|The whole charge is in/ });
  await sentence.waitFor();
  const [code] = /L-\d{4}-\d/.exec(await sentence.innerText()) ?? [];
  return code ? [code, (await page.locator('h1 + p > span').first().innerText()).trim()] : null;
};

/** Weighs in whatever the screen still asks for, and gives it in thousandths of a gram. */
const weighInTheRest = async (terminal: TerminalDriver): Promise<number> => {
  const charge = driveCharge(terminal);
  let sumMg = 0;
  for (let asked = await askedFor(terminal); asked; asked = await askedFor(terminal)) {
    const [code, mass] = asked;
    await charge.scanLot(code);
    await charge.putIn(mass);
    sumMg += Math.round(Number(mass) * 1000);
    await charge.lines.waitFor();
  }
  return sumMg;
};

describe('the way of metal through the studio', () => {
  it('leads from the lots received through a planned charge and its button to a month that reconciles', async () => {
    const metal = await atDesk();
    const received = await metal.receive({
      name: 'Sterling grain, new bag',
      kind: 'Casting grain',
      parts: [
        ['Ag', '92,6', '0,05'],
        ['Cu', '7,4', ''],
      ],
      mass: '250',
    });
    expect(received).toMatch(/^L-\d{4}-\d$/);
    expect(await metal.openMonth()).toBe('Every line adds up to the milligram.');
    const issuedBefore = (await metal.monthLine('Crucibles', 'Weighed in'))['All metal'] ?? 0;

    await metal.planCharge([150]);
    const lines = await metal.planLines();
    expect(lines.some(([, kind]) => kind === 'returns')).toBe(true);
    const [grainCode, , grainG] = lines.find(([, kind]) => kind !== 'returns') ?? ['', '', 0];
    await metal.keepPlan();

    const terminal = await floor.atTerminal();
    await terminal.page.goto(`${studio.origin}/kiosk`);
    await terminal.signIn('ines');
    const { castingId, meltId } = await cardAhead(terminal.page, studio, 150, 'charge');
    await terminal.openCard(castingId);
    const charge = driveCharge(terminal);
    await charge.touchLot(grainCode);
    // 3 % too much is over the line's 2 %, and within what the rest can put right.
    const overG = Math.round(grainG * 103) / 100;
    await charge.putIn(overG.toFixed(2));
    await terminal.heading(/more than is wanted/).waitFor();
    await terminal.button('Keep it, correct the rest').click();
    await terminal.page.getByText(/Instead of/).waitFor();
    const plannedRestMg = lines.reduce(
      (sum, [code, , massG]) => sum + (code === grainCode ? 0 : Math.round(massG * 1000)),
      0,
    );
    const restMg = await weighInTheRest(terminal);
    expect(restMg).toBeLessThan(plannedRestMg);
    await charge.close();
    await terminal.read('980');
    await pourOut(terminal, studio);

    const { MetalMovement, Lot } = studio.services.models;
    await waitFor(
      'the close in the ledger',
      async () => (await MetalMovement.count({ where: { meltId, kind: 'cast' } })) === 1,
    );
    const button = await Lot.findOne({ where: { meltId }, rejectOnEmpty: true });
    expect(button).toMatchObject({ kind: 'returns', balanceMg: 9100 });
    await metal.openLot(button.code);
    await metal.page.getByText('9.100\u00a0g').first().waitFor();

    expect(await metal.openMonth()).toBe('Every line adds up to the milligram.');
    const issued = (await metal.monthLine('Crucibles', 'Weighed in'))['All metal'] ?? 0;
    expect(issued - issuedBefore).toBe(Math.round(overG * 1000) + restMg);
  });
});
