import type { Page } from 'playwright-core';
import { driveMetal } from '#tests/support/metal-driver.ts';
import type { ServedStudio } from '#tests/support/served-studio.ts';
import { sizes, type Capture } from './capture.ts';

const sheetRow = (index: number): string => {
  const mass = index % 100 === 50 ? 'some' : '10,5';
  return `Sterling, bag ${index};grain;${mass};g;R-${index};cupboard;2026-11-30;;92,65;7,35;0,08`;
};

/** A thousand rows with ten faults, as a supplier might send them. */
const sheet = [
  'name;kind;mass;unit;reference;place;received;Au;Ag;Cu;Ag ±',
  ...Array.from({ length: 1000 }, (_, index) => sheetRow(index)),
].join('\n');

const acts = ['count', 'assay', 'move', 'quarantine', 'dispatch'] as const;

/** The metal's screens, for someone who is signed in as the owner. */
export const captureMetal = async (page: Page, studio: ServedStudio, capture: Capture): Promise<void> => {
  const metal = driveMetal(page, studio.origin);
  const { models } = studio.services;
  const lot = await models.Lot.findOne({ where: { name: 'Sterling, casting grain' }, rejectOnEmpty: true });
  const take = (name: string): Promise<void> => capture(page, name, sizes.desk, { wholePage: true });
  const shoot = async (path: string, name: string): Promise<void> => {
    await metal.go(path);
    await page.waitForLoadState('networkidle');
    await take(name);
  };
  await shoot('/metal', '45-metal');
  await shoot('/metal?kind=returns&metal=Au', '46-metal-gold-returns');
  await shoot(`/metal/lots/${lot.id}`, '47-lot');
  for (const act of acts) await shoot(`/metal/lots/${lot.id}?act=${act}`, `48-lot-${act}`);
  await shoot('/metal/receive', '49-receive');
  await page.getByRole('button', { name: 'Take it in' }).click();
  await page.getByText('Name the lot.').waitFor();
  await take('50-receive-faults');
  await shoot('/metal/intake', '51-intake');
  await metal.lookThrough(sheet);
  await take('52-intake-faults');
  await shoot('/metal/plan', '53-plan');
  await metal.planCharge([150]);
  await take('54-planned');
  await page.getByRole('button', { name: 'Change it by hand' }).click();
  await page.getByText('It holds every limit.').waitFor();
  await take('55-plan-by-hand');
  await metal.go('/metal/pot');
  await page.getByLabel('Fill in from').selectOption({ label: '14 ct yellow 585' });
  await page.getByLabel('Mass in the pot').fill('20');
  await page.getByLabel('It is to become').selectOption({ label: '18 ct yellow 750' });
  await page.getByRole('button', { name: 'Work out what to add' }).click();
  await page.getByRole('heading', { name: /^To make it/ }).waitFor({ timeout: 60_000 });
  await take('56-pot');
  await shoot('/metal/month', '57-month');
  await shoot(`/print/lots/${lot.id}`, '58-print-lot-label');
};
