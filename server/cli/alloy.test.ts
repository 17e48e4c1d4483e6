import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const ROOT = fileURLToPath(new URL('../../', import.meta.url));

const alloy = (...words: readonly string[]) => {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ['--import', 'tsx', 'server/cli/alloy.ts', ...words],
    {
      cwd: ROOT,
      encoding: 'utf8',
    },
  );
  return { status, stderr, json: (stdout ? JSON.parse(stdout) : null) as Record<string, unknown> | null };
};

describe('the alloy command', { timeout: 30_000 }, () => {
  it('prints a melting range', () => {
    const { status, json } = alloy('range', 'Ag 92.5 Cu 7.5');
    expect(status).toBe(0);
    expect(json).toMatchObject({ withinModel: true, reason: null });
    expect(Object.keys(json ?? {})).toEqual(
      expect.arrayContaining(['liquidusC', 'solidusC', 'asCastSolidusC']),
    );
  });

  it('prints a state and a path', () => {
    const state = alloy('state', 'Ag 92.5 Cu 7.5', '850').json;
    expect(Object.keys(state ?? {})).toEqual(
      expect.arrayContaining(['phases', 'solidMassFraction', 'degreesOfFreedom']),
    );
    const path = alloy('path', 'Ag 92.5 Cu 7.5', '--rule', 'scheil', '--step', '5').json;
    expect(path?.['points']).toContainEqual(expect.objectContaining({ temperatureC: 850 }));
  });

  it.each([
    [['range', 'Ag 92.5 Cu 7'], /adds up to 99.5 wt%/],
    [['range', 'Ag ninety'], /must be a number/],
    [['range', 'Ag'], /pairs of element/],
    [['state', 'Ag 92.5 Cu 7.5', 'hot'], /temperature must be a number/],
    [['path', 'Ag 92.5 Cu 7.5', '--rule', 'fast'], /lever or scheil/],
  ])('says in one sentence what is wrong with %j and exits 2', (words, sentence) => {
    const { status, stderr, json } = alloy(...words);
    expect(status).toBe(2);
    expect(json).toBeNull();
    expect(stderr.trim()).toMatch(sentence);
    expect(stderr.trim().split('\n')).toHaveLength(1);
  });

  it('answers that an alloy lies outside the model', () => {
    const { status, json } = alloy('range', 'Au 75 Pd 25');
    expect(status).toBe(0);
    expect(json).toMatchObject({ withinModel: false });
    expect(json?.['reason']).toMatch(/Pd 25 wt%/);
  });
});
