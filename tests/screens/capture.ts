import { mkdir } from 'node:fs/promises';
import { join } from 'node:path';
import type { Page } from 'playwright-core';

/** A screen's size in CSS pixels, with the name its pictures carry. */
export interface ScreenSize {
  readonly name: string;
  readonly width: number;
  readonly height: number;
}

/** The sizes each application is made for. */
export const sizes = {
  terminal: [
    { name: 'terminal-1280x800', width: 1280, height: 800 },
    { name: 'terminal-800x1280', width: 800, height: 1280 },
  ],
  desk: [{ name: 'desk-1440x900', width: 1440, height: 900 }],
  phone: [{ name: 'phone-390x844', width: 390, height: 844 }],
} as const satisfies Record<string, readonly ScreenSize[]>;

const themes = ['day', 'melt-room'] as const;

/** Lets fonts arrive and the last transition end, so that a picture shows the screen at rest. */
const settle = (page: Page): Promise<unknown> =>
  page.evaluate(async () => {
    await document.fonts.ready;
    await Promise.allSettled(document.getAnimations().map((animation) => animation.finished));
    await new Promise((resolve) => requestAnimationFrame(() => requestAnimationFrame(resolve)));
  });

/** Writes pictures of the page as it is, in both themes and at each size; says each file's name. */
export const captureInto =
  (folder: string, say: (line: string) => void) =>
  async (page: Page, name: string, at: readonly ScreenSize[], { wholePage = false } = {}): Promise<void> => {
    await mkdir(folder, { recursive: true });
    for (const size of at) {
      await page.setViewportSize(size);
      for (const theme of themes) {
        await page.evaluate(
          (dark) => document.documentElement.classList.toggle('melt-room', dark),
          theme === 'melt-room',
        );
        await page.waitForTimeout(350);
        await settle(page);
        const file = `${name}.${size.name}.${theme}.png`;
        await page.screenshot({ path: join(folder, file), fullPage: wholePage });
        say(file);
      }
    }
    await page.setViewportSize(at[0] ?? sizes.desk[0]);
    await page.evaluate(() => document.documentElement.classList.remove('melt-room'));
  };

/** Takes a picture of a page. */
export type Capture = ReturnType<typeof captureInto>;
