import { describe, expect, it } from 'vitest';
import { toGrams } from '#shared/lib/units.ts';
import { judgeWeighing, type Weighing } from './judge-weighing.ts';

const judge = (massG: number, over: Partial<Weighing> = {}) =>
  judgeWeighing({
    massG,
    code: 'L-0001-2',
    toGoG: 39.18,
    roomG: 60,
    onHandG: 120,
    tolerance: 0.02,
    unit: 'g',
    ...over,
  });
const sentenceOf = (...given: Parameters<typeof judge>): string => {
  const verdict = judge(...given);
  return verdict.kind === 'accept' ? '' : verdict.sentence.replace(/\s/g, ' ');
};

describe('judgeWeighing', () => {
  it('takes a part, the whole, and what is over by no more than the tolerance', () => {
    for (const massG of [4, 39.18, 39.9]) expect(judge(massG).kind).toBe('accept');
  });

  it('questions what is over by more, and says by how much', () => {
    expect(judge(41.28)).toMatchObject({ kind: 'question', overG: 2.1 });
    expect(sentenceOf(41.28)).toBe('2.10 g more than is wanted of lot L-0001-2. Take some off the pan?');
    expect(judge(1, { toGoG: 0 })).toMatchObject({ kind: 'question', overG: 1 });
    expect(sentenceOf(61, { toGoG: null })).toContain('1.00 g more than the charge can take');
  });

  it('refuses grams where ounces are typed, and the other way round, with what was meant', () => {
    // 39.18 typed in a studio that weighs in troy ounces.
    expect(judge(toGrams(39.18, 'ozt'), { unit: 'ozt', onHandG: 5000 })).toMatchObject({
      kind: 'refuse',
      meantG: 39.18,
    });
    // 1.2597 ozt is 39.18 g; typed as grams it is a thirtieth of what is wanted.
    const slip = judge(1.2597);
    expect(slip).toMatchObject({ kind: 'refuse', meantG: 39.181 });
    expect(sentenceOf(1.2597)).toContain('was it weighed in troy ounces?');
    expect(sentenceOf(toGrams(39.18, 'ozt'), { toGoG: null, roomG: 39.18, unit: 'ozt' })).toContain('grams');
  });

  it('refuses what no studio weighs, more than the ledger has, and ten times what is wanted', () => {
    expect(sentenceOf(0)).toContain('above zero');
    expect(sentenceOf(-1)).toContain('above zero');
    expect(sentenceOf(39.18, { onHandG: 20 })).toBe(
      'Lot L-0001-2 has 20.00 g by the ledger. Weigh again, or have it counted at the desk.',
    );
    expect(sentenceOf(500, { onHandG: 5000 })).toContain('more than 10 times');
  });
});
