import { describe, expect, it } from 'vitest';
import { buildCardContext } from '#shared/domain/pour-card/build-card-context.fixture.ts';
import type { LotKind } from '#shared/domain/metal/lot.ts';
import type { ChargedLot } from '#shared/domain/pour-card/card-state.ts';
import { chargeKindOf } from '#shared/domain/pour-card/card-event.ts';
import { chargeLines, type WantedLot } from '#shared/domain/pour-card/charge-lines.ts';
import { unitWriter } from '#kiosk/lib/unit-writer.ts';
import { lotChargeWords } from './lot-charge-words.ts';
import { refusalOfLot } from './refusal-of-lot.ts';
import { choicesOf } from './take-out.tsx';
import type { LotCharge } from './use-lot-charge.ts';

const context = buildCardContext({
  alloy: {
    compositionWt: { Au: 75, Ag: 12.5, Cu: 12.5 },
    toleranceWt: { Au: 0.3, Ag: 0.3, Cu: 0.3 },
    markedMetal: 'Au',
    markPpt: 750,
  },
});
const write = unitWriter({ temperature: 'C', mass: 'g' });
const plain = (text: string): string => text.replace(/\s/g, ' ');

const wanted = (id: string, massG: number, kind: LotKind = 'grain'): WantedLot => ({
  lotId: id,
  code: `L-000${id}-0`,
  name: `Lot ${id}`,
  kind,
  massG,
});
const plan = [wanted('1', 30, 'returns'), wanted('2', 54.2)];
const charged = (id: string, massG: number, kind: LotKind = 'grain'): ChargedLot => ({
  id,
  code: `L-000${id}-0`,
  kind,
  compositionWt: { Au: 75.06, Ag: 12.5, Cu: 12.44 },
  toleranceWt: { Au: 0.04 },
  massG,
});
const stateOf = (...lots: readonly ChargedLot[]) => {
  const of = (which: 'grain' | 'returns'): number =>
    lots.reduce((sum, { kind, massG }) => sum + (chargeKindOf(kind) === which ? massG : 0), 0);
  return { lots, charge: { grain: of('grain'), returns: of('returns') } };
};
const chargeOf = (
  lots: readonly ChargedLot[],
  over: Partial<LotCharge> = {},
  remainder: readonly WantedLot[] | null = null,
): LotCharge => {
  const lines = chargeLines({ plan, lots, remainder, tolerance: 0.02 });
  const next = lines.find(({ state }) => state === 'next') ?? null;
  return { hasPlan: true, lines, next, rest: 'as-planned', short: null, advice: null, lots: [], ...over };
};
const say = (lots: readonly ChargedLot[], charge: LotCharge = chargeOf(lots)) => {
  const words = lotChargeWords(charge, stateOf(...lots), context, write);
  return { ...words, mass: plain(words.mass), stateWords: plain(words.stateWords), sub: plain(words.sub) };
};

describe('lotChargeWords', () => {
  it('names the next lot and what is to go of it', () => {
    expect(say([])).toMatchObject({
      sentence: 'Weigh in returns, lot L-0001-0.',
      mass: '30.00 g',
      stateWords: 'To go',
      sub: '0.00 g of 84.20 g is in. Then lot L-0002-0.',
      blocked: 'Melt opens when lot L-0001-0 is in',
    });
    expect(say([charged('1', 30, 'returns'), charged('2', 24.2)])).toMatchObject({
      mass: '30.00 g',
      stateWords: 'To go, of 54.20 g',
    });
  });

  it('says what a corrected line is instead of, and when it could not be corrected', () => {
    const lots = [charged('1', 32, 'returns')];
    expect(say(lots, chargeOf(lots, { rest: 'corrected' }, [wanted('2', 52.2)]))).toMatchObject({
      mass: '52.20 g',
      stateWords: 'Instead of 54.20 g',
    });
    expect(say(lots, chargeOf(lots, { rest: 'unknown' })).sub).toContain('what remains is not corrected');
  });

  it('stops at a breach and says which lot and how much', () => {
    const lots = [charged('1', 30, 'returns'), charged('2', 60)];
    const advice = {
      fault: 'too-much',
      out: { lotId: '2', code: 'L-0002-0', massG: 5.8 },
      add: null,
    } as const;
    expect(say(lots, chargeOf(lots, { advice }))).toMatchObject({
      state: 'caution',
      mass: '5.80 g',
      stateWords: 'Too much in the crucible',
      blocked: 'Melt opens when this is put right',
    });
    const short = {
      kind: 'short',
      obstacles: ['It stands in the way.'],
      wouldDo: [{ name: 'fine gold', massG: 1.2 }],
    };
    const stuck = chargeOf([lots[0]!], { rest: 'corrected', short: short as LotCharge['short'] });
    expect(say([lots[0]!], stuck)).toMatchObject({
      sentence: 'It stands in the way.',
      mass: '1.20 g',
      stateWords: 'of fine gold would do',
    });
  });

  it('opens when all is in, and asks for any lot where nothing was planned', () => {
    expect(say([charged('1', 30, 'returns'), charged('2', 54.2)])).toMatchObject({
      state: 'ready',
      mass: '84.20 g',
      blocked: null,
    });
    const free = chargeOf([], { hasPlan: false, lines: [], next: null });
    expect(say([], free)).toMatchObject({ sentence: 'Scan a lot, then weigh it in.', mass: '84.20 g' });
  });
});

describe('refusalOfLot', () => {
  const lot = {
    id: '1',
    code: 'L-0001-0',
    kind: 'returns',
    quarantineReason: null,
    balanceG: 50,
  } as Parameters<typeof refusalOfLot>[0];
  const refusal = (over: object, lots: readonly ChargedLot[] = []) =>
    refusalOfLot({ ...lot, ...over }, chargeOf(lots));

  it('takes a planned lot in any order, and any usable one where nothing was planned', () => {
    expect(refusal({})).toBeNull();
    expect(refusal({ id: '2', code: 'L-0002-0' })).toBeNull();
    expect(refusalOfLot({ ...lot, id: '9' }, { ...chargeOf([]), hasPlan: false })).toBeNull();
  });

  it.each([
    [
      { quarantineReason: 'May hold solder.' },
      'in quarantine: May hold solder. Put it aside. Take lot L-0001-0.',
    ],
    [{ kind: 'scrap' }, 'scrap for refining: it does not go into a crucible. Take lot L-0001-0.'],
    [{ balanceG: 0 }, 'used up by the ledger. Have it counted at the desk, or take another.'],
    [{ id: '9', code: 'L-0009-0' }, 'L-0009-0 is not in this charge. Take lot L-0001-0.'],
  ])('refuses %j and says what to do', (over, sentence) => {
    expect(refusal(over)).toContain(sentence);
  });

  it('refuses a lot that is in already', () => {
    expect(refusal({}, [charged('1', 30, 'returns')])).toBe('Lot L-0001-0 is in already. Take lot L-0002-0.');
  });
});

describe('choicesOf', () => {
  it('lists what can come out: each lot, and what is of none', () => {
    const state = { ...stateOf(charged('1', 30, 'returns')), charge: { grain: 5, returns: 30 } };
    expect(choicesOf(state).map(({ words, inG }) => [words, inG])).toEqual([
      ['lot L-0001-0', 30],
      ['casting grain', 5],
    ]);
  });
});
