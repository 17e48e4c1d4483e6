import { describe, expect, it } from 'vitest';
import { cardFiguresInput } from './build-card-context.fixture.ts';
import { computeCardFigures } from './card-figures.ts';
import { flaskTemperatureAt } from './flask-cooling.ts';

const figures = computeCardFigures(cardFiguresInput);

describe('figures of a pour card', () => {
  it('pours at the liquidus plus the superheat of process and section', () => {
    expect(figures.pourC).toEqual({ low: 969, target: 979, high: 988 });
    expect(figures.meltHoldC).toBe(984);
  });

  it('keeps a centrifugal flask and melt lower than a vacuum one', () => {
    const spun = computeCardFigures({ ...cardFiguresInput, method: 'centrifugal' });
    expect(spun.flaskHoldC).toBeLessThan(figures.flaskHoldC);
    expect(spun.pourC.target).toBeLessThan(figures.pourC.target);
  });

  it('wants hotter metal and mould for thinner work', () => {
    const thin = computeCardFigures({ ...cardFiguresInput, sectionMm: 0.8 });
    expect(thin.pourC.target).toBeGreaterThan(figures.pourC.target);
    expect(thin.flaskHoldC).toBeGreaterThan(figures.flaskHoldC);
  });

  it('ends the pour window when the mould has reached its coldest allowed temperature', () => {
    const mould = { startC: figures.flaskHoldC, roomC: figures.roomC, perSecond: figures.coolingPerSecond };
    expect(flaskTemperatureAt(mould, figures.pourWindowS)).toBeGreaterThanOrEqual(figures.flaskPourLowC);
    expect(flaskTemperatureAt(mould, figures.pourWindowS + 1)).toBeLessThan(figures.flaskPourLowC);
  });

  it('turns wax into metal by density, button included', () => {
    expect(figures.metalWantedG).toBeCloseTo((5 * 1.1 * 15.45) / 0.96, 9);
  });

  it('gives every figure a rule, inputs and a source', () => {
    for (const basis of Object.values(figures.basis)) {
      expect(basis.rule).not.toBe('');
      expect(basis.inputs.length).toBeGreaterThan(0);
      expect(basis.source).not.toBe('');
    }
  });
});
