import { fileURLToPath } from 'node:url';
import type { Page } from 'playwright-core';

/** What `fake-serial-page.mjs` puts on a page's window. */
interface FakeInstrument {
  readonly send: (text: string) => void;
  readonly unplug: () => void;
  readonly plugIn: () => void;
}

type WindowWithInstrument = Window & { readonly fakeInstrument: FakeInstrument };

/** Gives the page, whatever it opens from now on, a serial port with an instrument that a test plays. */
export const installFakeSerial = async (page: Page) => {
  await page.addInitScript({ path: fileURLToPath(new URL('fake-serial-page.mjs', import.meta.url)) });
  return {
    /** Sends text as it is, line ends included. */
    send: (text: string): Promise<void> =>
      page.evaluate((sent) => (window as unknown as WindowWithInstrument).fakeInstrument.send(sent), text),
    unplug: (): Promise<void> =>
      page.evaluate(() => (window as unknown as WindowWithInstrument).fakeInstrument.unplug()),
    plugIn: (): Promise<void> =>
      page.evaluate(() => (window as unknown as WindowWithInstrument).fakeInstrument.plugIn()),
  };
};

/** The instrument a test plays. */
export type FakeSerial = Awaited<ReturnType<typeof installFakeSerial>>;
