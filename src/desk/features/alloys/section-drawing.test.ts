import { describe, expect, it } from 'vitest';
import { equilibrium, tieLine, type SectionPoint, type SectionRequest } from '#shared/metallurgy/index.ts';
import type { DiagramField } from '#src/ui/section-diagram.tsx';
import { runStudy } from './alloy-study.ts';
import { sectionDrawing } from './section-drawing.ts';

const studyOf = (request: SectionRequest) => {
  const study = runStudy('section', { request });
  if (!study.withinModel) throw new Error(study.reason);
  return study;
};

const [lowC, highC] = [600, 1100] as const;
const silverCopper = studyOf({ kind: 'binary', elements: ['Ag', 'Cu'] });
const drawn = sectionDrawing(silverCopper, lowC, highC);
const nineCarat = studyOf({ kind: 'carat', goldWt: 37.5 });

/** Least distance in wt% from a place to a drawn line, at its temperature. */
const distanceTo = (name: string, { x, temperatureC }: SectionPoint): number => {
  let least = Infinity;
  for (const { points } of drawn.lines.filter((line) => line.name === name)) {
    points.forEach((a, index) => {
      const b = points[index + 1];
      if (!b || (a.temperatureC - temperatureC) * (b.temperatureC - temperatureC) > 0) return;
      const part =
        a.temperatureC === b.temperatureC
          ? 0
          : (temperatureC - a.temperatureC) / (b.temperatureC - a.temperatureC);
      least = Math.min(least, Math.abs(a.x + part * (b.x - a.x) - x));
    });
  }
  return least;
};

const isInside = ({ outline }: DiagramField, { x, temperatureC }: SectionPoint): boolean =>
  outline.reduce((inside, b, index) => {
    const a = outline.at(index - 1) ?? b;
    const crosses = a.temperatureC > temperatureC !== b.temperatureC > temperatureC;
    if (!crosses) return inside;
    const at = a.x + ((temperatureC - a.temperatureC) / (b.temperatureC - a.temperatureC)) * (b.x - a.x);
    return x < at ? !inside : inside;
  }, false);

describe('sectionDrawing of silver-copper', () => {
  it.each([785, 800, 820, 850, 880, 893])(
    'ends the tie line at %d °C on the drawn boundaries',
    (temperatureC) => {
      const tie = tieLine(silverCopper.section, 7.5, temperatureC);
      if (!tie.withinModel) throw new Error(tie.reason);
      for (const { name, x, massFraction } of tie.ends) {
        if (massFraction > 0.999) continue;
        const line = name === 'liquid' ? 'liquidus' : 'solidus';
        expect(distanceTo(line, { x, temperatureC })).toBeLessThan(0.05);
      }
    },
  );

  it.each([650, 700, 750])(
    'ends the tie line between two solids at %d °C on the drawn solvus',
    (temperatureC) => {
      const tie = tieLine(silverCopper.section, 7.5, temperatureC);
      if (!tie.withinModel) throw new Error(tie.reason);
      expect(tie.ends).toHaveLength(2);
      for (const { x } of tie.ends) expect(distanceTo('solvus', { x, temperatureC })).toBeLessThan(0.05);
    },
  );

  it.each([860, 960, 1020])(
    'ends the copper-rich tie line at %d °C on the steep solidus too',
    (temperatureC) => {
      const tie = tieLine(silverCopper.section, 88, temperatureC);
      if (!tie.withinModel) throw new Error(tie.reason);
      const solid = tie.ends.find(({ name }) => name !== 'liquid');
      expect(distanceTo('solidus', { x: solid?.x ?? 0, temperatureC })).toBeLessThan(0.05);
    },
  );

  it('draws the invariant at the temperature and compositions of the NIST silver-copper page', () => {
    // NIST metallurgy, Ag-Cu page: 779.1 °C, liquid 28.41 wt% Cu, solids 8.27 and 92.53 wt% Cu.
    const eutectic = silverCopper.section.invariants.find(({ name }) => name === 'eutectic');
    expect(eutectic?.temperatureC).toBeCloseTo(779.1, 1);
    expect(eutectic?.liquidX).toBeCloseTo(28.41, 1);
    expect(eutectic?.fromX).toBeCloseTo(8.27, 1);
    expect(eutectic?.toX).toBeCloseTo(92.53, 1);
  });

  it('puts every place in the field of the phases that stand there', () => {
    const kindOf = (phases: readonly { readonly name: string }[]): string => {
      if (phases.length === 1) return phases[0]?.name === 'liquid' ? 'liquid' : 'solid';
      return phases.some(({ name }) => name === 'liquid') ? 'mushy' : 'two-solids';
    };
    const wrong: string[] = [];
    for (let x = 1.3; x < 99; x += 3.7) {
      for (let temperatureC = lowC + 7; temperatureC < highC; temperatureC += 13) {
        const state = equilibrium({ Ag: 100 - x, Cu: x }, temperatureC);
        if (!state.withinModel || state.phases.some(({ massFraction }) => massFraction < 0.01)) continue;
        const field = drawn.fields.findLast((candidate) => isInside(candidate, { x, temperatureC }));
        if (field?.kind !== kindOf(state.phases)) wrong.push(`${x.toFixed(1)} % at ${temperatureC} °C`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('names its fields by the two metals', () => {
    expect(drawn.fields.map(({ words }) => words)).toEqual([
      'liquid',
      'silver, solid',
      'copper, solid',
      'silver + copper, both solid',
      'silver + liquid',
      'copper + liquid',
    ]);
  });
});

describe('sectionDrawing of a carat section', () => {
  it('draws the field of 9 ct gold in which liquid stands beside two solids', () => {
    const { fields } = sectionDrawing(nineCarat, 600, 1050);
    const field = fields.find(({ kind }) => kind === 'three-phases');
    const [start, end] = [nineCarat.roof[0], nineCarat.roof.at(-1)];
    const middle = ((start?.x ?? 0) + (end?.x ?? 0)) / 2;
    const roof = nineCarat.roof.reduce((best, p) =>
      Math.abs(p.x - middle) < Math.abs(best.x - middle) ? p : best,
    );
    const state = equilibrium({ Au: 37.5, Ag: 62.5 - roof.x, Cu: roof.x }, roof.temperatureC - 0.2);
    expect(state.withinModel && state.phases).toHaveLength(3);
    expect(field && isInside(field, { x: roof.x, temperatureC: roof.temperatureC - 0.2 })).toBe(true);
  });

  it('has no such field in a binary, where it shrinks to a line', () => {
    expect(silverCopper.roof).toEqual([]);
  });
});
