import { randomUUID } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { faultsOn } from '#tests/support/axe-faults.ts';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { chargeOf } from '#tests/support/charge-by-lot.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { driveMetal, thousandthsOf, type MetalDriver } from '#tests/support/metal-driver.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import { demoPerson } from '#tests/support/terminal-driver.ts';
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

const atDesk = async (): Promise<MetalDriver> => {
  const context = await floor.browser.newContext({ viewport: { width: 1280, height: 900 } });
  const page = await context.newPage();
  await driveDesk(page, studio.origin).signIn('maren');
  return driveMetal(page, studio.origin);
};

/** A melt whose card was ended with 40 g of a lot in its crucible. */
const abandonedMelt = async (): Promise<string> => {
  const terminal = await floor.atTerminal();
  await terminal.page.goto(`${studio.origin}/kiosk`);
  await terminal.signIn('ines');
  const card = await cardAhead(terminal.page, studio, 150, 'charge');
  const lot = await studio.services.models.Lot.findOne({
    where: { name: 'Sterling, casting grain' },
    rejectOnEmpty: true,
  });
  for (const event of [chargeOf(lot, 40), { type: 'abandoned', note: 'The torch ran dry.' }])
    expect((await card.deliver(event)).status()).toBe(201);
  await terminal.page.context().close();
  return card.meltId;
};

/** Two good rows and a faulty one; `mark` makes the lots others than those of another sheet. */
const sheetOf = (mark: string): string =>
  [
    'name;kind;mass;unit;reference;place;received;Au;Ag;Cu;Ag ±;Au ±',
    `Sterling, second bag;grain;0,25;kg;${mark}-7;cupboard;2026-11-30;;92,65;7,35;0,08;`,
    `Fine gold, bar;fine;1;ozt;${mark}-8;safe;2026-11-30;99,99;;;;0,005`,
    `Sterling, bad row;grain;many;g;${mark}-9;cupboard;2026-11-30;;92,65;7,35;0,08;`,
  ].join('\n');

const pdf = Buffer.from('%PDF-1.4\n1 0 obj<</Type/Catalog>>endobj\ntrailer<</Root 1 0 R>>\n%%EOF\n');

