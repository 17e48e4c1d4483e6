import { existsSync, readFileSync } from 'node:fs';
import { relative } from 'node:path';
import { z } from 'zod';

const reportShape = z.object({
  testResults: z.array(
    z.object({
      name: z.string(),
      status: z.string(),
      assertionResults: z.array(
        z.object({ status: z.string(), fullName: z.string(), duration: z.number().nullish() }),
      ),
    }),
  ),
});

/** One test's name and how long it took, in milliseconds. */
export interface TimedTest {
  readonly name: string;
  readonly durationMs: number;
}

/** What vitest found; a file that could not be loaded counts as one failure. */
export interface VitestReport {
  readonly passed: number;
  readonly failed: number;
  readonly notRun: number;
  /** The ten slowest, slowest first. */
  readonly slowest: readonly TimedTest[];
}

const NOTHING: VitestReport = { passed: 0, failed: 0, notRun: 0, slowest: [] };

/** Reads vitest's JSON report; a missing one, or an exit code that no failed test explains, is a failure. */
export const readVitestReport = (path: string, exitCode: number): VitestReport => {
  if (!existsSync(path)) return { ...NOTHING, failed: 1 };
  const { testResults } = reportShape.parse(JSON.parse(readFileSync(path, 'utf8')));
  const tests = testResults.flatMap(({ name, assertionResults }) =>
    assertionResults.map((test) => ({ ...test, file: relative(process.cwd(), name) })),
  );
  const count = (status: string): number => tests.filter((test) => test.status === status).length;
  const [passed, failedTests] = [count('passed'), count('failed')];
  const brokenFiles = testResults.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
  ).length;
  const found = failedTests + brokenFiles;
  const slowest = tests
    .map(({ file, fullName, duration }) => ({ name: `${file}: ${fullName}`, durationMs: duration ?? 0 }))
    .sort((a, b) => b.durationMs - a.durationMs)
    .slice(0, 10);
  return {
    passed,
    failed: found === 0 && (exitCode !== 0 || passed === 0) ? 1 : found,
    notRun: tests.length - passed - failedTests,
    slowest,
  };
};
