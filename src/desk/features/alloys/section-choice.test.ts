import { describe, expect, it } from 'vitest';
import { sectionChoice } from './section-choice.ts';

describe('sectionChoice', () => {
  it('draws an alloy of two metals in their binary system, the main metal at the left', () => {
    expect(sectionChoice({ Cu: 7.5, Ag: 92.5 })).toEqual({
      request: { kind: 'binary', elements: ['Ag', 'Cu'] },
      x: 7.5,
      xElement: 'Cu',
    });
  });

  it('draws gold, silver and copper at fixed gold, told by copper', () => {
    expect(sectionChoice({ Au: 75, Ag: 12.5, Cu: 12.5 })).toEqual({
      request: { kind: 'carat', goldWt: 75 },
      x: 12.5,
      xElement: 'Cu',
    });
  });

  it.each([
    [{ Au: 37.5, Ag: 10, Cu: 45, Zn: 7.5 }, /zinc/],
    [{ Ag: 92.5, Cu: 5, Zn: 2.5 }, /zinc/],
    [{ Ag: 100 }, /single metal/],
    [{ Au: 75, Pd: 20, Ag: 5 }, /does not/],
  ])('says why %o has no section', (compositionWt, reason) => {
    const choice = sectionChoice(compositionWt);
    expect(choice.request).toBeNull();
    expect(choice.request === null && choice.whyNone).toMatch(reason);
  });

  it('takes no notice of an element that is named but absent', () => {
    expect(sectionChoice({ Ag: 92.5, Cu: 7.5, Zn: 0 }).request).toEqual({
      kind: 'binary',
      elements: ['Ag', 'Cu'],
    });
  });
});
