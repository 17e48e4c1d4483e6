import { fileURLToPath } from 'node:url';
import { ensureClients } from '#server/services/clients-build.ts';
import { sayOnStdout } from '#server/services/say.ts';

const root = fileURLToPath(new URL('../..', import.meta.url));

/** Builds the desk and the terminal before the first test that opens a page, when their sources have changed. */
export const setup = async (): Promise<void> => {
  await ensureClients(root, sayOnStdout);
};
