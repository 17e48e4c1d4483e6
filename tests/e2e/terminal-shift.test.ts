import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import { everyKindInstruction } from '#tests/factories/every-kind.ts';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { openPreview } from '#tests/support/open-preview.ts';
import { makeQrVideo } from '#tests/support/qr-video.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import { demoPerson, driveTerminal, type TerminalDriver } from '#tests/support/terminal-driver.ts';
import { openTerminalFloor, type TerminalFloor } from '#tests/support/terminal-floor.ts';
import { createTestDatabase, type TestDatabase } from '#tests/support/test-database.ts';
import { waitFor } from '#tests/support/wait-for.ts';

let database: TestDatabase;
let studio: ServedStudio;
/** The camera sees the code of a flask that is on hold, which serves as a picture too. */
let floor: TerminalFloor;

beforeAll(async () => {
  database = await createTestDatabase();
  studio = await serveStudio(database);
  await studio.services.models.Casting.update(
    { state: 'holding' },
    { where: { state: ['dewaxed', 'invested'] } },
  );
  floor = await openTerminalFloor(studio, { fakeVideo: await makeQrVideo(buildFlaskCode(88)) });
});

afterAll(async () => {
  await floor.close();
  await studio.close();
  await database.drop();
});

const signedIn = async (login: string): Promise<TerminalDriver> => {
  const terminal = await floor.atTerminal();
  // The camera would read its flask at the standby screen; an address that is nobody's leaves it shut.
  await terminal.page.goto(`${studio.origin}/kiosk/nowhere`);
  await terminal.signIn(login);
  return terminal;
};

const eventsOf = async (meltId: string) => {
  const { MeltEvent, User } = studio.services.models;
  const rows = await MeltEvent.findAll({ where: { meltId }, order: ['seq'] });
  const people = new Map((await User.findAll()).map(({ id, name }) => [id, name]));
  return rows.map(({ event, userId }) => ({ event, person: people.get(userId) }));
};

