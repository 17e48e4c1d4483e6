import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addContents, contentsOf, massOfContents, partsOfContents } from './contents.ts';

const composition = fc
  .uniqueArray(fc.constantFrom('Au', 'Ag', 'Cu', 'Zn', 'Ni', 'Pd'), { minLength: 1 })
  .chain((elements) =>
    fc
      .array(fc.integer({ min: 1, max: 10_000 }), { minLength: elements.length, maxLength: elements.length })
      .map((parts) => {
        const sum = parts.reduce((total, part) => total + part, 0);
        return Object.fromEntries(elements.map((element, k) => [element, (100 * (parts[k] ?? 0)) / sum]));
      }),
  );
const massMg = fc.integer({ min: 0, max: 5_000_000 });

describe('what some metal holds', () => {
  it('comes to the mass, to the milligram', () => {
    fc.assert(fc.property(massMg, composition, (mass, wt) => massOfContents(contentsOf(mass, wt)) === mass));
  });

  it('is within a milligram of the exact part of each element, or two at the most', () => {
    fc.assert(
      fc.property(massMg, composition, (mass, wt) => {
        const contents = contentsOf(mass, wt);
        return Object.entries(wt).every(
          ([element, part]) => Math.abs((contents[element] ?? 0) - (mass * part) / 100) < 2,
        );
      }),
    );
  });

  it('never loses any of an element when the mass grows', () => {
    fc.assert(
      fc.property(massMg, fc.integer({ min: 1, max: 50 }), composition, (mass, more, wt) =>
        Object.values(addContents(contentsOf(mass + more, wt), contentsOf(mass, wt), -1)).every(
          (mg) => mg > 0,
        ),
      ),
    );
  });

  it('keeps what a certificate leaves unnamed', () => {
    expect(contentsOf(1_000_000, { Au: 99.99 })).toEqual({ Au: 999_900, other: 100 });
    expect(contentsOf(0, { Au: 99.99 })).toEqual({});
  });

  it('gives the parts back', () => {
    expect(partsOfContents({ Ag: 925, Cu: 75 })).toEqual({ Ag: 92.5, Cu: 7.5 });
    expect(partsOfContents({})).toEqual({});
    expect(addContents({ Ag: 925, Cu: 75 }, { Ag: 925, Cu: 70 }, -1)).toEqual({ Cu: 5 });
  });
});
