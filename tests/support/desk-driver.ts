import type { Locator, Page } from 'playwright-core';
import { demoPerson } from './terminal-driver.ts';

/** Drives the desk as a person would. */
export const driveDesk = (page: Page, origin: string) => ({
  page,
  open: async (path: string): Promise<void> => {
    await page.goto(`${origin}${path}`);
  },
  signIn: async (login: string): Promise<void> => {
    await page.goto(origin);
    await page.getByLabel(/name/i).fill(login);
    await page.getByLabel(/password/i).fill(demoPerson(login).password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByRole('navigation').first().waitFor();
  },
  heading: (name: string | RegExp): Locator => page.getByRole('heading', { level: 1, name }),
});

/** The desk being driven. */
export type DeskDriver = ReturnType<typeof driveDesk>;
