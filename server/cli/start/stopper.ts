import type { Say } from '#server/services/say.ts';
import { StartProblem } from '#server/services/start-problem.ts';

/** Ends the program in good order, whatever asks for it. */
export interface Stopper {
  /** Aborted at the first signal; a long step may end early on it. */
  readonly signal: AbortSignal;
  /** Registers what to undo at the end; the last registered is undone first. */
  readonly onStop: (task: () => Promise<void>) => void;
  /** Runs one step of the start; throws before or after it, for `fail` to take, when a stop was asked for. */
  readonly step: <T>(work: () => Promise<T>) => Promise<T>;
  /** Says that the start is over: from now on a signal ends the program at once. */
  readonly started: () => void;
  /** Says what went wrong, undoes everything and exits. */
  readonly fail: (error: unknown) => Promise<never>;
}

/** npm passes a terminal's Ctrl-C on to us a second time; a person's own second press comes later than this. */
const ECHO_MS = 1_000;

const FORCED = 130;

const describe = (error: unknown): string => {
  if (error instanceof StartProblem) return error.message;
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
};

class Stopped extends Error {}

/** Listens for SIGINT, SIGTERM and SIGHUP; the first stops in good order, a second one a second later at once. */
export const createStopper = (say: Say): Stopper => {
  const abort = new AbortController();
  const tasks: (() => Promise<void>)[] = [];
  let askedAt = 0;
  let isStarting = true;
  let ending: Promise<never> | null = null;

  const undoAll = async (): Promise<void> => {
    for (const task of tasks.reverse()) {
      await task().catch((error: unknown) => say(describe(error)));
    }
  };

  const end = (code: number): Promise<never> => (ending ??= undoAll().then(() => process.exit(code)));

  const ask = (): void => {
    if (abort.signal.aborted) {
      if (Date.now() - askedAt > ECHO_MS) process.exit(FORCED);
      return;
    }
    askedAt = Date.now();
    abort.abort();
    say(isStarting ? 'Stopping after this step ...' : 'Stopping ...');
    if (!isStarting) void end(0);
  };

  const goOn = (): void => {
    if (abort.signal.aborted) throw new Stopped();
  };

  const fail = (error: unknown): Promise<never> => {
    if (abort.signal.aborted || error instanceof Stopped) return end(0);
    say(describe(error));
    return end(error instanceof StartProblem ? error.exitCode : 1);
  };

  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, ask);
  process.on('uncaughtException', (error) => void fail(error));

  return {
    signal: abort.signal,
    onStop: (task) => void tasks.push(task),
    step: async (work) => {
      goOn();
      const result = await work();
      goOn();
      return result;
    },
    started: () => {
      isStarting = false;
    },
    fail,
  };
};
