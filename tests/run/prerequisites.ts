import { ensurePostgres } from '#server/services/postgres/postgres-binaries.ts';
import { installPackage, mayInstall } from '#server/services/process/install-package.ts';
import { sayOnStdout as say } from '#server/services/say.ts';
import { StartProblem } from '#server/services/start-problem.ts';
import { findChromium } from '#tests/support/chromium.ts';

/**
 * Finds Chromium or installs Debian's package when it may.
 * @throws {StartProblem} saying what to type when it is missing and may not be installed.
 */
const ensureChromium = async (): Promise<void> => {
  if (findChromium()) return;
  if (mayInstall()) say('Installing Chromium (about half a minute) ...');
  if ((await installPackage('chromium')) && findChromium()) return;
  throw new StartProblem(
    'Chromium is not installed. Type "sudo apt-get install chromium" and run the tests again.',
  );
};

/** Makes sure of the programs that the tests of these projects use. */
export const ensurePrerequisites = async (projects: readonly string[]): Promise<void> => {
  if (projects.includes('e2e')) await ensureChromium();
  if (['api', 'e2e', 'faults'].some((project) => projects.includes(project))) await ensurePostgres(say);
};
