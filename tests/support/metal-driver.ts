import type { Download, Page } from 'playwright-core';

/** A lot as a person types it at the desk; masses and parts as text, decimal commas too. */
export interface TypedLot {
  readonly name: string;
  /** As the list of kinds writes it: `Casting grain`. */
  readonly kind: string;
  readonly parts: readonly (readonly [symbol: string, wt: string, tolerance: string])[];
  readonly mass: string;
  readonly supplier?: string;
  readonly reference?: string;
  readonly place?: string;
}

/** A file as a browser chooses it. */
export interface ChosenFile {
  readonly name: string;
  readonly mimeType: string;
  readonly buffer: Buffer;
}

/** A machine under load takes its time over a plan. */
const planMs = 60_000;

/** Reads a figure with its unit off a screen, in thousandths: `120.000 g` is 120000. */
export const thousandthsOf = (text: string): number => {
  const [figure] = /[\u2212-]?[\d.]+/.exec(text) ?? [];
  if (figure === undefined) throw new Error(`There is no figure in “${text}”.`);
  return Math.round(Number(figure.replace('\u2212', '-')) * 1000);
};

/** Drives the metal's pages at the desk as an owner would; someone must be signed in. */
export const driveMetal = (page: Page, origin: string) => {
  const go = async (path: string): Promise<void> => {
    await page.goto(`${origin}${path}`);
    await page.getByRole('heading', { level: 1 }).waitFor();
  };
  const typePart = async (row: number, [symbol, wt, tolerance]: TypedLot['parts'][number]): Promise<void> => {
    if ((await page.getByLabel(`Element ${row}`, { exact: true }).count()) === 0)
      await page.getByRole('button', { name: 'Add an element' }).click();
    await page.getByLabel(`Element ${row}`, { exact: true }).fill(symbol);
    await page.getByLabel(`Part of element ${row}, wt%`).fill(wt);
    await page.getByLabel(`Tolerance of element ${row}, wt%`).fill(tolerance);
  };
  return {
    page,
    go,

    /** Takes one lot in by its form and gives its code, from the page of the lot it leads to. */
    receive: async ({ name, kind, parts, mass, ...words }: TypedLot): Promise<string> => {
      await go('/metal/receive');
      await page.getByLabel('Name', { exact: true }).fill(name);
      await page.getByLabel('Kind').selectOption({ label: kind });
      for (const [index, part] of parts.entries()) await typePart(index + 1, part);
      await page.getByLabel('Mass', { exact: true }).fill(mass);
      await page.getByLabel('Supplier', { exact: true }).fill(words.supplier ?? '');
      await page.getByLabel('Supplier’s reference').fill(words.reference ?? '');
      await page.getByLabel('Place', { exact: true }).fill(words.place ?? '');
      await page.getByRole('button', { name: 'Take it in' }).click();
      const heading = page.getByRole('heading', { level: 1, name });
      await heading.waitFor();
      return (await heading.innerText()).split(' ')[0] ?? '';
    },

    /** Chooses a sheet and waits until it was looked through; gives the sentence that counts its rows. */
    lookThrough: async (text: string): Promise<string> => {
      await go('/metal/intake');
      await page
        .getByLabel(/Choose a sheet/)
        .setInputFiles({ name: 'lots.csv', mimeType: 'text/csv', buffer: Buffer.from(text) });
      const sentence = page.getByText(/^\d+ rows?[:,]/);
      await sentence.waitFor();
      return sentence.innerText();
    },

    /** Takes the rows of the sheet that are good; says so first where others stay out. Gives what came of it. */
    takeGoodRows: async (): Promise<string> => {
      const only = page.getByRole('checkbox', { name: /^Take the .* only/ });
      if ((await only.count()) > 0) await only.check();
      await page.getByRole('button', { name: /^Take \d+ lots? in$/ }).click();
      const result = page.getByText(/^\d+ lots? (is|are) taken in/);
      await result.waitFor();
      return result.innerText();
    },

    /** Opens a lot's page from the list, by its code. */
    openLot: async (code: string): Promise<void> => {
      await go('/metal');
      await page
        .getByRole('link', { name: code.slice(0, -2) })
        .first()
        .click();
      await page.getByRole('heading', { level: 1, name: code }).waitFor();
    },

    /** Offers a file as a document of the lot that is open; gives the refusal, or an empty text when it was kept. */
    addDocument: async (file: ChosenFile): Promise<string> => {
      const field = page.getByLabel('Add a document');
      await field.setInputFiles(file);
      const kept = page.getByRole('link', { name: file.name });
      const fault = page.getByRole('alert').filter({ hasText: /\S/ });
      await kept.or(fault).first().waitFor();
      return (await kept.count()) > 0 ? '' : fault.first().innerText();
    },

    /** Plans a charge for castings by their flasks' numbers, and leaves the plan on the screen. */
    planCharge: async (flasks: readonly number[]): Promise<void> => {
      await go('/metal/plan');
      for (const flask of flasks)
        await page
          .getByRole('checkbox', { name: new RegExp(`^F-${String(flask).padStart(4, '0')}\\b`) })
          .check();
      await page.getByRole('button', { name: 'Plan the charge' }).click();
      await page.getByRole('button', { name: 'Keep this plan' }).waitFor({ timeout: planMs });
    },

    /** The lines of the plan on the screen: code of the lot, kind, and mass in g. */
    planLines: async (): Promise<readonly (readonly [code: string, kind: string, massG: number])[]> => {
      const rows = page.getByRole('region', { name: 'Lots of the charge' }).locator('tbody tr');
      return Promise.all(
        (await rows.all()).map(async (row) => {
          const cells = await row.locator('th, td').allInnerTexts();
          const [lot = '', kind = '', mass = ''] = cells;
          return [lot.split(' ')[0] ?? '', kind, thousandthsOf(mass) / 1000] as const;
        }),
      );
    },

    /** Keeps the plan on the screen. */
    keepPlan: async (): Promise<void> => {
      await page.getByRole('button', { name: /^Keep (this|the changed) plan$/ }).click();
      await page.getByText('The plan is kept.').waitFor();
    },

    /** Counts the lot that is open; a difference is explained and signed for. */
    count: async (
      mass: string,
      difference?: { readonly why: string; readonly login: string; readonly password: string },
    ): Promise<void> => {
      await page.getByRole('button', { name: 'Count it' }).click();
      const dialog = page.getByRole('dialog');
      await dialog.getByLabel('On the balance').fill(mass);
      if (difference) {
        await dialog.getByLabel('Why it differs').fill(difference.why);
        await dialog.getByLabel('Second person’s sign-in name').fill(difference.login);
        await dialog.getByLabel('Their password').fill(difference.password);
      }
      await dialog.getByRole('button', { name: 'Write the count down' }).click();
      await dialog.waitFor({ state: 'detached' });
    },

    /** Reads a line of the month's account as milligrams by metal; `account` is Lots or Crucibles. The studio weighs in g. */
    monthLine: async (
      account: 'Lots' | 'Crucibles',
      name: string,
    ): Promise<Readonly<Record<string, number>>> => {
      const table = page.getByRole('region', { name: account, exact: true });
      const metals = await table.locator('thead th').allInnerTexts();
      const row = table.getByRole('row').filter({ has: page.getByRole('rowheader', { name, exact: true }) });
      const figures = await row.locator('td').allInnerTexts();
      return Object.fromEntries(metals.map((metal, index) => [metal, thousandthsOf(figures[index] ?? '')]));
    },

    /** Opens the running month, and waits for its verdict: whether every line adds up to the milligram. */
    openMonth: async (): Promise<string> => {
      await go('/metal/month');
      const verdict = page.getByText(/add(s)? up/);
      await verdict.first().waitFor();
      return verdict.first().innerText();
    },

    /** Saves the month as a file. */
    download: async (kind: 'PDF' | 'CSV'): Promise<Download> => {
      const arrives = page.waitForEvent('download');
      await page.getByRole('link', { name: new RegExp(`^${kind}`) }).click();
      return arrives;
    },

    /** Says what became of the metal that a card left in its crucible. */
    closeOut: async (
      meltId: string,
      { button, loss, note }: { readonly button: string; readonly loss: string; readonly note: string },
    ): Promise<void> => {
      await go(`/metal/crucibles/${meltId}`);
      await page.getByLabel('Button', { exact: true }).fill(button);
      await page.getByLabel('Lost', { exact: true }).fill(loss);
      await page.getByLabel('What became of the melt').fill(note);
      await page.getByRole('button', { name: 'Close it out' }).click();
      await page.getByRole('heading', { level: 1, name: /^Melt M-/ }).waitFor();
    },
  };
};

/** The metal's pages being driven. */
export type MetalDriver = ReturnType<typeof driveMetal>;
