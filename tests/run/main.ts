import { availableParallelism } from 'node:os';
import { join } from 'node:path';
import { sayOnStdout as say } from '#server/services/say.ts';
import { makeScratchFolder } from '#tests/support/scratch-folder.ts';
import { type Choice, PROJECTS, readChoice } from './choice.ts';
import { endChildOnSignal, runNode } from './child.ts';
import { ensurePrerequisites } from './prerequisites.ts';
import { readVitestReport, type VitestReport } from './vitest-report.ts';

interface Step {
  readonly name: string;
  readonly seconds: number;
  readonly passed: number;
  readonly failed: number;
}

const COMMANDS: Readonly<Record<string, readonly string[]>> = {
  types: ['node_modules/typescript/bin/tsc', '--noEmit'],
  lint: ['node_modules/eslint/bin/eslint.js', '.'],
  format: ['node_modules/prettier/bin/prettier.cjs', '--check', '--log-level=warn', '.'],
};

/** Goes with everything in it when this process does, even when it is killed. */
const scratch = makeScratchFolder();

/** What runs under test keeps its hands off the real data, and is known to the sweeper by this setting. */
const settings = { DATA_DIR: join(scratch.path, 'data') };

const timed = async <T>(work: () => Promise<T>): Promise<[T, number]> => {
  const from = performance.now();
  return [await work(), (performance.now() - from) / 1000];
};

const runStaticCheck = async (name: string): Promise<Step> => {
  say(`\n== ${name}`);
  const [code, seconds] = await timed(() => runNode(COMMANDS[name] ?? []));
  return { name, seconds, passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1 };
};

/** Two at least, for browser tests wait more than they work; four at most, for each holds a database pool. */
const workers = (): number => Math.max(2, Math.min(4, availableParallelism()));

const runVitest = async ({ projects, paths }: Choice): Promise<[Step, VitestReport]> => {
  say('\n== tests');
  const output = join(scratch.path, 'report.json');
  const args = ['run', `--maxWorkers=${workers()}`, '--reporter=default', '--reporter=json'];
  const chosen = projects.map((project) => `--project=${project}`);
  const command = [
    'node_modules/vitest/vitest.mjs',
    ...args,
    `--outputFile.json=${output}`,
    ...chosen,
    ...paths,
  ];
  const [code, seconds] = await timed(() => runNode(command, settings));
  const report = readVitestReport(output, code);
  return [{ name: 'tests', seconds, passed: report.passed, failed: report.failed }, report];
};

const printReport = (steps: readonly Step[], report: VitestReport | null): void => {
  say('\nSteps');
  for (const { name, seconds, passed, failed } of steps) {
    say(`  ${name.padEnd(8)} ${seconds.toFixed(1).padStart(7)} s  ${passed} passed, ${failed} failed`);
  }
  if (report === null) return;
  if (report.notRun > 0) say(`\n${report.notRun} tests were not run.`);
  say('\nSlowest tests');
  for (const { name, durationMs } of report.slowest) {
    say(`  ${(durationMs / 1000).toFixed(2).padStart(7)} s  ${name}`);
  }
};

const sum = (steps: readonly Step[], part: 'passed' | 'failed'): number =>
  steps.reduce((total, step) => total + step[part], 0);

/** The very last line, whatever happened before. */
const finish = async (passed: number, failed: number): Promise<never> => {
  await scratch.sweep();
  say(`\n${passed} passed, ${failed} failed`);
  process.exit(failed > 0 || passed === 0 ? 1 : 0);
};

const runChecks = async (args: readonly string[]): Promise<never> => {
  const choice = readChoice(args);
  if (choice.projects.length > 0) await ensurePrerequisites(choice.projects);
  const steps: Step[] = [];
  for (const name of choice.staticChecks) steps.push(await runStaticCheck(name));
  let report: VitestReport | null = null;
  if (choice.projects.length > 0) {
    const [step, found] = await runVitest(choice);
    steps.push(step);
    report = found;
  }
  printReport(steps, report);
  return finish(sum(steps, 'passed'), sum(steps, 'failed'));
};

const runScript = async (path: string, args: readonly string[]): Promise<never> => {
  await ensurePrerequisites(PROJECTS);
  const code = await runNode(['--import', 'tsx', path, ...args], settings);
  await scratch.sweep();
  return process.exit(code);
};

const [first = '', ...rest] = process.argv.slice(2);

endChildOnSignal(() => say('\nInterrupted; ending what was started ...'));

try {
  if (first === '--screens') await runScript('tests/screens/run.ts', rest);
  else if (first === '--bench') await runScript('tests/bench/run.ts', rest);
  else await runChecks(process.argv.slice(2));
} catch (error) {
  say(error instanceof Error ? error.message : String(error));
  await finish(0, 1);
}
