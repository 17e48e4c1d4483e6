import type { Browser, Page } from 'playwright-core';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import type { ServedStudio } from '#tests/support/served-studio.ts';
import { driveDesk } from '#tests/support/desk-driver.ts';
import { sizes, type Capture } from './capture.ts';
import { captureMetal } from './metal-screens.ts';

const ready = async (page: Page): Promise<void> => {
  await page.getByRole('heading', { level: 1 }).waitFor();
  await page.waitForLoadState('networkidle');
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
  const shoot = async (path: string, name: string, wholePage = false): Promise<void> => {
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
  await shoot('/studio', '40-studio', true);
  await shoot(`/print/flasks/${buildFlaskCode(147)}`, '41-print-plate');
  await shoot(`/print/castings/${casting.id}`, '42-print-traveller');
  await shoot('/no-such-page', '43-not-found');
  await desk.open('/');
  await ready(page);
  await capture(page, '44-today-on-a-phone', sizes.phone);
  await context.close();
};
