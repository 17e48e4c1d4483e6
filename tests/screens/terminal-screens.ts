import type { Browser } from 'playwright-core';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import type { ServedStudio } from '#tests/support/served-studio.ts';
import { demoPerson, driveTerminal } from '#tests/support/terminal-driver.ts';
import { sizes, type Capture } from './capture.ts';
import { captureCharge, captureLooseCharge, planCharge } from './charge-screens.ts';

/** The terminal's screens, met in the order a caster meets them on one card. */
export const captureTerminal = async (
  browser: Browser,
  studio: ServedStudio,
  capture: Capture,
): Promise<void> => {
  const context = await browser.newContext({ viewport: sizes.terminal[0] });
  const page = await context.newPage();
  const terminal = driveTerminal(page, studio.origin);
  const shoot = (name: string): Promise<void> => capture(page, name, sizes.terminal);

  const plan = await planCharge(studio);

  await page.goto(`${studio.origin}/kiosk`);
  await terminal.heading(/not a terminal yet/).waitFor();
  await shoot('01-enrol');
  await terminal.enrol();
  await shoot('02-sign-in');
  await terminal.button(new RegExp(demoPerson('ines').name)).click();
  await page.getByRole('group', { name: /^PIN of/ }).waitFor();
  await shoot('03-pin');
  await terminal.button('Someone else').click();
  await terminal.signIn('ines');
  await page.getByRole('region', { name: 'Work at this bay' }).waitFor();
  await shoot('04-standby');
  await terminal.scanWithWedge('https://example.org/menu');
  await terminal.heading(/not one of our flask codes/).waitFor();
  await shoot('05-refused-code');
  await page.goto(`${studio.origin}/kiosk`);
  await page.getByRole('region', { name: 'Work at this bay' }).waitFor();
  await captureLooseCharge(terminal, studio, shoot);
  await page.goto(`${studio.origin}/kiosk`);
  await terminal.scanWithWedge(buildFlaskCode(147));
  await terminal.heading(/Check the flask/).waitFor();
  await shoot('06-card');
  await terminal.hold('Hold to open the card');
  await page.getByRole('group', { name: 'Cautions' }).waitFor();
  await shoot('07-guard');
  await terminal.guard();
  await captureCharge(terminal, shoot, plan);
  await page.getByRole('button', { name: 'Type a reading' }).waitFor();
  await shoot('10-melt-no-reading');
  await terminal.read('891');
  await page.getByText(/still solid/).waitFor();
  await shoot('11-melt-mushy');
  await terminal.button('Type a reading').click();
  await terminal.type('1750');
  await terminal.button(/^Take/).click();
  await page.getByRole('button', { name: /I meant/ }).waitFor();
  await shoot('12-reading-questioned');
  await terminal.button('Type again').click();
  await terminal.type('980');
  await terminal.button(/^Take/).click();
  await page.getByRole('button', { name: /Ready\. Hold/ }).waitFor();
  await shoot('13-melt-ready');
  await terminal.button('Stop work').click();
  await terminal.heading(/Stop\. What has happened/).waitFor();
  await shoot('14-stop-question');
  await terminal.button(/equipment/i).click();
  await page.getByRole('button', { name: /Hold to resume/ }).waitFor();
  await shoot('15-stopped');
  await terminal.hold(/Hold to resume/);
  await terminal.hold(/Ready\. Hold/);
  await page.getByRole('button', { name: /Flask is out/ }).waitFor();
  await shoot('16-flask-out');
  await terminal.hold('Flask is out. Hold');
  await terminal.heading(/Pour now/).waitFor();
  await shoot('17-pour');
  await terminal.hold(/^Poured/);
  await page.getByText(/Wait until/).waitFor();
  await shoot('18-quench');
  studio.advance(21 * 60);
  await page.reload();
  await page.getByRole('button', { name: 'Quenched. Hold' }).waitFor();
  await shoot('19-quench-open');
  await terminal.hold('Quenched. Hold');
  await page.getByRole('group', { name: 'What the pad types' }).waitFor();
  await terminal.type('9.1');
  await shoot('20-close');
  await page.keyboard.press('Enter');
  await terminal.type('0.2');
  await page.getByRole('group', { name: 'Look of the casting' }).getByRole('button').first().click();
  await terminal.hold('Hold to close the card');
  await terminal.heading(/Done\./).waitFor();
  await shoot('21-done');
  await context.close();
};
