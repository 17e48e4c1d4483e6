import type { Lot } from '#server/models/lot.ts';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import { cardAhead } from '#tests/support/card-ahead.ts';
import { driveCharge } from '#tests/support/charge-driver.ts';
import { demoLot, planChargeFor } from '#tests/support/plan-charge-for.ts';
import type { ServedStudio } from '#tests/support/served-studio.ts';
import type { TerminalDriver } from '#tests/support/terminal-driver.ts';

type Shoot = (name: string) => Promise<void>;

/** A lot of a plan, and how much of it. */
interface Line {
  readonly lot: Lot;
  readonly massG: number;
}

const hundredths = (grams: number): number => Math.round(grams * 100) / 100;

/** Keeps a plan for flask 147: returns, grain, and the rest of fine gold and master alloy. */
export const planCharge = async ({ services }: ServedStudio): Promise<readonly Line[]> => {
  const { models } = services;
  const flask = await models.Flask.findOne({ where: { code: buildFlaskCode(147) }, rejectOnEmpty: true });
  const casting = await models.Casting.findOne({
    where: { flaskId: flask.id, state: 'holding' },
    rejectOnEmpty: true,
  });
  const madeG = hundredths(casting.plannedMetalG - 54);
  const fineG = hundredths(madeG * 0.7507);
  const lines = [
    { lot: await demoLot(services, /18 ct yellow/, 'returns'), massG: 20 },
    { lot: await demoLot(services, /18 ct yellow/, 'grain'), massG: 34 },
    { lot: await demoLot(services, /Fine gold/, 'fine'), massG: fineG },
    { lot: await demoLot(services, /Master alloy/, 'master'), massG: hundredths(madeG - fineG) },
  ];
  await planChargeFor(services, casting.id, lines);
  return lines;
};

/** Metal of no lot: the charge, and a mass being typed. */
export const captureLooseCharge = async (
  terminal: TerminalDriver,
  studio: ServedStudio,
  shoot: Shoot,
): Promise<void> => {
  const { castingId } = await cardAhead(terminal.page, studio, 122, 'charge');
  await terminal.openCard(castingId);
  await terminal.button('Scan a lot').waitFor();
  await shoot('05a-charge-without-a-plan');
  await terminal.withoutLots();
  await shoot('05b-charge-without-lots');
  await terminal.button('Grain in').click();
  await terminal.type('12,15');
  await shoot('05c-mass-of-no-lot');
};

/** A planned charge, lot by lot, with one lot over-weighed and the rest corrected. */
export const captureCharge = async (
  terminal: TerminalDriver,
  shoot: Shoot,
  plan: readonly Line[],
): Promise<void> => {
  const charge = driveCharge(terminal);
  const { page, button, heading } = terminal;
  const [returns, grain, fine, master] = plan;
  if (!returns || !grain || !fine || !master) throw new Error('The plan has lost its lines.');
  await charge.asksFor(returns.lot.code);
  await shoot('08-charge');
  await button('Scan a lot').click();
  await heading(/Show me the label/).waitFor();
  await shoot('08a-find-lot');
  await terminal.scanWithWedge(buildFlaskCode(147));
  await heading(/names a flask/).waitFor();
  await shoot('08b-lot-refused');
  await button('Back').click();
  for (const { lot, massG } of [returns, grain]) {
    await charge.scanLot(lot.code);
    await charge.putIn(massG.toFixed(2));
  }
  await charge.asksFor(fine.lot.code);
  await charge.touchLot(fine.lot.code);
  await terminal.type((fine.massG + 0.6).toFixed(2));
  await shoot('09-weigh-lot');
  await button(/^Put in/).click();
  await heading(/more than is wanted/).waitFor();
  await shoot('09a-too-much');
  await button('Keep it, correct the rest').click();
  await page.getByText(/^Instead of/).waitFor();
  await shoot('09b-corrected');
  const corrected = await page.locator('h1 + p > span').first().innerText();
  await button('Take some out').click();
  await heading(/comes out/).waitFor();
  await shoot('09c-take-out');
  await button('Back').click();
  await charge.touchLot(master.lot.code);
  await charge.putIn(corrected.trim());
  await heading(/The whole charge is in/).waitFor();
  await shoot('09d-whole-charge');
  await charge.close();
};
