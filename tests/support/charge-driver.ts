import type { Locator } from 'playwright-core';
import type { FakeSerial } from './fake-serial.ts';
import type { TerminalDriver } from './terminal-driver.ts';
import { typeAtOnce } from './type-at-once.ts';

/** Drives the charge step of a card whose metal is weighed in by lot. */
export const driveCharge = (terminal: TerminalDriver) => {
  const { page, button, heading, type } = terminal;
  const lines = page.getByRole('list', { name: 'Lots of this charge' });
  const atPad = (code: string): Promise<void> =>
    page.getByRole('group', { name: `Mass of lot ${code}` }).waitFor();
  return {
    /** The list of the charge's lots, and one line of it. */
    lines,
    line: (code: string): Locator => lines.getByRole('button', { name: new RegExp(code) }),

    /** Waits until the screen asks for a lot. */
    asksFor: (code: string): Promise<void> => heading(new RegExp(`Weigh in .*${code}`)).waitFor(),

    /** Touches a lot's line in the list. */
    touchLot: async (code: string): Promise<void> => {
      await lines.getByRole('button', { name: new RegExp(code) }).click();
      await atPad(code);
    },

    /** Scans a lot's label with a scanner that types. */
    scanLot: async (code: string): Promise<void> => {
      await lines.waitFor();
      await terminal.scanWithWedge(code);
      await atPad(code);
    },

    /** Opens the camera, which sees the lot's label. */
    showLot: async (code: string): Promise<void> => {
      await button('Scan a lot').click();
      await atPad(code);
    },

    /** Types a mass on the pad and puts the metal in. */
    putIn: async (typed: string): Promise<void> => {
      await type(typed);
      await button(/^Put in/).click();
    },

    /** Types a line as a balance that is a keyboard does: all at once, ending in Enter. */
    balanceTypes: (line: string): Promise<void> => typeAtOnce(page, line),

    /** Chooses the serial port of the balance, as it stands. */
    connectBalance: async (): Promise<void> => {
      await button('Connect the balance').click();
      await button('Choose its port').click();
      await page.getByText('The balance is connected.').waitFor();
    },

    /** Puts in what the balance shows, first on a moving pan, then at rest. */
    putInFromBalance: async ({ send }: FakeSerial, mass: string): Promise<void> => {
      await send(`~ ${mass} g\r\n`);
      await page
        .getByRole('alert')
        .getByText(/still moving/)
        .waitFor();
      await send(`= ${mass} g\r\n`);
      await button(new RegExp(`Put in ${mass.replace('.', '\\.')}\\sg`)).click();
    },

    /** Takes metal of a lot out of the crucible. */
    takeOut: async (code: string, typed: string): Promise<void> => {
      await button('Take some out').click();
      await heading(/comes out/).waitFor();
      const choice = page.getByRole('group', { name: 'What comes out' }).getByRole('button', { name: code });
      if (await choice.isVisible()) await choice.click();
      await page.getByRole('group', { name: new RegExp(`${code} taken out`) }).waitFor();
      await type(typed);
      await button(/^Take out/).click();
    },

    /** Holds the button that closes the charge. */
    close: (): Promise<void> => terminal.hold(/Complete\. Hold/),
  };
};

/** A charge being driven. */
export type ChargeDriver = ReturnType<typeof driveCharge>;
