import { describe, expect, it } from 'vitest';
import type { Lot } from '#shared/contracts/lot.ts';
import { judgeHandPlan, lotsToPlan } from './hand-plan.ts';

const lot = (id: string, kind: Lot['kind'], silver: number, balanceG: number): Lot => ({
  id,
  code: id,
  name: id,
  kind,
  alloy: null,
  melt: null,
  compositionWt: { Ag: silver, Cu: 100 - silver },
  toleranceWt: { Ag: 0.05, Cu: 0.05 },
  supplier: '',
  supplierReference: '',
  place: '',
  quarantineReason: null,
  receivedG: balanceG,
  balanceG,
  contentsMg: {},
  receivedAt: '2026-11-01T00:00:00Z',
  receivedBy: 'Someone',
  abilities: { amend: true, release: false, count: true, dispatch: true },
});

const lots = [lot('grain', 'grain', 92.65, 500), lot('box', 'returns', 92.6, 40)];
const proposal = {
  castingIds: [],
  alloyName: 'Sterling',
  revision: 1,
  wantedG: 100,
  markedMetal: 'Ag',
  markPpt: 925,
  targetWt: { Ag: 92.6, Cu: 7.4 },
  toleranceWt: { Ag: 0.1, Cu: 0.1 },
  returnsLimit: 0.5,
} as const;

const judge = (...lines: readonly (readonly [string, string])[]) =>
  judgeHandPlan(
    lines.map(([lotId, mass]) => ({ lotId, mass })),
    lots,
    proposal,
    'g',
  );

describe('a plan changed by hand', () => {
  it('holds when every limit does', () => {
    const { plan, faults } = judge(['grain', '70'], ['box', '30,00']);
    expect(faults).toEqual([]);
    expect(plan?.worstPpt).toBeCloseTo(925.85, 2);
    expect(plan?.returnsShare).toBe(0.3);
  });

  it('says each limit that it breaks', () => {
    expect(judge(['grain', '55'], ['box', '45']).faults).toEqual(['Lot box does not hold that much.']);
    expect(judge(['grain', '90']).faults).toEqual(['The masses do not come to the metal wanted.']);
    expect(judge(['grain', '']).faults).toEqual(['Type what to weigh of grain.']);
    expect(judge().faults).toEqual(['A charge has at least one lot.']);
  });

  it('leaves scrap and quarantine out of the choice', () => {
    const held = { ...lot('held', 'grain', 92.6, 1), quarantineReason: 'No label.' };
    expect(lotsToPlan([...lots, held, lot('scrap', 'scrap', 92.6, 1)])).toEqual(lots);
  });
});
