import { describe, expect, it } from 'vitest';
import { noBurst, pressWedgeKey, type WedgeBurst } from './scanner-wedge.ts';

/** Types keys `gapMs` apart and gives the code the last of them ended, if any. */
const type = (keys: readonly string[], gapMs: number): string | null => {
  let burst: WedgeBurst = noBurst;
  let code: string | null = null;
  keys.forEach((key, index) => {
    const pressed = pressWedgeKey(burst, key, 10_000 + index * gapMs);
    burst = pressed.burst;
    code = pressed.code;
  });
  return code;
};

const flask = [...'F-0147-2'];

describe('pressWedgeKey', () => {
  it('takes fast keystrokes that end in Enter as a code', () => {
    expect(type([...flask, 'Enter'], 8)).toBe('F-0147-2');
  });

  it('bears the Shift keys a scanner sends for capitals', () => {
    expect(type(['Shift', 'F', '-', '0', '1', '4', '7', '-', '2', 'Enter'], 20)).toBe('F-0147-2');
  });

  it('leaves what a person types', () => {
    expect(type([...flask, 'Enter'], 180)).toBeNull();
  });

  it('begins anew after a pause, so that a stray key does not spoil a scan', () => {
    let { burst } = pressWedgeKey(noBurst, 'x', 1_000);
    for (const [index, key] of flask.entries()) ({ burst } = pressWedgeKey(burst, key, 5_000 + index * 10));
    expect(pressWedgeKey(burst, 'Enter', 5_085).code).toBe('F-0147-2');
  });

  it('does not take a lone Enter, nor one that comes late', () => {
    expect(type(['1', '2', 'Enter'], 5)).toBeNull();
    const burst = flask.reduce(
      (sum, key, index) => pressWedgeKey(sum, key, 1_000 + index * 5).burst,
      noBurst,
    );
    expect(pressWedgeKey(burst, 'Enter', 2_000).code).toBeNull();
  });
});
