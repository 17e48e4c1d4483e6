import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import { checksBefore } from '#tests/factories/card-events.ts';
import { faultsOn, settle } from '#tests/support/axe-faults.ts';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { driveCharge } from '#tests/support/charge-driver.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import type { TerminalDriver } from '#tests/support/terminal-driver.ts';
import { demoLot } from '#tests/support/plan-charge-for.ts';
import { openTerminalFloor, type TerminalFloor } from '#tests/support/terminal-floor.ts';
import { createTestDatabase, type TestDatabase } from '#tests/support/test-database.ts';

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

const signedIn = async (login: string): Promise<TerminalDriver> => {
  const terminal = await floor.atTerminal();
  await terminal.page.goto(`${studio.origin}/kiosk`);
  await terminal.signIn(login);
  return terminal;
};

describe('accessibility, by axe against WCAG 2.2 AA', () => {
  it('has no fault on the pages of the desk', async () => {
    const page = await (await floor.browser.newContext({ viewport: { width: 1440, height: 900 } })).newPage();
    const desk = driveDesk(page, studio.origin);
    const { models } = studio.services;
    const melt = await models.Melt.findOne({ order: [['number', 'ASC']], rejectOnEmpty: true });
    const alloy = await models.Alloy.findOne({ where: { name: '18 ct yellow' }, rejectOnEmpty: true });
    const person = await models.User.findOne({ where: { login: 'ines' }, rejectOnEmpty: true });
    const faults: string[] = [];
    const look = async (path: string): Promise<void> => {
      await desk.open(path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await page.waitForLoadState('networkidle');
      faults.push(...(await faultsOn(page, path)));
    };
    await look('/');
    await desk.signIn('maren');
    for (const path of [
      '/',
      '/melts',
      `/melts/${melt.id}`,
      '/alloys',
      `/alloys/${alloy.id}`,
      `/alloys/${alloy.id}?form=revision`,
      '/flasks',
      '/people',
      `/people/${person.id}`,
      '/terminals',
      '/studio',
      `/print/flasks/${buildFlaskCode(147)}`,
    ])
      await look(path);
    expect(faults).toEqual([]);
  });

  it('has no fault at the terminal outside a card', async () => {
    const terminal = await floor.atTerminal();
    const { page } = terminal;
    const faults: string[] = [];
    const look = async (screen: string): Promise<void> => void faults.push(...(await faultsOn(page, screen)));

    const stranger = await (await floor.browser.newContext()).newPage();
    await stranger.goto(`${studio.origin}/kiosk`);
    await stranger.getByRole('heading', { name: /not a terminal yet/ }).waitFor();
    faults.push(...(await faultsOn(stranger, 'enrol')));

    await page.goto(`${studio.origin}/kiosk`);
    await page.getByRole('button', { name: /Ines/ }).waitFor();
    await look('sign-in');
    await terminal.button('Type its number').click();
    await page.getByRole('dialog').waitFor();
    await look('number of a flask');
    await page.keyboard.press('Escape');
    await terminal.button(/Ines/).click();
    await page.getByRole('group', { name: /^PIN of/ }).waitFor();
    await look('PIN');
    await terminal.button('Someone else').click();
    await terminal.signIn('ines');
    await page.getByText('Next at this bay').waitFor();
    await look('standby');
    await terminal.scanWithWedge('https://example.org/menu');
    await terminal.heading(/not one of our flask codes/).waitFor();
    await look('refused code');
    await terminal.button('Scan another').click();
    await page.getByText('Next at this bay').waitFor();
    await terminal.scanWithWedge(buildFlaskCode(147));
    await terminal.heading(/Check the flask/).waitFor();
    await look('card before it is opened');
    expect(faults).toEqual([]);
  });

  it('has no fault on any step of a card', async () => {
    const terminal = await signedIn('ines');
    const { page } = terminal;
    const faults: string[] = [];
    const look = async (screen: string): Promise<void> => void faults.push(...(await faultsOn(page, screen)));
    const card = await cardAhead(page, studio, 150, 'guard');
    await terminal.openCard(card.castingId);
    await page.getByRole('group', { name: 'Cautions' }).waitFor();
    await look('guard');
    const deliverAll = async (events: readonly object[]): Promise<void> => {
      for (const event of events) expect((await card.deliver(event)).status()).toBe(201);
    };
    await deliverAll([...checksBefore('guard', card.context), ...checksBefore('charge', card.context)]);
    await page.reload();
    await terminal.button('Scan a lot').waitFor();
    await look('charge by lot');
    const charge = driveCharge(terminal);
    await charge.scanLot((await demoLot(studio.services, /Sterling, casting/, 'grain')).code);
    await look('weighing a lot');
    await terminal.button('Back').click();
    await terminal.button('Scan a lot').click();
    await terminal.heading(/Show me the label/).waitFor();
    await look('finding a lot');
    await card.deliver({ type: 'charge-weighed', kind: 'grain', massG: card.plannedG });
    await page.reload();
    await terminal.button('Grain in').waitFor();
    await look('charge');
    await terminal.button('Grain in').click();
    await terminal.heading(/How much/).waitFor();
    await look('weighing');
    await card.deliver({ type: 'charge-closed' });
    await page.reload();
    await terminal.read('1150');
    await terminal.button('Yes, it is right').waitFor();
    await look('questioned reading');
    await terminal.button('Type again').click();
    await terminal.type('980');
    await terminal.button(/^Take/).click();
    await terminal.button(/Ready\. Hold/).waitFor();
    await look('melt');
    await terminal.button(/: figures, comfort, sign out/).click();
    await page.getByRole('dialog').waitFor();
    await look('figures of the card');
    await page.keyboard.press('Escape');
    await terminal.button('Stop work').click();
    await terminal.heading(/Stop\. What has happened/).waitFor();
    await look('stop');
    await terminal.button('Nothing. Go on with the work').click();
    await terminal.button(/Ready\. Hold/).waitFor();
    const steps = [
      [{ type: 'melt-ready' }, 'Flask is out. Hold'],
      [{ type: 'flask-out', furnaceC: null }, /^Poured\. Hold/],
      [{ type: 'poured' }, 'Quenched already'],
    ] as const;
    for (const [event, button] of steps) {
      await deliverAll([event]);
      if (event.type === 'melt-ready') {
        await page.reload();
        await page.getByRole('group', { name: 'Cautions' }).waitFor();
        await look('words before flask out');
        await deliverAll(checksBefore('flask-out', card.context));
      }
      await page.reload();
      await terminal.button(button).waitFor();
      await look(`after ${event.type}`);
    }
    await card.deliver({ type: 'quenched' });
    await page.reload();
    await page.getByRole('group', { name: 'What the pad types' }).waitFor();
    await look('close');
    await deliverAll([{ type: 'closed', buttonMassG: 10, lossMassG: 0.1, look: 'full', note: '' }]);
    await page.reload();
    await page.getByRole('group', { name: 'Reason' }).waitFor();
    await look('departure');
    await terminal.giveReason('A slip', 'The timer rang early.');
    await terminal.button('Next: a second person signs').click();
    await page.getByRole('list', { name: 'People' }).waitFor();
    await look('second person');
    await terminal.signAs('tomas', 'Look, then sign');
    await terminal.heading(/Done\./).waitFor();
    await look('after the close');
    expect(faults).toEqual([]);
  });
});

it.each(['g', 'dwt', 'ozt'] as const)(
  'keeps the one large number within its column in %s',
  async (massUnit) => {
    const { models } = studio.services;
    await models.StudioSettings.update({ massUnit }, { where: {} });
    const flask = { g: 122, dwt: 161, ozt: 170 }[massUnit];
    await models.Casting.update({ state: 'holding' }, { where: { state: ['dewaxed', 'invested'] } });
    const terminal = await signedIn('ines');
    const card = await cardAhead(terminal.page, studio, flask, 'charge');
    await terminal.openCard(card.castingId);
    await terminal.withoutLots();
    await settle(terminal.page);
    // The words' column holds the number; the crucible's labels stay within its picture.
    const spill = await terminal.page.evaluate(() => {
      const column = document.querySelector('h1')?.parentElement;
      const number = column?.querySelector('p');
      const picture = document.querySelector('main svg[role="img"][aria-label*="Wanted in all"]');
      if (!column || !number || !picture) throw new Error('The charge step has lost its parts.');
      const rightOf = (part: Element): number => part.getBoundingClientRect().right;
      return {
        number: Math.max(...[...number.children].map(rightOf)) - rightOf(column),
        labels: Math.max(...[...picture.querySelectorAll('text')].map(rightOf)) - rightOf(picture),
      };
    });
    expect(spill.number).toBeLessThanOrEqual(0);
    expect(spill.labels).toBeLessThanOrEqual(0);
  },
);
