import { describe, expect, it } from 'vitest';
import { defaultStudioLimits } from '../studio/studio-limits.ts';
import { buildCardContext } from './build-card-context.fixture.ts';
import { judgeReading } from './judge-reading.ts';

const { figures } = buildCardContext();
const judge = (typed: number, unit: 'C' | 'F' = 'C') =>
  judgeReading(typed, unit, figures, defaultStudioLimits);

describe('a typed melt reading', () => {
  it('is taken when it is within reason', () => {
    expect(judge(892)).toEqual({ kind: 'accept', celsius: 892 });
    expect(judge(1832, 'F')).toEqual({ kind: 'accept', celsius: 1000 });
  });

  it('is questioned when it fits only the other unit: 1750 on a Celsius terminal', () => {
    const verdict = judge(1750);
    expect(verdict).toMatchObject({ kind: 'refuse', meant: { label: '1750 °F' } });
    expect(verdict.kind === 'refuse' && verdict.meant?.celsius).toBeCloseTo(954.4, 1);
  });

  it('is questioned when a digit slipped in: 9800', () => {
    expect(judge(9800)).toMatchObject({ kind: 'refuse', meant: { celsius: 980, label: '980 °C' } });
  });

  it('is refused without a guess when nothing near it makes sense', () => {
    expect(judge(99999)).toMatchObject({ kind: 'refuse', meant: null });
    expect(judge(-300)).toMatchObject({ kind: 'refuse', meant: null });
  });

  it('is questioned when it is possible but far over the pour window', () => {
    expect(judge(1300)).toMatchObject({ kind: 'question', celsius: 1300 });
  });
});