describe('a shift at the terminal', () => {
  it('lets an apprentice pour only after another person has signed with their own PIN', async () => {
    const terminal = await signedIn('yara');
    const { page } = terminal;
    const { castingId, meltId } = await cardAhead(page, studio, 147, 'melt');
    await terminal.openCard(castingId);
    await page.getByText('Face shield down before the heat goes on.').waitFor();
    await terminal.readOn();
    await terminal.read('980');
    await terminal.hold(/Ready\. Hold/);
    await terminal.readOn();

    await terminal.heading(/signs for the pour/).waitFor();
    const people = page.getByRole('list', { name: 'People' });
    await people.getByRole('button', { name: /Ines/ }).waitFor();
    expect(await people.getByRole('button', { name: /Yara/ }).count()).toBe(0);
    expect(await terminal.button('Skip this step').count()).toBe(0);
    await terminal.signAs('ines', 'Look, then sign', demoPerson('yara').pin);
    await page.getByRole('group', { name: /^PIN of/ }).waitFor();
    await page.getByRole('alert').getByText(/PIN/).waitFor();
    expect(await studio.services.models.Countersign.count({ where: { meltId } })).toBe(0);
    await terminal.type(demoPerson('ines').pin);
    await terminal.button('Look, then sign').click();
    await terminal.button('Flask is out. Hold').waitFor();
    const signed = await waitFor('the sign in the melt book', async () =>
      (await eventsOf(meltId)).find(({ event }) => event.type === 'step-done'),
    );
    expect(signed).toMatchObject({
      person: demoPerson('yara').name,
      event: { answer: { kind: 'countersign', by: { name: demoPerson('ines').name, onDevice: false } } },
    });
  });

  it('asks a pour after the window for its reason and a second sign, and holds the pieces', async () => {
    const terminal = await signedIn('tomas');
    const { page } = terminal;
    const { castingId, meltId } = await cardAhead(page, studio, 150, 'pour');
    await terminal.openCard(castingId);
    await terminal.heading(/Pour now/).waitFor();
    studio.advance(10 * 60);
    await page.getByRole('alert').getByText('F-0150: The pour window has ended.').waitFor();
    await terminal.hold(/^Poured/);
    await terminal.button('Give the reason').click();
    await terminal.heading(/^Poured 10:\d\d after flask out/).waitFor();
    await terminal.giveReason('Equipment failed', 'The tongs slipped.');
    await terminal.button('Hold the pieces').click();
    await terminal.button('Next: a second person signs').click();
    await terminal.signAs('ines', 'Look, then sign');
    await page.getByText(/Wait until/).waitFor();
    studio.advance(16 * 60);
    await page.reload();
    await terminal.hold('Quenched. Hold');
    await terminal.close('10', '0.1');
    await terminal.heading(/Done\..*Hold the pieces/).waitFor();
    await page
      .getByText('Equipment failed: The tongs slipped. Signed by Ines Duarte. Pieces held.')
      .waitFor();
    await waitFor('the pieces on hold', async () => {
      const casting = await studio.services.models.Casting.findByPk(castingId, { rejectOnEmpty: true });
      return casting.state === 'held';
    });
    const melt = await studio.services.models.Melt.findByPk(meltId, { rejectOnEmpty: true });
    expect(melt.state.departures).toMatchObject([
      { kind: 'poured-late', explained: { reason: 'equipment', hold: true, by: { name: 'Ines Duarte' } } },
    ]);
  });

  it('hands a running card over, and the melt book shows both', async () => {
    const terminal = await signedIn('ines');
    const { page } = terminal;
    const { castingId, meltId } = await cardAhead(page, studio, 161, 'charge');
    await terminal.openCard(castingId);
    await waitFor('what was read in the melt book', async () =>
      (await eventsOf(meltId)).some(({ event }) => event.type === 'checked'),
    );
    await terminal.menu();
    await terminal.button('Hand over').click();
    await terminal.signAs('tomas', 'Take it over');
    await terminal.button(/^Tomas/).waitFor();
    const { name } = demoPerson('tomas');
    await waitFor('the hand-over in the melt book', async () =>
      (await eventsOf(meltId)).some(({ event, person }) => event.type === 'carried-on' && person === name),
    );
    await terminal.withoutLots();
    await terminal.weighIn('Grain', '20');
    await waitFor('the weighing in the melt book', async () =>
      (await eventsOf(meltId)).some(
        ({ event, person }) => event.type === 'charge-weighed' && person === name,
      ),
    );
    const desk = driveDesk(await (await floor.browser.newContext()).newPage(), studio.origin);
    await desk.signIn('maren');
    await desk.open(`/melts/${meltId}`);
    await desk.heading(/M-/).waitFor();
    const record = desk.page.getByRole('main');
    await record.getByText('Ines Duarte').first().waitFor();
    await record.getByText(name).first().waitFor();
  });

  it('walks a card for practice and records nothing', async () => {
    const terminal = await signedIn('yara');
    const { page } = terminal;
    const { Melt, MeltEvent } = studio.services.models;
    const count = async () => [await Melt.count(), await MeltEvent.count()];
    const before = await count();
    const sent: string[] = [];
    page.on('request', (request) => {
      if (request.method() !== 'GET') sent.push(request.url());
    });
    await page.goto(`${studio.origin}/kiosk/practice`);
    await page.getByText('Practice: nothing is recorded').waitFor();
    await terminal.guard();
    await terminal.readOn();
    await terminal.withoutLots();
    await terminal.weighIn('Grain', '20');
    await page.getByText(/20\.00\sg is in/).waitFor();
    await page.getByText('Practice: nothing is recorded').waitFor();
    await terminal.menu();
    await terminal.button('End the practice').click();
    await page.waitForURL(`${studio.origin}/kiosk`);
    expect(await count()).toEqual(before);
    expect(sent).toEqual([]);
    expect(await page.evaluate(() => Object.keys(window.sessionStorage))).toEqual([]);
  });

  it('keeps a photograph through a dead server and a killed page, and delivers it once', async () => {
    const terminal = await signedIn('ines');
    const { page } = terminal;
    const context = page.context();
    const { castingId, meltId } = await cardAhead(page, studio, 170, 'close');
    await terminal.openCard(castingId);
    await terminal.menu();
    await terminal.button('Photograph').click();
    await page.getByText('Hold still').waitFor();
    await terminal.button('Take it').click();
    await page.getByRole('img', { name: 'What was taken' }).waitFor();
    await studio.suspend();
    try {
      await terminal.button('Keep it').click();
      await page.getByText('1 photograph waits.').waitFor();
      await page.close();
    } finally {
      await studio.resume();
    }
    const { Photograph } = studio.services.models;
    expect(await Photograph.count({ where: { meltId } })).toBe(0);
    const again = driveTerminal(await context.newPage(), studio.origin);
    await again.openCard(castingId);
    const kept = await waitFor('the photograph', () => Photograph.findOne({ where: { meltId } }));
    await again.page.getByText('1 photograph waits.').waitFor({ state: 'hidden' });
    const named = await waitFor('the photograph in the melt book', async () =>
      (await eventsOf(meltId)).find(({ event }) => event.type === 'photographed'),
    );
    expect(named.event).toMatchObject({ photographId: kept.id, of: 'tree' });
    expect(kept.mediaType).toBe('image/jpeg');
    expect(await Photograph.count({ where: { meltId } })).toBe(1);
  });

  it('shows an instruction that the desk hands in, without an enrolment', async () => {
    const desk = await (await floor.browser.newContext()).newPage();
    await desk.goto(studio.origin);
    const preview = driveTerminal(
      await openPreview(desk, { ...everyKindInstruction, family: 'silver', role: 'apprentice' }),
      studio.origin,
    );
    await preview.page.getByText('Practice: nothing is recorded').waitFor();
    await preview.guard();
    await preview.page.getByText(/Silver takes up oxygen/).waitFor();
    await preview.readOn();
    await preview.button('Grain in').waitFor();
  });
});
