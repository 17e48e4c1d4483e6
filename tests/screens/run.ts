import { rm } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { ensureClients } from '#server/services/clients-build.ts';
import { launchChromium } from '#tests/support/chromium.ts';
import { serveStudio } from '#tests/support/served-studio.ts';
import { cloneTemplate } from '#tests/support/template-database.ts';
import { startTestCluster } from '#tests/support/test-cluster.ts';
import { captureInto } from './capture.ts';
import { captureDesk } from './desk-screens.ts';
import { captureTerminal } from './terminal-screens.ts';

const root = fileURLToPath(new URL('../..', import.meta.url));
const folder = fileURLToPath(new URL('../../screens', import.meta.url));
const say = (line: string): void => console.log(line);

await rm(folder, { recursive: true, force: true });
await ensureClients(root, say);
const cluster = await startTestCluster(say);
const database = await cloneTemplate(cluster.url);
const studio = await serveStudio(database);
const browser = await launchChromium();
try {
  const capture = captureInto(folder, say);
  await captureDesk(browser, studio, capture);
  await captureTerminal(browser, studio, capture);
  say(`All pictures are in ${folder}.`);
} finally {
  await browser.close();
  await studio.close();
  await database.drop();
  await cluster.stop();
}
