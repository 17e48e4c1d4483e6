import type { Browser, Page } from 'playwright-core';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import type { ServedStudio } from '#tests/support/served-studio.ts';
import { buildInstructionDraft } from '#tests/factories/build-instruction-draft.ts';
import { buildApprenticeMelt } from '#tests/support/apprentice-melt.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { sizes, type Capture } from './capture.ts';
import { captureMetal } from './metal-screens.ts';

const ready = async (page: Page): Promise<void> => {
  await page.getByRole('heading', { level: 1 }).waitFor();
  await page.waitForLoadState('networkidle');
};

type Shoot = (path: string, name: string, wholePage?: boolean) => Promise<void>;

/** The work instruction: its revisions, the one in force, a draft with a step opened, and the sheet on paper. */
const captureInstruction = async (
  page: Page,
  { services }: ServedStudio,
  shoot: Shoot,
  capture: Capture,
): Promise<void> => {
  const { WorkInstructionRevision } = services.models;
  const first = await WorkInstructionRevision.findOne({ where: { number: 1 }, rejectOnEmpty: true });
  const [face, ...rest] = first.content.steps;
  const steps = rest.map((step) =>
    step.key === 'dry' ? { ...step, sentence: 'Metal, crucible and tools are dry and warm.' } : step,
  );
  const draft = await buildInstructionDraft(services, {
    content: { ...first.content, steps, title: 'Pour one flask, two at a time' },
    note: `“${face?.sentence ?? ''}” is in the next one already.`,
  });
  await shoot('/instructions', '45-instructions');
  await shoot(`/instructions/${first.id}`, '46-instruction', true);
  await shoot(`/instructions/${draft.id}`, '47-instruction-draft', true);
  await page.getByRole('button', { name: /^A caster looks at melt/ }).click();
  await page.getByRole('button', { name: 'Add a step before Guard' }).click();
  await page.getByText('Say what to do.').first().waitFor();
  await capture(page, '48-instruction-step', sizes.desk);
  // What was typed is not stored, which the page would ask about.
  await page.getByRole('button', { name: 'Undo my changes' }).click();
  await shoot(`/print/instructions/${first.id}`, '49-print-instruction', true);
};

/** An apprentice's melt on which work is stopped, and the apprentice's own page. */
const captureApprentice = async ({ services }: ServedStudio, shoot: Shoot): Promise<void> => {
  const melt = await buildApprenticeMelt(services);
  await shoot(`/melts/${melt.id}`, '50-melt-with-variances', true);
  await shoot('/melts', '51-melt-book-with-variances');
  await shoot('/', '52-today-stopped', true);
  await shoot(`/people/${melt.openedBy}`, '53-apprentice', true);
};

/** The desk's screens, as the owner sees them. */
export const captureDesk = async (
  browser: Browser,
  studio: ServedStudio,
  capture: Capture,
): Promise<void> => {
  const context = await browser.newContext({ viewport: sizes.desk[0] });
  const page = await context.newPage();
  const desk = driveDesk(page, studio.origin);
  const { models } = studio.services;
  const melt = await models.Melt.findOne({ order: [['number', 'ASC']], offset: 4, rejectOnEmpty: true });
  const alloys = await models.Alloy.findAll({ order: [['name', 'ASC']] });
  const casting = await models.Casting.findOne({ where: { state: 'holding' }, rejectOnEmpty: true });
  const shoot: Shoot = async (path, name, wholePage = false) => {
    await desk.open(path);
    await ready(page);
    await capture(page, name, sizes.desk, { wholePage });
  };

  await desk.open('/');
  await ready(page);
  await capture(page, '31-desk-sign-in', sizes.desk);
  await desk.signIn('maren');
  await shoot('/', '32-today', true);
  await shoot('/melts', '33-melt-book');
  await shoot(`/melts/${melt.id}`, '34-melt', true);
  await shoot('/alloys', '35-alloys');
  for (const [index, alloy] of alloys.entries())
    await shoot(`/alloys/${alloy.id}`, `36-alloy-${index + 1}`, true);
  await captureMetal(page, studio, capture);
  await shoot('/flasks', '37-flasks');
  await shoot('/people', '38-people');
  await shoot('/terminals', '39-terminals');
  await shoot('/instruments', '39-instruments', true);
  await shoot('/studio', '40-studio', true);
  await shoot(`/print/flasks/${buildFlaskCode(147)}`, '41-print-plate');
  await shoot(`/print/castings/${casting.id}`, '42-print-traveller');
  await shoot('/no-such-page', '43-not-found');
  await captureInstruction(page, studio, shoot, capture);
  await captureApprentice(studio, shoot);
  await desk.open('/');
  await ready(page);
  await capture(page, '44-today-on-a-phone', sizes.phone);
  await context.close();
};
