import { spawn } from 'node:child_process';
import { findProgram } from './find-program.ts';

const aptGet = (): string | null => (process.getuid?.() === 0 ? findProgram(['apt-get']) : null);

/** Runs apt-get and gives null when it worked, or all that it said. */
const runApt = (apt: string, args: readonly string[]): Promise<string | null> =>
  new Promise((resolve) => {
    const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    const child = spawn(apt, ['-qq', '-y', ...args], { env, stdio: ['ignore', 'pipe', 'pipe'] });
    const words: Buffer[] = [];
    child.stdout.on('data', (chunk: Buffer) => words.push(chunk));
    child.stderr.on('data', (chunk: Buffer) => words.push(chunk));
    child.once('error', (error) => resolve(error.message));
    child.once('exit', (code) => resolve(code === 0 ? null : Buffer.concat(words).toString()));
  });

/** Tells whether this user may install Debian's packages here. */
export const mayInstall = (): boolean => aptGet() !== null;

/** Installs a Debian package; false, with apt-get's own words on standard error, when it cannot. */
export const installPackage = async (name: string): Promise<boolean> => {
  const apt = aptGet();
  if (apt === null) return false;
  const install = ['install', '--no-install-recommends', name];
  if ((await runApt(apt, install)) === null) return true;
  // The lists of packages may be old, or absent as in a bare container.
  const refusal = (await runApt(apt, ['update'])) ?? (await runApt(apt, install));
  if (refusal !== null) process.stderr.write(refusal);
  return refusal === null;
};
