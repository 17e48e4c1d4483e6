import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';

const START = fileURLToPath(new URL('../../server/cli/start.mjs', import.meta.url));

/** A server started as `npm start` does it, in a process of its own. */
export interface StartedServer {
  readonly pid: number;
  /** Everything it has said so far. */
  readonly said: () => string;
  /** Resolves with its origin when it says that it is ready; rejects with what it said if it ends before. */
  readonly ready: Promise<string>;
  /** Resolves with its exit code, or with the signal that killed it. */
  readonly ended: Promise<number | NodeJS.Signals | null>;
  readonly signal: (name: NodeJS.Signals) => void;
}

/** Starts the product on a free port; `settings` are its only settings, DATA_DIR among them. */
export const startServerProcess = (settings: Readonly<Record<string, string>>): StartedServer => {
  const { PATH = '', HOME = '/' } = process.env;
  const child = spawn(process.execPath, [START], {
    env: { PATH, HOME, PORT: '0', ...settings },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let text = '';
  const ended = new Promise<number | NodeJS.Signals | null>((resolve) =>
    child.once('close', (code, signal) => resolve(code ?? signal)),
  );
  const ready = new Promise<string>((resolve, reject) => {
    const hear = (chunk: Buffer): void => {
      text += chunk.toString();
      const origin = /^ {2}desk +(http:\S+)\/$/m.exec(text)?.[1];
      if (origin && text.includes('Stop with Ctrl-C')) resolve(origin);
    };
    child.stdout.on('data', hear);
    child.stderr.on('data', hear);
    void ended.then(() => reject(new Error(`The server ended:\n${text}`)));
  });
  // A test that expects the end does not look at `ready`.
  ready.catch(() => {});
  return {
    pid: child.pid ?? 0,
    said: () => text,
    ready,
    ended,
    signal: (name) => void child.kill(name),
  };
};
