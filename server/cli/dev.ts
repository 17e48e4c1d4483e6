import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { readEnvironment } from '#server/environment.ts';
import { prepareDatabase } from '#server/services/prepare-database.ts';
import { sayOnStdout as say } from '#server/services/say.ts';
import { createStopper } from './start/stopper.ts';

const tsx = fileURLToPath(new URL('../../node_modules/tsx/dist/cli.mjs', import.meta.url));
const main = fileURLToPath(new URL('../main.ts', import.meta.url));

const stopper = createStopper(say);

/** Keeps the server running from its sources: tsx starts it anew at each change of its files. */
const watchServer = (databaseUrl: string): void => {
  const child = spawn(process.execPath, [tsx, 'watch', '--clear-screen=false', main, '--dev'], {
    env: { ...process.env, DATABASE_URL: databaseUrl },
    // In a group of its own it hears a Ctrl-C once, from us; tsx takes a second signal as leave to kill.
    detached: true,
    stdio: ['ignore', 'inherit', 'inherit'],
  });
  const gone = new Promise<void>((resolve) => child.once('exit', () => resolve()));
  stopper.onStop(async () => {
    child.kill('SIGTERM');
    await gone;
  });
  void gone.then(() => stopper.fail(new Error('The watching process has ended.')));
};

try {
  const environment = readEnvironment(process.env);
  const database = await stopper.step(() => prepareDatabase(environment, say));
  stopper.onStop(database.release);
  watchServer(database.url);
  stopper.started();
} catch (error) {
  await stopper.fail(error);
}
