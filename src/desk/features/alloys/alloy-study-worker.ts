import { runStudy, type StudyInput, type StudyName } from './alloy-study.ts';

/** One question to the worker; the answer carries the same `id`. */
export interface StudyQuestion {
  readonly id: number;
  readonly name: StudyName;
  readonly input: StudyInput<StudyName>;
}

self.onmessage = ({ data: { id, name, input } }: MessageEvent<StudyQuestion>): void => {
  self.postMessage({ id, answer: runStudy(name, input) });
};
