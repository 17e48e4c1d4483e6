import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { readVitestReport, type VitestReport } from './vitest-report.ts';

const folder = mkdtempSync(join(tmpdir(), 'ladlemark-report-'));
afterAll(() => rmSync(folder, { recursive: true }));

type Assertion = readonly [status: string, duration: number];

const file = (status: string, assertions: readonly Assertion[]) => ({
  name: resolve('tests/api/a.test.ts'),
  status,
  assertionResults: assertions.map(([of, duration], index) => ({
    status: of,
    fullName: `test ${index}`,
    duration,
  })),
});

const read = (files: readonly unknown[], exitCode: number): VitestReport => {
  const path = join(folder, 'report.json');
  writeFileSync(path, JSON.stringify({ testResults: files }));
  return readVitestReport(path, exitCode);
};

describe('readVitestReport', () => {
  it('counts what passed, failed and did not run, and names the slowest first', () => {
    const report = read(
      [
        file('failed', [
          ['passed', 5],
          ['failed', 90],
          ['skipped', 0],
        ]),
      ],
      1,
    );
    expect(report).toMatchObject({ passed: 1, failed: 1, notRun: 1 });
    expect(report.slowest[0]).toEqual({ name: 'tests/api/a.test.ts: test 1', durationMs: 90 });
  });

  it('counts a file that could not be loaded, or whose set-up failed, as a failure', () => {
    expect(read([file('failed', []), file('passed', [['passed', 1]])], 1)).toMatchObject({
      passed: 1,
      failed: 1,
    });
    expect(read([file('failed', [['passed', 1]])], 1)).toMatchObject({ passed: 1, failed: 1 });
  });

  it('counts an error outside every test as a failure', () => {
    expect(read([file('passed', [['passed', 1]])], 1)).toMatchObject({ passed: 1, failed: 1 });
  });

  it('takes a run in which nothing passed for a failure', () => {
    expect(read([], 0).failed).toBe(1);
    expect(read([file('passed', [['skipped', 0]])], 0).failed).toBe(1);
  });

  it('takes a missing report for a failure', () => {
    expect(readVitestReport(join(folder, 'missing.json'), 0)).toMatchObject({ passed: 0, failed: 1 });
  });

  it('finds no fault with a good run', () => {
    expect(read([file('passed', [['passed', 1]])], 0)).toMatchObject({ passed: 1, failed: 0 });
  });
});
