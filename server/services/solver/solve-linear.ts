import { Worker } from 'node:worker_threads';

/** A solved programme: the value and the reduced cost of each variable, and the cost of it all. */
export interface LinearSolution {
  readonly values: Readonly<Record<string, number>>;
  readonly reducedCosts: Readonly<Record<string, number>>;
  readonly cost: number;
}

/** How long one programme may take, s, and how near to the best it must come, as a share of the cost. */
export interface SolveOptions {
  readonly timeLimitS?: number;
  readonly gap?: number;
}

interface Answer {
  readonly id: number;
  readonly status: string;
  readonly columns: Readonly<Record<string, { readonly Primal?: number; readonly Dual?: number }>>;
  readonly cost: number;
}

interface Waiting {
  readonly resolve: (answer: Answer) => void;
  readonly reject: (error: Error) => void;
}

let worker: Worker | null = null;
let asked = 0;
const waiting = new Map<number, Waiting>();

/** A worker that fell ill is dropped with all it was asked; the next question starts another. */
const drop = (error: Error): void => {
  worker = null;
  for (const { reject } of waiting.values()) reject(error);
  waiting.clear();
};

const startWorker = (): Worker => {
  const started = new Worker(new URL('./solver-worker.mjs', import.meta.url));
  started.on('message', (answer: Answer) => {
    waiting.get(answer.id)?.resolve(answer);
    waiting.delete(answer.id);
    // Only unanswered questions keep the process alive.
    if (waiting.size === 0) started.unref();
  });
  started.on('error', drop);
  started.on('exit', () => drop(new Error('The solver ended.')));
  return started;
};

const ask = (programme: string, options: object): Promise<Answer> =>
  new Promise((resolve, reject) => {
    worker ??= startWorker();
    worker.ref();
    asked += 1;
    waiting.set(asked, { resolve, reject });
    worker.postMessage({ id: asked, programme, options });
  });

const pick = (
  columns: Answer['columns'],
  of: (column: { readonly Primal?: number; readonly Dual?: number }) => number | undefined,
): Readonly<Record<string, number>> =>
  Object.fromEntries(Object.entries(columns).map(([name, column]) => [name, of(column) ?? 0]));

/** Solves a programme in the CPLEX LP format with HiGHS, in a thread of its own; null when nothing satisfies it. */
export const solveLinear = async (
  programme: string,
  { timeLimitS = 5, gap = 1e-4 }: SolveOptions = {},
): Promise<LinearSolution | null> => {
  const options = { time_limit: timeLimitS, mip_rel_gap: gap, output_flag: false };
  const { status, columns, cost } = await ask(programme, options);
  const isSolved = status === 'Optimal' || (status === 'Time limit reached' && Number.isFinite(cost));
  if (!isSolved) return null;
  const values = pick(columns, ({ Primal }) => Primal);
  return { values, reducedCosts: pick(columns, ({ Dual }) => Dual), cost };
};
