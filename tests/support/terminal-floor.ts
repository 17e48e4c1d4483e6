import type { Browser } from 'playwright-core';
import { launchChromium } from './chromium.ts';
import type { ServedStudio } from './served-studio.ts';
import { driveTerminal, type TerminalDriver } from './terminal-driver.ts';

/** A browser whose every new window may be the same enrolled terminal, or the desk. */
export interface TerminalFloor {
  readonly browser: Browser;
  /** A fresh window at the enrolled terminal; what an earlier window kept for itself is not in it. */
  readonly atTerminal: () => Promise<TerminalDriver>;
  readonly close: () => Promise<void>;
}

const viewport = { width: 1280, height: 800 } as const;

/** Starts a browser and makes it the demo studio's first terminal; `fakeVideo` becomes what its camera sees. */
export const openTerminalFloor = async (
  { origin }: ServedStudio,
  options: { readonly fakeVideo?: string } = {},
): Promise<TerminalFloor> => {
  const browser = await launchChromium(options);
  const first = await browser.newContext({ viewport });
  await driveTerminal(await first.newPage(), origin).enrol();
  const storageState = await first.storageState();
  await first.close();
  return {
    browser,
    atTerminal: async () => {
      const context = await browser.newContext({ viewport, storageState, permissions: ['camera'] });
      return driveTerminal(await context.newPage(), origin);
    },
    close: () => browser.close(),
  };
};
