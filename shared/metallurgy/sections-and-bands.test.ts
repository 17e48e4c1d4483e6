import { describe, expect, it } from 'vitest';
import {
  binarySection,
  ENGINE_VERSION,
  freezingPath,
  PROVENANCE,
  rangeBand,
  tieLine,
  type Outcome,
} from './index.ts';

const known = <T>(outcome: Outcome<T>): T => {
  if (!outcome.withinModel) throw new Error(outcome.reason);
  return outcome;
};

describe('binarySection', { timeout: 30_000 }, () => {
  it('draws Ag-Cu with its fields and its eutectic line', () => {
    const section = known(binarySection({ kind: 'binary', elements: ['Ag', 'Cu'] }));
    expect(section.boundaries.map(({ name }) => name)).toEqual(['liquidus', 'solidus', 'solvus', 'solvus']);
    const fields = section.fields.map(({ phases }) => phases.join(' + '));
    expect(fields).toEqual(
      expect.arrayContaining(['liquid', 'fcc', 'liquid + fcc', 'silver-rich fcc + copper-rich fcc']),
    );
    for (const { name, points } of section.boundaries) {
      const along = points.map(({ x, temperatureC }) => (name === 'solvus' ? temperatureC : x));
      const rising = along.every((value, k) => k === 0 || value >= (along[k - 1] ?? 0));
      const falling = along.every((value, k) => k === 0 || value <= (along[k - 1] ?? 0));
      expect(rising || falling).toBe(true);
    }
  });

  it('draws a carat section, whose tie lines leave its plane', () => {
    const section = known(binarySection({ kind: 'carat', goldWt: 58.5 }));
    expect(section).toMatchObject({ xElement: 'Cu', xMin: 0, xMax: 41.5, invariants: [] });
    const line = known(tieLine(section, 21, 836));
    expect(line.ends.map(({ name }) => name)).toEqual(expect.arrayContaining(['liquid', 'fcc']));
    expect(line.inPlane).toBe(false);
  });

  it('refuses what is no section, and a place off it', () => {
    expect(binarySection({ kind: 'carat', goldWt: 100 })).toMatchObject({ withinModel: false });
    expect(binarySection({ kind: 'binary', elements: ['Ag', 'Ag'] })).toMatchObject({ withinModel: false });
    const section = known(binarySection({ kind: 'carat', goldWt: 75 }));
    expect(tieLine(section, 30, 850)).toMatchObject({ withinModel: false, code: 'option' });
  });
});

describe('rangeBand', () => {
  it('widens with the tolerance and holds the nominal range', () => {
    const narrow = known(rangeBand({ Ag: 92.5, Cu: 7.5 }, { Ag: 0.1 }));
    const wide = known(rangeBand({ Ag: 92.5, Cu: 7.5 }, { Ag: 0.3 }));
    expect(wide.liquidusC.low).toBeLessThan(narrow.liquidusC.low);
    expect(wide.solidusC.high).toBeGreaterThan(narrow.solidusC.high);
    expect(narrow.liquidusC.low).toBeLessThan(896.26);
    expect(narrow.liquidusC.high).toBeGreaterThan(896.25);
    expect(narrow.asCastSolidusC?.high).toBeCloseTo(779.1, 1);
  });

  it('gives sensitivities that foretell the band', () => {
    const band = known(rangeBand({ Ag: 92.5, Cu: 7.5 }, { Ag: 0.1 }));
    const silver = band.sensitivities.find(({ element }) => element === 'Ag');
    expect(band.solidusC.high - band.solidusC.low).toBeCloseTo(0.2 * (silver?.solidusCPerWt ?? 0), 1);
  });
});

describe('freezingPath', () => {
  it('reads at whole multiples of the step, and steps at the eutectic', () => {
    const path = known(freezingPath({ Ag: 92.5, Cu: 7.5 }, { rule: 'scheil', stepC: 5 }));
    expect(path.points[1]?.temperatureC).toBe(895);
    expect(path.points.at(-1)).toMatchObject({ solidMassFraction: 1, liquidWt: null });
    expect(path.points.at(-2)?.solidMassFraction).toBeLessThan(0.9);
    expect(path.points.at(-2)?.solidMassFraction).toBeGreaterThan(0.85);
  });

  it('stops with a note where zinc takes the liquid out of the model', () => {
    const path = known(freezingPath({ Ag: 65, Cu: 20, Zn: 15 }, { rule: 'scheil' }));
    expect(path.endsC).toBeNull();
    expect(path.note).toMatch(/beta/);
  });

  it('of a pure metal is one step', () => {
    const path = known(freezingPath({ Ag: 100 }, { rule: 'lever' }));
    expect(path.points.map(({ solidMassFraction }) => solidMassFraction)).toEqual([0, 1]);
  });
});

describe('provenance', () => {
  it('names the version and a source for every set of parameters', () => {
    expect(ENGINE_VERSION).toMatch(/^\d+\.\d+\.\d+$/);
    expect(PROVENANCE.map(({ what }) => what)).toEqual(
      expect.arrayContaining(['Ag-Cu', 'Ag-Au', 'Au-Cu', 'Cu-Zn', 'Ag-Au-Cu']),
    );
    for (const { source, basis } of PROVENANCE) expect(source.length * basis.length).toBeGreaterThan(50);
  });
});
