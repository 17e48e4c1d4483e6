import { measureCurveError, measureVerdicts } from '#tests/support/measure-curve-error.ts';

/** How well cooling curves are read: the error of the liquidus (°C) and of the verdicts, over 200 played melts each. */
export const benchCoolingCurve = (): Promise<Record<string, number>> => {
  const start = performance.now();
  const error = measureCurveError(200, 11);
  const milliseconds = (performance.now() - start) / error.curves;
  const verdicts = measureVerdicts(200, 23);
  return Promise.resolve({
    'curve.curves': error.curves,
    'curve.untold': error.untold,
    'curve.liquidusBiasC': error.biasC,
    'curve.liquidusRmsC': error.rmsC,
    'curve.liquidusWithin95C': error.within95C,
    'curve.liquidusLargestC': error.largestC,
    'curve.readMs': milliseconds,
    'verdict.curves': verdicts.curves,
    'verdict.untold': verdicts.untold,
    'verdict.falseAlarms': verdicts.falseAlarms,
    'verdict.missed': verdicts.missed,
    'verdict.copperRmsWt': verdicts.copperRmsWt,
  });
};
