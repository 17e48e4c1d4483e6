import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, it } from 'vitest';
import type { PourCard } from '#shared/contracts/card.ts';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import { formatPercent } from '#shared/lib/units.ts';
import { equilibrium } from '#shared/metallurgy/index.ts';
import { askThrough } from '#tests/support/ask-through.ts';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import { driveTerminal } from '#tests/support/terminal-driver.ts';
import { createTestDatabase, type TestDatabase } from '#tests/support/test-database.ts';
import { launchChromium } from '#tests/support/chromium.ts';

let database: TestDatabase;
let studio: ServedStudio;
let browser: Browser;

beforeAll(async () => {
  database = await createTestDatabase();
  studio = await serveStudio(database);
  browser = await launchChromium();
});

afterAll(async () => {
  await browser.close();
  await studio.close();
  await database.drop();
});

const newPage = async (): Promise<Page> =>
  (await browser.newContext({ viewport: { width: 1440, height: 900 } })).newPage();

const alloyId = async (): Promise<string> => {
  const { models } = studio.services;
  return (await models.Alloy.findOne({ where: { name: 'Sterling, plain' }, rejectOnEmpty: true })).id;
};

/** The rows of the phase table as the engine has them: name, share, then wt% of each element. */
const phasesAt = (atC: number): readonly string[] => {
  const state = equilibrium({ Ag: 92.5, Cu: 7.5 }, atC);
  if (!state.withinModel) throw new Error(state.reason);
  return state.phases.map(({ massFraction, wt }) =>
    [
      formatPercent(massFraction),
      ...Object.keys(state.chemicalPotentials).map((e) => wt[e]?.toFixed(1)),
    ].join(' '),
  );
};

const tableOn = async (page: Page): Promise<readonly string[]> => {
  const rows = page.getByRole('table', { name: /phases at this temperature/ }).locator('tbody tr');
  const cells = await Promise.all((await rows.all()).map((row) => row.getByRole('cell').allInnerTexts()));
  return cells.map((texts) => texts.join(' ').replace(/[\u00a0\u202f]/g, ' '));
};

it('reads sterling at a temperature: what is solid, what is liquid, and what each holds', async () => {
  const page = await newPage();
  const desk = driveDesk(page, studio.origin);
  await desk.signIn('maren');
  await desk.open(`/alloys/${await alloyId()}`);
  await page.getByLabel('Read it at').fill('850');
  await page.getByRole('button', { name: 'Go there' }).click();
  await page.getByRole('heading', { name: /^At 850 °C$/ }).waitFor();
  // The lever rule on the assessed Ag-Cu system: 77 % solid at 850 °C.
  expect(phasesAt(850).some((row) => row.startsWith('77 %'))).toBe(true);
  expect(await tableOn(page)).toEqual(phasesAt(850));
  await page.getByRole('img', { name: /77 %/ }).first().waitFor();

  const slider = page.getByRole('slider', { name: 'Temperature' });
  await slider.focus();
  await page.keyboard.press('ArrowUp');
  await page.getByRole('heading', { name: /^At 851 °C$/ }).waitFor();
  expect(await tableOn(page)).toEqual(phasesAt(851));
  await page.keyboard.press('Shift+ArrowDown');
  await page.getByRole('heading', { name: /^At 84[01] °C$/ }).waitFor();
  expect(new URL(page.url()).search).toMatch(/84[01]/);
});

it('drafts, checks and approves a revision, which planned castings take on and an open card does not', async () => {
  const page = await newPage();
  const desk = driveDesk(page, studio.origin);
  const terminal = driveTerminal(await newPage(), studio.origin);
  await terminal.enrol();
  await terminal.signIn('ines');
  // Two castings are planned on revision 1; the card of one is open before the next revision is approved.
  const { models } = studio.services;
  await models.Casting.update({ state: 'holding' }, { where: { state: 'dewaxed' } });
  const running = await cardAhead(terminal.page, studio, 150, 'melt');
  const ask = askThrough(terminal.page, studio.origin, 'terminal');
  const liquidusOf = async (castingId: string): Promise<number> =>
    ((await (await ask.get(`/api/cards/${castingId}`)).json()) as PourCard).context.figures.liquidusC;
  const before = await liquidusOf(running.castingId);

  await desk.signIn('maren');
  const id = await alloyId();
  await desk.open(`/alloys/${id}`);
  await page.getByRole('link', { name: 'Draft a new revision' }).click();
  await page.getByLabel('Part of element 1, wt%').fill('93,5');
  await page.getByLabel('Part of element 2, wt%').fill('6,5');
  await page.getByLabel('Note').fill('A little richer, for the wire.');
  await page.getByRole('button', { name: 'Draft the revision' }).click();
  await page.getByRole('button', { name: 'Check' }).click();
  await page.getByRole('button', { name: 'I have checked it' }).click();
  await page.getByRole('button', { name: 'Approve' }).click();
  await page.getByRole('button', { name: 'Hold to approve' }).click({ delay: 1_600 });
  await page.getByRole('dialog').waitFor({ state: 'detached' });
  const second = await models.AlloyRevision.findOne({
    where: { alloyId: id, status: 'approved' },
    rejectOnEmpty: true,
  });
  expect([second.number, second.compositionWt]).toEqual([2, { Ag: 93.5, Cu: 6.5 }]);
  expect(second.figures.liquidusC).toBeGreaterThan(before);

  expect(await liquidusOf(running.castingId)).toBe(before);
  await terminal.openCard(running.castingId);
  await terminal.page.getByText(`All liquid at ${Math.round(before)}`).waitFor();

  const flask = await models.Flask.findOne({ where: { code: buildFlaskCode(161) }, rejectOnEmpty: true });
  await terminal.page.goto(`${studio.origin}/kiosk`);
  await terminal.page.getByText('Next at this bay').waitFor();
  await terminal.scanWithWedge(flask.code);
  await terminal.heading(/Check the flask/).waitFor();
  expect(await liquidusOf(new URL(terminal.page.url()).pathname.split('/').at(-1) ?? '')).toBe(
    second.figures.liquidusC,
  );
});
