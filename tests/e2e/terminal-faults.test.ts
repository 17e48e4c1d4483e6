import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import type { Enrolment } from '#shared/contracts/terminal.ts';
import { askThrough } from '#tests/support/ask-through.ts';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import { driveTerminal, type TerminalDriver } from '#tests/support/terminal-driver.ts';
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

/** A window at the terminal with someone signed in. */
const signedIn = async (login: string): Promise<TerminalDriver> => {
  const terminal = await floor.atTerminal();
  await terminal.page.goto(`${studio.origin}/kiosk`);
  await terminal.signIn(login);
  return terminal;
};

/** Whether nothing waits for delivery at a terminal. */
const isIdle = async ({ page }: TerminalDriver): Promise<boolean> =>
  (await page.getByText(/records? waits?/).count()) === 0;

/** What the melt book holds of the metal put in on one melt, g. */
const weighings = async (meltId: string): Promise<readonly number[]> => {
  const events = await studio.services.models.MeltEvent.findAll({ where: { meltId }, order: ['seq'] });
  return events.flatMap(({ event }) => (event.type === 'charge-weighed' ? [event.massG] : []));
};

const secondsOf = (clock: string): number => {
  const [minutes = NaN, seconds = NaN] = (/(\d+):(\d\d)/.exec(clock) ?? []).slice(1).map(Number);
  return minutes * 60 + seconds;
};

describe('a terminal in trouble', () => {
  it('keeps what was done while the server is away, through a crash, and delivers it once', async () => {
    const terminal = await signedIn('ines');
    const context = terminal.page.context();
    const { castingId, meltId } = await cardAhead(terminal.page, studio, 147, 'charge');
    await terminal.openCard(castingId);
    await terminal.withoutLots();
    await waitFor('the reading in the melt book', () => isIdle(terminal));
    await studio.suspend();
    try {
      await terminal.weighIn('Grain', '31.4');
      await terminal.page.getByText('No server. 1 record waits.').waitFor();
      await terminal.page.getByText(/31\.40\sg is in/).waitFor();
      expect(await weighings(meltId)).toEqual([]);
      // The window dies before the server is back: only what the device kept can save the record.
      await terminal.page.close();
      expect(await weighings(meltId)).toEqual([]);
    } finally {
      await studio.resume();
    }
    const again = driveTerminal(await context.newPage(), studio.origin);
    await again.openCard(castingId);
    await again.page.getByText(/31\.40\sg is in/).waitFor();
    await waitFor('the weighing in the melt book', async () => (await weighings(meltId)).length > 0);
    await again.page.getByText(/record waits/).waitFor({ state: 'hidden' });
    await again.page.reload();
    await again.page.getByText(/31\.40\sg is in/).waitFor();
    expect(await weighings(meltId)).toEqual([31.4]);
  });

  it('sends an event again whose answer was lost, and the melt book holds it once', async () => {
    const terminal = await signedIn('ines');
    const { page } = terminal;
    const { castingId, meltId } = await cardAhead(page, studio, 122, 'charge');
    await terminal.openCard(castingId);
    await waitFor('the reading in the melt book', () => isIdle(terminal));
    let sent = 0;
    await page.route('**/api/melts/*/events', async (route) => {
      sent += 1;
      const answer = await route.fetch();
      if (sent === 1) await route.abort('connectionreset');
      else await route.fulfill({ response: answer });
    });
    await terminal.withoutLots();
    await terminal.weighIn('Grain', '20');
    await page.getByText(/record waits/).waitFor();
    await waitFor('a second delivery', () => sent > 1);
    await page.getByText(/record waits/).waitFor({ state: 'hidden' });
    expect(await weighings(meltId)).toEqual([20]);
  });

  it('tells a second terminal who has the flask', async () => {
    const desk = driveDesk(await (await floor.browser.newContext()).newPage(), studio.origin);
    await desk.signIn('maren');
    const made = await askThrough(desk.page, studio.origin, 'desk').post('/api/terminals/codes', {
      name: 'Terminal 2',
      bay: 'furnace bay 2',
    });
    const { code } = (await made.json()) as Enrolment;
    const second = driveTerminal(await (await floor.browser.newContext()).newPage(), studio.origin);
    await second.enrol(code);
    await second.signIn('tomas');
    const first = await signedIn('ines');
    for (const terminal of [first, second]) {
      await terminal.scanWithWedge(buildFlaskCode(150));
      await terminal.heading(/Check the flask/).waitFor();
    }
    await first.hold('Hold to open the card');
    await first.page.getByRole('group', { name: 'Cautions' }).waitFor();
    const held = second.page.getByText(
      'Ines Duarte has this flask at Terminal 1. Ask there, or choose another flask.',
    );
    await second.hold('Hold to open the card');
    await held.waitFor();
    await second.page.goto(`${studio.origin}/kiosk`);
    await second.page.getByRole('region', { name: 'Work at this bay' }).waitFor();
    await second.scanWithWedge(buildFlaskCode(150));
    await held.waitFor();
    expect(await second.button('Hold to carry on here').count()).toBe(0);
  });

  it('locks when idle and comes back to the same step with its clock running', async () => {
    await studio.services.models.Casting.update({ state: 'holding' }, { where: { state: 'dewaxed' } });
    const terminal = await floor.atTerminal();
    const { page } = terminal;
    await page.clock.install();
    await page.goto(`${studio.origin}/kiosk`);
    await terminal.signIn('ines');
    const { castingId } = await cardAhead(page, studio, 161, 'quench');
    await terminal.openCard(castingId);
    await page.getByText(/Wait until/).waitFor();
    const idleS = 200;
    studio.advance(idleS);
    await page.clock.fastForward(idleS * 1000);
    await terminal.heading(/Sign in to go on with F-0161/).waitFor();
    // Sterling stands fifteen minutes; some of them have passed before an empty terminal.
    const standsS = 15 * 60;
    const onLock = secondsOf((await page.getByRole('timer').getAttribute('aria-label')) ?? '');
    expect(onLock).toBeLessThanOrEqual(standsS - idleS);
    expect(onLock).toBeGreaterThan(standsS - idleS - 60);
    await terminal.signIn('ines');
    await page.getByText(/Wait until/).waitFor();
    expect(new URL(page.url()).pathname).toBe(`/kiosk/cards/${castingId}`);
    const after = secondsOf(await page.getByRole('main').innerText());
    expect(after).toBeLessThanOrEqual(onLock);
    expect(after).toBeGreaterThan(onLock - 60);
  });

  it('marks a pour after the window as a departure that the desk shows', async () => {
    await studio.services.models.Casting.update({ state: 'holding' }, { where: { state: 'invested' } });
    const terminal = await signedIn('tomas');
    const { castingId, meltId } = await cardAhead(terminal.page, studio, 170, 'pour');
    studio.advance(10 * 60);
    await terminal.openCard(castingId);
    await terminal.page.getByText('Too late to pour').waitFor();
    await terminal.hold(/^Poured/);
    await terminal.page.getByText(/Wait until/).waitFor();

    const desk = driveDesk(await (await floor.browser.newContext()).newPage(), studio.origin);
    await desk.signIn('maren');
    await desk.open(`/melts/${meltId}`);
    const departures = desk.page.getByRole('region', { name: 'Departures from the card' });
    await departures.getByText(/^Poured 10:\d\d after flask out/).waitFor();
  });
});
