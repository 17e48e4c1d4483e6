import { type ChildProcess, spawn } from 'node:child_process';

const LEAVE_WITHIN_MS = 10_000;

let current: ChildProcess | null = null;

const signalGroup = (child: ChildProcess, signal: NodeJS.Signals): void => {
  try {
    if (child.pid) process.kill(-child.pid, signal);
  } catch {
    // The group has ended already.
  }
};

/** Runs a Node program from the packages in a process group of its own, and gives its exit code (1 if killed). */
export const runNode = (args: readonly string[], env: NodeJS.ProcessEnv = {}): Promise<number> =>
  new Promise((resolve, reject) => {
    const child = spawn(process.execPath, args, {
      detached: true,
      stdio: ['ignore', 'inherit', 'inherit'],
      env: { ...process.env, ...env },
    });
    current = child;
    child.once('error', reject);
    child.once('exit', (code) => {
      // Whatever the program left in its group ends with it.
      signalGroup(child, 'SIGKILL');
      current = null;
      resolve(code ?? 1);
    });
  });

/** Ends the running child and everything it started, then this process, when a signal asks for it. */
export const endChildOnSignal = (farewell: () => void): void => {
  const end = (): void => {
    farewell();
    if (current === null) process.exit(130);
    const child = current;
    child.once('exit', () => process.exit(130));
    signalGroup(child, 'SIGTERM');
    setTimeout(() => signalGroup(child, 'SIGKILL'), LEAVE_WITHIN_MS).unref();
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.once(signal, end);
};
