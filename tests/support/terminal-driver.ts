import type { Locator, Page } from 'playwright-core';
import { typeAtOnce } from './type-at-once.ts';
import { demoEnrolmentCode, demoPeople, type DemoPerson } from '#server/services/demo-studio/people.ts';

/** Longer than any hold takes, also on a machine that is busy. */
const holdMs = 10_000;

/** A person of the demo studio by sign-in name. */
export const demoPerson = (login: string): DemoPerson => {
  const person = demoPeople.find((candidate) => candidate.login === login);
  if (!person) throw new Error(`The demo studio has no ${login}.`);
  return person;
};

/** Presses a button and keeps it pressed until what it does is done: then it is gone, or says something else. */
const hold = async (button: Locator): Promise<void> => {
  const { mouse } = button.page();
  await button.hover();
  await mouse.down();
  await button.waitFor({ state: 'detached', timeout: holdMs });
  await mouse.up();
};

/** Drives the terminal as a person would, by what its screens say. */
export const driveTerminal = (page: Page, origin: string) => {
  const button = (name: string | RegExp): Locator => page.getByRole('button', { name });
  const type = (text: string): Promise<void> => page.keyboard.type(text, { delay: 60 });
  return {
    page,
    button,
    hold: (name: string | RegExp): Promise<void> => hold(button(name)),
    type,

    /** Makes this browser a terminal with a one-time code, the demo studio's own unless told otherwise. */
    enrol: async (code = demoEnrolmentCode): Promise<void> => {
      await page.goto(`${origin}/kiosk`);
      await page.getByRole('heading', { name: /not a terminal yet/ }).waitFor();
      await type(code.replace(/\D/g, ''));
      await button('Enrol this terminal').click();
      await page.getByRole('heading', { name: /who/i }).waitFor();
    },

    /** Chooses a person and types the PIN; whatever address was open comes back. */
    signIn: async (login: string): Promise<void> => {
      const { name, pin } = demoPerson(login);
      await button(new RegExp(name)).click();
      await page.getByRole('group', { name: `PIN of ${name}` }).waitFor();
      await type(pin);
      await button('Sign in').click();
      await page.getByRole('group', { name: `PIN of ${name}` }).waitFor({ state: 'detached' });
    },

    /** Types a flask's digits as a scanner does: fast, ending in Enter. */
    scanWithWedge: async (code: string): Promise<void> => {
      // Standby listens only once it stands; a scanner's keys before that are lost.
      if (/\/kiosk\/?$/.test(new URL(page.url()).pathname)) {
        await page.getByRole('region', { name: 'Work at this bay' }).waitFor();
      }
      await typeAtOnce(page, code);
    },

    /** Opens a casting's card by its address. */
    openCard: async (castingId: string): Promise<void> => {
      await page.goto(`${origin}/kiosk/cards/${castingId}`);
    },

    /** Touches every caution, then holds. */
    guard: async (): Promise<void> => {
      const cautions = page.getByRole('group', { name: 'Cautions' }).getByRole('button');
      await cautions.first().waitFor();
      for (const caution of await cautions.all()) await caution.click();
      await hold(button(/Guarded/));
    },

    /** Reads and touches what the instruction asks before a part of the card, then holds. */
    readOn: async (): Promise<void> => {
      const cautions = page.getByRole('group', { name: 'Cautions' });
      await cautions.waitFor();
      for (const caution of await cautions.getByRole('button').all()) await caution.click();
      await hold(button('Hold to go on'));
      await cautions.waitFor({ state: 'detached' });
    },

    /** Says that the metal at hand is of no lot, where nothing is in yet and nothing was planned. */
    withoutLots: async (): Promise<void> => {
      await button('Scan a lot').click();
      await button('The metal has no lot').click();
      await button('Grain in').waitFor();
    },

    /** Weighs in one kind of metal that is of no lot, as typed. */
    weighIn: async (kind: 'Returns' | 'Grain', typed: string): Promise<void> => {
      await button(`${kind} in`).click();
      await page.getByRole('heading', { name: /How much/ }).waitFor();
      await type(typed);
      await button(/^Put in/).click();
    },

    /** Types a melt temperature and takes it. */
    read: async (typed: string): Promise<void> => {
      await button('Type a reading').click();
      await page.getByRole('heading', { name: /pyrometer/ }).waitFor();
      await type(typed);
      await button(new RegExp(`^Take ${typed}`)).click();
    },

    /** Button, loss and look, then holds to close. */
    close: async (buttonMass: string, loss: string): Promise<void> => {
      await page.getByRole('group', { name: 'What the pad types' }).waitFor();
      await type(buttonMass);
      await page.keyboard.press('Enter');
      await type(loss);
      await page.getByRole('group', { name: 'Look of the casting' }).getByRole('button').first().click();
      await hold(button('Hold to close the card'));
    },

    /** Another person's tile and PIN on this terminal, and what then is pressed. */
    signAs: async (login: string, verb: string, typed = demoPerson(login).pin): Promise<void> => {
      const { name } = demoPerson(login);
      await button(new RegExp(name)).click();
      await page.getByRole('group', { name: `PIN of ${name}` }).waitFor();
      await type(typed);
      await button(verb).click();
    },

    /** Opens what is behind the name of whoever is signed in. */
    menu: async (): Promise<void> => {
      await button(/: figures, comfort, sign out/).click();
      await page.getByRole('dialog').first().waitFor();
    },

    /** The reason of the departure shown, in words where given. */
    giveReason: async (reason: string, words = ''): Promise<void> => {
      await page.getByRole('group', { name: 'Reason' }).getByRole('button', { name: reason }).click();
      if (words === '') return;
      await button(/Add words/).click();
      await page.getByRole('textbox').fill(words);
      await button('Keep the words').click();
    },

    heading: (name: RegExp): Locator => page.getByRole('heading', { level: 1, name }),
  };
};

/** A terminal being driven. */
export type TerminalDriver = ReturnType<typeof driveTerminal>;
