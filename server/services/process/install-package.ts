import { spawn } from 'node:child_process';
import { findProgram } from './find-program.ts';

const aptGet = (): string | null => (process.getuid?.() === 0 ? findProgram(['apt-get']) : null);

const runApt = (apt: string, args: readonly string[]): Promise<boolean> =>
  new Promise((resolve) => {
    const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    const child = spawn(apt, ['-qq', '-y', ...args], { env, stdio: ['ignore', 'ignore', 'inherit'] });
    child.once('error', () => resolve(false));
    child.once('exit', (code) => resolve(code === 0));
  });

/** Tells whether this user may install Debian's packages here. */
export const mayInstall = (): boolean => aptGet() !== null;

/** Installs a Debian package; false when this user may not, or when apt-get fails. */
export const installPackage = async (name: string): Promise<boolean> => {
  const apt = aptGet();
  if (apt === null) return false;
  const install = ['install', '--no-install-recommends', name];
  return (await runApt(apt, install)) || ((await runApt(apt, ['update'])) && (await runApt(apt, install)));
};
