import { spawn } from 'node:child_process';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { withFileLock } from '../../services/process/file-lock.mjs';

const readText = (path) => readFile(path, 'utf8').catch(() => null);

const parse = (text) => {
  try {
    return JSON.parse(text ?? '').packages ?? null;
  } catch {
    return null;
  }
};

/** Compares the lock file with npm's own record of what it put into node_modules. */
const isAsLocked = (lock, installed) =>
  installed !== null &&
  Object.entries(lock).every(([path, entry]) => {
    if (path === '') return true;
    const found = installed[path];
    return found ? found.version === entry.version && found.integrity === entry.integrity : entry.optional;
  });

const isFresh = async (root, lockText) => {
  const installed = parse(await readText(join(root, 'node_modules', '.package-lock.json')));
  return isAsLocked(parse(lockText) ?? {}, installed);
};

const npmCommand = () => {
  const cli = process.env.npm_execpath;
  return cli && /npm-cli\.[cm]?js$/.test(cli) ? [process.execPath, [cli]] : ['npm', []];
};

const install = (root) =>
  new Promise((resolve, reject) => {
    const [command, first] = npmCommand();
    const options = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
    const child = spawn(command, [...first, ...options], {
      cwd: root,
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    child.once('error', (error) => reject(new Error(`npm could not be run: ${error.message}.`)));
    child.once('exit', (code) =>
      code === 0 ? resolve() : reject(new Error('The packages could not be installed; npm says why above.')),
    );
  });

/** Installs the packages of package-lock.json when node_modules does not hold exactly those. */
export async function ensurePackages(root, say) {
  const lockText = await readFile(join(root, 'package-lock.json'), 'utf8');
  if (await isFresh(root, lockText)) return;
  const lock = join(root, 'data', 'locks', 'packages.lock');
  await withFileLock(
    lock,
    async () => {
      if (await isFresh(root, lockText)) return;
      say('Installing the packages (about half a minute) ...');
      await install(root);
    },
    () => say('Waiting for another start to install the packages ...'),
  );
}
