import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { columnLabels } from './column-labels.ts';
import { temperatureScale, type ColumnTemperatures } from './temperature-scale.ts';

const gold: ColumnTemperatures = {
  solidusC: 885,
  liquidusC: 901,
  windowC: { low: 980, high: 1010 },
  rangeC: { low: 800, high: 1060 },
};

const anyColumn = fc
  .record({
    low: fc.integer({ min: 300, max: 700 }),
    asCast: fc.option(fc.integer({ min: 0, max: 60 }), { nil: undefined }),
    solid: fc.integer({ min: 10, max: 200 }),
    mushy: fc.integer({ min: 0, max: 150 }),
    superheat: fc.integer({ min: -20, max: 120 }),
    window: fc.option(fc.integer({ min: 1, max: 60 }), { nil: undefined }),
    above: fc.integer({ min: 1, max: 100 }),
  })
  .map((part): ColumnTemperatures => {
    const solidusC = part.low + part.solid;
    const liquidusC = solidusC + part.mushy;
    const low = liquidusC + part.superheat;
    const windowC = part.window === undefined ? null : { low, high: low + part.window };
    return {
      solidusC,
      liquidusC,
      ...(part.asCast === undefined ? {} : { asCastSolidusC: solidusC - part.asCast }),
      windowC,
      rangeC: { low: part.low, high: Math.max(liquidusC, windowC?.high ?? 0) + part.above },
    };
  });

describe('temperatureScale', () => {
  it('rises strictly with the temperature, whatever the alloy and its window', () => {
    fc.assert(
      fc.property(anyColumn, fc.double({ min: 0, max: 1, noNaN: true }), (column, at) => {
        const scale = temperatureScale(column, 100, 500);
        const { low, high } = column.rangeC;
        const celsius = low + at * (high - low - 1);
        expect(scale(celsius + 1)).toBeLessThan(scale(celsius));
      }),
    );
  });

  it('fills the picture and never leaves it', () => {
    const scale = temperatureScale(gold, 100, 500);
    expect(scale(800)).toBeCloseTo(500, 9);
    expect(scale(1060)).toBeCloseTo(100, 9);
    expect(scale(20)).toBe(scale(800));
    expect(scale(9999)).toBe(scale(1060));
  });

  it('stretches a mushy zone of 16 degrees to more than a quarter of the picture', () => {
    const scale = temperatureScale(gold, 100, 500);
    expect(scale(885) - scale(901)).toBeGreaterThan(100);
  });
});

describe('columnLabels', () => {
  it('stand apart, in order from hot to cold', () => {
    fc.assert(
      fc.property(anyColumn, (column) => {
        const labels = columnLabels(column, temperatureScale(column, 112, 492), String);
        labels.slice(1).forEach((label, index) => {
          expect(label.y - (labels[index]?.y ?? Infinity)).toBeGreaterThanOrEqual(25.999);
        });
      }),
    );
  });
});
