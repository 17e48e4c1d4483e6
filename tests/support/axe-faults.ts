import AxeBuilder from '@axe-core/playwright';
import type { Page } from 'playwright-core';

const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/** Lets fonts arrive and transitions end: a colour on its way has no contrast of its own. */
export const settle = (page: Page): Promise<unknown> =>
  page.evaluate(async () => {
    await document.fonts.ready;
    await Promise.allSettled(
      document
        .getAnimations()
        .filter(({ effect }) => effect?.getTiming().iterations !== Infinity)
        .map((animation) => animation.finished),
    );
  });

const faultsIn = async (axe: AxeBuilder, where: string): Promise<readonly string[]> => {
  // Without a page of its own for what frames hold: our pages hold none, and it takes as long as the rest.
  const { violations } = await axe.setLegacyMode(true).analyze();
  return violations.map(
    ({ id, nodes }) => `${where}: ${id} at ${nodes.map(({ target }) => target.join(' ')).join('; ')}`,
  );
};

const paint = async (page: Page, theme: 'day' | 'melt-room'): Promise<void> => {
  await page.evaluate(
    (isDark) => document.documentElement.classList.toggle('melt-room', isDark),
    theme === 'melt-room',
  );
  await settle(page);
};

/** What axe finds wrong on the page as it is, a line each; the themes differ in nothing but colour. */
export const faultsOn = async (page: Page, screen: string): Promise<readonly string[]> => {
  await paint(page, 'day');
  const inDay = await faultsIn(new AxeBuilder({ page }).withTags(tags), `${screen}, day`);
  await paint(page, 'melt-room');
  const contrast = new AxeBuilder({ page }).withRules(['color-contrast']);
  return [...inDay, ...(await faultsIn(contrast, `${screen}, melt room`))];
};
