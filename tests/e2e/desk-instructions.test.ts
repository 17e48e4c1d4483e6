import AxeBuilder from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { PourCard } from '#shared/contracts/card.ts';
import type { Instruction } from '#shared/contracts/instruction.ts';
import { buildInstructionDraft } from '#tests/factories/build-instruction-draft.ts';
import { buildApprenticeMelt } from '#tests/support/apprentice-melt.ts';
import { askThrough } from '#tests/support/ask-through.ts';
import { launchChromium } from '#tests/support/chromium.ts';
import { driveDesk, type DeskDriver } from '#tests/support/desk-driver.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import { demoPerson, driveTerminal } from '#tests/support/terminal-driver.ts';
import { createTestDatabase, type TestDatabase } from '#tests/support/test-database.ts';

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

const deskOf = async (login: string): Promise<DeskDriver> => {
  const desk = driveDesk(await newPage(), studio.origin);
  await desk.signIn(login);
  return desk;
};

/** A terminal of this browser at which someone is signed in, asked through its own API. */
const askTerminal = async (login: string) => {
  const terminal = driveTerminal(await newPage(), studio.origin);
  await terminal.enrol();
  await terminal.signIn(login);
  await terminal.page.getByRole('region', { name: 'Work at this bay' }).waitFor();
  return askThrough(terminal.page, studio.origin, 'terminal');
};

const bodyOf = async <Body>(answer: { json: () => Promise<unknown> }): Promise<Body> =>
  (await answer.json()) as Body;

describe('the work instruction at the desk', () => {
  const sentence = 'Tell whoever is near that metal is about to melt.';

  it('gets a step from the owner and the approval of a caster; the next card asks for it, a running one does not', async () => {
    const { models } = studio.services;
    const [first, second] = await models.Casting.findAll({
      where: { state: 'holding' },
      order: [['plannedPourAt', 'ASC']],
    });
    if (!first || !second) throw new Error('The demo studio has fewer than two flasks ready to pour.');
    const terminal = await askTerminal('ines');
    const open = async (castingId: string): Promise<PourCard> => {
      const request = { key: crypto.randomUUID(), occurredAt: new Date().toISOString() };
      return bodyOf(await terminal.post(`/api/cards/${castingId}/open`, request));
    };
    const running = await open(first.id);

    const owner = await deskOf('maren');
    await owner.open('/instructions');
    await owner.page.getByRole('button', { name: 'Draft a new revision' }).click();
    await owner.heading(/revision 2/).waitFor();
    const { page } = owner;
    await page.getByRole('button', { name: 'Add a step before Melt' }).click();
    // What is missing is said at the step at once, and keeps the draft from being stored.
    await page.getByText('Say what to do.').waitFor();
    await page.getByText('1 point to be mended before it can be stored.').waitFor();
    await page.keyboard.type(sentence);
    await page.getByLabel('Safety sign').selectOption('hot-surface');
    const row = page.getByRole('button', { name: sentence });
    await page.getByRole('group', { name: sentence }).getByRole('button', { name: 'Move up' }).click();
    await page.getByText('Not stored yet.').waitFor();

    // Leaving is asked about, and staying loses nothing.
    await page.getByRole('link', { name: 'Casting' }).click();
    await page.getByRole('button', { name: 'Stay here' }).click();
    await row.waitFor();

    // A step that is removed can be put back where it stood.
    await page.getByRole('group', { name: sentence }).getByRole('button', { name: 'Remove' }).click();
    await row.waitFor({ state: 'detached' });
    await page.getByRole('button', { name: 'Put it back' }).click();
    await row.waitFor();
    await page.getByLabel('What is new').fill('A warning before the heat.');
    await page.getByRole('button', { name: 'Store the draft' }).click();
    await page.getByText('Stored as a draft; nobody works by it yet.').waitFor();
    expect(await page.getByRole('button', { name: 'Approve' }).count()).toBe(0);

    const caster = await deskOf('ines');
    await caster.open(new URL(page.url()).pathname);
    await caster.page.getByRole('heading', { name: 'Compared with revision 1' }).waitFor();
    await caster.page.getByText(`Added, Melt: ${sentence}`).waitFor();
    await caster.page.getByRole('button', { name: 'Approve' }).click();
    await caster.page.getByRole('button', { name: 'Hold to approve' }).click({ delay: 1_600 });
    await caster.page.getByText('in force').waitFor();

    const sentencesOf = ({ context }: PourCard) => context.rules?.steps.map((step) => step.sentence);
    const next = await open(second.id);
    expect(next.instruction.revision).toBe(2);
    expect(sentencesOf(next)).toContain(sentence);
    const again = await bodyOf<PourCard>(await terminal.get(`/api/cards/${first.id}`));
    expect(again.instruction.revision).toBe(1);
    expect(again.context).toEqual(running.context);
    expect(sentencesOf(again)).not.toContain(sentence);
    const id = new URL(page.url()).pathname.split('/').at(-1) ?? '';
    const stored = await bodyOf<Instruction>(
      await askThrough(page, studio.origin, 'desk').get(`/api/instructions/${id}`),
    );
    expect(stored).toMatchObject({ approvedBy: demoPerson('ines').name, note: 'A warning before the heat.' });
  });

  it('keeps what was typed when another owner was first, and says so', async () => {
    const draft = await buildInstructionDraft(studio.services);
    const { page, ...owner } = await deskOf('maren');
    await owner.open(`/instructions/${draft.id}`);
    await page.getByLabel('Title').fill('Mine');
    const changed = { content: { ...draft.content, title: 'Theirs' }, version: 2 };
    await draft.update(changed);
    await page.getByRole('button', { name: 'Store the draft' }).click();
    await page.getByText('This draft was changed meanwhile. Load it again.').waitFor();
    expect(await page.getByLabel('Title').inputValue()).toBe('Mine');
    await page.getByRole('button', { name: 'Load the stored draft, drop mine' }).click();
    await page.getByText('Stored as a draft; nobody works by it yet.').waitFor();
    expect(await page.getByLabel('Title').inputValue()).toBe('Theirs');
  });
});

