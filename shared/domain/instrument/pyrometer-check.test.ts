import { describe, expect, it } from 'vitest';
import { degreesOfFreedom, fixedPointData, fixedPoints } from './fixed-point.ts';
import { checkDue, correctReading, judgePlateau, largestOffsetC } from './pyrometer-check.ts';

const finding = (...[reading]: Parameters<typeof judgePlateau>) => {
  const judged = judgePlateau(reading);
  if (!judged.ok) throw new Error(judged.error);
  return judged.value;
};

describe('a fixed point', () => {
  it.each(fixedPoints)('leaves no freedom: %s', (point) => {
    expect(degreesOfFreedom(fixedPointData[point])).toBe(0);
    expect(fixedPointData[point].source).not.toBe('');
  });
});

describe('a check at a plateau', () => {
  it('gives what must be added to a reading', () => {
    expect(finding({ point: 'silver', readC: 957.5, wanderC: 0.5 })).toMatchObject({ offsetC: 4.3 });
    expect(finding({ point: 'gold', readC: 1066, wanderC: 0.5 }).offsetC).toBe(-1.8);
    expect(finding({ point: 'silver-copper', readC: 779.1, wanderC: 0 }).sentence).toMatch(/Reads true/);
  });

  it('says in words how well it is known, and that it fades with distance', () => {
    const { sentence, uncertaintyC } = finding({ point: 'silver', readC: 957.5, wanderC: 1 });
    // 2 √(1²/3 + 0.5²/3 + 0.5²)
    expect(uncertaintyC).toBe(1.6);
    expect(sentence).toMatch(/Reads 4\.3 °C low at 961\.78 °C, known to about ± 1\.6 °C: offset \+4\.3 °C/);
    expect(sentence).toMatch(/the less the check says/);
  });

  it('is less certain the more the plateau wandered, and refused when it is none', () => {
    const calm = finding({ point: 'silver', readC: 960, wanderC: 0.2 });
    const restless = finding({ point: 'silver', readC: 960, wanderC: 4 });
    expect(restless.uncertaintyC).toBeGreaterThan(2 * calm.uncertaintyC);
    expect(judgePlateau({ point: 'silver', readC: 960, wanderC: 6 })).toMatchObject({
      ok: false,
      error: expect.stringContaining('no plateau') as string,
    });
  });

  it('refuses an offset that is absurd, on either side', () => {
    for (const readC of [961.78 + largestOffsetC + 0.2, 961.78 - largestOffsetC - 0.2, 1064, 0, Number.NaN])
      expect(judgePlateau({ point: 'silver', readC, wanderC: 0.5 }).ok).toBe(false);
    expect(judgePlateau({ point: 'silver', readC: 961.78 - largestOffsetC + 0.1, wanderC: 0.5 }).ok).toBe(
      true,
    );
  });
});

describe('a corrected reading', () => {
  it('keeps what was read beside what it means', () => {
    expect(correctReading(888.04, 4.3)).toEqual({ rawC: 888.04, offsetC: 4.3, temperatureC: 892.3 });
    expect(correctReading(888, null)).toEqual({ rawC: 888, offsetC: 0, temperatureC: 888 });
  });
});

describe('when a check is due', () => {
  const checked = '2026-11-01T10:00:00.000Z';
  const on = (day: string) => checkDue(checked, 30, new Date(day));

  it('is told from the interval', () => {
    expect(on('2026-11-10T10:00:00Z')).toMatchObject({ state: 'in-date', dueAt: '2026-12-01T10:00:00.000Z' });
    expect(on('2026-11-28T10:00:00Z')).toMatchObject({ state: 'due', sentence: 'Check due within 3 days.' });
    expect(on('2026-12-01T10:00:00Z').state).toBe('due');
    expect(on('2026-12-01T10:00:01Z')).toMatchObject({
      state: 'overdue',
      sentence: 'Check overdue by 1 day.',
    });
    expect(on('2026-12-11T11:00:00Z').sentence).toBe('Check overdue by 10 days.');
  });

  it('is never in date without a check', () => {
    expect(checkDue(null, 30, new Date(checked))).toMatchObject({ state: 'never', dueAt: null });
  });
});
