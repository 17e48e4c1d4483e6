import { runStudy, type StudyAnswer, type StudyInput, type StudyName } from './alloy-study.ts';
import type { StudyQuestion } from './alloy-study-worker.ts';

interface Waiting {
  readonly resolve: (answer: unknown) => void;
  readonly reject: (error: Error) => void;
}

const waiting = new Map<number, Waiting>();
let worker: Worker | null = null;
let asked = 0;

const failAll = (): void => {
  for (const { reject } of waiting.values())
    reject(new Error('The computation stopped. Load the page again.'));
  waiting.clear();
  worker?.terminate();
  worker = null;
};

const startWorker = (): Worker => {
  const started = new Worker(new URL('./alloy-study-worker.ts', import.meta.url), { type: 'module' });
  started.onmessage = ({ data }: MessageEvent<{ readonly id: number; readonly answer: unknown }>) => {
    waiting.get(data.id)?.resolve(data.answer);
    waiting.delete(data.id);
  };
  started.onerror = failAll;
  return started;
};

const askWorker = (question: Omit<StudyQuestion, 'id'>): Promise<unknown> =>
  new Promise((resolve, reject) => {
    worker ??= startWorker();
    asked += 1;
    waiting.set(asked, { resolve, reject });
    worker.postMessage({ ...question, id: asked });
  });

/** Runs a study off the page's thread, so that typing and dragging go on; on the page's own where there are no workers. */
export const askStudy = async <Name extends StudyName>(
  name: Name,
  input: StudyInput<Name>,
): Promise<StudyAnswer<Name>> =>
  typeof Worker === 'undefined'
    ? runStudy(name, input)
    : ((await askWorker({ name, input })) as StudyAnswer<Name>);