describe('accessibility, by axe against WCAG 2.2 AA', () => {
  const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

  it('has no fault on the pages of the instruction, of an apprentice and of a stopped melt, in both themes', async () => {
    const melt = await buildApprenticeMelt(studio.services);
    const draft = await buildInstructionDraft(studio.services);
    const { page, ...owner } = await deskOf('maren');
    const faults: string[] = [];
    const look = async (where: string): Promise<void> => {
      for (const theme of ['day', 'melt room']) {
        await page.evaluate(async (isDark) => {
          document.documentElement.classList.toggle('melt-room', isDark);
          await document.fonts.ready;
          await Promise.allSettled(document.getAnimations().map((animation) => animation.finished));
        }, theme === 'melt room');
        // The terminal's preview is looked at where it is made; the themes differ in nothing but colour.
        const axe = new AxeBuilder({ page }).exclude('iframe');
        const { violations } = await (
          theme === 'day' ? axe.withTags(tags) : axe.withRules(['color-contrast'])
        ).analyze();
        faults.push(
          ...violations.map(({ id, nodes }) => `${where}, ${theme}: ${id} at ${String(nodes[0]?.target)}`),
        );
      }
    };
    for (const path of [
      '/',
      '/instructions',
      `/instructions/${draft.id}`,
      `/print/instructions/${draft.id}`,
      `/melts/${melt.id}`,
      `/people/${melt.openedBy}`,
    ]) {
      await owner.open(path);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await page.waitForLoadState('networkidle');
      await look(path);
    }
    await owner.open(`/instructions/${draft.id}`);
    await page.getByRole('button', { name: 'Add a step before Guard' }).click();
    await look('a step with a fault');
    await page.getByLabel('Kind', { exact: true }).selectOption('choose');
    await look('answers to choose from');
    await page.getByRole('button', { name: 'Undo my changes' }).click();
    await owner.open(`/people/${melt.openedBy}`);
    await page.getByLabel('Every alloy').uncheck();
    await page.getByLabel('Every part of a card').uncheck();
    await look('the limits of an apprentice');
    expect(faults).toEqual([]);
  });
});
