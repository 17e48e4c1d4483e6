import { describe, expect, it } from 'vitest';
import { benchFigures, ordering, soldersBelow } from './index.ts';

const figures = (wt: Record<string, number>) => {
  const answer = benchFigures(wt);
  if (!answer.withinModel) throw new Error(answer.reason);
  return answer;
};

describe('bench figures', () => {
  it('puts the ceiling of as-cast sterling at the eutectic and of homogenised sterling at the solidus', () => {
    const { torchCeilingAsCastC, torchCeilingHomogenisedC } = figures({ Ag: 92.5, Cu: 7.5 });
    expect(torchCeilingAsCastC.temperatureC).toBeCloseTo(779.1, 1);
    expect(torchCeilingAsCastC.stayBelowC).toBeCloseTo(759.1, 1);
    expect(torchCeilingHomogenisedC.temperatureC).toBeCloseTo(802.8, 1);
  });

  it('keeps windows below the as-cast limit', () => {
    const sterling = figures({ Ag: 92.5, Cu: 7.5 });
    expect(sterling.solutionWindowC.fromC).toBeLessThan(sterling.solutionWindowC.toC ?? 0);
    expect(sterling.solutionWindowC.toC).toBeCloseTo(769.1, 1);
    expect(sterling.annealWindowC).toMatchObject({ fromC: 593, toC: 649 });
  });

  it('names no window where there is none, and says why', () => {
    const { solutionWindowC, annealWindowC } = figures({ Au: 75, Ag: 25 });
    expect(solutionWindowC).toMatchObject({ fromC: null, toC: null });
    expect(solutionWindowC.basis).toMatch(/No solvus/);
    expect(annealWindowC.fromC).toBe(650);
    expect(figures({ Ag: 100 }).annealWindowC.fromC).toBeNull();
  });

  it('refuses with the reason of the range', () => {
    expect(benchFigures({ Au: 75, Ni: 25 })).toMatchObject({ withinModel: false, code: 'outside-model' });
  });
});

describe('soldersBelow', () => {
  const solders = [
    { name: 'easy', liquidusC: 718 },
    { name: 'hard', liquidusC: 745 },
    { name: 'extra hard', liquidusC: 771 },
  ];

  it('gives those that flow far enough below the ceiling, hottest first', () => {
    expect(soldersBelow(779, solders).map(({ name, clearanceC }) => [name, clearanceC])).toEqual([
      ['hard', 34],
      ['easy', 61],
    ]);
  });

  it('minds the margin', () => {
    expect(soldersBelow(779, solders, 5).map(({ name }) => name)).toEqual(['extra hard', 'hard', 'easy']);
  });
});

describe('ordering', () => {
  it.each([
    [{ Au: 75, Cu: 25 }, 410, true],
    [{ Au: 75, Ag: 4.5, Cu: 20.5 }, 410, true],
    [{ Au: 75, Ag: 12.5, Cu: 12.5 }, 410, false],
    [{ Au: 75, Ag: 25 }, null, false],
    [{ Au: 37.5, Ag: 7.5, Cu: 55 }, 390, true],
    [{ Ag: 92.5, Cu: 7.5 }, null, false],
  ] as [Record<string, number>, number | null, boolean][])('%o', (wt, belowC, early) => {
    expect(ordering(wt)).toMatchObject({ ordersBelowC: belowC, needsEarlyQuench: early });
  });
});
