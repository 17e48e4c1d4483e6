import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import { guarded } from '#tests/factories/card-events.ts';
import { faultsOn, settle } from '#tests/support/axe-faults.ts';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import type { TerminalDriver } from '#tests/support/terminal-driver.ts';
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
    expect((await card.deliver(guarded)).status()).toBe(201);
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
    await terminal.button(/: figures, theme, sign out/).click();
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
      await card.deliver(event);
      await page.reload();
      await terminal.button(button).waitFor();
      await look(`after ${event.type}`);
    }
    await card.deliver({ type: 'quenched' });
    await page.reload();
    await page.getByRole('group', { name: 'What the pad types' }).waitFor();
    await look('close');
    await card.deliver({ type: 'closed', buttonMassG: 10, lossMassG: 0.1, look: 'full', note: '' });
    await page.reload();
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
    const { castingId } = await cardAhead(terminal.page, studio, flask, 'charge');
    await terminal.openCard(castingId);
    await terminal.button('Grain in').waitFor();
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
