import type { ServedStudio } from './served-studio.ts';
import type { TerminalDriver } from './terminal-driver.ts';

/** Takes a card whose melt is ready to its end: poured, quenched in time, 9.1 g of button, 0.2 g lost. */
export const pourOut = async (terminal: TerminalDriver, studio: ServedStudio): Promise<void> => {
  const { page } = terminal;
  await terminal.hold(/Ready\. Hold/);
  await terminal.readOn();
  await terminal.hold('Flask is out. Hold');
  await terminal.heading(/Pour now/).waitFor();
  await terminal.hold(/^Poured/);
  await page.getByText(/Wait until/).waitFor();
  studio.advance(21 * 60);
  await page.reload();
  await terminal.hold('Quenched. Hold');
  await terminal.close('9.1', '0.2');
  await terminal.heading(/Done\. It is melt M-/).waitFor();
};
