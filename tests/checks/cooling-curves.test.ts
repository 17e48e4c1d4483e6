import { describe, expect, it } from 'vitest';
import { findArrests, type Arrests } from '#shared/domain/cooling-curve/find-arrests.ts';
import { judgeCurve } from '#shared/domain/cooling-curve/judge-curve.ts';
import { fixedPointData } from '#shared/domain/instrument/fixed-point.ts';
import { randomStream } from '#tests/checks/support/random.ts';
import { measureCurveError, measureVerdicts } from '#tests/support/measure-curve-error.ts';
import { playCooling, plainMelt, type PlayedMelt } from '#tests/support/play-cooling.ts';

const arrestsOf = (melt: Partial<PlayedMelt>): Arrests => {
  const { found, fault } = findArrests(playCooling({ ...plainMelt, ...melt }, randomStream(5)));
  if (!found) throw new Error(`No arrest was found: ${fault}.`);
  return found;
};

const logged = { noiseC: 0.5, undercoolingC: 5, lagS: 1, heldS: 10 };

/*
 * The shapes are those of any textbook of metallurgy: a pure metal and a eutectic stop at one temperature, an alloy
 * between them slows down at its liquidus and stops once more at the eutectic.
 */
describe('the shape of published cooling curves', () => {
  // ITS-90: silver freezes at 961.78 °C.
  it('pure silver: one plateau at its freezing point', () => {
    const found = arrestsOf({ composition: { Ag: 100 }, startC: 1020, untilC: 900, ...logged });
    expect(Math.abs(found.liquidusC - fixedPointData.silver.temperatureC)).toBeLessThan(1);
    expect(found.plateauC).toBeNull();
    expect(Math.abs((found.endC ?? 0) - fixedPointData.silver.temperatureC)).toBeLessThan(4);
  });

  // ITS-90: gold freezes at 1064.18 °C.
  it('pure gold: one plateau at its freezing point', () => {
    const found = arrestsOf({ composition: { Au: 100 }, startC: 1120, untilC: 1000, ...logged });
    expect(Math.abs(found.liquidusC - fixedPointData.gold.temperatureC)).toBeLessThan(1);
    expect(found.plateauC).toBeNull();
  });

  // NIST solder systems, Ag-Cu: eutectic at 779.1 °C with 71.59 wt% silver.
  it('silver-copper eutectic: one plateau where the phase rule leaves no freedom', () => {
    const found = arrestsOf({ composition: { Ag: 71.59, Cu: 28.41 }, startC: 850, untilC: 720, ...logged });
    expect(Math.abs(found.liquidusC - fixedPointData['silver-copper'].temperatureC)).toBeLessThan(1);
  });

  // The same source: sterling's liquidus 896 °C by its parameters (handbooks give about 893 to 899), then 779.1 °C.
  it('sterling as cast: its liquidus, then the eutectic plateau', () => {
    const found = arrestsOf(logged);
    expect(found.liquidusC).toBeGreaterThan(893);
    expect(found.liquidusC).toBeLessThan(899);
    expect(Math.abs((found.plateauC ?? 0) - fixedPointData['silver-copper'].temperatureC)).toBeLessThan(1.5);
    expect(found.undercoolingC).toBeGreaterThan(2);
  });
});

describe('the error of the liquidus', () => {
  const error = measureCurveError(200, 11);

  it('is half a degree over 200 curves of nine alloys, with noise, undercooling, lag and spikes', () => {
    // Measured: rms 0.5 °C, 95 % within 1.0 °C, largest 3.0 °C; the bounds leave a little room.
    expect(error.rmsC).toBeLessThan(0.8);
    expect(Math.abs(error.biasC)).toBeLessThan(0.3);
    expect(error.within95C).toBeLessThan(1.5);
    expect(error.largestC).toBeLessThan(4);
  });

  it('is bought by declining to answer seldom', () => {
    expect(error.untold).toBeLessThan(8);
  });
});

describe('the verdict on sterling', () => {
  const verdicts = measureVerdicts(200, 23);

  it('takes right for right, and wrong by 1.5 wt% copper or more for wrong', () => {
    expect(verdicts.untold).toBeLessThan(8);
    expect(verdicts.falseAlarms).toBe(0);
    expect(verdicts.missed).toBe(0);
  });

  it('tells how much copper it is', () => {
    expect(verdicts.copperRmsWt).toBeLessThan(0.2);
  });
});

describe('a wrong alloy in the crucible', () => {
  const judge = (composition: PlayedMelt['composition'], asked: PlayedMelt['composition']) =>
    judgeCurve({
      points: playCooling({ ...plainMelt, ...logged, composition, startC: 1010 }, randomStream(9)),
      compositionWt: asked,
      toleranceWt: {},
      thermometerC: 2,
      unit: 'C',
    });

  it('betrays itself: silver with 20 wt% copper for sterling', () => {
    const verdict = judge({ Ag: 80, Cu: 20 }, { Ag: 92.5, Cu: 7.5 });
    expect(verdict).toMatchObject({ kind: 'differs', element: 'Cu' });
    expect(verdict.kind === 'differs' && verdict.moreWt).toBeGreaterThan(11.5);
    expect(verdict.sentence).toMatch(/^Differs by 8\d °C: .* about 1[23]\.\d wt% more copper\.$/);
  });

  it('betrays itself: fine silver for sterling', () => {
    const verdict = judge({ Ag: 100 }, { Ag: 92.5, Cu: 7.5 });
    expect(verdict.sentence).toMatch(/about 7\.\d wt% less copper\.$/);
  });

  it('is told to be another alloy where no copper explains it', () => {
    const verdict = judge({ Au: 75, Ag: 12.5, Cu: 12.5 }, { Au: 91.7, Ag: 4.3, Cu: 4 });
    expect(verdict.kind).toBe('differs');
  });
});
