import { describe, expect, it } from 'vitest';
import { faultOfAssay, questionsOfLot } from './judge-lot.ts';

const sterling = { compositionWt: { Ag: 92.5, Cu: 7.5 }, toleranceWt: { Ag: 0.1, Cu: 0.1 } };

describe('the assay of a lot', () => {
  it('may be off the whole by its own rounding, and no more', () => {
    const cu = (wt: number) => faultOfAssay('grain', { ...sterling, compositionWt: { Ag: 92.5, Cu: wt } });
    expect([cu(7.46), cu(7.54)]).toEqual([null, null]);
    expect(cu(7.4)?.message).toBe('The parts come to 99.90 wt%; they must come to 100 wt%.');
    expect(cu(7.6)?.field).toBe('compositionWt');
  });

  it('of fine metal may leave up to one per cent unnamed', () => {
    const fine = (wt: number) => faultOfAssay('fine', { compositionWt: { Cu: wt }, toleranceWt: {} });
    expect([fine(99.9), fine(99), fine(98.9)?.field]).toEqual([null, null, 'compositionWt']);
  });

  it('names the tolerance that is missing or stray', () => {
    expect(faultOfAssay('grain', { ...sterling, toleranceWt: { Cu: 0.1 } })?.message).toContain('silver');
    expect(faultOfAssay('grain', { ...sterling, toleranceWt: { Ag: 0.1, Zn: 0.1 } })?.message).toContain(
      'zinc',
    );
  });
});

describe('what is asked about a lot', () => {
  const asked = (massG: number, alloy = sterling, lot = sterling) =>
    questionsOfLot({ ...lot, massG }, alloy).map(({ field }) => field);

  it('is a mass that may be in another unit', () => {
    expect([asked(1), asked(5000), asked(0.99), asked(5000.1)]).toEqual([[], [], ['massG'], ['massG']]);
  });

  it('is a tolerance wider than the alloy’s, and parts outside the alloy', () => {
    expect(asked(100, sterling, { ...sterling, toleranceWt: { Ag: 0.11, Cu: 0.1 } })).toEqual([
      'toleranceWt',
    ]);
    expect(asked(100, sterling, { ...sterling, compositionWt: { Ag: 92.7, Cu: 7.3 } })).toEqual([
      'compositionWt',
    ]);
    expect(questionsOfLot({ ...sterling, massG: 100 }, null)).toEqual([]);
  });
});
