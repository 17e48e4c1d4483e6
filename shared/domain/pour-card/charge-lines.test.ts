import { describe, expect, it } from 'vitest';
import type { ChargedLot } from './card-state.ts';
import { chargeLines, correctedFromG, type WantedLot } from './charge-lines.ts';

const wanted = (id: string, massG: number, kind: WantedLot['kind'] = 'fine'): WantedLot => ({
  lotId: id,
  code: `L-000${id}`,
  name: `Lot ${id}`,
  kind,
  massG,
});
const charged = (id: string, massG: number): ChargedLot => ({
  id,
  code: `L-000${id}`,
  kind: 'fine',
  compositionWt: { Au: 99.99 },
  toleranceWt: { Au: 0.005 },
  massG,
});
const plan = [wanted('1', 32, 'returns'), wanted('2', 39.18), wanted('3', 13.02, 'master')];
const linesOf = (lots: readonly ChargedLot[], remainder: readonly WantedLot[] | null = null) =>
  chargeLines({ plan, lots, remainder, tolerance: 0.02 });
const statesOf = (...given: Parameters<typeof linesOf>): readonly string[] =>
  linesOf(...given).map(({ state }) => state);

describe('chargeLines', () => {
  it('goes through the plan in its order, a line being done within the tolerance', () => {
    expect(statesOf([])).toEqual(['next', 'to-come', 'to-come']);
    expect(statesOf([charged('1', 31.9), charged('2', 24.1)])).toEqual(['done', 'next', 'to-come']);
    expect(linesOf([charged('1', 31.9), charged('2', 24.1)])[1]).toMatchObject({ inG: 24.1, toGoG: 15.08 });
  });

  it('marks a line over, and takes what remains from the server where it is known', () => {
    expect(statesOf([charged('1', 34)])).toEqual(['over', 'next', 'to-come']);
    const lines = linesOf([charged('1', 34)], [wanted('2', 38.4), wanted('3', 12.4)]);
    expect(lines.map(({ toGoG }) => toGoG)).toEqual([0, 38.4, 12.4]);
    expect(lines.map(correctedFromG)).toEqual([null, 39.18, 13.02]);
  });

  it('adds a lot the server wants beside the plan, and one that came in without it', () => {
    const lines = linesOf([charged('4', 5)], [wanted('1', 32, 'returns'), wanted('5', 1.2)]);
    expect(lines.map(({ lotId, state }) => [lotId, state])).toEqual([
      ['1', 'next'],
      ['2', 'done'],
      ['3', 'done'],
      ['4', 'over'],
      ['5', 'to-come'],
    ]);
    expect(lines.at(-1)).toMatchObject({ name: 'Lot 5', plannedG: 0 });
  });

  it('has a line for each lot that is in where nothing was planned', () => {
    const lines = chargeLines({ plan: [], lots: [charged('1', 10)], remainder: null, tolerance: 0.02 });
    expect(lines.map(({ state, toGoG }) => [state, toGoG])).toEqual([['done', 0]]);
  });
});