describe('an owner’s metal at the desk', () => {
  it('is received by form and by sheet, papered, planned with returns, counted, and read as a month', async () => {
    const metal = await atDesk();
    const { page } = metal;
    expect(await metal.openMonth()).toBe('Every line adds up to the milligram.');
    const before = await metal.monthLine('Lots', 'Received');
    const countedBefore = await metal.monthLine('Lots', 'Difference found at counts');
    const sheet = sheetOf(randomUUID().slice(0, 8));

    const code = await metal.receive({
      name: 'Sterling, first bag',
      kind: 'Casting grain',
      parts: [
        ['ag', '92,65', '0,08'],
        ['Cu', '7.35', ''],
      ],
      mass: '2 ozt',
      supplier: 'A refiner in the valley',
      reference: 'R-6',
      place: 'Metal cupboard, bay 1',
    });
    await page.getByText('62.207\u00a0g').first().waitFor();

    const text = { name: 'certificate.pdf', mimeType: 'application/pdf', buffer: Buffer.from('Ag 92.65') };
    expect(await metal.addDocument(text)).toMatch(/PDF, JPEG, PNG or WebP/);
    expect(await metal.addDocument({ ...text, name: 'assay R-6.pdf', buffer: pdf })).toBe('');

    expect(await metal.lookThrough(sheet)).toBe('3 rows: 2 good, 1 with a fault.');
    await page.getByText('“many” is not a number.').waitFor();
    expect(await page.getByRole('button', { name: 'Say first what is to be taken' }).isDisabled()).toBe(true);
    expect(await metal.takeGoodRows()).toMatch(
      /^2 lots are taken in: L-\d{4}-\d to L-\d{4}-\d\. 1 row stayed out\.$/,
    );
    expect(await metal.lookThrough(sheet)).toBe('3 rows: 0 good, 2 to be looked at again, 1 with a fault.');

    await metal.planCharge([150]);
    const lines = await metal.planLines();
    expect(lines.some(([, kind]) => kind === 'returns')).toBe(true);
    await page
      .getByText(/is a(n)? .* mark|silver mark/)
      .first()
      .waitFor();
    await metal.keepPlan();
    await page.getByRole('region', { name: 'Lots of the kept plan' }).waitFor();

    await metal.openLot(code);
    const { login, password } = demoPerson('ines');
    await metal.count('62.2', { why: 'Dust in the bag.', login, password });
    await page.getByText('62.200\u00a0g').first().waitFor();

    expect(await metal.openMonth()).toBe('Every line adds up to the milligram.');
    const after = await metal.monthLine('Lots', 'Received');
    // What came today; the sheet's rows came in the month before.
    expect((after['All metal'] ?? 0) - (before['All metal'] ?? 0)).toBe(62_207);
    const counted = await metal.monthLine('Lots', 'Difference found at counts');
    expect((counted['All metal'] ?? 0) - (countedBefore['All metal'] ?? 0)).toBe(-7);
    await page.getByText('Dust in the bag.').first().waitFor();
    const csv = await readFile(await (await metal.download('CSV')).path(), 'utf8');
    expect(csv).toContain('Dust in the bag.');
    const printed = await readFile(await (await metal.download('PDF')).path());
    expect(printed.subarray(0, 5).toString()).toBe('%PDF-');
    await page.context().close();
  });

  it('is changed by hand in a plan only while every limit holds', async () => {
    const metal = await atDesk();
    const { page } = metal;
    await metal.planCharge([147]);
    await page.getByRole('button', { name: 'Change it by hand' }).click();
    await page.getByText('It holds every limit.').waitFor();
    const first = page.getByLabel(/^Mass of L-/).first();
    const massG = Number(await first.inputValue());
    await first.fill(String(massG + 5));
    await page.getByText('The masses do not come to the metal wanted.').waitFor();
    expect(await page.getByRole('button', { name: 'It breaks a limit' }).isDisabled()).toBe(true);
    await first.fill(String(massG));
    await metal.keepPlan();
    await page.context().close();
  });

  it('is put right when a movement was wrong, with a second person’s name to it', async () => {
    const metal = await atDesk();
    const { page } = metal;
    await metal.openLot('L-0001-3');
    await page.getByRole('button', { name: /^Correct 120\.000/ }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('What it should have been').fill('119,5');
    await dialog.getByLabel('What was wrong').fill('The tray was weighed with it.');
    await dialog.getByRole('button', { name: 'Correct it' }).click();
    await dialog
      .getByText(/second person must sign|Whose sign-in/)
      .first()
      .waitFor();
    const { login, password } = demoPerson('tomas');
    await dialog.getByLabel('Second person’s sign-in name').fill(login);
    await dialog.getByLabel('Their password').fill(password);
    await dialog.getByRole('button', { name: 'Correct it' }).click();
    await dialog.waitFor({ state: 'detached' });
    await page.getByText('119.500\u00a0g').first().waitFor();
    await page.context().close();
  });

  it('is raised in a pot, and closed out of a crucible that a card left full', async () => {
    const meltId = await abandonedMelt();
    const metal = await atDesk();
    const { page } = metal;
    await metal.go('/metal/pot');
    await page.getByLabel('Fill in from').selectOption({ label: '14 ct yellow 585' });
    await page.getByLabel('Mass in the pot').fill('20');
    await page.getByLabel('It is to become').selectOption({ label: '18 ct yellow 750' });
    await page.getByRole('button', { name: 'Work out what to add' }).click();
    await page.getByRole('heading', { name: 'To make it 18 ct yellow 750' }).waitFor({ timeout: 60_000 });
    const added = await page
      .getByText('Added', { exact: true })
      .locator('xpath=following-sibling::dd')
      .first()
      .innerText();
    expect(thousandthsOf(added)).toBeGreaterThan(10_000);

    await metal.go('/metal');
    await page.getByText(/40\.00\u00a0g of .* are still in the crucible of M-/).waitFor();
    await metal.closeOut(meltId, {
      button: '39,9',
      loss: '0,1',
      note: 'Let freeze; the button came out whole.',
    });
    await metal.go('/metal');
    await page.getByRole('link', { name: /^L-0001/ }).waitFor();
    expect(await page.getByText(/still in the crucible/).count()).toBe(0);
    expect(await metal.openMonth()).toBe('Every line adds up to the milligram.');
    await page.context().close();
  });

  it('is judged by the marks of the place that the studio chose', async () => {
    const metal = await atDesk();
    const { page } = metal;
    await metal.go('/studio');
    await page.getByLabel('Fineness marks are judged by').selectOption('United States');
    await page.getByRole('button', { name: /^Store/ }).click();
    await page
      .getByText(/stored/i)
      .first()
      .waitFor();
    await metal.openLot('L-0006-4');
    await page.getByText(/it reaches 925, a silver mark of the United States/).waitFor();
    await page.context().close();
  });
});

describe('accessibility of the metal’s pages, by axe against WCAG 2.2 AA', () => {
  const firstLot = async (): Promise<string> =>
    (await studio.services.models.Lot.findOne({ order: [['number', 'ASC']], rejectOnEmpty: true })).id;

  const faultsAt = async (metal: MetalDriver, paths: readonly string[]): Promise<readonly string[]> => {
    const faults: string[] = [];
    for (const path of paths) {
      await metal.go(path);
      await metal.page.waitForLoadState('networkidle');
      faults.push(...(await faultsOn(metal.page, path)));
    }
    return faults;
  };

  it.each([
    [['/metal', '/metal?lots=used-up', '/metal/month']],
    [['/metal/receive', '/metal/intake', '/metal/plan', '/metal/pot']],
  ])('has no fault in either theme at %s', async (paths) => {
    expect(await faultsAt(await atDesk(), paths)).toEqual([]);
  });

  it('has no fault on a lot, its acts, its label and an empty crucible', async () => {
    const id = await firstLot();
    const paths = ['', '?act=count', '?act=assay'].map((act) => `/metal/lots/${id}${act}`);
    const others = [`/print/lots/${id}`, `/metal/crucibles/${id}`];
    expect(await faultsAt(await atDesk(), [...paths, ...others])).toEqual([]);
  });

  it('has no fault on a sheet with a fault, a planned charge, and a plan changed by hand', async () => {
    const metal = await atDesk();
    const { page } = metal;
    const faults: string[] = [];
    await metal.lookThrough(sheetOf('axe'));
    faults.push(...(await faultsOn(page, 'a sheet')));
    await metal.planCharge([161]);
    faults.push(...(await faultsOn(page, 'a planned charge')));
    await page.getByRole('button', { name: 'Change it by hand' }).click();
    await page.getByText('It holds every limit.').waitFor();
    faults.push(...(await faultsOn(page, 'a plan changed by hand')));
    expect(faults).toEqual([]);
  });
});
