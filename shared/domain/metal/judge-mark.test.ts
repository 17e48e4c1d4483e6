import { describe, expect, it } from 'vitest';
import { judgeMark } from './judge-mark.ts';

describe('judgeMark', () => {
  it('names the highest mark reached, never rounding up', () => {
    expect(judgeMark({ metal: 'Au', worstPpt: 750.2 }, 'ISO 9202').reached?.ppt).toBe(750);
    expect(judgeMark({ metal: 'Au', worstPpt: 749.99 }, 'ISO 9202').reached?.ppt).toBe(585);
  });

  it('allows nothing below the mark in the United Kingdom, and tells of the tolerance in the United States', () => {
    const uk = judgeMark({ metal: 'Au', worstPpt: 748, markPpt: 750 }, 'United Kingdom');
    expect([uk.reached?.ppt, uk.byTolerance]).toEqual([585, null]);
    const us = judgeMark({ metal: 'Au', worstPpt: 748, markPpt: 750 }, 'United States');
    expect([us.reached?.ppt, us.byTolerance?.ppt]).toEqual([583, 750]);
    expect(us.sentence).toContain('Only by a tolerance of 3 would it pass for 750');
  });

  it('says that a mark is none of the place’s', () => {
    const britannia = { metal: 'Ag', worstPpt: 958.4, markPpt: 958 } as const;
    expect(judgeMark(britannia, 'United Kingdom').isListed).toBe(true);
    const us = judgeMark(britannia, 'United States');
    expect(us.isListed).toBe(false);
    expect(us.sentence).toMatch(/^958 is no silver mark of the United States\./);
  });

  it('says what is lowest where nothing is reached, and always leaves it to the assay office', () => {
    const { reached, sentence } = judgeMark({ metal: 'Au', worstPpt: 250 }, 'ISO 9202');
    expect(reached).toBeNull();
    expect(sentence).toBe(
      'At the worst, 250.0, it reaches no gold mark of ISO 9202; the lowest is 375. The local assay office decides.',
    );
  });
});
